/** A figure of a table: alone under its header; where rows are stacked and there is none, with its word. */
export function Figure({ value, narrow }: { value: string; narrow: string }) {
  return (
    <>
      <span className="max-lg:hidden">{value}</span>
      <span className="lg:hidden">{narrow}</span>
    </>
  );
}
