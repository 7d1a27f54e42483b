/**
 * The whole cube: where eight corners, twelve edges and six centres go.
 *
 * Places: corners UFR UBR UBL UFL DFR DFL DBL DBR, edges UF UR UB UL DF DR DB DL FR FL BR BL, 0 upwards;
 * the last layer comes first. A cubie is one number: corner place · 3 + twist, edge place · 2 + flip.
 * Turns of the whole cube move nothing against the centres, so they only change which face the next letter
 * means: a sequence is read as face turns in the frame of the centres, and the centres as one of 24 holds.
 */
import { type Axis, FACES, FAMILIES, type Face, type Move, PARTS } from './moves.ts';

export const CORNER_NAMES = ['UFR', 'UBR', 'UBL', 'UFL', 'DFR', 'DFL', 'DBL', 'DBR'] as const;
export const EDGE_NAMES = ['UF', 'UR', 'UB', 'UL', 'DF', 'DR', 'DB', 'DL', 'FR', 'FL', 'BR', 'BL'] as const;

/** Where one clockwise quarter carries the pieces: each place to the next. */
const CYCLES: Readonly<Record<Face, { corners: readonly number[]; edges: readonly number[] }>> = {
  U: { corners: [0, 3, 2, 1], edges: [0, 3, 2, 1] },
  L: { corners: [2, 3, 5, 6], edges: [3, 9, 7, 11] },
  F: { corners: [0, 4, 5, 3], edges: [0, 8, 4, 9] },
  R: { corners: [0, 1, 7, 4], edges: [1, 10, 5, 8] },
  B: { corners: [1, 2, 6, 7], edges: [2, 11, 6, 10] },
  D: { corners: [4, 7, 6, 5], edges: [4, 5, 6, 7] },
};

const isUpper = (corner: number): boolean => corner < 4;

/** Where a quarter turn of a face puts each of the 24 corner and 24 edge cubies. */
function quarter(face: Face): { corners: Uint8Array; edges: Uint8Array } {
  const corners = Uint8Array.from({ length: 24 }, (_, cubie) => cubie);
  const edges = Uint8Array.from({ length: 24 }, (_, cubie) => cubie);
  const level = face === 'U' || face === 'D';
  const flips = face === 'F' || face === 'B' ? 1 : 0;
  for (let step = 0; step < 4; step++) {
    const [from, to] = [CYCLES[face].corners[step]!, CYCLES[face].corners[(step + 1) % 4]!];
    // A side face twists a corner once when it stays in its layer, twice when it changes layers.
    const twists = level ? 0 : isUpper(from) === isUpper(to) ? 1 : 2;
    for (let twist = 0; twist < 3; twist++) corners[from * 3 + twist] = to * 3 + ((twist + twists) % 3);
    const [start, end] = [CYCLES[face].edges[step]!, CYCLES[face].edges[(step + 1) % 4]!];
    for (let flip = 0; flip < 2; flip++) edges[start * 2 + flip] = end * 2 + (flip ^ flips);
  }
  return { corners, edges };
}

/** Edge cubies stand behind the 24 corner cubies in the table below. */
const EDGES = 24;
const CUBIES = 48;
/** Cubies after each of 18 face turns: at turn·48 + cubie, turn = face · 3 + quarters − 1. */
const AFTER_TURN: Uint8Array = (() => {
  const after = new Uint8Array(18 * CUBIES);
  FACES.forEach((face, at) => {
    const once = quarter(face);
    for (let cubie = 0; cubie < CUBIES; cubie++) {
      let place = cubie;
      for (let turn = at * 3; turn < at * 3 + 3; turn++) {
        place = place < EDGES ? once.corners[place]! : EDGES + once.edges[place - EDGES]!;
        after[turn * CUBIES + cubie] = place;
      }
    }
  });
  return after;
})();

/** The faces a quarter turn of the whole cube carries round: each goes where the next one was. */
const FACE_CYCLES: Readonly<Record<Axis, readonly Face[]>> = {
  x: ['F', 'U', 'B', 'D'],
  y: ['F', 'L', 'B', 'R'],
  z: ['U', 'R', 'D', 'L'],
};

/** A hold names, for U L F R B D as the holder sees them, the centre that is there. */
function rotated(hold: readonly Face[], axis: Axis, quarters: number): Face[] {
  const cycle = FACE_CYCLES[axis];
  const after = [...hold];
  cycle.forEach((face, step) => {
    const to = cycle[(step + quarters) & 3]!;
    after[FACES.indexOf(to)] = hold[FACES.indexOf(face)]!;
  });
  return after;
}

