/** The cubing library's puzzle model written as 54 stickers, as an oracle for our own. */
import { Alg } from 'cubing/alg';
import type { KPattern } from 'cubing/kpuzzle';
import { cube3x3x3 } from 'cubing/puzzles';
import { FACELET_FACES } from '#shared/lastlayer/facelets.ts';

const puzzle = await cube3x3x3.kpuzzle();

/** The model's places, each with its stickers clockwise, the one it is oriented by first. */
const CORNERS = ['URF', 'UBR', 'ULB', 'UFL', 'DFR', 'DLF', 'DBL', 'DRB'];
const EDGES = ['UF', 'UR', 'UB', 'UL', 'DF', 'DR', 'DB', 'DL', 'FR', 'FL', 'BR', 'BL'];
const CENTRES = 'ULFRBD';

/** For each face the pieces row by row as who looks at it sees them, as sets of face letters. */
const ROWS: Readonly<Record<string, readonly string[]>> = {
  U: ['ULB', 'UB', 'UBR', 'UL', 'U', 'UR', 'UFL', 'UF', 'URF'],
  R: ['URF', 'UR', 'UBR', 'FR', 'R', 'BR', 'DFR', 'DR', 'DRB'],
  F: ['UFL', 'UF', 'URF', 'FL', 'F', 'FR', 'DLF', 'DF', 'DFR'],
  D: ['DLF', 'DF', 'DFR', 'DL', 'D', 'DR', 'DBL', 'DB', 'DRB'],
  L: ['ULB', 'UL', 'UFL', 'BL', 'L', 'FL', 'DBL', 'DL', 'DLF'],
  B: ['UBR', 'UB', 'ULB', 'BR', 'B', 'BL', 'DRB', 'DB', 'DBL'],
};

function stickerOf({ patternData }: KPattern, place: string, face: string): string {
  if (place.length === 1) return CENTRES[patternData.CENTERS!.pieces[CENTRES.indexOf(place)]!]!;
  const [names, orbit] = place.length === 2 ? [EDGES, patternData.EDGES!] : [CORNERS, patternData.CORNERS!];
  const at = names.indexOf(place);
  const size = place.length;
  const piece = names[orbit.pieces[at]!]!;
  return piece[(place.indexOf(face) + size - orbit.orientation[at]!) % size]!;
}

/** The stickers of a pattern, faces U R F D L B, row by row. */
export const puzzleFacelets = (pattern: KPattern): string =>
  FACELET_FACES.map((face) => ROWS[face]!.map((place) => stickerOf(pattern, place, face)).join('')).join('');

/** A solved cube turned by an algorithm, the cube left in whatever way it is then held. */
export const puzzleAfter = (algorithm: string): KPattern =>
  puzzle.defaultPattern().applyAlg(new Alg(algorithm));
