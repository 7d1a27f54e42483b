/** What is seen of a state from the seat, packed so that two pictures can be compared in a few operations. */
import type { Aspect } from './aspects.ts';
import { maskStickers } from './pictures/mask.ts';
import { CORNER_SITES, EDGE_SITES, type Site, stickerAt, stickersOf } from './pictures/stickers.ts';
import {
  cornerRank,
  edgeRank,
  FLIP_AT,
  flipOf,
  PERMUTATION_AT,
  STATES,
  stateAt,
  TWIST_AT,
  twistOf,
} from './state.ts';

/** Which hand's side is turned to the holder. */
export type Holding = 'right' | 'left';

/** Three bits for each of eight top stickers in one word, of six side stickers in another. */
export interface SeatCodes {
  top(state: number): number;
  sides(state: number): number;
}

const LETTERS = '?UFRBLD';

/** Bit place of a sticker in its word, or −1 where the seat view does not show it. */
function slot([side, at]: Site, holding: Holding): { word: 'top' | 'sides'; shift: number } | null {
  if (side === 'top') return at === 4 ? null : { word: 'top', shift: 3 * (at > 4 ? at - 1 : at) };
  if (side === 'front') return { word: 'sides', shift: 3 * at };
  return side === holding ? { word: 'sides', shift: 9 + 3 * at } : null;
}

/** A state for every (place, piece, orientation) of corners and of edges, found once by looking. */
function examples(): { corners: Int32Array; edges: Int32Array } {
  const corners = new Int32Array(48).fill(-1);
  const edges = new Int32Array(32).fill(-1);
  // Every twist of one corner and flip of one edge turns up within a step coprime to the code's bases.
  for (let index = 0; index < STATES; index += 23) {
    const { cp, co, ep, eo } = stateAt(index);
    for (let place = 0; place < 4; place++) {
      corners[place * 12 + cp[place]! * 3 + co[place]!] = index;
      edges[place * 8 + ep[place]! * 2 + eo[place]!] = index;
    }
  }
  return { corners, edges };
}
let found: ReturnType<typeof examples> | undefined;

/** Codes of the seat view with everything hatched that `seen` does not tell apart. */
export function seatCodes(seen: readonly Aspect[], holding: Holding): SeatCodes {
  found ??= examples();
  const pack = (sites: readonly Site[], state: number): { top: number; sides: number } => {
    const stickers = maskStickers(stickersOf(state), seen);
    const code = { top: 0, sides: 0 };
    for (const site of sites) {
      const at = slot(site, holding);
      if (at) code[at.word] |= LETTERS.indexOf(stickerAt(stickers, site)) << at.shift;
    }
    return code;
  };
  const corners = Array.from(found.corners, (state, at) => pack(CORNER_SITES[Math.floor(at / 12)]!, state));
  const edges = Array.from(found.edges, (state, at) => pack(EDGE_SITES[at >> 3]!, state));

  const word = (name: 'top' | 'sides'): ((state: number) => number) => {
    const cornerWords = Int32Array.from(corners, (code) => code[name]);
    const edgeWords = Int32Array.from(edges, (code) => code[name]);
    return (state) => {
      const [cp, co, ep, eo] = [
        cornerRank(state) * 4,
        twistOf(state) * 4,
        edgeRank(state) * 4,
        flipOf(state) * 4,
      ];
      let packed = 0;
      for (let place = 0; place < 4; place++) {
        packed |= cornerWords[place * 12 + PERMUTATION_AT[cp + place]! * 3 + TWIST_AT[co + place]!]!;
        packed |= edgeWords[place * 8 + PERMUTATION_AT[ep + place]! * 2 + FLIP_AT[eo + place]!]!;
      }
      return packed;
    };
  };
  return { top: word('top'), sides: word('sides') };
}

/** How many stickers two packed words differ in, 0..8: one bit of three is enough to differ. */
export function stickersApart(one: number, other: number): number {
  const bits = one ^ other;
  let differing = (bits | (bits >> 1) | (bits >> 2)) & 0o11111111;
  let count = 0;
  while (differing !== 0) {
    differing &= differing - 1;
    count++;
  }
  return count;
}
