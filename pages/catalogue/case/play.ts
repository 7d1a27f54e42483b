import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { ASPECTS, isAspect, isEntry, seenThrough } from '#shared/lastlayer/aspects.ts';
import { type Frame, playAlgorithm } from '#shared/lastlayer/facelets.ts';
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { maskStickers } from '#shared/lastlayer/pictures/mask.ts';
import { stickersOf } from '#shared/lastlayer/pictures/stickers.ts';
import { readAlgorithm } from '#shared/lastlayer/reading.ts';

/**
 * The cube before an algorithm of the case and after each of its moves, from the state that it solves; what the
 * set does not tell apart is left open. Null for what keeps no first two layers: no edition has such.
 */
export function framesOf(
  { entry, toldApart }: Pick<CatalogueCaseView, 'entry' | 'toldApart'>,
  algorithm: string,
): readonly Frame[] | null {
  const reading = readAlgorithm(algorithm);
  if (reading.kind !== 'state') return null;
  const seen = isEntry(entry) ? seenThrough(entry, toldApart.filter(isAspect)) : ASPECTS;
  return playAlgorithm(maskStickers(stickersOf(reading.state), seen), parseMoves(algorithm));
}
