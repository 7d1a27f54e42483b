/** A figure of a table: alone under its header, on paper too; where rows are stacked and have none, with its word. */
export function Figure({ value, narrow }: { value: string; narrow: string }) {
  return (
    <>
      <span className="max-lg:not-print:hidden">{value}</span>
      <span className="lg:hidden print:hidden">{narrow}</span>
    </>
  );
}
