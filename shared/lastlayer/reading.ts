/** Which state an algorithm solves. */
import { brokenPieces, firstTwoLayersIntact, followMoves, type Track } from './cube.ts';
import type { Move } from './moves.ts';
import { type Expander, parseAlgorithm } from './notation.ts';
import { AlgorithmSyntaxError } from './scanner.ts';
import { flipCode, indexOf, rankOf, twistCode } from './state.ts';

export type Reading =
  | {
      readonly kind: 'state' /** Solved by the algorithm with no AUF. */;
      readonly state: number;
      readonly normalised: string;
    }
  | {
      readonly kind: 'first-two-layers-broken';
      readonly pieces: readonly string[];
      readonly normalised: string;
    }
  | { readonly kind: 'not-a-move'; readonly column: number; readonly token: string };

/** Scratch space: reading is synchronous, so one is enough. */
const scratch: Track = new Uint8Array(20);

const cornerPlace = (cubie: number): number => Math.floor(cubie / 3);
const untwisted = (cubie: number): number => (3 - (cubie % 3)) % 3;

/**
 * The state that the followed moves solve. The moves take piece p to a place: backwards, place p receives
 * the piece of that place with the opposite twist, so the track read as a state is the inverse.
 */
function stateSolvedBy(track: Track): number {
  const [a, b, c, d] = [track[0]!, track[1]!, track[2]!, track[3]!];
  const [e, f, g, h] = [track[8]!, track[9]!, track[10]!, track[11]!];
  return indexOf(
    rankOf(cornerPlace(a), cornerPlace(b), cornerPlace(c), cornerPlace(d)),
    twistCode(untwisted(a), untwisted(b), untwisted(c)),
    rankOf(e >> 1, f >> 1, g >> 1, h >> 1),
    flipCode(e & 1, f & 1, g & 1),
  );
}

/**
 * The state that moves solve when they are applied to it, or null if they disturb the first two layers.
 * Turns of the whole cube at the end change nothing: the centres are brought home before it is read.
 */
export function stateSolved(moves: readonly Move[]): number | null {
  followMoves(moves, scratch);
  return firstTwoLayersIntact(scratch) ? stateSolvedBy(scratch) : null;
}

/** Reads an algorithm on the cube: the state it solves, or what is wrong with it. Never throws. */
export function readAlgorithm(text: string, expand?: Expander): Reading {
  try {
    const { moves, text: normalised } = parseAlgorithm(text, expand);
    const state = stateSolved(moves);
    if (state !== null) return { kind: 'state', state, normalised };
    return { kind: 'first-two-layers-broken', pieces: brokenPieces(scratch), normalised };
  } catch (error) {
    if (!(error instanceof AlgorithmSyntaxError)) throw error;
    return { kind: 'not-a-move', column: error.column, token: error.token };
  }
}
