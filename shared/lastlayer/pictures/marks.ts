/** Outlines round stickers that a picture points at: where two pictures differ. */
import type { Holding } from '../seat-codes.ts';
import { type Side, type Site, type Stickers, stickerAt } from './stickers.ts';
import { HATCH_PAPER, INK, type Tile } from './tiles.ts';

/** What a picture shows: from a seat the top and two sides, from above everything. */
export type PictureView = { readonly kind: 'seat'; readonly holding: Holding } | { readonly kind: 'flat' };

/** The sides of the last layer that a picture shows. */
export const sidesInView = (view: PictureView): readonly Side[] =>
  view.kind === 'flat' ? ['top', 'front', 'right', 'back', 'left'] : ['top', 'front', view.holding];

/** The stickers in view in which two pictures differ, top first, each side in its own order. */
export function sitesApart(one: Stickers, other: Stickers, view: PictureView): readonly Site[] {
  return sidesInView(view).flatMap((side) =>
    Array.from(one[side], (_, index): Site => [side, index]).filter(
      (site) => stickerAt(one, site) !== stickerAt(other, site),
    ),
  );
}

export const isMarked = (marks: readonly Site[], [side, index]: Site): boolean =>
  marks.some(([markedSide, markedIndex]) => markedSide === side && markedIndex === index);

/** Widths of the outline's light band and of the dark line in it, in units of the drawing. */
const BANDS = { cube: [15, 5], flat: [5.4, 2.2] } as const;

/** A light band with a dark line in it: one of the two is seen against any shade, plastic or paper. */
export function markMarkup(tile: Tile, kind: 'cube' | 'flat'): string {
  const [band, line] = BANDS[kind];
  const stroke = (part: string, colour: string, width: number) =>
    `<path class="${kind}-${part}" d="${tile.path}" fill="none" stroke="${colour}" stroke-width="${width}" stroke-linejoin="round"/>`;
  return stroke('mark-band', HATCH_PAPER, band) + stroke('mark-line', INK, line);
}
