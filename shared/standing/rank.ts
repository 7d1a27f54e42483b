/** Figures closer than this are the same figure. */
const SAME = 1e-9;

/**
 * Rows from the highest value down, each with its rank. Equal values share the rank and the next one is
 * skipped (1, 2, 2, 4), as in competition results. Rows of equal value stand in the order of `tieOrder`.
 *
 * @param figureOf a finite number, higher is better
 * @param tieOrder order within a tie; without it, the order the rows came in
 * @throws RangeError for a value that is not a number.
 */
export function rank<Row>(
  rows: readonly Row[],
  figureOf: (row: Row) => number,
  tieOrder: (a: Row, b: Row) => number = () => 0,
): { row: Row; rank: number }[] {
  const valued = rows.map((row) => ({ row, value: Math.round(figureOf(row) / SAME) }));
  if (!valued.every(({ value }) => Number.isFinite(value))) throw new RangeError('A rank needs a number.');
  valued.sort((a, b) => b.value - a.value || tieOrder(a.row, b.row));
  let place = 0;
  let previous = Number.NaN;
  return valued.map(({ row, value }, index) => {
    if (value !== previous) place = index + 1;
    previous = value;
    return { row, rank: place };
  });
}
