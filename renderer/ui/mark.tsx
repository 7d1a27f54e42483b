const CELLS = [0, 1, 2, 3].flatMap((row) => [0, 1, 2, 3].map((column) => ({ row, column })));

/** One orbit of a quarter turn of the 4×4 grid: row r, column c goes to row c, column 3 − r. */
const ORBIT = new Set(['0 2', '2 3', '3 1', '1 0']);

/** The product's mark: a 4×4 grid with one four-fold orbit inked. Decorative unless it has a title. */
export function Mark({ title, className = 'size-6' }: { title?: string; className?: string }) {
  return (
    <svg
      viewBox="0 0 50 50"
      className={className}
      shapeRendering="crispEdges"
      focusable="false"
      role={title ? 'img' : undefined}
      aria-label={title}
      aria-hidden={title ? undefined : true}
    >
      {CELLS.map(({ row, column }) => (
        <rect
          key={`${row} ${column}`}
          x={1 + column * 12}
          y={1 + row * 12}
          width="12"
          height="12"
          strokeWidth="2"
          className={ORBIT.has(`${row} ${column}`) ? 'fill-ink stroke-ink' : 'fill-none stroke-ink'}
        />
      ))}
    </svg>
  );
}
