import { logistic, logit } from './special.ts';

/** Days of first scored answers that a calibration looks back on. */
export const CALIBRATION_DAYS = 30;
/** Standard deviation of the prior on b: half a logit. */
export const SHIFT_PRIOR_SD = 0.5;

/** A training day's first scored answer, as calibration sees it. */
export interface CalibrationAnswer {
  /** Recall predicted just before; null for a case nothing was known of, which says nothing here. */
  readonly recall: number | null;
  /** Names offered, at least 1. */
  readonly keys: number;
  readonly held: boolean;
}

/** A member's shift on the logit scale and how well it is known. */
export interface Calibration {
  readonly b: number;
  /** h = 4 + Σ e(1 − e), e the calibrated recall of each answer; 4 is the prior's share. */
  readonly information: number;
}

/** What holds before any answer: the prior alone. */
export const NO_CALIBRATION: Calibration = Object.freeze({ b: 0, information: 1 / SHIFT_PRIOR_SD ** 2 });

/** Recall after calibration: σ(logit R + b). */
export function calibrated(recall: number, b: number): number {
  return logistic(logit(recall) + b);
}

/**
 * How much better or worse than the memory model says a member really does: the most probable b, with prior
 * N(0, .5²), under P(held) = 1/k + (1 − 1/k)·σ(logit R + b). Fisher scoring with halved steps, so that it
 * always ends at the same value. Answers on cases that are nearly certain weigh e(1 − e) ≈ 0: repeating what
 * one knows moves nothing.
 *
 * @param answers first scored answers of the last 30 training days, in any order
 * @throws RangeError for a recall outside 0..1 or fewer than one key.
 */
export function logitCalibration(answers: readonly CalibrationAnswer[]): Calibration {
  const points = answers.flatMap(({ recall, keys, held }) => {
    if (recall === null) return [];
    if (!(recall >= 0 && recall <= 1)) throw new RangeError('A recall lies between 0 and 1.');
    if (!(keys >= 1)) throw new RangeError('At least one key is offered.');
    return [{ x: logit(recall), guess: 1 / keys, held }];
  });
  if (points.length === 0) return NO_CALIBRATION;
  // Sums depend on the order of their terms in the last bits: with one order, a rebuild differs by zero.
  points.sort((a, b) => a.x - b.x || a.guess - b.guess || Number(a.held) - Number(b.held));
  let b = 0;
  let here = score(points, b);
  for (let step = 0; step < 100; step += 1) {
    let move = here.slope / here.information;
    let next = score(points, b + move);
    while (next.height < here.height && Math.abs(move) > 1e-12) {
      move /= 2;
      next = score(points, b + move);
    }
    if (next.height < here.height) break;
    b += move;
    here = next;
    if (Math.abs(move) < 1e-12) break;
  }
  const spread = points.reduce((sum, { x }) => {
    const e = logistic(x + b);
    return sum + e * (1 - e);
  }, 0);
  return { b, information: NO_CALIBRATION.information + spread };
}

interface Point {
  readonly x: number;
  readonly guess: number;
  readonly held: boolean;
}

/** Log posterior at b, its slope, and the expected information used as step scale. */
function score(points: readonly Point[], b: number) {
  const precision = NO_CALIBRATION.information;
  let height = -0.5 * precision * b * b;
  let slope = -precision * b;
  let information = precision;
  for (const { x, guess, held } of points) {
    const e = logistic(x + b);
    const chance = guess + (1 - guess) * e;
    const miss = (1 - guess) * logistic(-x - b);
    const rise = (1 - guess) * e * logistic(-x - b);
    if (miss === 0) continue;
    height += held ? Math.log(chance) : Math.log(miss);
    slope += held ? rise / chance : -rise / miss;
    information += (rise * rise) / (chance * miss);
  }
  return { height, slope, information };
}
