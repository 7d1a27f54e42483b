import type { MovesFound, MovesHit } from '#shared/contracts/catalogue-search.ts';
import {
  type CaseOfSet,
  cancelledKey,
  inverse,
  moveCounts,
  parseAlgorithm,
  readAlgorithm,
  rightAufsBefore,
  solvesCase,
} from '#shared/lastlayer/index.ts';
import { expandAlgorithm } from '../intake/expand-algorithm.ts';
import { caseOfCatalogue } from './cases-of-catalogue.ts';
import type { ShownSet } from './read-shown-set.ts';
import { referencesIn } from './refer-to-case.ts';

type Aliases = ReadonlyMap<string, string>;

/** What moves do: the cases they solve, and as a scramble lead to, of every set; or what is wrong with them. */
export function searchMoves(text: string, sets: readonly ShownSet[], aliases: Aliases): MovesFound {
  const reading = readAlgorithm(text, expandAlgorithm);
  if (reading.kind === 'not-a-move')
    return { kind: 'not-a-move', column: reading.column, token: reading.token };
  if (reading.kind === 'first-two-layers-broken')
    return { kind: reading.kind, moves: reading.normalised, pieces: [...reading.pieces] };
  const moves = reading.normalised;
  const own = cancelledKey(parseAlgorithm(moves).moves);
  return {
    kind: 'read',
    moves,
    counts: moveCounts(moves),
    sets: sets.flatMap((shown) => {
      const { set } = shown;
      const solves = solvesCase(set, moves);
      const solved = 'case' in solves ? solves.case : null;
      const scrambled = inverse(reading.state);
      const reached = set.caseOfState(scrambled);
      // A set all of whose cases are left alone has nothing to say.
      if ((solved?.skip ?? true) && (reached?.skip ?? true)) return [];
      const hit = (of: CaseOfSet | null, state: number, key: string | null) =>
        of && foundBy(shown, aliases, of, state, key);
      return [
        {
          set: { setKey: set.definition.key, name: set.definition.name },
          solves: hit(solved, reading.state, own),
          leadsTo: hit(reached, scrambled, null),
        },
      ];
    }),
  };
}

/** A case that moves came to in a state of it, and how the catalogue's first algorithm takes that state. */
function foundBy(
  shown: ShownSet,
  aliases: Aliases,
  of: CaseOfSet,
  state: number,
  /** The moves themselves, cancelled, where they solve the case. */
  moves: string | null,
): MovesHit {
  const { algorithms } = caseOfCatalogue(of, shown.content, aliases);
  const algorithm = algorithms[0]?.algorithm ?? null;
  return {
    case: referencesIn(shown, aliases)(of),
    algorithm,
    aufs: algorithm === null ? [] : [...rightAufsBefore(shown.set, algorithm, state)],
    known: algorithms.some((one) => cancelledKey(parseAlgorithm(one.algorithm).moves) === moves),
  };
}
