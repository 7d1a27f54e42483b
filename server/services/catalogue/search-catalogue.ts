import type { SearchInput, SearchView } from '#shared/contracts/catalogue-search.ts';
import { readAlgorithm } from '#shared/lastlayer/index.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { type CaseOfCatalogue, casesOfCatalogue } from './cases-of-catalogue.ts';
import { filterCases } from './find-cases.ts';
import { readAliases } from './read-aliases.ts';
import { readAllSets } from './read-all-sets.ts';
import type { ShownSet } from './read-shown-set.ts';
import { referencesIn } from './refer-to-case.ts';
import { searchMoves } from './search-moves.ts';

/** Cases told by name; the rest are counted. */
const SHOWN = 24;

/**
 * Cases of all sets by name, alias, number or part of an algorithm, and what the words do if they are moves.
 */
export async function searchCatalogue(ctx: Ctx, { q }: SearchInput): Promise<SearchView> {
  return asSignedIn(ctx, async (tx, actor) => {
    const sets = await readAllSets(tx);
    const aliases = await readAliases(tx, actor);
    const found = sets.flatMap((shown) => foundIn(shown, q, aliases));
    found.sort((one, other) => one.rank - other.rank);
    const moves = searchMoves(q, sets, aliases);
    return {
      q,
      moves: moves.kind === 'not-a-move' && (found.length > 0 || !beginsWithMoves(q, moves)) ? null : moves,
      names: found.slice(0, SHOWN).map(({ shown, one, algorithm }) => ({
        set: { setKey: shown.set.definition.key, name: shown.set.definition.name },
        case: referencesIn(shown, aliases)(one.case),
        algorithm,
      })),
      more: Math.max(0, found.length - SHOWN),
    };
  });
}

/** Whether what is no algorithm was meant as one: two moves at least before the character that is none. */
function beginsWithMoves(q: string, { column, token }: { column: number; token: string }): boolean {
  const read = readAlgorithm(q.slice(0, Math.min(column - 1, q.lastIndexOf(token, column - 1))));
  return 'normalised' in read && read.normalised.split(' ').length > 1;
}

interface Found {
  readonly shown: ShownSet;
  readonly one: CaseOfCatalogue;
  readonly algorithm: string | null;
  /** 0: called exactly so; 1: the words are in its name, or are its number; 2: in its group; 3: in an algorithm. */
  readonly rank: 0 | 1 | 2 | 3;
}

/** From this many letters on, words may stand inside others: a T is no Antisune. */
const LETTERS_INSIDE = 3;
const unspaced = (moves: string): string => moves.replaceAll(/[’′‘`´]/gu, "'").replaceAll(/\s+/gu, '');

function foundIn(shown: ShownSet, q: string, aliases: ReadonlyMap<string, string>): readonly Found[] {
  const { set, content } = shown;
  const cases = casesOfCatalogue(set, content, aliases);
  const exact = set.byName(q)?.key;
  const words = q.toLowerCase();
  const has = (text: string | null): boolean => {
    const letters = text?.toLowerCase() ?? '';
    return words.length < LETTERS_INSIDE ? letters.split(/\s/u).includes(words) : letters.includes(words);
  };
  const wanted = [
    ...cases.filter((one) => one.case.key === exact),
    ...filterCases(cases, { q }).filter((one) => one.case.key !== exact),
  ];
  return wanted.flatMap((one): Found[] => {
    const found = (rank: Found['rank'], algorithm: string | null = null) => [{ shown, one, algorithm, rank }];
    if (one.case.key === exact || one.alias?.toLowerCase() === words) return found(0);
    if (has(one.name) || has(one.alias) || String(one.case.number) === words.replace('#', ''))
      return found(1);
    if (has(one.group)) return found(2);
    const algorithm = one.algorithms.find(({ algorithm: text }) => unspaced(text).includes(unspaced(q)));
    return algorithm && words.length >= LETTERS_INSIDE ? found(3, algorithm.algorithm) : [];
  });
}
