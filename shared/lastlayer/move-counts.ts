/** How long an algorithm is, in the four ways the trade counts. */
import { type Move, PARTS } from './moves.ts';
import { type Expander, parseMoves } from './notation.ts';

export interface MoveCounts {
  /** Half turn metric: any turn of a face or of two layers is one, a slice two, a turn of the whole cube none. */
  readonly htm: number;
  /** Quarter turn metric: as HTM, but each quarter counts by itself. */
  readonly qtm: number;
  /** Slice turn metric: a slice is one like any other turn, a turn of the whole cube none. */
  readonly stm: number;
  /** Execution turn metric: everything the hands do is one, turns of the whole cube among it. */
  readonly etm: number;
}

/** Counts of moves already read. Nothing is cancelled: what is written is what is counted. */
export function countMoves(moves: readonly Move[]): MoveCounts {
  let [htm, qtm, stm] = [0, 0, 0];
  for (const { family, amount } of moves) {
    // A face or wide turn is one face turn against the centres, a slice two, a rotation none.
    const faces = PARTS[family].turns.length;
    htm += faces;
    qtm += faces * (amount === 2 ? 2 : 1);
    stm += faces > 0 ? 1 : 0;
  }
  return { htm, qtm, stm, etm: moves.length };
}

/**
 * Counts of an algorithm as written, brackets expanded.
 * @throws AlgorithmSyntaxError if it cannot be read.
 */
export const moveCounts = (algorithm: string, expand?: Expander): MoveCounts =>
  countMoves(parseMoves(algorithm, expand));
