/** Which pieces a drawing leaves possible at each place, and how they can be put together. */
import type { Cell, Drawing } from './drawing.ts';
import { type Colouring, type ColourName, paint } from './pictures/colours.ts';
import {
  CORNER_PIECES,
  CORNER_SITES,
  EDGE_PIECES,
  EDGE_SITES,
  type Face,
  type Site,
} from './pictures/stickers.ts';
import { FLIP_AT, FLIPS, PARITY, PERMUTATION_AT, PERMUTATIONS, TWIST_AT, TWISTS } from './state.ts';

export interface PieceFits {
  /** 1 where a corner fits: at place · 12 + piece · 3 + twist. */
  readonly corners: Uint8Array;
  /** 1 where an edge fits: at place · 8 + piece · 2 + flip. */
  readonly edges: Uint8Array;
}

export const cellAt = (drawing: Drawing, [side, index]: Site): Cell => drawing[side][index] ?? null;

/** What can lie at each place, for a cube held in a colouring. */
export function pieceFits(drawing: Drawing, colouring: Colouring): PieceFits {
  const top = paint('U', colouring);
  const allows = (cell: Cell, colour: ColourName): boolean =>
    cell === null || cell === colour || (cell === 'other' && colour !== top);
  const table = (sites: readonly (readonly Site[])[], pieces: readonly string[], ways: number): Uint8Array =>
    Uint8Array.from({ length: 4 * 4 * ways }, (_, at) => {
      const [place, piece, turn] = [Math.floor(at / (4 * ways)), Math.floor(at / ways) % 4, at % ways];
      return sites[place]!.every((site, k) =>
        // A piece's sticker k lies on the place's sticker k + orientation.
        allows(cellAt(drawing, site), paint(pieces[piece]![(k + ways - turn) % ways] as Face, colouring)),
      )
        ? 1
        : 0;
    });
  return { corners: table(CORNER_SITES, CORNER_PIECES, 3), edges: table(EDGE_SITES, EDGE_PIECES, 2) };
}

/** A way to put four pieces in: permutation rank, its parity, and the code of the orientations. */
export interface Placed {
  readonly rank: number;
  readonly parity: number;
  readonly code: number;
}

function fitting(fits: Uint8Array, ways: number, codes: number, turns: Uint8Array): readonly Placed[] {
  const found: Placed[] = [];
  for (let rank = 0; rank < PERMUTATIONS; rank++)
    for (let code = 0; code < codes; code++) {
      let fit = 1;
      for (let place = 0; place < 4 && fit; place++) {
        const piece = PERMUTATION_AT[rank * 4 + place]!;
        fit = fits[(place * 4 + piece) * ways + turns[code * 4 + place]!]!;
      }
      if (fit) found.push({ rank, parity: PARITY[rank]!, code });
    }
  return found;
}

/** Every solvable arrangement of the corners that the drawing allows: code is that of the twists, 0..26. */
export const fittingCorners = ({ corners }: PieceFits): readonly Placed[] =>
  fitting(corners, 3, TWISTS, TWIST_AT);

/** Every solvable arrangement of the edges that the drawing allows: code is that of the flips, 0..7. */
export const fittingEdges = ({ edges }: PieceFits): readonly Placed[] => fitting(edges, 2, FLIPS, FLIP_AT);

/** Every four orientations, their sum free: four digits each. */
const anyTurns = (ways: 2 | 3): Uint8Array =>
  Uint8Array.from({ length: ways ** 4 * 4 }, (_, at) => {
    const [code, place] = [Math.floor(at / 4), at % 4];
    return Math.floor(code / ways ** place) % ways;
  });

/** Arrangements the drawing allows if the cube may be taken apart, with what their orientations add up to. */
export function assembled(fits: Uint8Array, ways: 2 | 3): readonly (Placed & { readonly sum: number })[] {
  const turns = anyTurns(ways);
  return fitting(fits, ways, ways ** 4, turns).map((placed) => {
    const at = placed.code * 4;
    return { ...placed, sum: (turns[at]! + turns[at + 1]! + turns[at + 2]! + turns[at + 3]!) % ways };
  });
}
