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

/** What only the colour of a sticker decides of its markup. */
interface Coat {
  /** Attributes of the outline. */
  readonly outline: string;
  /** Fill of the letter. */
  readonly letter: string;
}
type Coats = Readonly<Record<ColourName, Coat>>;
type Layer = 'cube' | 'flat' | 'pale';

const coats = new WeakMap<Palette, Readonly<Record<Layer, Coats>>>();

/** A palette's coats, worked out once: contrasts are the dear part of a picture. */
function coatsOf(palette: Palette): Readonly<Record<Layer, Coats>> {
  const known = coats.get(palette);
  if (known) return known;
  const layer = (shadeOf: (shade: string) => string, edge: (shade: string) => string): Coats => {
    const coat = (name: ColourName): Coat => {
      const shade = shadeOf(palette.colours[name]);
      return { outline: `fill="${shade}" stroke="${edge(shade)}"/>`, letter: letterShade(shade) };
    };
    return {
      white: coat('white'),
      yellow: coat('yellow'),
      green: coat('green'),
      blue: coat('blue'),
      orange: coat('orange'),
      red: coat('red'),
    };
  };
  const same = (shade: string) => shade;
  const made = {
    cube: layer(same, (shade) => (contrast(shade, INK) < 3 ? HAIRLINE : 'none')),
    flat: layer(same, () => INK),
    pale: layer(pale, () => HATCH_INK),
  };
  coats.set(palette, made);
  return made;
}

function blankMarkup(tile: Tile, kind: TileStyle['kind']): string {
  const thin = `stroke="${HATCH_INK}" stroke-width="${kind === 'flat' ? 1.1 : 2.4}"`;
  return (
    `<path class="${kind}-blank" d="${tile.path}" fill="${HATCH_PAPER}" ${thin}/>` +
    `<path class="${kind}-hatch" d="${tile.hatch}" fill="none" ${thin}/>`
  );
}

/** Markup of one sticker. Only fills, strokes and the letter depend on the sticker; hatching is added for '?'. */
export function tileMarkup(tile: Tile, sticker: Sticker, style: TileStyle): string {
  const colour = colourOf(sticker, style.colouring);
  if (colour === null) return blankMarkup(tile, style.kind);
  const coat = coatsOf(style.palette)[style.pale ? 'pale' : style.kind][colour];
  const part = style.pale ? `${style.kind}-pale` : `${style.kind}-sticker`;
  const outline = `<path class="${part}" d="${tile.path}" ${coat.outline}`;
  if (!style.letters && !style.palette.lettered) return outline;
  const [x, y] = tile.middle;
  const size = tile.letterSize;
  return (
    `${outline}<text class="picture-letter" x="${x.toFixed(1)}" y="${(y + size * 0.35).toFixed(1)}" ` +
    `font-size="${size}" text-anchor="middle" fill="${coat.letter}">${COLOUR_LETTERS[colour]}</text>`
  );
}
