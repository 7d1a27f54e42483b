import { type FaceletFace, type Facelets, faceletAt, requireFacelets } from '../facelets.ts';
import type { Holding } from '../seat-codes.ts';
import { CELL, facesHeld, faceTile, LETTER_SIZES, SPAN, WIDTH } from './cabinet.ts';
import type { Colouring, ColourName } from './colours.ts';
import { polygonPath, svgElement } from './geometry.ts';
import { PALETTES, type Palette } from './palettes.ts';
import { colourOf, INK, type Tile, tileMarkup } from './tiles.ts';

export interface CubeViewOptions {
  readonly facelets: Facelets;
  /** Colours of the faces as they are called in `facelets`: U is the last layer's. */
  readonly colouring: Colouring;
  readonly holding: Holding;
  readonly palette?: Palette;
  /** Lays each colour's letter on it. */
  readonly letters?: boolean;
  /** Text alternative; without one the drawing is hidden from assistive technology. */
  readonly title?: string;
}

/** Room for three layers and their outline. */
export const CUBE_VIEW_BOX = `-8 -134 ${WIDTH + 16} ${SPAN + 142}`;

interface Spot {
  readonly face: FaceletFace;
  readonly row: number;
  readonly column: number;
}
interface Scene {
  readonly rim: string;
  readonly tiles: readonly { spot: Spot; tile: Tile }[];
}

const THREE = [0, 1, 2] as const;

/** The nine spots of each face in view, in the drawing's own columns: mirrored for the left-front view. */
function scene(holding: Holding, body: Palette['body']): Scene {
  const { front, top, side } = facesHeld(holding);
  const mirrored = holding === 'left';
  const column = (k: number) => (mirrored ? 2 - k : k);
  const cells = THREE.flatMap((row) => THREE.map((k) => ({ row, k })));
  return {
    rim: polygonPath([
      front(0, 0),
      top(0, SPAN),
      top(SPAN, SPAN),
      side(SPAN, SPAN),
      front(SPAN, SPAN),
      front(0, SPAN),
    ]),
    tiles: [
      ...cells.map(({ row, k }) => ({
        spot: { face: 'U' as const, row, column: column(k) },
        tile: faceTile(top, k * CELL, (2 - row) * CELL, LETTER_SIZES.top, body),
      })),
      ...cells.map(({ row, k }) => ({
        spot: { face: 'F' as const, row, column: column(k) },
        tile: faceTile(front, k * CELL, row * CELL, LETTER_SIZES.front, body),
      })),
      ...cells.map(({ row, k }) => ({
        spot: { face: mirrored ? ('L' as const) : ('R' as const), row, column: column(k) },
        tile: faceTile(side, k * CELL, row * CELL, LETTER_SIZES.side, body),
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

/**
 * The drawing inside the svg element of {@link cubeSeatViewSvg}.
 * @throws RangeError unless `facelets` is 54 letters.
 */
export function cubeSeatViewInner(options: CubeViewOptions): string {
  const { facelets, colouring, holding, palette = PALETTES.standard, letters = false } = options;
  requireFacelets(facelets);
  const { rim, tiles } = sceneFor(holding, palette.body);
  const style = { colouring, palette, letters, kind: 'cube' } as const;
  return [
    `<path class="cube-rim" d="${rim}" fill="none" stroke="none" stroke-width="14" stroke-linejoin="round"/>`,
    `<path class="cube-body" d="${rim}" fill="${INK}" stroke="${INK}" stroke-width="9" stroke-linejoin="round"/>`,
    '<g stroke-width="1.6">',
    ...tiles.map(({ spot, tile }) =>
      tileMarkup(tile, faceletAt(facelets, spot.face, spot.row, spot.column), style),
    ),
    '</g>',
  ].join('');
}

/** A whole cube from the holder's seat, in the projection of the seat view. */
export function cubeSeatViewSvg(options: CubeViewOptions): string {
  return svgElement('seat-view', CUBE_VIEW_BOX, cubeSeatViewInner(options), options.title);
}

/** The words of a whole cube's text form, from the message catalogue. */
export interface CubeWords {
  readonly letters: Readonly<Record<ColourName, string>>;
  readonly hidden: string;
  readonly cubeFaces: Readonly<Record<'top' | 'front' | Holding, string>>;
  /** One face: its name and its three rows of letters. */
  readonly cubeFace: (face: string, rows: readonly (readonly string[])[]) => string;
}

/** A whole cube in words: the three faces in view, row by row. It names what is seen and nothing else. */
export function describeCube(
  { facelets, colouring, holding }: Pick<CubeViewOptions, 'facelets' | 'colouring' | 'holding'>,
  words: CubeWords,
): string {
  const faces = [
    ['top', 'U'],
    ['front', 'F'],
    [holding, holding === 'right' ? 'R' : 'L'],
  ] as const;
  const letter = (face: FaceletFace, row: number, column: number): string => {
    const colour = colourOf(faceletAt(facelets, face, row, column), colouring);
    return colour ? words.letters[colour] : words.hidden;
  };
  return faces
    .map(([name, face]) =>
      words.cubeFace(
        words.cubeFaces[name],
        THREE.map((row) => THREE.map((column) => letter(face, row, column))),
      ),
    )
    .join(' ');
}
