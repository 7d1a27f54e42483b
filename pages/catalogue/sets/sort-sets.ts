import type { CatalogueView } from '#shared/contracts/catalogue.ts';

export type SetRow = CatalogueView['sets'][number];

const SORTS = ['set', 'cases', 'editions'] as const;
export type SetSort = (typeof SORTS)[number];

const COMPARE: Readonly<Record<SetSort, (one: SetRow, other: SetRow) => number>> = {
  set: (one, other) => one.name.localeCompare(other.name, 'en', { numeric: true }),
  cases: (one, other) => one.cases - other.cases,
  editions: (one, other) => (one.editions[0]?.publishedAt ?? 0) - (other.editions[0]?.publishedAt ?? 0),
};

/** Sets in the order of a word (`-` turns it round); without one as the trade lists them. */
export function sortSets(sets: readonly SetRow[], word: string | null): SetRow[] {
  const by = SORTS.find((sort) => sort === word?.replace(/^-/, ''));
  if (!by) return [...sets];
  const turn = word?.startsWith('-') ? -1 : 1;
  return [...sets].sort((one, other) => turn * COMPARE[by](one, other));
}
