import type { Picture } from '#shared/contracts/common.ts';
import { type CaseOfSet, type CaseSet, readAlgorithm, seenThrough } from '#shared/lastlayer/index.ts';
import { maskStickers, stickersOf, TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';

/**
 * The picture of a case in tables and lists: what the set tells apart, in the usual colours, from where
 * `algorithm` solves it without an AUF before; without one, from the canonical angle.
 */
export function casePicture(set: CaseSet, c: CaseOfSet, algorithm?: string): Picture {
  return { stickers: seenStickers(set, frontOf(set, c, algorithm)), colouring: TABLE_COLOURING };
}

/** The stickers of a state as far as the set tells them apart. */
export function seenStickers(set: CaseSet, state: number): Picture['stickers'] {
  return maskStickers(stickersOf(state), seenThrough(set.definition.entry, set.definition.toldApart));
}

/** The full state of a case that `algorithm` solves without an AUF before; else the canonical one. */
export function frontOf(set: CaseSet, c: CaseOfSet, algorithm: string | undefined): number {
  if (algorithm === undefined) return c.canonical;
  const reading = readAlgorithm(algorithm);
  return reading.kind === 'state' && set.caseOfState(reading.state)?.key === c.key
    ? reading.state
    : c.canonical;
}
