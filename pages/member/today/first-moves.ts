import { printedAlgorithm } from '#renderer/ui/index.ts';

/** The first moves of an algorithm as printed: enough to know which one is meant. */
export function firstMoves(algorithm: string, count = 4): string {
  return printedAlgorithm(algorithm.split(' ').slice(0, count).join(' '));
}
