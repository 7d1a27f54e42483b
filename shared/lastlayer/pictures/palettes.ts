import { COLOUR_NAMES, type ColourName } from './colours.ts';

/** Shades for the six colours, and how the cube around them is made. */
export interface Palette {
  readonly key: string;
  /** `#RRGGBB` for each colour. */
  readonly colours: Readonly<Record<ColourName, string>>;
  /** Letters are always laid on, because the shades alone do not tell the colours apart. */
  readonly lettered: boolean;
  /** Black plastic between the stickers, or coloured plastic with hardly a gap. */
  readonly body: 'black' | 'stickerless';
}

export const PALETTE_KEYS = ['standard', 'safe', 'stickerless', 'greys'] as const;
export type PaletteKey = (typeof PALETTE_KEYS)[number];

export const PALETTES: Readonly<Record<PaletteKey, Palette>> = {
  standard: {
    key: 'standard',
    colours: {
      white: '#FFFFFF',
      yellow: '#F7D038',
      green: '#2E8B57',
      blue: '#3066B2',
      orange: '#E8762C',
      red: '#C8313A',
    },
    lettered: false,
    body: 'black',
  },
  /** Every pair at least ΔE2000 20 apart in normal, protan, deutan and tritan vision. */
  safe: {
    key: 'safe',
    colours: {
      white: '#FFFFFF',
      yellow: '#FFCF00',
      green: '#4DA994',
      blue: '#205784',
      orange: '#CD6420',
      red: '#75020E',
    },
    lettered: false,
    body: 'black',
  },
  stickerless: {
    key: 'stickerless',
    colours: {
      white: '#F6F6F2',
      yellow: '#FFE23B',
      green: '#35B44A',
      blue: '#2A6FD6',
      orange: '#FF7F1F',
      red: '#D92534',
    },
    lettered: false,
    body: 'stickerless',
  },
  greys: {
    key: 'greys',
    colours: {
      white: '#FFFFFF',
      yellow: '#E2E2E2',
      orange: '#BDBDBD',
      green: '#949494',
      red: '#626262',
      blue: '#343434',
    },
    lettered: true,
    body: 'black',
  },
};

/** The letter laid on each colour: its initial. */
export const COLOUR_LETTERS: Readonly<Record<ColourName, string>> = {
  white: 'W',
  yellow: 'Y',
  green: 'G',
  blue: 'B',
  orange: 'O',
  red: 'R',
};

const SHADE = /^#[0-9a-f]{6}$/i;

/**
 * A palette of a person's own shades. Throws RangeError unless every colour is `#RRGGBB`:
 * shades are written into markup, so nothing else may pass.
 */
export function ownPalette(colours: Readonly<Record<ColourName, string>>): Palette {
  for (const name of COLOUR_NAMES) {
    if (!SHADE.test(colours[name])) throw new RangeError(`The shade for ${name} must look like #RRGGBB.`);
  }
  return { key: 'own', colours: { ...colours }, lettered: false, body: 'black' };
}

/** Channels of `#RRGGBB`, 0..255. */
function channels(shade: string): [number, number, number] {
  const value = Number.parseInt(shade.slice(1), 16);
  return [(value >> 16) & 255, (value >> 8) & 255, value & 255];
}

/** The shade with 45 % of white in it: centres below the layer are pale, never darkened. */
export function pale(shade: string): string {
  const mixed = channels(shade).map((value) => Math.round(value * 0.55 + 255 * 0.45));
  return `#${mixed
    .map((value) => value.toString(16).padStart(2, '0'))
    .join('')
    .toUpperCase()}`;
}

/** Relative luminance, 0..1 (WCAG 2.2, definition of relative luminance). */
export function luminance(shade: string): number {
  const [r, g, b] = channels(shade).map((value) => {
    const part = value / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** Contrast ratio of two shades, 1..21 (WCAG 2.2, definition of contrast ratio). */
export function contrast(a: string, b: string): number {
  const [low, high] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

/** Black or white, whichever reads better on the shade; the better of the two is always above 4.5:1. */
export function letterShade(shade: string): string {
  return contrast(shade, '#000000') >= contrast(shade, '#FFFFFF') ? '#000000' : '#FFFFFF';
}
