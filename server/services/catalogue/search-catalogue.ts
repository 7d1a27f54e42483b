import type { SearchInput, SearchView } from '#shared/contracts/catalogue-search.ts';
import { readAlgorithm } from '#shared/lastlayer/index.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { type CaseOfCatalogue, casesOfCatalogue } from './cases-of-catalogue.ts';
import { type Match, matchWords, RANKS } from './match-words.ts';
import { readAliases } from './read-aliases.ts';
import { readAllSets } from './read-all-sets.ts';
import { inNameOrder } from './read-edition.ts';
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
    found.sort((one, other) => RANKS.indexOf(one.rank) - RANKS.indexOf(other.rank));
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

interface Found extends Match {
  readonly shown: ShownSet;
  readonly one: CaseOfCatalogue;
}

function foundIn(shown: ShownSet, q: string, aliases: ReadonlyMap<string, string>): readonly Found[] {
  const { set, content } = shown;
  const asked = { q, setName: set.definition.name, exactKey: set.byName(q)?.key };
  return casesOfCatalogue(set, content, aliases)
    .flatMap((one): Found[] => {
      const match = matchWords(one, asked);
      return match ? [{ shown, one, ...match }] : [];
    })
    .sort((one, other) => inNameOrder(one.one.name, other.one.name));
}