/** The 24 holds; 0 is the centres at home. */
const HOLDS: readonly (readonly Face[])[] = (() => {
  const found: Face[][] = [[...FACES]];
  const known = new Set([FACES.join('')]);
  for (let at = 0; at < found.length; at++)
    for (const axis of ['x', 'y', 'z'] as const) {
      const next = rotated(found[at]!, axis, 1);
      if (!known.has(next.join(''))) {
        known.add(next.join(''));
        found.push(next);
      }
    }
  return found;
})();
const HOLD_NUMBER = new Map(HOLDS.map((hold, number) => [hold.join(''), number]));

const MOVE_COUNT = FAMILIES.length * 3;
const NO_TURN = 255;
/** For each hold and move, at hold · 54 + move: one or two face turns among the centres, and the new hold. */
const FIRST_TURN = new Uint8Array(24 * MOVE_COUNT).fill(NO_TURN);
const SECOND_TURN = new Uint8Array(24 * MOVE_COUNT).fill(NO_TURN);
const NEXT_HOLD = new Uint8Array(24 * MOVE_COUNT);
HOLDS.forEach((hold, number) => {
  FAMILIES.forEach((family, at) => {
    const { turns, rotation } = PARTS[family];
    for (let amount = 1; amount <= 3; amount++) {
      const place = number * MOVE_COUNT + at * 3 + amount - 1;
      const turn = (part: (typeof turns)[number]): number => {
        const centre = hold[FACES.indexOf(part[0])]!;
        return FACES.indexOf(centre) * 3 + ((part[1] * amount) & 3) - 1;
      };
      if (turns[0]) FIRST_TURN[place] = turn(turns[0]);
      if (turns[1]) SECOND_TURN[place] = turn(turns[1]);
      const next = rotation ? rotated(hold, rotation[0], (rotation[1] * amount) & 3) : hold;
      NEXT_HOLD[place] = HOLD_NUMBER.get(next.join(''))!;
    }
  });
});

/** Corners 0..7 then edges at 8..19: where the piece that began at each place is now. */
export type Track = Uint8Array;
const HOME: Track = Uint8Array.from({ length: 20 }, (_, piece) => (piece < 8 ? piece * 3 : (piece - 8) * 2));

/** Scratch list of face turns, as offsets into the table: following is synchronous, so one is enough. */
let offsets = new Uint16Array(64);

/**
 * Follows every piece of a solved cube through the moves, relative to the centres. Writes into `track`
 * (20 bytes) and returns the hold, 0..23, that the moves end in.
 */
export function followMoves(moves: readonly Move[], track: Track): number {
  if (offsets.length < moves.length * 2) offsets = new Uint16Array(moves.length * 4);
  let hold = 0;
  let turns = 0;
  for (let at = 0; at < moves.length; at++) {
    const place = hold * MOVE_COUNT + moves[at]!.code;
    const first = FIRST_TURN[place]!;
    if (first !== NO_TURN) offsets[turns++] = first * CUBIES;
    const second = SECOND_TURN[place]!;
    if (second !== NO_TURN) offsets[turns++] = second * CUBIES;
    hold = NEXT_HOLD[place]!;
  }
  for (let piece = 0; piece < 20; piece++) {
    const base = piece < 8 ? 0 : EDGES;
    let cubie = HOME[piece]! + base;
    for (let turn = 0; turn < turns; turn++) cubie = AFTER_TURN[offsets[turn]! + cubie]!;
    track[piece] = cubie - base;
  }
  return hold;
}

export interface WholeCube {
  /** Cubie of each corner piece, relative to the centres. */
  readonly corners: readonly number[];
  readonly edges: readonly number[];
  /** The centre that ends at U L F R B D. */
  readonly centres: readonly Face[];
}

/** Where everything of a solved cube is after the moves. */
export function cubeAfter(moves: readonly Move[]): WholeCube {
  const track = new Uint8Array(20);
  const hold = followMoves(moves, track);
  return { corners: [...track.subarray(0, 8)], edges: [...track.subarray(8)], centres: HOLDS[hold]! };
}

/** Names of the pieces below the last layer that are not as they were. */
export function brokenPieces(track: Track): string[] {
  const broken: string[] = [];
  for (let piece = 4; piece < 8; piece++) if (track[piece] !== HOME[piece]) broken.push(CORNER_NAMES[piece]!);
  for (let piece = 12; piece < 20; piece++)
    if (track[piece] !== HOME[piece]) broken.push(EDGE_NAMES[piece - 8]!);
  return broken;
}

export function firstTwoLayersIntact(track: Track): boolean {
  for (let piece = 4; piece < 8; piece++) if (track[piece] !== HOME[piece]) return false;
  for (let piece = 12; piece < 20; piece++) if (track[piece] !== HOME[piece]) return false;
  return true;
}
