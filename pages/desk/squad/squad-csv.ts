import { type CsvValue, csvOf } from '#renderer/csv.ts';
import type { SquadRow, SquadView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.squad;

/** The grid as a file, rows as they stand on the page; shares in per cent with one decimal. */
export function squadCsv(view: Pick<SquadView, 'columns'>, rows: readonly SquadRow[]): string {
  const head: CsvValue[] = [
    text.member,
    text.csvHead.role,
    ...view.columns.flatMap(({ name }) => [
      text.csvHead.recall(name),
      text.csvHead.low(name),
      text.csvHead.high(name),
      text.csvHead.answersOf(name),
      text.csvHead.change(name),
    ]),
    text.csvHead.answers,
    text.lastTrained,
    text.csvHead.minutes,
  ];
  return csvOf([
    head,
    ...rows.map((row): CsvValue[] => [
      row.nickname,
      text.roles[row.role],
      ...row.cells.flatMap(({ figure, change }): CsvValue[] =>
        figure?.rests === 'nothing'
          ? [deskText.notBegun, null, null, 0, null]
          : figure
            ? [
                tenths(figure.value * 100),
                tenths(figure.low * 100),
                tenths(figure.high * 100),
                figure.answers,
                change === null ? null : tenths(change),
              ]
            : [null, null, null, null, null],
      ),
      row.answers,
      row.lastTrained,
      tenths(row.minutesPerDay),
    ]),
  ]);
}

function tenths(value: number): number {
  return Math.round(value * 10) / 10;
}
