/**
 * The whole cube as 54 stickers, turned by rotating the stickers of layers: it knows the moves as hands do,
 * rotations of the whole cube, slices and wides among them, so every step of an algorithm can be drawn.
 */
import { type Axis, FAMILIES, type Family, MOVES, type Move } from './moves.ts';
import { type Sticker, type Stickers, stickersOf } from './pictures/stickers.ts';

/**
 * 54 letters, each the face a sticker belongs to or '?' for one that is not told apart: the faces U R F D L B
 * one after the other, each row by row as seen by who looks at it (U with B at its top, D with F).
 */
export type Facelets = string;

export const FACELET_FACES = ['U', 'R', 'F', 'D', 'L', 'B'] as const;
export type FaceletFace = (typeof FACELET_FACES)[number];

export const SOLVED_FACELETS: Facelets = 'UUUUUUUUURRRRRRRRRFFFFFFFFFDDDDDDDDDLLLLLLLLLBBBBBBBBB';

/** x to the right, y up, z towards the holder. */
type Vector = readonly [x: number, y: number, z: number];

/** Each face's outward direction, and the directions along its rows and down its columns. */
const FRAMES: Readonly<Record<FaceletFace, { out: Vector; along: Vector; down: Vector }>> = {
  U: { out: [0, 1, 0], along: [1, 0, 0], down: [0, 0, 1] },
  R: { out: [1, 0, 0], along: [0, 0, -1], down: [0, -1, 0] },
  F: { out: [0, 0, 1], along: [1, 0, 0], down: [0, -1, 0] },
  D: { out: [0, -1, 0], along: [1, 0, 0], down: [0, 0, -1] },
  L: { out: [-1, 0, 0], along: [0, 0, 1], down: [0, -1, 0] },
  B: { out: [0, 0, -1], along: [-1, 0, 0], down: [0, -1, 0] },
};

interface Spot {
  readonly at: Vector;
  readonly out: Vector;
}
const spotsOf = (face: FaceletFace): Spot[] => {
  const { out, along, down } = FRAMES[face];
  return Array.from({ length: 9 }, (_, n): Spot => {
    const [column, row] = [(n % 3) - 1, Math.floor(n / 3) - 1];
    const on = (k: 0 | 1 | 2) => out[k] + column * along[k] + row * down[k];
    return { at: [on(0), on(1), on(2)], out };
  });
};

const COORDINATE: Readonly<Record<Axis, 0 | 1 | 2>> = { x: 0, y: 1, z: 2 };

/** A quarter turn clockwise as seen from the positive end of an axis. */
function quarterTurned([x, y, z]: Vector, axis: Axis): Vector {
  // Adding nothing turns a negative nought into a plain one, so that places compare as text.
  if (axis === 'x') return [x, z + 0, -y + 0];
  if (axis === 'y') return [-z + 0, y, x];
  return [y, -x + 0, z];
}

/** The layers each family carries, by their place along the axis, and the sense it turns them in. */
const LAYERS: Readonly<Record<Family, readonly [axis: Axis, layers: readonly number[], sense: 1 | -1]>> = {
  R: ['x', [1], 1],
  r: ['x', [1, 0], 1],
  L: ['x', [-1], -1],
  l: ['x', [-1, 0], -1],
  M: ['x', [0], -1],
  x: ['x', [-1, 0, 1], 1],
  U: ['y', [1], 1],
  u: ['y', [1, 0], 1],
  D: ['y', [-1], -1],
  d: ['y', [-1, 0], -1],
  E: ['y', [0], -1],
  y: ['y', [-1, 0, 1], 1],
  F: ['z', [1], 1],
  f: ['z', [1, 0], 1],
  B: ['z', [-1], -1],
  b: ['z', [-1, 0], -1],
  S: ['z', [0], 1],
  z: ['z', [-1, 0, 1], 1],
};

