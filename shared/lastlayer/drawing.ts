/** Finding cases by a drawing: the top and the sides painted in, as much of them as was seen. */
import { PERMUTATION_ACT } from './action.ts';
import type { CaseOfSet, CaseSet } from './case-set.ts';
import { fittingCorners, fittingEdges, pieceFits } from './drawing-fits.ts';
import {
  COLOUR_NAMES,
  type Colouring,
  type ColourName,
  colouringWith,
  oppositeColour,
} from './pictures/colours.ts';
import { COLOUR_LETTERS } from './pictures/palettes.ts';
import type { Side } from './pictures/stickers.ts';
import { indexOf, STATES } from './state.ts';

/** A colour; any colour but the one on top; or not known. */
export type Cell = ColourName | 'other' | null;

/** The 21 stickers in the order of the pictures: `top` nine, row by row from the back left, the sides three each. */
export type Drawing = Readonly<Record<Side, readonly Cell[]>>;

export const DRAWN_SIDES: readonly Side[] = ['top', 'front', 'right', 'back', 'left'];

export const EMPTY_DRAWING: Drawing = {
  top: Array<Cell>(9).fill(null),
  front: [null, null, null],
  right: [null, null, null],
  back: [null, null, null],
  left: [null, null, null],
};

/** The colour of the last layer's face: that of the top centre, yellow while it is not painted. */
export function topColour(drawing: Drawing): ColourName {
  const centre = drawing.top[4];
  return centre && centre !== 'other' ? centre : 'yellow';
}

/** The drawing with one cell painted. */
export function painted(drawing: Drawing, side: Side, index: number, cell: Cell): Drawing {
  return { ...drawing, [side]: drawing[side].map((was, at) => (at === index ? cell : was)) };
}

/**
 * A way of holding the cube that has the drawing's colour on top; which of four faces the holder is left open by
 * a drawing, so any will do.
 */
export function colouringOf(drawing: Drawing): Colouring {
  const top = topColour(drawing);
  const front = (['green', 'white'] as const).find((name) => name !== top && name !== oppositeColour(top))!;
  return colouringWith(top, front);
}

const LETTER_OF = new Map<Cell, string>([
  ...COLOUR_NAMES.map((name): [Cell, string] => [name, COLOUR_LETTERS[name].toLowerCase()]),
  ['other', 'x'],
  [null, '-'],
]);
const CELL_OF = new Map(Array.from(LETTER_OF, ([cell, letter]) => [letter, cell]));

/** The drawing as 21 letters for addresses: w y g b o r, x for any but the top colour, - for not known. */
export const writeDrawing = (drawing: Drawing): string =>
  DRAWN_SIDES.flatMap((side) => drawing[side].map((cell) => LETTER_OF.get(cell)!)).join('');

/** Reads what writeDrawing wrote; null for anything else. */
export function readDrawing(text: string): Drawing | null {
  const cells = Array.from(text.toLowerCase(), (letter) => CELL_OF.get(letter));
  if (cells.length !== 21 || cells.includes(undefined)) return null;
  const known = cells as Cell[];
  const side = (from: number) => known.slice(from, from + 3);
  return { top: known.slice(0, 9), front: side(9), right: side(12), back: side(15), left: side(18) };
}

export interface DrawnCase {
  readonly case: CaseOfSet;
  /** Full states of the case, 1 to its weight, that look like the drawing from some front. */
  readonly states: number;
  /** One of them, to be painted with {@link colouringOf}: it shows the case at the drawing's angle. */
  readonly example: number;
}

/**
 * The cases of a set that a drawing fits, those of the most states first. A drawing says nothing of which
 * centre is in front, so every AUF after fits alike. Empty if the drawing is of no cube: see drawingProblems.
 */
export function casesDrawn(set: CaseSet, drawing: Drawing): readonly DrawnCase[] {
  const fits = pieceFits(drawing, colouringOf(drawing));
  const corners = fittingCorners(fits);
  const edges = fittingEdges(fits);
  // 1 for a state that fits as it is held, 2 for one that does with another front.
  const marks = new Uint8Array(STATES);
  for (const corner of corners)
    for (const edge of edges) {
      if (corner.parity !== edge.parity) continue;
      for (let after = 0; after < 4; after++) {
        const state = indexOf(
          PERMUTATION_ACT[corner.rank * 16 + after]!,
          corner.code,
          PERMUTATION_ACT[edge.rank * 16 + after]!,
          edge.code,
        );
        marks[state]! |= after === 0 ? 1 : 2;
      }
    }
  const found = new Map<CaseOfSet, { states: number; example: number }>();
  for (let state = 0; state < STATES; state++) {
    if (marks[state] === 0) continue;
    const of = set.caseOfState(state);
    if (!of) continue;
    const entry = found.get(of) ?? { states: 0, example: -1 };
    entry.states++;
    if (entry.example < 0 && marks[state]! & 1) entry.example = state;
    found.set(of, entry);
  }
  return Array.from(found, ([of, entry]) => ({ case: of, ...entry })).sort(
    (a, b) => b.states - a.states || a.case.number - b.case.number,
  );
}
