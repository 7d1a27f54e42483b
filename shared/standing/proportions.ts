import { betaQuantile, normalQuantile } from './special.ts';

/** Confidence of every interval the product shows. */
export const CONFIDENCE = 0.9;

/**
 * Wilson's score interval for a share (Wilson 1927; recommended by Brown, Cai and DasGupta, "Interval
 * Estimation for a Binomial Proportion", 2001). No answers: [0, 1].
 *
 * @throws RangeError unless 0 ≤ successes ≤ trials, whole numbers, and 0 < confidence < 1.
 */
export function wilson(successes: number, trials: number, confidence = CONFIDENCE): [number, number] {
  checkCounts(successes, trials, confidence);
  if (trials === 0) return [0, 1];
  const z2 = normalQuantile((1 + confidence) / 2) ** 2;
  const share = successes / trials;
  const centre = (share + z2 / (2 * trials)) / (1 + z2 / trials);
  const half = Math.sqrt((z2 * share * (1 - share)) / trials + (z2 / (2 * trials)) ** 2) / (1 + z2 / trials);
  return [
    successes === 0 ? 0 : Math.max(0, centre - half),
    successes === trials ? 1 : Math.min(1, centre + half),
  ];
}

/**
 * Jeffreys' interval for a share: the middle of Beta(x + ½, n − x + ½), stretched to 0 when nothing and to 1
 * when everything succeeded (as Brown, Cai and DasGupta 2001 advise). For small counts.
 *
 * @throws RangeError as `wilson` does.
 */
export function jeffreys(successes: number, trials: number, confidence = CONFIDENCE): [number, number] {
  checkCounts(successes, trials, confidence);
  const tail = (1 - confidence) / 2;
  const a = successes + 0.5;
  const b = trials - successes + 0.5;
  return [
    successes === 0 ? 0 : betaQuantile(tail, a, b),
    successes === trials ? 1 : betaQuantile(1 - tail, a, b),
  ];
}

function checkCounts(successes: number, trials: number, confidence: number): void {
  if (!Number.isInteger(successes) || !Number.isInteger(trials) || successes < 0 || successes > trials) {
    throw new RangeError('A share is a whole number of successes out of at least as many trials.');
  }
  if (!(confidence > 0 && confidence < 1)) throw new RangeError('The confidence lies between 0 and 1.');
}