/** Where each sticker comes from, for one clockwise quarter of every family: at family · 54 + spot. */
function sources(): Uint8Array {
  const spots = FACELET_FACES.flatMap(spotsOf);
  const spotAt = new Map(spots.map(({ at, out }, spot) => [`${at} ${out}`, spot]));
  const table = new Uint8Array(FAMILIES.length * 54);
  FAMILIES.forEach((family, number) => {
    const [axis, layers, sense] = LAYERS[family];
    spots.forEach((spot, from) => {
      let to = spot;
      if (layers.includes(spot.at[COORDINATE[axis]]))
        for (let quarter = 0; quarter < (sense === 1 ? 1 : 3); quarter++)
          to = { at: quarterTurned(to.at, axis), out: quarterTurned(to.out, axis) };
      table[number * 54 + spotAt.get(`${to.at} ${to.out}`)!] = from;
    });
  });
  return table;
}
/** Made when the first move is, so that pages without a cube to turn carry none of it. */
let cameFrom: Uint8Array | undefined;

/** @throws RangeError unless the text is 54 face letters or question marks. */
export function requireFacelets(facelets: Facelets): void {
  if (!/^[URFDLB?]{54}$/u.test(facelets))
    throw new RangeError('A cube is written as 54 letters of U R F D L B and question marks.');
}

/** The stickers after one move. */
export function turnFacelets(facelets: Facelets, { code }: Move): Facelets {
  cameFrom ??= sources();
  const { family, amount } = MOVES[code]!;
  const base = FAMILIES.indexOf(family) * 54;
  let after = facelets;
  for (let quarter = 0; quarter < amount; quarter++) {
    const before = after;
    after = '';
    for (let spot = 0; spot < 54; spot++) after += before[cameFrom[base + spot]!]!;
  }
  return after;
}

/** The stickers of a solved cube after the moves. */
export const faceletsAfter = (moves: readonly Move[]): Facelets =>
  moves.reduce(turnFacelets, SOLVED_FACELETS);

const reversed = (letters: string): string => Array.from(letters).reverse().join('');

/** A cube whose first two layers are solved and whose last layer has these stickers. */
export function faceletsOf(stickers: Stickers): Facelets {
  // The pictures tell the back as it is seen from the front; a face tells it as seen by who looks at it.
  const rows: Readonly<Partial<Record<FaceletFace, string>>> = {
    U: stickers.top,
    R: stickers.right,
    F: stickers.front,
    L: stickers.left,
    B: reversed(stickers.back),
  };
  return FACELET_FACES.map((face) => (rows[face] ?? '').padEnd(9, face)).join('');
}

/** The sticker at a face's row and column, 0..2 each, as seen by who looks at the face. */
export function faceletAt(facelets: Facelets, face: FaceletFace, row: number, column: number): Sticker {
  const letter = facelets[FACELET_FACES.indexOf(face) * 9 + row * 3 + column];
  return letter === undefined || letter === '?' ? '?' : (letter as FaceletFace);
}

export interface Frame {
  /** Moves made so far. */
  readonly step: number;
  /** The move that led here; null for the frame before the first. */
  readonly move: Move | null;
  readonly facelets: Facelets;
}

/**
 * The cube before an algorithm and after each of its moves: one frame more than there are moves. The start
 * is a last-layer state, 0..62207, or the stickers of one, of which some may be left open as '?'. From the
 * state that an algorithm solves the last frame is a solved cube, in whatever way the hands end up holding it.
 * @throws RangeError unless a start given by number is 0..62207.
 */
export function playAlgorithm(start: number | Stickers, moves: readonly Move[]): readonly Frame[] {
  const stickers = typeof start === 'number' ? stickersOf(start) : start;
  const frames: Frame[] = [{ step: 0, move: null, facelets: faceletsOf(stickers) }];
  for (const move of moves)
    frames.push({ step: frames.length, move, facelets: turnFacelets(frames.at(-1)!.facelets, move) });
  return frames;
}
