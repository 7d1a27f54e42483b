import type { CaseOfCatalogue } from './cases-of-catalogue.ts';

/** How well words name a case, the best first. */
export const RANKS = [
  /** Called exactly so. */
  'exact',
  /** Its name begins so, or it is its number. */
  'begins',
  /** A later word of its name, or a word of its group. */
  'word',
  /** Inside its name. */
  'inside',
  /** In one of its algorithms. */
  'algorithm',
] as const;
export type Rank = (typeof RANKS)[number];

export interface Match {
  readonly rank: Rank;
  /** The algorithm that has the words in it; null where a name has. */
  readonly algorithm: string | null;
}

/** From this many letters on, words may stand inside others: a T is no Antisune. */
const LETTERS_INSIDE = 3;

const plain = (text: string): string => text.normalize('NFKC').toLowerCase();
const unspaced = (moves: string): string => moves.replaceAll(/[’′‘`´]/gu, "'").replaceAll(/\s+/gu, '');

/** Whether a name begins with the words; a 1 does not begin a 10. */
function begins(name: string, words: string): boolean {
  return name.startsWith(words) && !(/\d$/u.test(words) && /^\d/u.test(name.slice(words.length)));
}

/**
 * What is left of words once the set's own name before them and “perm” after them are taken away: `PLL J perm` asks
 * PLL for J.
 */
export function wordsWithin(setName: string, q: string): string {
  const words = plain(q.trim()).replaceAll(/\s+/gu, ' ');
  const name = `${plain(setName)} `;
  const rest = words.startsWith(name) ? words.slice(name.length) : words;
  return rest.replace(/(?<=.)[ -]perms?$/u, '');
}

/**
 * How `q`, looked for in a set of this name, names the case; null where it does not.
 * @param exactKey the case that the set itself knows by these words, if any.
 */
export function matchWords(
  one: CaseOfCatalogue,
  { q, setName, exactKey }: { q: string; setName: string; exactKey: string | undefined },
): Match | null {
  const words = wordsWithin(setName, q);
  const named = (rank: Rank): Match => ({ rank, algorithm: null });
  const names = [one.name, one.alias ?? ''].filter(Boolean).map(plain);
  if (one.case.key === exactKey || names.includes(words)) return named('exact');
  if (String(one.case.number) === words.replace('#', '')) return named('begins');
  if (words === '') return null;
  if (names.some((name) => begins(name, words))) return named('begins');
  const asWord = (text: string) => ` ${text} `.includes(` ${words} `);
  if (names.some(asWord) || asWord(plain(one.group))) return named('word');
  if (words.length < LETTERS_INSIDE) return null;
  if (names.some((name) => name.includes(words))) return named('inside');
  const turns = unspaced(q);
  const found = one.algorithms.find(({ algorithm }) => unspaced(algorithm).includes(turns));
  return found ? { rank: 'algorithm', algorithm: found.algorithm } : null;
}
