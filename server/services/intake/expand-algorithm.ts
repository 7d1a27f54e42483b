import { Alg } from 'cubing/alg';

/**
 * Writes out repetitions, commutators and conjugates as plain moves. The text was checked character by
 * character before, and its length bounded, by the reader that hands it over (shared/lastlayer).
 */
export function expandAlgorithm(structured: string): string {
  return new Alg(structured).expand().toString();
}
