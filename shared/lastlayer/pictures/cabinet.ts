/** The cabinet projection of both views from the seat: the front square on, top and one side going back. */
import type { Holding } from '../seat-codes.ts';
import { type FaceMap, hatchPath, type Point, tilePath } from './geometry.ts';
import type { Palette } from './palettes.ts';
import type { Tile } from './tiles.ts';

/** One piece is 100 units wide; depth k goes to (0.47 k, −0.42 k). */
export const CELL = 100;
export const SPAN = 3 * CELL;
const DEPTH_X = 0.47;
const DEPTH_Y = 0.42;
export const WIDTH = SPAN * (1 + DEPTH_X);

/** The three faces in view as maps of their own coordinates; the left-front view is the mirror image. */
export interface Faces {
  /** Along the front from the outer edge, and down. */
  readonly front: FaceMap;
  /** Along the front, and away from the holder. */
  readonly top: FaceMap;
  /** Away from the holder, and down. */
  readonly side: FaceMap;
}

export function facesHeld(holding: Holding): Faces {
  const place = (x: number, y: number): Point => (holding === 'left' ? [WIDTH - x, y] : [x, y]);
  return {
    front: (a, b) => place(a, b),
    top: (a, k) => place(a + DEPTH_X * k, -DEPTH_Y * k),
    side: (k, b) => place(SPAN + DEPTH_X * k, b - DEPTH_Y * k),
  };
}

/** How far outside a sticker its mark runs. */
const RING = 5;

/** One sticker of a face at column a and row b, in units of the drawing; gaps as the body has them. */
export function faceTile(
  map: FaceMap,
  a: number,
  b: number,
  letterSize: number,
  body: Palette['body'],
): Tile {
  const [gap, radius] = body === 'black' ? [5, 8.5] : [1.6, 11];
  return {
    path: tilePath(map, a + gap, b + gap, a + CELL - gap, b + CELL - gap, radius),
    hatch: hatchPath(map, a + gap + 3, b + gap + 3, a + CELL - gap - 3, b + CELL - gap - 3, 17),
    ring: tilePath(
      map,
      a + gap - RING,
      b + gap - RING,
      a + CELL - gap + RING,
      b + CELL - gap + RING,
      radius + RING,
    ),
    middle: map(a + CELL / 2, b + CELL / 2),
    letterSize,
  };
}

/** Height of a letter on the stickers of each face, smaller where the face is foreshortened. */
export const LETTER_SIZES = { front: 44, top: 30, side: 32 } as const;
