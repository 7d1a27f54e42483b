/**
 * What can be done to a last-layer state without leaving the last layer: the sixteen-fold action, products,
 * inverses and the mirror. Every answer is a few look-ups in tables of at most 729 bytes.
 */
import {
  cornerRank,
  edgeRank,
  FLIP_AT,
  FLIPS,
  flipCode,
  flipOf,
  indexOf,
  PERMUTATION_AT,
  PERMUTATIONS,
  rankOf,
  requireStateIndex,
  TWIST_AT,
  TWISTS,
  twistCode,
  twistOf,
} from './state.ts';

/** Turns of the top: 0 none, 1 U, 2 U2, 3 U'. */
export type Auf = 0 | 1 | 2 | 3;
export const AUFS: readonly Auf[] = [0, 1, 2, 3];

const table = (size: number, at: (i: number) => number): Uint8Array =>
  Uint8Array.from({ length: size }, (_, i) => at(i));
const p = (rank: number, place: number): number => PERMUTATION_AT[rank * 4 + (place & 3)]!;
const twist = (code: number, place: number): number => TWIST_AT[code * 4 + (place & 3)]!;
const flip = (code: number, place: number): number => FLIP_AT[code * 4 + (place & 3)]!;

/** Permutation rank after turning places by i and pieces by j: at rank·16 + i·4 + j. */
export const PERMUTATION_ACT: Uint8Array = table(PERMUTATIONS * 16, (at) => {
  const [rank, i, j] = [at >> 4, (at >> 2) & 3, at & 3];
  const moved = (place: number) => (p(rank, place + i) - j) & 3;
  return rankOf(moved(0), moved(1), moved(2), moved(3));
});
/** Twist code after turning places by i: at code·4 + i. */
export const TWIST_ACT: Uint8Array = table(TWISTS * 4, (at) => {
  const [code, i] = [at >> 2, at & 3];
  return twistCode(twist(code, i), twist(code, 1 + i), twist(code, 2 + i));
});
/** Flip code after turning places by i: at code·4 + i. */
export const FLIP_ACT: Uint8Array = table(FLIPS * 4, (at) => {
  const [code, i] = [at >> 2, at & 3];
  return flipCode(flip(code, i), flip(code, 1 + i), flip(code, 2 + i));
});

/**
 * The sixteen-fold action of Z4×Z4 on states. `before` quarter turns of the places: the state after
 * U^before was turned on it. `after` quarter turns of the pieces: if an algorithm solves the state, then it
 * solves the new state up to U^after behind it. act(s, k, k) is the same position looked at from another
 * side; act(0, k, k) is 0.
 * @throws RangeError unless `index` is an integer 0..62207.
 */
export function act(index: number, before: Auf, after: Auf): number {
  requireStateIndex(index);
  const turn = before * 4 + after;
  return indexOf(
    PERMUTATION_ACT[cornerRank(index) * 16 + turn]!,
    TWIST_ACT[twistOf(index) * 4 + before]!,
    PERMUTATION_ACT[edgeRank(index) * 16 + turn]!,
    FLIP_ACT[flipOf(index) * 4 + before]!,
  );
}

/** Smallest index of the sixteen images: the same for two states exactly if they are the same 1LLL case. */
export function canonical(index: number): number {
  let least = index;
  for (const before of AUFS) for (const after of AUFS) least = Math.min(least, act(index, before, after));
  return least;
}

