import { CASE_SORTS, type CaseSort } from '#shared/contracts/case-sorts.ts';
import type { CaseOfCatalogue } from './cases-of-catalogue.ts';
import { inNameOrder } from './read-edition.ts';

export interface CaseFilter {
  readonly group?: string | undefined;
  readonly angles?: string | undefined;
  readonly algorithms?: 'with' | 'without' | undefined;
  readonly q?: string | undefined;
}

const plain = (text: string): string => text.normalize('NFKC').toLowerCase();
/** Moves without the spaces between them; a small r is not a large one. */
const moves = (text: string): string => text.replaceAll(/[’′‘`´]/gu, "'").replaceAll(/\s+/gu, '');

/** The cases that fit: every part of the filter that is given must. */
export function filterCases(cases: readonly CaseOfCatalogue[], filter: CaseFilter): CaseOfCatalogue[] {
  const { group, angles, algorithms, q = '' } = filter;
  const fitsWords = wordsFit(q.trim());
  return cases.filter(
    (one) =>
      (group === undefined || one.group === group) &&
      (angles === undefined || String(one.case.angles) === angles) &&
      (algorithms === undefined || one.algorithms.length > 0 === (algorithms === 'with')) &&
      fitsWords(one),
  );
}

function wordsFit(words: string): (one: CaseOfCatalogue) => boolean {
  if (words === '') return () => true;
  const [text, turns] = [plain(words), moves(words)];
  const number = /^#?(\d+)$/.exec(words)?.[1];
  return (one) =>
    one.case.number === Number(number) ||
    [one.name, one.alias ?? '', one.group].some((field) => plain(field).includes(text)) ||
    one.algorithms.some(({ algorithm }) => moves(algorithm).includes(turns));
}

const COMPARE: Readonly<Record<CaseSort, (one: CaseOfCatalogue, other: CaseOfCatalogue) => number>> = {
  number: () => 0,
  name: (one, other) => inNameOrder(one.name, other.name),
  group: (one, other) => inNameOrder(one.group, other.group),
  prior: (one, other) => one.case.weight - other.case.weight,
  angles: (one, other) => one.case.angles - other.case.angles,
  algorithms: (one, other) => one.algorithms.length - other.algorithms.length,
};

/**
 * The order of a sort word: total, because cases that are equal in it follow by number. `-` before the word turns
 * it round, the numbers too. An unknown word is the usual order, by name.
 */
export function orderOf(word = 'name'): (one: CaseOfCatalogue, other: CaseOfCatalogue) => number {
  const turn = word.startsWith('-') ? -1 : 1;
  const by = CASE_SORTS.find((sort) => sort === word.replace('-', '')) ?? 'name';
  return (one, other) => turn * (COMPARE[by](one, other) || one.case.number - other.case.number);
}

export interface CasePage {
  readonly rows: readonly CaseOfCatalogue[];
  /** Place of the first row among all, from 1; 0 for an empty page. */
  readonly from: number;
  readonly next: string | null;
  readonly previous: string | null;
}

/**
 * One page of sorted cases: the first `size` behind the case `after`, or the last `size` ahead of the case `before`,
 * or the first of all. The two need not be among the cases: their places in the order count.
 */
export function pageOfCases(
  sorted: readonly CaseOfCatalogue[],
  order: (one: CaseOfCatalogue, other: CaseOfCatalogue) => number,
  { after, before, size }: { after?: CaseOfCatalogue; before?: CaseOfCatalogue; size: number },
): CasePage {
  const ahead = (of: CaseOfCatalogue, own: boolean) =>
    sorted.filter((one) => order(one, of) < 0 || (own && one.case.key === of.case.key)).length;
  const start = before ? Math.max(0, ahead(before, false) - size) : after ? ahead(after, true) : 0;
  const end = before ? ahead(before, false) : start + size;
  const rows = sorted.slice(start, end);
  return {
    rows,
    from: rows.length === 0 ? 0 : start + 1,
    next: start + rows.length < sorted.length ? (rows.at(-1)?.case.key ?? null) : null,
    previous: start > 0 ? (rows[0]?.case.key ?? null) : null,
  };
}
