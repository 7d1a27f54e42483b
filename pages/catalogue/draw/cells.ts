import type { PlaceName, Side, Site } from '#shared/lastlayer/pictures/index.ts';

/** A sticker's place in the five rows and columns of the grid, and the piece it is on. */
export interface GridCell {
  readonly site: Site;
  /** null for the top centre. */
  readonly piece: PlaceName | null;
}

const cell = (side: Side, index: number, piece: PlaceName | null): GridCell => ({
  site: [side, index],
  piece,
});

/** The layer from above, its corners cut out: back, three rows of the top between left and right, front. */
export const GRID: readonly (readonly (GridCell | null)[])[] = [
  [null, cell('back', 0, 'UBL'), cell('back', 1, 'UB'), cell('back', 2, 'UBR'), null],
  [
    cell('left', 0, 'UBL'),
    cell('top', 0, 'UBL'),
    cell('top', 1, 'UB'),
    cell('top', 2, 'UBR'),
    cell('right', 2, 'UBR'),
  ],
  [
    cell('left', 1, 'UL'),
    cell('top', 3, 'UL'),
    cell('top', 4, null),
    cell('top', 5, 'UR'),
    cell('right', 1, 'UR'),
  ],
  [
    cell('left', 2, 'UFL'),
    cell('top', 6, 'UFL'),
    cell('top', 7, 'UF'),
    cell('top', 8, 'UFR'),
    cell('right', 0, 'UFR'),
  ],
  [null, cell('front', 0, 'UFL'), cell('front', 1, 'UF'), cell('front', 2, 'UFR'), null],
];

/** Rows and columns from 0 to 4. */
export interface Spot {
  readonly row: number;
  readonly column: number;
}

const STEPS: Readonly<Record<string, readonly [down: number, right: number]>> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
};

/** Where a key leads from a cell: to the next one, to the ends of the row; null for other keys and at the edge. */
export function spotAfter(key: string, { row, column }: Spot): Spot | null {
  const line = GRID[row] ?? [];
  if (key === 'Home') return { row, column: line.findIndex((one) => one !== null) };
  if (key === 'End') return { row, column: line.findLastIndex((one) => one !== null) };
  const step = STEPS[key];
  if (!step) return null;
  const to = { row: row + step[0], column: column + step[1] };
  return GRID[to.row]?.[to.column] ? to : null;
}
