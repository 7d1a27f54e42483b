/** Solving a last layer in two looks: orient everything, then permute everything. */
import { AUFS, type Auf, act, product } from './action.ts';
import { type CaseOfSet, caseSet } from './case-set.ts';
import { moveCounts } from './move-counts.ts';
import { effectOf, rightAufsAfter, rightAufsBefore } from './solving.ts';

/** A turn of the top, then an algorithm. */
export interface Look {
  readonly before: Auf;
  readonly algorithm: string;
}

export interface TwoLookRoute {
  /** null where everything is oriented already. */
  readonly first: Look | null;
  /** The PLL case, or its skip, that the first look leaves. */
  readonly leaves: CaseOfSet;
  /** null where nothing but an AUF is left. */
  readonly second: Look | null;
  /** The last turn of the top. */
  readonly after: Auf;
  /** Slice turn metric, with each turn of the top before, between and after as one move. */
  readonly moves: number;
}

const aufMoves = (auf: Auf): number => (auf === 0 ? 0 : 1);
const lookMoves = (look: Look | null): number =>
  look === null ? 0 : aufMoves(look.before) + moveCounts(look.algorithm).stm;

/** The turn that finishes a layer in which only the top is turned, or null. */
const turnHome = (state: number): Auf | null => AUFS.find((auf) => act(state, auf, 0) === 0) ?? null;

/** How an algorithm finishes an oriented layer, the top turned as little as can be; null if it does not. */
function finish(state: number, algorithm: string): { second: Look; after: Auf } | null {
  const ways = rightAufsBefore(caseSet('pll'), algorithm, state).flatMap((before) =>
    rightAufsAfter(caseSet('pll'), algorithm, state, before).map((after) => ({
      second: { before, algorithm },
      after,
    })),
  );
  const turns = (way: (typeof ways)[number]) => aufMoves(way.second.before) + aufMoves(way.after);
  return ways.reduce<(typeof ways)[number] | null>(
    (best, way) => (best && turns(best) <= turns(way) ? best : way),
    null,
  );
}

/** The ways a state is oriented by these algorithms, each with the state it leaves. */
function orient(state: number, algorithms: readonly string[]): { first: Look | null; left: number }[] {
  const oll = caseSet('oll');
  if (oll.caseOfState(state)?.skip) return [{ first: null, left: state }];
  return algorithms.flatMap((algorithm) => {
    const effect = effectOf(algorithm);
    if (effect === null) return [];
    return rightAufsBefore(oll, algorithm, state).map((before) => ({
      first: { before, algorithm },
      left: product(act(state, before, 0), effect),
    }));
  });
}

/**
 * Every way of solving a full state in two looks with these algorithms: each algorithm of the first look at each
 * right AUF, each algorithm of the second look for the PLL case that it leaves, at the AUF that turns the top
 * least. Shortest first, equals in the order of the algorithms given. Algorithms of the first look that do not
 * orient the state are passed over, so all of OLL may be given; a PLL case without algorithms ends its route.
 * @param secondLook algorithms by the key of their PLL case.
 * @throws AlgorithmSyntaxError if an algorithm cannot be read; RangeError if there is no such state.
 */
export function twoLookRoutes(
  state: number,
  firstLook: readonly string[],
  secondLook: ReadonlyMap<string, readonly string[]>,
): readonly TwoLookRoute[] {
  const routes = orient(state, firstLook).flatMap(({ first, left }): TwoLookRoute[] => {
    const leaves = caseSet('pll').caseOfState(left)!;
    const home = turnHome(left);
    const ends =
      home === null
        ? (secondLook.get(leaves.key) ?? []).flatMap((algorithm) => finish(left, algorithm) ?? [])
        : [{ second: null, after: home }];
    return ends.map(({ second, after }) => ({
      first,
      leaves,
      second,
      after,
      moves: lookMoves(first) + lookMoves(second) + aufMoves(after),
    }));
  });
  return routes.sort((one, other) => one.moves - other.moves);
}
