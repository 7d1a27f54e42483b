import { csvOf } from '#renderer/csv.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import type { CaseRow } from './sort-cases.ts';

/** An edition's cases as a case file: what Intake reads, algorithms in order of preference. */
export function editionCsv(cases: readonly CaseRow[]): string {
  return csvOf([
    catalogueText.edition.csvColumns,
    ...cases.flatMap(({ name, group, algorithms }) =>
      algorithms.map(({ algorithm, note }) => [name, algorithm, group, note]),
    ),
  ]);
}
