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
  /** 0: called exactly so; 1: the words are in its name; 2: in its group; 3: in an algorithm. */
  readonly rank: 0 | 1 | 2 | 3;
}

function foundIn(shown: ShownSet, q: string, aliases: ReadonlyMap<string, string>): readonly Found[] {
  const { set, content } = shown;
  const cases = casesOfCatalogue(set, content, aliases);
  const exact = set.byName(q)?.key;
  const words = q.toLowerCase();
  const has = (text: string | null) => text?.toLowerCase().includes(words) ?? false;
  return [
    ...cases.filter((one) => one.case.key === exact),
    ...filterCases(cases, { q }).filter((one) => one.case.key !== exact),
  ].map((one): Found => {
    if (one.case.key === exact || one.alias?.toLowerCase() === words)
      return { shown, one, algorithm: null, rank: 0 };
    if (has(one.name) || has(one.alias)) return { shown, one, algorithm: null, rank: 1 };
    const algorithm = one.algorithms.find(({ algorithm: text }) => text.includes(q));
    if (algorithm) return { shown, one, algorithm: algorithm.algorithm, rank: 3 };
    return { shown, one, algorithm: has(one.group) ? null : (one.algorithms[0]?.algorithm ?? null), rank: 2 };
  });
}
