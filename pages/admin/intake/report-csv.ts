import { csvOf } from '#renderer/csv.ts';
import type { DraftLine } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';

const text = intakeText.draft;

/** Every line with its finding and where it stands, for whoever wrote the file. */
export function reportCsv(lines: readonly DraftLine[]): string {
  return csvOf([
    text.reportColumns,
    ...lines.map((line) => [
      line.line,
      line.caseName,
      line.algorithm,
      line.group,
      line.solves,
      line.finding,
      line.column,
      line.decision === 'take'
        ? text.taken(line.solves ?? '')
        : [line.says, line.hint].filter(Boolean).join('; '),
      text.standings[line.standing],
      line.note,
    ]),
  ]);
}
