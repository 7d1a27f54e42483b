import type { MemoryModel, Trace } from './fsrs.ts';
import { quickSteps } from './quick-steps.ts';

/** Rolling horizon of the gain, in days. Never an event's date: an end-date objective procrastinates. */
export const HORIZON_DAYS = 60;

/** Seconds a showing takes, by what comes of it. */
export interface ShowingCosts {
  readonly held: number;
  readonly missed: number;
  /** The retest later in the sitting, added to every miss. */
  readonly retest: number;
  /** A new case: its meeting's picture, first showing and, often, retest. */
  readonly fresh: number;
}

/** The seconds the policy simulations used; a member's own replace them once known. */
export const DEFAULT_COSTS: ShowingCosts = Object.freeze({ held: 5, missed: 10, retest: 5, fresh: 12 });

/** Share of new cases held at their first showing, as the policy simulations assume. */
export const FRESH_HELD = 0.5;

/**
 * Mean recall from `from` to `from + horizon` days after an answer that left this stability:
 * V = S/(h·F·(1 − d)) · [(1 + F(a + h)/S)^(1−d) − (1 + F·a/S)^(1−d)], the integral of the forgetting curve.
 */
export function meanRecall(model: MemoryModel, from: number, horizon: number, stability: number): number {
  const { factor, decay } = model;
  const power = 1 - decay;
  const scale = stability / (horizon * factor * power);
  const until = (1 + (factor * (from + horizon)) / stability) ** power;
  return scale * (until - (from === 0 ? 1 : (1 + (factor * from) / stability) ** power));
}

/** Seconds a showing is expected to take when recall is `recall`. */
export function expectedSeconds(recall: number, costs: ShowingCosts): number {
  return recall * costs.held + (1 - recall) * (costs.missed + costs.retest);
}

/**
 * What a showing today adds to the prior-weighted mean recall of the horizon, per second it takes:
 * G = p·{R·V(0,h,S⁺) + (1 − R)·V(0,h,S⁻) − V(e,h,S)} / expected seconds.
 */
export function gainOfShowing(
  model: MemoryModel,
  prior: number,
  trace: Trace,
  elapsedDays: number,
  costs: ShowingCosts,
  horizon = HORIZON_DAYS,
): number {
  const quick = quickSteps(model);
  const { stability, difficulty } = trace;
  const chance = quick.recall(elapsedDays, stability);
  const pass = quick.afterHeld(stability, difficulty, chance);
  const fail = quick.afterMissAndRetest(stability, difficulty, chance);
  const shown =
    chance * meanRecall(model, 0, horizon, pass) + (1 - chance) * meanRecall(model, 0, horizon, fail);
  const notShown = meanRecall(model, elapsedDays, horizon, stability);
  return (prior * (shown - notShown)) / expectedSeconds(chance, costs);
}

/** The same for a case never shown, per unit of prior: its recall is nothing until it is met. */
export function gainOfNew(model: MemoryModel, costs: ShowingCosts, horizon = HORIZON_DAYS): number {
  const pass = meanRecall(model, 0, horizon, model.next(null, 0, true).stability);
  const fail = meanRecall(model, 0, horizon, model.next(null, 0, false).stability);
  return (FRESH_HELD * pass + (1 - FRESH_HELD) * fail) / costs.fresh;
}
