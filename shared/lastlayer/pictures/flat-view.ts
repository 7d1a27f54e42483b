import type { Colouring } from './colours.ts';
import { type FaceMap, hatchPath, polygonPath, svgElement, tilePath } from './geometry.ts';
import { isMarked, markMarkup } from './marks.ts';
import { PALETTES, type Palette } from './palettes.ts';
import { type Site, type Stickers, stickerAt } from './stickers.ts';
import { INK, type Tile, tileMarkup } from './tiles.ts';

export interface FlatViewOptions {
  readonly stickers: Stickers;
  readonly colouring: Colouring;
  readonly palette?: Palette;
  /** Lays each colour's letter on the top stickers and bars. */
  readonly letters?: boolean;
  /** Stickers to be outlined. */
  readonly marks?: readonly Site[];
  /** Text alternative; without one the drawing is hidden from assistive technology. */
  readonly title?: string;
}

/** One top sticker and its gap are 24 units wide. */
const CELL = 24;
const STICKER = 20.4;
const BAR = 8.6;
/** From the top's outer edge to the bar's near edge. */
const GAP = 6;
const RADIUS = 1.4;
/** How far outside a sticker its mark runs. */
const RING = 1.9;

export const FLAT_VIEW_BOX = '-16 -16 104 112';

const flat: FaceMap = (a, b) => [a, b];

function tile(x: number, y: number, width: number, height: number): Tile {
  return {
    path: tilePath(flat, x, y, x + width, y + height, RADIUS),
    hatch: hatchPath(flat, x + 1, y + 1, x + width - 1, y + height - 1, 4),
    ring: tilePath(flat, x - RING, y - RING, x + width + RING, y + height + RING, RADIUS + RING),
    middle: [x + width / 2, y + height / 2],
    letterSize: Math.min(width, height) > BAR ? 14 : 8,
  };
}

const INSET = (CELL - STICKER) / 2;
const NEAR = INSET - GAP - BAR;
const FAR = 3 * CELL - INSET + GAP;

const TILES: readonly { site: Site; tile: Tile }[] = [0, 1, 2].flatMap((k) => {
  const along = k * CELL + INSET;
  return [
    ...[0, 1, 2].map((column) => ({
      site: ['top', k * 3 + column] as const,
      tile: tile(column * CELL + INSET, along, STICKER, STICKER),
    })),
    { site: ['back', k] as const, tile: tile(along, NEAR, STICKER, BAR) },
    { site: ['front', k] as const, tile: tile(along, FAR, STICKER, BAR) },
    { site: ['left', k] as const, tile: tile(NEAR, along, BAR, STICKER) },
    { site: ['right', 2 - k] as const, tile: tile(FAR, along, BAR, STICKER) },
  ];
});

const NOTCH = polygonPath([
  [36, FAR + BAR + 2.6],
  [40.6, FAR + BAR + 8],
  [31.4, FAR + BAR + 8],
]);

/** The drawing inside the svg element of {@link flatViewSvg}. */
export function flatViewInner(options: FlatViewOptions): string {
  const { stickers, colouring, palette = PALETTES.standard, letters = false, marks } = options;
  const style = { colouring, palette, letters, kind: 'flat' } as const;
  return [
    '<g stroke-width="1.9" stroke-linejoin="round">',
    ...TILES.map(({ site, tile }) => tileMarkup(tile, stickerAt(stickers, site), style)),
    '</g>',
    ...(marks
      ? TILES.flatMap(({ site, tile }) => (isMarked(marks, site) ? [markMarkup(tile, 'flat')] : []))
      : []),
    `<path class="flat-notch" d="${NOTCH}" fill="${INK}"/>`,
  ].join('');
}

/**
 * A last layer from above, for tables and sheets: the top as nine outlined stickers, the side stickers as
 * bars set off by a gap, a notch at the front. Stickers that are not told apart are hatched.
 */
export function flatViewSvg(options: FlatViewOptions): string {
  return svgElement('flat-view', FLAT_VIEW_BOX, flatViewInner(options), options.title);
}
