import type { EditionView } from '#shared/contracts/catalogue.ts';

export type CaseRow = EditionView['cases'][number];

/** How cases can be sorted; `-` before the word turns it round (`?sort=-prior`). */
const SORTS = ['name', 'group', 'prior', 'angles', 'algorithms'] as const;
export type Sort = (typeof SORTS)[number];

export interface SortOrder {
  readonly by: Sort;
  readonly descending: boolean;
}

export function sortFrom(word: string | null): SortOrder {
  const descending = word?.startsWith('-') ?? false;
  const by = SORTS.find((sort) => sort === word?.slice(descending ? 1 : 0));
  return by ? { by, descending } : { by: 'name', descending: false };
}

/** The word for an address; null for the usual order. */
export function sortWord({ by, descending }: SortOrder): string | null {
  return by === 'name' && !descending ? null : `${descending ? '-' : ''}${by}`;
}

const collator = new Intl.Collator('en', { numeric: true });

const COMPARE: Readonly<Record<Sort, (one: CaseRow, other: CaseRow) => number>> = {
  name: (one, other) => collator.compare(one.name, other.name),
  group: (one, other) => collator.compare(one.group, other.group),
  prior: (one, other) => one.prior.weight - other.prior.weight,
  angles: (one, other) => one.angles - other.angles,
  algorithms: (one, other) => one.algorithms.length - other.algorithms.length,
};

/** Cases in an order; those that are equal in it stay in the order of their names. */
export function sortCases(cases: readonly CaseRow[], { by, descending }: SortOrder): CaseRow[] {
  const turn = descending ? -1 : 1;
  return [...cases].sort((one, other) => turn * COMPARE[by](one, other) || COMPARE.name(one, other));
}

const plain = (text: string): string => text.toLowerCase().replaceAll(/[’′‘`´]/gu, "'");

/** Cases in whose name, group, algorithms or notes every word of the text occurs. */
export function filterCases(cases: readonly CaseRow[], text: string): CaseRow[] {
  const wanted = plain(text).trim();
  if (wanted === '') return [...cases];
  return cases.filter(({ name, group, algorithms }) =>
    [name, group, ...algorithms.flatMap(({ algorithm, note }) => [algorithm, note])].some((field) =>
      plain(field).includes(wanted),
    ),
  );
}
