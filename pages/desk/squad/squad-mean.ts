import type { SquadView } from '#shared/contracts/desk.ts';

/** Mean figure of a column, 0..1, over those who have begun it; null when nobody has. */
export function meanOf({ rows }: Pick<SquadView, 'rows'>, column: number): number | null {
  const values = rows.flatMap((row) => {
    const figure = row.cells[column]?.figure;
    return figure && figure.rests !== 'nothing' ? [figure.value] : [];
  });
  return values.length === 0 ? null : values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** How many answer for a column and have not answered any of its cases yet: the mean leaves them out. */
export function notBegun({ rows }: Pick<SquadView, 'rows'>, column: number): number {
  return rows.filter((row) => row.cells[column]?.figure?.rests === 'nothing').length;
}
