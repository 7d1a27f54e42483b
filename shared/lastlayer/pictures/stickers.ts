import { type LastLayerState, stateAt } from '../state.ts';

/** The faces of a cube as its holder names them. */
export type Face = 'U' | 'D' | 'F' | 'B' | 'L' | 'R';

/** What one sticker shows: the face its colour belongs to, or '?' where it is not told apart. */
export type Sticker = Face | '?';

/** The five sides of a last layer that carry stickers. */
export type Side = 'top' | 'front' | 'right' | 'back' | 'left';

/**
 * The 21 stickers of a last layer, as strings of {@link Sticker} letters.
 * `top` has nine, row by row from the back-left as seen from above; the others have three each:
 * `front` left to right, `right` front to back, `back` left to right as seen from above, `left` back to front.
 */
export type Stickers = Readonly<Record<Side, string>>;

/** Where one sticker lies: a side and the index into its string. */
export type Site = readonly [side: Side, index: number];

/**
 * The stickers of each corner place, clockwise as seen from outside, the top one first.
 * Order of places: UFR, UBR, UBL, UFL.
 */
export const CORNER_SITES: readonly (readonly [Site, Site, Site])[] = [
  [
    ['top', 8],
    ['right', 0],
    ['front', 2],
  ],
  [
    ['top', 2],
    ['back', 2],
    ['right', 2],
  ],
  [
    ['top', 0],
    ['left', 0],
    ['back', 0],
  ],
  [
    ['top', 6],
    ['front', 0],
    ['left', 2],
  ],
];

/** The two stickers of each edge place, the top one first. Order of places: UF, UR, UB, UL. */
export const EDGE_SITES: readonly (readonly [Site, Site])[] = [
  [
    ['top', 7],
    ['front', 1],
  ],
  [
    ['top', 5],
    ['right', 1],
  ],
  [
    ['top', 1],
    ['back', 1],
  ],
  [
    ['top', 3],
    ['left', 1],
  ],
];

/** The faces of each piece's stickers, clockwise from its top one: corners URF UBR ULB UFL, edges UF UR UB UL. */
export const CORNER_PIECES: readonly string[] = ['URF', 'UBR', 'ULB', 'UFL'];
export const EDGE_PIECES: readonly string[] = ['UF', 'UR', 'UB', 'UL'];

/** Stickers that can be written to while they are being put together. */
export type DraftStickers = Record<Side, Sticker[]>;

/** An all-hatched layer with the top centre in place. */
export function blankStickers(): DraftStickers {
  const draft: DraftStickers = {
    top: Array<Sticker>(9).fill('?'),
    front: Array<Sticker>(3).fill('?'),
    right: Array<Sticker>(3).fill('?'),
    back: Array<Sticker>(3).fill('?'),
    left: Array<Sticker>(3).fill('?'),
  };
  draft.top[4] = 'U';
  return draft;
}

/** The draft as immutable strings. */
export function finishStickers(draft: DraftStickers): Stickers {
  return {
    top: draft.top.join(''),
    front: draft.front.join(''),
    right: draft.right.join(''),
    back: draft.back.join(''),
    left: draft.left.join(''),
  };
}

/** The letter at a site; '?' for anything that is not a face letter. */
export function stickerAt(stickers: Stickers, [side, index]: Site): Sticker {
  const letter = stickers[side][index];
  return letter !== undefined && 'UDFBLR'.includes(letter) ? (letter as Face) : '?';
}

/**
 * The stickers of a state, given as its index (0..62207) or in full.
 * A piece's sticker k, clockwise from its top sticker, lies on the place's sticker k + orientation.
 * Throws RangeError for an index outside the range.
 */
export function stickersOf(state: number | LastLayerState): Stickers {
  const { cp, co, ep, eo } = typeof state === 'number' ? stateAt(state) : state;
  const draft = blankStickers();
  CORNER_SITES.forEach((sites, place) => {
    const piece = CORNER_PIECES[cp[place] ?? 0] ?? '';
    sites.forEach(([side, index], k) => {
      draft[side][index] = piece[(k + 3 - (co[place] ?? 0)) % 3] as Face;
    });
  });
  EDGE_SITES.forEach((sites, place) => {
    const piece = EDGE_PIECES[ep[place] ?? 0] ?? '';
    sites.forEach(([side, index], k) => {
      draft[side][index] = piece[(k + (eo[place] ?? 0)) % 2] as Face;
    });
  });
  return finishStickers(draft);
}