/** Product of permutations: at first·24 + then. A place p takes what `first` had at place then[p]. */
const PERMUTATION_PRODUCT: Uint8Array = table(PERMUTATIONS * PERMUTATIONS, (at) => {
  const [first, then] = [Math.floor(at / PERMUTATIONS), at % PERMUTATIONS];
  const moved = (place: number) => p(first, p(then, place));
  return rankOf(moved(0), moved(1), moved(2), moved(3));
});
/** Twists carried by a permutation: at code·24 + rank. */
const TWIST_CARRIED: Uint8Array = table(TWISTS * PERMUTATIONS, (at) => {
  const [code, rank] = [Math.floor(at / PERMUTATIONS), at % PERMUTATIONS];
  return twistCode(twist(code, p(rank, 0)), twist(code, p(rank, 1)), twist(code, p(rank, 2)));
});
const TWIST_SUM: Uint8Array = table(TWISTS * TWISTS, (at) => {
  const [a, b] = [Math.floor(at / TWISTS), at % TWISTS];
  const sum = (place: number) => (twist(a, place) + twist(b, place)) % 3;
  return twistCode(sum(0), sum(1), sum(2));
});
/** Flips carried by a permutation: at code·24 + rank. The sum of two flips is their exclusive or. */
const FLIP_CARRIED: Uint8Array = table(FLIPS * PERMUTATIONS, (at) => {
  const [code, rank] = [Math.floor(at / PERMUTATIONS), at % PERMUTATIONS];
  return flipCode(flip(code, p(rank, 0)), flip(code, p(rank, 1)), flip(code, p(rank, 2)));
});

/** The state reached from `first` by turns that take the solved cube to `then`. Both 0..62207. */
export function product(first: number, then: number): number {
  const [corners, edges] = [cornerRank(then), edgeRank(then)];
  return indexOf(
    PERMUTATION_PRODUCT[cornerRank(first) * PERMUTATIONS + corners]!,
    TWIST_SUM[TWIST_CARRIED[twistOf(first) * PERMUTATIONS + corners]! * TWISTS + twistOf(then)]!,
    PERMUTATION_PRODUCT[edgeRank(first) * PERMUTATIONS + edges]!,
    FLIP_CARRIED[flipOf(first) * PERMUTATIONS + edges]! ^ flipOf(then),
  );
}

const PERMUTATION_INVERSE: Uint8Array = table(PERMUTATIONS, (rank) => {
  const where = (piece: number) => [0, 1, 2, 3].find((place) => p(rank, place) === piece)!;
  return rankOf(where(0), where(1), where(2), where(3));
});
const TWIST_NEGATIVE: Uint8Array = table(TWISTS, (code) =>
  twistCode((3 - twist(code, 0)) % 3, (3 - twist(code, 1)) % 3, (3 - twist(code, 2)) % 3),
);

/** The state whose product with `index`, either way round, is solved. */
export function inverse(index: number): number {
  requireStateIndex(index);
  const corners = PERMUTATION_INVERSE[cornerRank(index)]!;
  const edges = PERMUTATION_INVERSE[edgeRank(index)]!;
  return indexOf(
    corners,
    TWIST_CARRIED[TWIST_NEGATIVE[twistOf(index)]! * PERMUTATIONS + corners]!,
    edges,
    FLIP_CARRIED[flipOf(index) * PERMUTATIONS + edges]!,
  );
}

/** Left and right swapped: corner 0 with 3 and 1 with 2, edge 1 with 3. */
const CORNER_MIRROR = [3, 2, 1, 0] as const;
const EDGE_MIRROR = [0, 3, 2, 1] as const;

function mirroredRank(rank: number, swap: readonly number[]): number {
  const piece = (place: number) => swap[p(rank, swap[place]!)]!;
  return rankOf(piece(0), piece(1), piece(2), piece(3));
}
const CORNER_RANK_MIRROR = table(PERMUTATIONS, (rank) => mirroredRank(rank, CORNER_MIRROR));
const EDGE_RANK_MIRROR = table(PERMUTATIONS, (rank) => mirroredRank(rank, EDGE_MIRROR));

/** The state seen in a mirror to the left or right of the cube. The mirror of the mirror is the state. */
export function mirror(index: number): number {
  requireStateIndex(index);
  const negative = TWIST_NEGATIVE[twistOf(index)]!;
  const flips = flipOf(index);
  return indexOf(
    CORNER_RANK_MIRROR[cornerRank(index)]!,
    twistCode(twist(negative, 3), twist(negative, 2), twist(negative, 1)),
    EDGE_RANK_MIRROR[edgeRank(index)]!,
    flipCode(flip(flips, 0), flip(flips, 3), flip(flips, 2)),
  );
}
