import type { Face } from './stickers.ts';

export const COLOUR_NAMES = ['white', 'yellow', 'green', 'blue', 'orange', 'red'] as const;
export type ColourName = (typeof COLOUR_NAMES)[number];

/**
 * How a cube is held, 0..23: 4 × the top colour (in the order of {@link COLOUR_NAMES}) + which of
 * the four remaining colours, in the same order, faces the holder.
 */
export type Colouring = number;

/** Cross colours of a solver: one, two opposite ones, or all six. */
export const CROSS_COLOURS = [...COLOUR_NAMES, 'white+yellow', 'green+blue', 'orange+red', 'all'] as const;
export type CrossColours = (typeof CROSS_COLOURS)[number];

/** White opposite yellow, green opposite blue, orange opposite red (the usual scheme; common practice). */
const OPPOSITE: Readonly<Record<ColourName, ColourName>> = {
  white: 'yellow',
  yellow: 'white',
  green: 'blue',
  blue: 'green',
  orange: 'red',
  red: 'orange',
};

export function oppositeColour(colour: ColourName): ColourName {
  return OPPOSITE[colour];
}

/**
 * A right-handed frame: red along x, white along y, green along z, so that with white on top and
 * green in front, red is on the right (the usual scheme; common practice).
 */
const AXES: Readonly<Record<ColourName, readonly [number, number, number]>> = {
  red: [1, 0, 0],
  orange: [-1, 0, 0],
  white: [0, 1, 0],
  yellow: [0, -1, 0],
  green: [0, 0, 1],
  blue: [0, 0, -1],
};

/** The colour on the right of a cube held with `top` up and `front` towards the holder: top × front. */
function rightOf(top: ColourName, front: ColourName): ColourName {
  const [a, b, c] = AXES[top];
  const [d, e, f] = AXES[front];
  const cross = [b * f - c * e, c * d - a * f, a * e - b * d];
  const found = COLOUR_NAMES.find((name) => AXES[name].every((value, k) => value === cross[k]));
  if (!found) throw new RangeError(`${top} and ${front} do not meet at an edge.`);
  return found;
}

const COLOURINGS: readonly Readonly<Record<Face, ColourName>>[] = COLOUR_NAMES.flatMap((top) =>
  COLOUR_NAMES.filter((front) => front !== top && front !== OPPOSITE[top]).map((front) => {
    const right = rightOf(top, front);
    return {
      U: top,
      D: OPPOSITE[top],
      F: front,
      B: OPPOSITE[front],
      R: right,
      L: OPPOSITE[right],
    };
  }),
);

/** How many ways a cube can be held. */
export const COLOURING_COUNT = COLOURINGS.length;

/** The colour of a face in a colouring. Throws RangeError for a colouring outside 0..23. */
export function paint(face: Face, colouring: Colouring): ColourName {
  const faces = COLOURINGS[colouring];
  if (!faces) throw new RangeError(`A colouring is a whole number from 0 to 23, not ${colouring}.`);
  return faces[face];
}

/** The colouring with these colours on top and in front. Throws RangeError if they never meet. */
export function colouringWith(top: ColourName, front: ColourName): Colouring {
  const found = COLOURINGS.findIndex((faces) => faces.U === top && faces.F === front);
  if (found < 0) throw new RangeError(`${top} and ${front} do not meet at an edge.`);
  return found;
}

/** The colouring of tables and sheets: yellow on top, green in front. */
export const TABLE_COLOURING: Colouring = colouringWith('yellow', 'green');

/**
 * The colourings a solver meets: the cross is on the bottom, so the colour opposite to it is on top,
 * with any of four in front. Four for one cross colour, eight for two, 24 for all.
 */
export function colouringsFor(cross: CrossColours): Colouring[] {
  const bottoms = cross === 'all' ? COLOUR_NAMES : (cross.split('+') as ColourName[]);
  return COLOURINGS.flatMap((faces, colouring) => (bottoms.includes(faces.D) ? [colouring] : []));
}
