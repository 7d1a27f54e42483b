import type { Colouring, ColourName } from './colours.ts';
import { type PictureView, sidesInView } from './marks.ts';
import {
  CORNER_SITES,
  EDGE_SITES,
  type Face,
  type Side,
  type Site,
  type Stickers,
  stickerAt,
} from './stickers.ts';
import { colourOf } from './tiles.ts';

/** The last layer's places, in the order a description goes round them: from the front left, anticlockwise. */
export type PlaceName = 'UFL' | 'UF' | 'UFR' | 'UR' | 'UBR' | 'UB' | 'UBL' | 'UL';

/** The words of a description, from the message catalogue. */
export interface PictureWords {
  readonly letters: Readonly<Record<ColourName, string>>;
  readonly hidden: string;
  readonly places: Readonly<Record<PlaceName, string>>;
  readonly sides: Readonly<Record<Side, string>>;
  /** One sticker of a piece: its side and its letter. */
  readonly sticker: (side: string, letter: string) => string;
  /** One piece: its place and its stickers. */
  readonly piece: (place: string, stickers: readonly string[]) => string;
  /** The centres below the layer. */
  readonly centres: (stickers: readonly string[]) => string;
}

export interface DescribeOptions {
  readonly stickers: Stickers;
  readonly colouring: Colouring;
  /** The sides that can be seen: from a seat the top and two more, on a flat picture all. */
  readonly view: PictureView;
  readonly words: PictureWords;
}

const ROUND: readonly (readonly [PlaceName, readonly Site[]])[] = [
  ['UFL', CORNER_SITES[3] ?? []],
  ['UF', EDGE_SITES[0] ?? []],
  ['UFR', CORNER_SITES[0] ?? []],
  ['UR', EDGE_SITES[1] ?? []],
  ['UBR', CORNER_SITES[1] ?? []],
  ['UB', EDGE_SITES[2] ?? []],
  ['UBL', CORNER_SITES[2] ?? []],
  ['UL', EDGE_SITES[3] ?? []],
];

const CENTRES: readonly (readonly [Side, Face])[] = [
  ['front', 'F'],
  ['right', 'R'],
  ['back', 'B'],
  ['left', 'L'],
];

/**
 * A picture in words: each piece by its place, with the letter of every sticker that the picture shows,
 * then the centres. It names what is seen and never the case.
 */
export function describeStickers({ stickers, colouring, view, words }: DescribeOptions): string {
  const sides = sidesInView(view);
  const letter = (site: Site) => {
    const colour = colourOf(stickerAt(stickers, site), colouring);
    return words.sticker(words.sides[site[0]], colour ? words.letters[colour] : words.hidden);
  };
  const pieces = ROUND.map(([place, sites]) =>
    words.piece(words.places[place], sites.filter(([side]) => sides.includes(side)).map(letter)),
  );
  const centres = CENTRES.filter(([side]) => sides.includes(side)).map(([side, face]) => {
    const colour = colourOf(face, colouring);
    return words.sticker(words.sides[side], colour ? words.letters[colour] : words.hidden);
  });
  return [...pieces, words.centres(centres)].join(' ');
}
