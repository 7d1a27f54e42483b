/** The moves that plain notation knows: faces, wides, slices, rotations, each by one, two or three quarters. */

export const FACES = ['U', 'L', 'F', 'R', 'B', 'D'] as const;
export type Face = (typeof FACES)[number];
export type Axis = 'x' | 'y' | 'z';
/** WCA Regulations, Article 12, with the trade's lower-case wides and the slices M E S. */
export const FAMILIES = [...FACES, 'u', 'l', 'f', 'r', 'b', 'd', 'M', 'E', 'S', 'x', 'y', 'z'] as const;
export type Family = (typeof FAMILIES)[number];

export interface Move {
  readonly family: Family;
  /** Clockwise quarter turns seen from the face the family follows. */
  readonly amount: 1 | 2 | 3;
  /** Dense number of the move, 0..53: family · 3 + amount − 1. */
  readonly code: number;
  /** ASCII text: `R`, `R2`, `R'`, `r` (never `Rw`). */
  readonly text: string;
}

const SUFFIX = ['', '2', "'"] as const;
const AMOUNTS = [1, 2, 3] as const;

export const MOVES: readonly Move[] = FAMILIES.flatMap((family, at) =>
  AMOUNTS.map((amount) => ({
    family,
    amount,
    code: at * 3 + amount - 1,
    text: family + SUFFIX[amount - 1],
  })),
);

/** What one clockwise quarter of a family does: face turns, signed, and a turn of the whole cube. */
export interface Parts {
  readonly turns: readonly (readonly [Face, 1 | -1])[];
  readonly rotation: readonly [Axis, 1 | -1] | null;
}

/**
 * A wide is the opposite face and a turn of the whole cube (r = x L); a slice is both faces and a turn of
 * the whole cube (M = L' R x'). M follows L, E follows D, S follows F; x follows R, y U, z F.
 */
export const PARTS: Readonly<Record<Family, Parts>> = {
  U: { turns: [['U', 1]], rotation: null },
  L: { turns: [['L', 1]], rotation: null },
  F: { turns: [['F', 1]], rotation: null },
  R: { turns: [['R', 1]], rotation: null },
  B: { turns: [['B', 1]], rotation: null },
  D: { turns: [['D', 1]], rotation: null },
  u: { turns: [['D', 1]], rotation: ['y', 1] },
  l: { turns: [['R', 1]], rotation: ['x', -1] },
  f: { turns: [['B', 1]], rotation: ['z', 1] },
  r: { turns: [['L', 1]], rotation: ['x', 1] },
  b: { turns: [['F', 1]], rotation: ['z', -1] },
  d: { turns: [['U', 1]], rotation: ['y', -1] },
  M: {
    turns: [
      ['R', 1],
      ['L', -1],
    ],
    rotation: ['x', -1],
  },
  E: {
    turns: [
      ['U', 1],
      ['D', -1],
    ],
    rotation: ['y', -1],
  },
  S: {
    turns: [
      ['B', 1],
      ['F', -1],
    ],
    rotation: ['z', 1],
  },
  x: { turns: [], rotation: ['x', 1] },
  y: { turns: [], rotation: ['y', 1] },
  z: { turns: [], rotation: ['z', 1] },
};
