import { type Colouring, type ColourName, paint } from './colours.ts';
import type { Point } from './geometry.ts';
import { COLOUR_LETTERS, contrast, letterShade, type Palette, pale } from './palettes.ts';
import type { Sticker } from './stickers.ts';

/** Ink of outlines and plastic where no style sheet says otherwise. */
export const INK = '#16191F';
/** What hatched stickers are made of. */
export const HATCH_PAPER = '#FFFEFB';
const HATCH_INK = '#7C7767';
/** The hairline round a sticker that is too near in lightness to the black plastic. */
const HAIRLINE = '#8D949E';

/** A sticker's drawn parts, worked out once: its outline, its hatching and where its letter stands. */
export interface Tile {
  readonly path: string;
  readonly hatch: string;
  /** An outline a little outside the sticker, for marks; empty where none is ever marked. */
  readonly ring: string;
  readonly middle: Point;
  /** Height of the letter in drawing units. */
  readonly letterSize: number;
}

/** How tiles are coloured. */
export interface TileStyle {
  readonly colouring: Colouring;
  readonly palette: Palette;
  readonly letters: boolean;
  /** Class of the outline: `cube` for seat views, `flat` for flat ones. */
  readonly kind: 'cube' | 'flat';
  /** Pale shades, for the centres under the layer. */
  readonly pale?: boolean;
}

/** The colour a sticker has in a colouring; null for one that is not told apart. */
export function colourOf(sticker: Sticker, colouring: Colouring): ColourName | null {
  return sticker === '?' ? null : paint(sticker, colouring);
}

/** Markup of one sticker. Only fills, strokes and the letter depend on the sticker; hatching is added for '?'. */
export function tileMarkup(tile: Tile, sticker: Sticker, style: TileStyle): string {
  const colour = colourOf(sticker, style.colouring);
  if (colour === null) {
    const thin = `stroke="${HATCH_INK}" stroke-width="${style.kind === 'flat' ? 1.1 : 2.4}"`;
    return (
      `<path class="${style.kind}-blank" d="${tile.path}" fill="${HATCH_PAPER}" ${thin}/>` +
      `<path class="${style.kind}-hatch" d="${tile.hatch}" fill="none" ${thin}/>`
    );
  }
  const shade = style.pale ? pale(style.palette.colours[colour]) : style.palette.colours[colour];
  const part = style.pale ? `${style.kind}-pale` : `${style.kind}-sticker`;
  const outline = `<path class="${part}" d="${tile.path}" fill="${shade}" stroke="${edge(shade, style)}"/>`;
  if (!style.letters && !style.palette.lettered) return outline;
  const [x, y] = tile.middle;
  const size = tile.letterSize;
  return (
    `${outline}<text class="picture-letter" x="${x.toFixed(1)}" y="${(y + size * 0.35).toFixed(1)}" ` +
    `font-size="${size}" text-anchor="middle" fill="${letterShade(shade)}">${COLOUR_LETTERS[colour]}</text>`
  );
}

function edge(shade: string, style: TileStyle): string {
  if (style.kind === 'flat') return INK;
  if (style.pale) return HATCH_INK;
  return contrast(shade, INK) < 3 ? HAIRLINE : 'none';
}
