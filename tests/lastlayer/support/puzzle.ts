/** The cubing library's puzzle model as an oracle: general, slow, and not ours. */
import { Alg } from 'cubing/alg';
import { KPattern, type KTransformation } from 'cubing/kpuzzle';
import { cube3x3x3 } from 'cubing/puzzles';
import { type Aspect, type LastLayerState, stateAt, stateIndex } from '#shared/lastlayer/index.ts';

const puzzle = await cube3x3x3.kpuzzle();
const solved = puzzle.defaultPattern();

/** The turns of the whole cube that reach each of its 24 positions. */
const ROTATIONS: readonly KTransformation[] = ['', 'x', 'x2', "x'", 'z', "z'"].flatMap((top) =>
  ['', 'y', 'y2', "y'"].map((front) => puzzle.algToTransformation(new Alg(`${top} ${front}`.trim()))),
);

const centresHome = (pattern: KPattern): boolean =>
  pattern.patternData.CENTERS!.pieces.every((piece, place) => piece === place);

/** The algorithm with the turn of the whole cube that brings its centres home behind it. */
export function broughtHome(algorithm: string): KTransformation {
  const turned = puzzle.algToTransformation(new Alg(algorithm));
  const pattern = solved.applyTransformation(turned);
  const home = ROTATIONS.find((rotation) => centresHome(pattern.applyTransformation(rotation)))!;
  return turned.applyTransformation(home);
}

/** Corners and edges after the algorithm, centres home: what is at each place. */
export function piecesAfter(algorithm: string) {
  const { CORNERS, EDGES } = solved.applyTransformation(broughtHome(algorithm)).patternData;
  return { corners: CORNERS!, edges: EDGES! };
}

/**
 * The state an algorithm solves, by the recipe alone: centres home, invert, apply to a solved cube, require
 * the first two layers intact. null if they are not.
 */
export function stateSolvedByPuzzle(algorithm: string): number | null {
  const { CORNERS, EDGES } = solved.applyTransformation(broughtHome(algorithm).invert()).patternData;
  const home = (orbit: { pieces: number[]; orientation: number[] }): boolean =>
    orbit.pieces.every((piece, place) => place < 4 || (piece === place && orbit.orientation[place] === 0));
  if (!home(CORNERS!) || !home(EDGES!)) return null;
  return stateIndex({
    cp: CORNERS!.pieces.slice(0, 4),
    co: CORNERS!.orientation.slice(0, 4),
    ep: EDGES!.pieces.slice(0, 4),
    eo: EDGES!.orientation.slice(0, 4),
  });
}

/** A cube in a last-layer state, to be turned by algorithms. */
export function puzzleIn({ cp, co, ep, eo }: LastLayerState): KPattern {
  const data = structuredClone(solved.patternData);
  const { CORNERS, EDGES } = data;
  cp.forEach((piece, place) => {
    CORNERS!.pieces[place] = piece;
    CORNERS!.orientation[place] = co[place]!;
  });
  ep.forEach((piece, place) => {
    EDGES!.pieces[place] = piece;
    EDGES!.orientation[place] = eo[place]!;
  });
  return new KPattern(puzzle, data);
}

/** The pattern turned by an algorithm, centres home again. */
export const turnedBy = (pattern: KPattern, algorithm: string): KPattern =>
  pattern.applyTransformation(broughtHome(algorithm));

/**
 * Whether these aspects of a cube in a last-layer state are solved by an algorithm and some turn of the top behind
 * it: told from the puzzle model alone.
 */
export function solvedOnCube(solved: readonly Aspect[], state: number, algorithm: string): boolean {
  const start = turnedBy(puzzleIn(stateAt(state)), algorithm);
  return ['', 'U', 'U2', "U'"].some((after) => {
    const { CORNERS, EDGES } = start.applyAlg(after).patternData;
    const home = (pieces: readonly number[]) => pieces.every((piece, place) => piece === place);
    const oriented = (list: readonly number[]) => list.every((value) => value === 0);
    return solved.every((aspect) => {
      if (aspect === 'co') return oriented(CORNERS!.orientation);
      if (aspect === 'eo') return oriented(EDGES!.orientation);
      return home(aspect === 'cp' ? CORNERS!.pieces : EDGES!.pieces);
    });
  });
}
