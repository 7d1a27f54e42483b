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

/** Widths of the ring's bed and of its line, in units of the drawing. */
const RINGS = {
  cube: { bed: 11, line: 5, bedColour: INK, lineColour: HATCH_PAPER },
  flat: { bed: 5.4, line: 2.8, bedColour: HATCH_PAPER, lineColour: INK },
} as const;

/**
 * A ring just outside a sticker, so that nothing of it is covered: light in a bed of plastic on the cube, ink in
 * a bed of paper on the flat view.
 */
export function markMarkup(tile: Tile, kind: 'cube' | 'flat'): string {
  const { bed, line, bedColour, lineColour } = RINGS[kind];
  const stroke = (part: string, colour: string, width: number) =>
    `<path class="${kind}-mark-${part}" d="${tile.ring}" fill="none" stroke="${colour}" stroke-width="${width}" stroke-linejoin="round"/>`;
  return stroke('bed', bedColour, bed) + stroke('line', lineColour, line);
}
