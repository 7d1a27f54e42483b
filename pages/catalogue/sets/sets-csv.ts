import { csvOf } from '#renderer/csv.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import type { SetRow } from './sort-sets.ts';

const text = catalogueText.sets;

/** The sets as a table for a spreadsheet: what each is and how far its newest edition goes. */
export function setsCsv(sets: readonly SetRow[]): string {
  return csvOf([
    text.csvColumns,
    ...sets.map(({ name, entry, mix, toldApart, solved, cases, editions: [newest] }) => [
      name,
      text.entryOrMix(entry, mix),
      text.aspects(toldApart),
      text.aspects(solved),
      cases,
      newest?.number ?? null,
      newest?.cases ?? null,
      newest?.algorithms ?? null,
    ]),
  ]);
}
