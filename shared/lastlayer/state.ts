/**
 * Last-layer states and their dense index.
 *
 * Places: corners 0 UFR, 1 UBR, 2 UBL, 3 UFL; edges 0 UF, 1 UR, 2 UB, 3 UL. One more is one place further
 * anticlockwise seen from above, so U carries the piece at place p+1 to place p.
 */
export interface LastLayerState {
  /** Corner piece at each place, 0..3. */
  readonly cp: readonly number[];
  /** Twist of the corner at each place, 0..2, sum ≡ 0 mod 3: 1 is a clockwise third of a turn. */
  readonly co: readonly number[];
  /** Edge piece at each place, 0..3; same parity as cp. */
  readonly ep: readonly number[];
  /** Flip of the edge at each place, 0..1, sum ≡ 0 mod 2. */
  readonly eo: readonly number[];
}

/** 24 · 12 · 27 · 8: corner permutations, edge permutations of the same parity, twists, flips. */
export const STATES = 62_208;

export const PERMUTATIONS = 24;
export const TWISTS = 27;
export const FLIPS = 8;

/** The 24 permutations of four things in lexicographic order, four bytes each; rank 0 is the identity. */
export const PERMUTATION_AT: Uint8Array = (() => {
  const out = new Uint8Array(PERMUTATIONS * 4);
  let at = 0;
  for (let a = 0; a < 4; a++)
    for (let b = 0; b < 4; b++)
      for (let c = 0; c < 4; c++)
        if (a !== b && a !== c && b !== c) {
          out.set([a, b, c, 6 - a - b - c], at);
          at += 4;
        }
  return out;
})();

/** Lexicographic rank of the permutation a b c d, 0..23. */
export function rankOf(a: number, b: number, c: number, d: number): number {
  const first = a * 6;
  const second = (b - (a < b ? 1 : 0)) * 2;
  return first + second + (c > d ? 1 : 0);
}

/** 0 for an even permutation, 1 for an odd one, by rank. */
export const PARITY: Uint8Array = Uint8Array.from({ length: PERMUTATIONS }, (_, rank) => {
  let inversions = 0;
  for (let i = 0; i < 4; i++)
    for (let j = i + 1; j < 4; j++)
      if (PERMUTATION_AT[rank * 4 + i]! > PERMUTATION_AT[rank * 4 + j]!) inversions++;
  return inversions % 2;
});

/** Ranks 2h and 2h+1 swap the last two things, so exactly one of each pair has a wanted parity. */
const EDGE_RANK: Uint8Array = Uint8Array.from({ length: 24 }, (_, i) => {
  const parity = i >= 12 ? 1 : 0;
  const half = i % 12;
  return PARITY[half * 2] === parity ? half * 2 : half * 2 + 1;
});

/** Twists of all four corners by code 0..26: base 3 over places 0, 1, 2; place 3 makes the sum 0. */
export const TWIST_AT: Uint8Array = (() => {
  const out = new Uint8Array(TWISTS * 4);
  for (let code = 0; code < TWISTS; code++) {
    const [a, b, c] = [Math.floor(code / 9), Math.floor(code / 3) % 3, code % 3];
    out.set([a, b, c, (6 - a - b - c) % 3], code * 4);
  }
  return out;
})();

/** Flips of all four edges by code 0..7: base 2 over places 0, 1, 2; place 3 makes the sum even. */
export const FLIP_AT: Uint8Array = (() => {
  const out = new Uint8Array(FLIPS * 4);
  for (let code = 0; code < FLIPS; code++) {
    const [a, b, c] = [code >> 2, (code >> 1) & 1, code & 1];
    out.set([a, b, c, (a + b + c) % 2], code * 4);
  }
  return out;
})();

/** Code of four twists whose sum is 0 mod 3. */
export const twistCode = (a: number, b: number, c: number): number => a * 9 + b * 3 + c;
/** Code of four flips whose sum is even. */
export const flipCode = (a: number, b: number, c: number): number => a * 4 + b * 2 + c;

/** Index of the state with these coordinates: permutation ranks 0..23 of equal parity, codes 0..26, 0..7. */
export function indexOf(cp: number, co: number, ep: number, eo: number): number {
  return ((cp * 12 + (ep >> 1)) * TWISTS + co) * FLIPS + eo;
}
export const cornerRank = (index: number): number => Math.floor(index / 2592);
/** Edge rank number `half`, 0..11, among those that go with the corners' parity. */
export const edgeRankOf = (corners: number, half: number): number => EDGE_RANK[PARITY[corners]! * 12 + half]!;
export const edgeRank = (index: number): number => {
  const permutations = Math.floor(index / 216);
  return edgeRankOf(Math.floor(permutations / 12), permutations % 12);
};
export const twistOf = (index: number): number => Math.floor(index / FLIPS) % TWISTS;
export const flipOf = (index: number): number => index % FLIPS;

/** True for an integer 0..62207. */
export const isStateIndex = (index: number): boolean =>
  Number.isInteger(index) && index >= 0 && index < STATES;

/** @throws RangeError unless `index` is an integer 0..62207. */
export function requireStateIndex(index: number): void {
  if (!isStateIndex(index))
    throw new RangeError(`There is no last-layer state ${index}: 0 to ${STATES - 1}.`);
}

const isPermutation = (list: readonly number[]): boolean =>
  list.length === 4 && [0, 1, 2, 3].every((piece) => list.includes(piece));

const isOrientation = (list: readonly number[], ways: number): boolean =>
  list.length === 4 &&
  list.every((value) => Number.isInteger(value) && value >= 0 && value < ways) &&
  list.reduce((sum, value) => sum + value, 0) % ways === 0;

/**
 * Dense index of a solvable state, 0..62207; the solved state is 0.
 * @throws RangeError if the lists are malformed or no cube can be turned into this state.
 */
export function stateIndex({ cp, co, ep, eo }: LastLayerState): number {
  if (!isPermutation(cp) || !isPermutation(ep))
    throw new RangeError('Each of the four corners and four edges must be in exactly one place.');
  if (!isOrientation(co, 3)) throw new RangeError('Corner twists are 0 to 2 and add up to a multiple of 3.');
  if (!isOrientation(eo, 2)) throw new RangeError('Edge flips are 0 or 1 and add up to an even number.');
  const corners = rankOf(cp[0]!, cp[1]!, cp[2]!, cp[3]!);
  const edges = rankOf(ep[0]!, ep[1]!, ep[2]!, ep[3]!);
  if (PARITY[corners] !== PARITY[edges])
    throw new RangeError('Corners and edges must both be evenly or both be oddly permuted.');
  return indexOf(corners, twistCode(co[0]!, co[1]!, co[2]!), edges, flipCode(eo[0]!, eo[1]!, eo[2]!));
}

/**
 * The state at a dense index.
 * @throws RangeError unless `index` is an integer 0..62207.
 */
export function stateAt(index: number): LastLayerState {
  requireStateIndex(index);
  const four = (table: Uint8Array, at: number) => Array.from(table.subarray(at * 4, at * 4 + 4));
  return {
    cp: four(PERMUTATION_AT, cornerRank(index)),
    co: four(TWIST_AT, twistOf(index)),
    ep: four(PERMUTATION_AT, edgeRank(index)),
    eo: four(FLIP_AT, flipOf(index)),
  };
}
