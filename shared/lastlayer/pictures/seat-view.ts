import type { Holding } from '../seat-codes.ts';
import { CELL, facesHeld, faceTile, LETTER_SIZES, SPAN, WIDTH } from './cabinet.ts';
import type { Colouring } from './colours.ts';
import { type FaceMap, polygonPath, svgElement, tilePath } from './geometry.ts';
import { isMarked, markMarkup } from './marks.ts';
import { PALETTES, type Palette } from './palettes.ts';
import { type Site, type Stickers, stickerAt } from './stickers.ts';
import { HATCH_PAPER, INK, type Tile, type TileStyle, tileMarkup } from './tiles.ts';

export type { Holding };

export interface SeatViewOptions {
  readonly stickers: Stickers;
  readonly colouring: Colouring;
  readonly holding: Holding;
  readonly palette?: Palette;
  /** Lays each colour's letter on it. */
  readonly letters?: boolean;
  /** Stickers to be outlined; those out of view are passed over. */
  readonly marks?: readonly Site[];
  /** Text alternative; without one the drawing is hidden from assistive technology. */
  readonly title?: string;
}

/** Height of the row of centres below the layer. */
const FOOT = 49;

/** Room for the layer, the row of centres below it and their outlines. */
export const SEAT_VIEW_BOX = `-8 -134 ${WIDTH + 16} 286`;

interface Scene {
  readonly rim: string;
  readonly foot: string;
  readonly tiles: readonly { site: Site; tile: Tile }[];
  readonly centres: readonly { face: 'F' | 'R' | 'L'; tile: Tile }[];
}

/** All geometry of one way of holding and one kind of body; the left-front view is the mirror image. */
function scene(holding: Holding, body: Palette['body']): Scene {
  const { front, top, side } = facesHeld(holding);
  const tile = (map: FaceMap, a: number, b: number, letterSize: number): Tile =>
    faceTile(map, a, b, letterSize, body);
  const centre = (map: FaceMap, a: number, letterSize: number): Tile => ({
    path: tilePath(map, a + 6.5, CELL + 10.5, a + CELL - 6.5, CELL + FOOT - 6.5, 4.5),
    hatch: '',
    ring: '',
    middle: map(a + CELL / 2, CELL + 2 + FOOT / 2),
    letterSize,
  });

  const columns = [0, 1, 2];
  // Mirrored, what is drawn leftmost belongs to the other end of the row.
  const column = (k: number) => (holding === 'left' ? 2 - k : k);
  return {
    rim: polygonPath([
      front(0, 0),
      top(0, SPAN),
      top(SPAN, SPAN),
      side(SPAN, CELL),
      front(SPAN, CELL),
      front(0, CELL),
    ]),
    foot: polygonPath([
      front(0, CELL),
      front(SPAN, CELL),
      side(SPAN, CELL),
      side(SPAN, CELL + FOOT),
      front(SPAN, CELL + FOOT),
      front(0, CELL + FOOT),
    ]),
    tiles: [
      ...columns.flatMap((row) =>
        columns.map((k) => ({
          site: ['top', row * 3 + column(k)] as const,
          tile: tile(top, k * CELL, (2 - row) * CELL, LETTER_SIZES.top),
        })),
      ),
      ...columns.map((k) => ({
        site: ['front', column(k)] as const,
        tile: tile(front, k * CELL, 0, LETTER_SIZES.front),
      })),
      ...columns.map((k) => ({
        site: holding === 'left' ? (['left', 2 - k] as const) : (['right', k] as const),
        tile: tile(side, k * CELL, 0, LETTER_SIZES.side),
      })),
    ],
    centres: [
      ...columns.map((k) => ({ face: 'F' as const, tile: centre(front, k * CELL, 26) })),
      ...columns.map((k) => ({
        face: holding === 'left' ? ('L' as const) : ('R' as const),
        tile: centre(side, k * CELL, 24),
      })),
    ],
  };
}

const scenes = new Map<string, Scene>();

function sceneFor(holding: Holding, body: Palette['body']): Scene {
  const key = `${holding} ${body}`;
  const known = scenes.get(key) ?? scene(holding, body);
  scenes.set(key, known);
  return known;
}

/** The drawing inside the svg element of {@link seatViewSvg}. */
export function seatViewInner(options: SeatViewOptions): string {
  const { stickers, colouring, holding, palette = PALETTES.standard, letters = false, marks } = options;
  const { rim, foot, tiles, centres } = sceneFor(holding, palette.body);
  const style: TileStyle = { colouring, palette, letters, kind: 'cube', pale: false };
  const low: TileStyle = { colouring, palette, letters, kind: 'cube', pale: true };
  let drawn =
    `<path class="cube-rim" d="${rim}" fill="none" stroke="none" stroke-width="14" stroke-linejoin="round"/>` +
    `<path class="cube-foot" d="${foot}" fill="${HATCH_PAPER}" stroke="${INK}" stroke-width="2" stroke-linejoin="round"/>`;
  for (const { face, tile } of centres) drawn += tileMarkup(tile, face, low);
  drawn += `<path class="cube-body" d="${rim}" fill="${INK}" stroke="${INK}" stroke-width="9" stroke-linejoin="round"/><g stroke-width="1.6">`;
  for (const { site, tile } of tiles) drawn += tileMarkup(tile, stickerAt(stickers, site), style);
  drawn += '</g>';
  if (marks) for (const { site, tile } of tiles) if (isMarked(marks, site)) drawn += markMarkup(tile, 'cube');
  return drawn;
}

/**
 * A last layer as it looks from the holder's seat: the front face square on, the top and one side in
 * cabinet projection, and below it the front and side centres in pale, so that the AUF can be seen.
 * The markup is the same for every state but for fills, strokes and letters of the stickers.
 */
export function seatViewSvg(options: SeatViewOptions): string {
  return svgElement('seat-view', SEAT_VIEW_BOX, seatViewInner(options), options.title);
}
