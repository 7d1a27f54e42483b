import { type Calibration, calibrated } from './calibration.ts';
import { CONFIDENCE } from './proportions.ts';
import { normalQuantile } from './special.ts';

/** Spread of what a single shift b cannot express, on the logit scale. */
export const MODEL_SD = 0.2;

/** A case of the set's edition, the skip left out. */
export interface DealtCase {
  /** Weight in the deal: any unit, as long as all cases share it. */
  readonly prior: number;
  /** Recall the memory model gives it now; null while unmet. */
  readonly recall: number | null;
}

/** Sums that add up over groups, sets of groups and days: what a rollup row keeps. */
export interface DealtSums {
  /** Σ p */
  readonly sumP: number;
  /** Σ p·e */
  readonly sumPe: number;
  /** Σ p·e·(1 − e) */
  readonly sumPee: number;
}

/** A figure between 0 and 1 with its standard error. */
export interface Estimate {
  readonly theta: number;
  readonly se: number;
}

/** Sums over cases with e = σ(logit R + b), 0 for the unmet; priors as they come, not normalised. */
export function dealtSums(cases: readonly DealtCase[], calibration: Calibration): DealtSums {
  let sumP = 0;
  let sumPe = 0;
  let sumPee = 0;
  for (const { prior, recall } of cases) {
    if (!(prior >= 0)) throw new RangeError('A prior is a number from 0.');
    sumP += prior;
    if (recall === null) continue;
    const e = calibrated(recall, calibration.b);
    sumPe += prior * e;
    sumPee += prior * e * (1 - e);
  }
  return { sumP, sumPe, sumPee };
}

/**
 * Dealt recall from sums, one row or the rows of several groups: θ = Σ p·e / Σ p and
 * SE = Σ p·e(1 − e) / Σ p · √(1/h + .2²).
 *
 * @param information h of the calibration the sums were made with
 * @throws RangeError if there is nothing to be dealt (Σ p = 0) or h is not above 0.
 */
export function dealtFromSums(rows: readonly DealtSums[], information: number): Estimate {
  let sumP = 0;
  let sumPe = 0;
  let sumPee = 0;
  for (const row of rows) {
    sumP += row.sumP;
    sumPe += row.sumPe;
    sumPee += row.sumPee;
  }
  if (!(sumP > 0)) throw new RangeError('Dealt recall needs at least one case that can be dealt.');
  if (!(information > 0)) throw new RangeError('The information of a calibration is above 0.');
  return { theta: sumPe / sumP, se: (sumPee / sumP) * Math.sqrt(1 / information + MODEL_SD ** 2) };
}

/** Dealt recall of a set: the prior-weighted chance that the next case a solve deals is held. */
export function dealtRecall(cases: readonly DealtCase[], calibration: Calibration): Estimate & DealtSums {
  const sums = dealtSums(cases, calibration);
  return { ...dealtFromSums([sums], calibration.information), ...sums };
}

/**
 * A period's figure: the mean of the daily figures. Its standard error is the mean of the daily ones: days
 * of one period share nearly all of the answers behind their calibration, so their errors do not cancel and
 * dividing by √days would claim too much.
 *
 * @throws RangeError without a day.
 */
export function periodMean(days: readonly Estimate[]): Estimate {
  if (days.length === 0) throw new RangeError('A period has at least one day.');
  return {
    theta: days.reduce((sum, day) => sum + day.theta, 0) / days.length,
    se: days.reduce((sum, day) => sum + day.se, 0) / days.length,
  };
}

const ONE_SIDED = 1.645;

/** What boards rank by: θ − 1.645·SE, the end of the interval that a doubter would bet on. */
export function lowerBound(theta: number, se: number): number {
  return theta - ONE_SIDED * se;
}

/** Interval around a figure, cut to 0..1; 90 % unless told. */
export function interval(theta: number, se: number, confidence = CONFIDENCE): [number, number] {
  const half = (confidence === CONFIDENCE ? ONE_SIDED : normalQuantile((1 + confidence) / 2)) * se;
  return [Math.max(0, theta - half), Math.min(1, theta + half)];
}
