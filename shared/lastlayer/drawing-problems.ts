/** Why a drawing is of no cube: the first thing a person should mend. */
import { type Cell, colouringOf, DRAWN_SIDES, type Drawing, topColour } from './drawing.ts';
import { assembled, cellAt, pieceFits } from './drawing-fits.ts';
import { COLOUR_NAMES, type ColourName, oppositeColour } from './pictures/colours.ts';
import type { PlaceName } from './pictures/describe.ts';
import { CORNER_SITES, EDGE_SITES, type Site } from './pictures/stickers.ts';

export type DrawingProblem =
  /** One piece that no cube has. */
  | { readonly kind: PieceProblem; readonly piece: PlaceName; readonly sites: readonly Site[] }
  /** More stickers of a colour than the last layer has: nine of the top's, three of a side's, no other. */
  | { readonly kind: 'too-many'; readonly colour: ColourName; readonly count: number; readonly most: number }
  | { readonly kind: 'piece-twice'; readonly pieces: readonly [PlaceName, PlaceName] }
  /** Each piece could be, but not all of them together. */
  | { readonly kind: 'do-not-go-together'; readonly of: 'corners' | 'edges' }
  /** A cube taken apart and put together wrongly. */
  | { readonly kind: 'corner-twisted' | 'edge-flipped' | 'two-swapped' };

export type PieceProblem =
  /** The colour opposite the top's, which the last layer has nowhere. */
  'bottom-colour' | 'same-twice' | 'opposite' | 'no-top-colour' | 'wrong-way-round';

const CORNERS: readonly PlaceName[] = ['UFR', 'UBR', 'UBL', 'UFL'];
const EDGES: readonly PlaceName[] = ['UF', 'UR', 'UB', 'UL'];

/** What is wrong with one piece's colours, or null: nothing fits at its place otherwise. */
function pieceProblem(cells: readonly Cell[], top: ColourName): PieceProblem | null {
  const colours = cells.filter((cell): cell is ColourName => cell !== null && cell !== 'other');
  if (colours.includes(oppositeColour(top))) return 'bottom-colour';
  if (new Set(colours).size < colours.length) return 'same-twice';
  if (colours.some((colour) => colours.includes(oppositeColour(colour)))) return 'opposite';
  return cells.every((cell) => cell !== null && cell !== top) ? 'no-top-colour' : null;
}

function tooMany(drawing: Drawing, top: ColourName): DrawingProblem[] {
  const cells = DRAWN_SIDES.flatMap((side) => drawing[side]);
  return COLOUR_NAMES.flatMap((colour): DrawingProblem[] => {
    if (colour === oppositeColour(top)) return [];
    const count = cells.filter((cell) => cell === colour).length;
    const most = colour === top ? 9 : 3;
    return count > most ? [{ kind: 'too-many', colour, count, most }] : [];
  });
}

/**
 * What is wrong with a drawing; empty if some solvable cube looks like it. Pieces that cannot be come first; what
 * pieces do together is told only when each of them could be.
 */
export function drawingProblems(drawing: Drawing): readonly DrawingProblem[] {
  const top = topColour(drawing);
  const fits = pieceFits(drawing, colouringOf(drawing));
  const pieces: DrawingProblem[] = [];
  const only = new Map<string, PlaceName>();
  const twice: DrawingProblem[] = [];
  const look = (names: readonly PlaceName[], all: readonly (readonly Site[])[], table: Uint8Array) => {
    const ways = table.length / 16;
    names.forEach((piece, place) => {
      const sites = all[place]!;
      const problem = pieceProblem(
        sites.map((site) => cellAt(drawing, site)),
        top,
      );
      const possible = [0, 1, 2, 3].filter((one) =>
        table.subarray((place * 4 + one) * ways, (place * 4 + one + 1) * ways).includes(1),
      );
      if (problem || possible.length === 0) pieces.push({ kind: problem ?? 'wrong-way-round', piece, sites });
      else if (possible.length === 1) {
        const other = only.get(`${ways} ${possible[0]}`);
        if (other) twice.push({ kind: 'piece-twice', pieces: [other, piece] });
        else only.set(`${ways} ${possible[0]}`, piece);
      }
    });
  };
  look(CORNERS, CORNER_SITES, fits.corners);
  look(EDGES, EDGE_SITES, fits.edges);
  const found = [...pieces, ...tooMany(drawing, top)];
  if (found.length > 0) return found;
  if (twice.length > 0) return twice;

  const corners = assembled(fits.corners, 3);
  const edges = assembled(fits.edges, 2);
  if (corners.length === 0) return [{ kind: 'do-not-go-together', of: 'corners' }];
  if (edges.length === 0) return [{ kind: 'do-not-go-together', of: 'edges' }];
  const sound = {
    corners: corners.filter(({ sum }) => sum === 0),
    edges: edges.filter(({ sum }) => sum === 0),
  };
  const wrong: DrawingProblem[] = [];
  if (sound.corners.length === 0) wrong.push({ kind: 'corner-twisted' });
  if (sound.edges.length === 0) wrong.push({ kind: 'edge-flipped' });
  if (wrong.length > 0) return wrong;
  const parities = new Set(sound.corners.map(({ parity }) => parity));
  return sound.edges.some(({ parity }) => parities.has(parity)) ? [] : [{ kind: 'two-swapped' }];
}
