/**
 * Reading algorithms from text. Plain moves are read here; round brackets only group. Repetitions
 * `(R U)3`, inverted groups `(R U)'`, commutators `[A, B]` and conjugates `[A: B]` are checked character by
 * character and handed to an expander where the caller has one.
 */
import type { Move } from './moves.ts';
import { AlgorithmScanner, AlgorithmSyntaxError } from './scanner.ts';

export interface ParsedAlgorithm {
  /** ASCII, one space between moves, no brackets, `r` for `Rw`: `R U R' U'`. */
  readonly text: string;
  readonly moves: readonly Move[];
}

/** Writes out repetitions, commutators and conjugates: ASCII text in, plain moves out. */
export type Expander = (structured: string) => string;

function scan(text: string): AlgorithmScanner {
  const scanner = new AlgorithmScanner(text);
  scanner.scan();
  return scanner;
}

/** Moves as normalised text. */
export const writeMoves = (moves: readonly Move[]): string => moves.map((move) => move.text).join(' ');

/** Only the moves: parseAlgorithm without writing the text out again. */
export function parseMoves(text: string, expand?: Expander): readonly Move[] {
  const read = scan(text);
  if (read.expandsAt < 0) return read.moves;
  if (!expand) throw new AlgorithmSyntaxError(read.expandsAt + 1, text[read.expandsAt]!, 'needs-expanding');
  return scan(expand(read.structured())).moves;
}

/**
 * Reads an algorithm: WCA Regulations, Article 12, with lower-case wides and slices. Spaces between moves may
 * be left out; ’ ′ ` ´ are primes; `Rw` and `r` are the same.
 * @throws AlgorithmSyntaxError at the first character that is no move of the notation, at an unbalanced
 *   bracket, beyond 500 moves, or at what needs an expander when none is given.
 */
export function parseAlgorithm(text: string, expand?: Expander): ParsedAlgorithm {
  const moves = parseMoves(text, expand);
  return { text: writeMoves(moves), moves };
}
