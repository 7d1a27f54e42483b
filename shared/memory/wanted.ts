import { DEFAULT_WEIGHTS, type MemoryModel, memoryModel, type Weights } from './fsrs.ts';
import type { CaseMemory } from './types.ts';

/** Bounds of wanted retention. */
export const WANTED_MIN = 0.7;
export const WANTED_MAX = 0.98;
/** β before the first nightly solution: the value the policy simulations used. */
export const DEFAULT_BETA = 0.07;
/** Training days from the first answer during which a case counts as settling. */
export const SETTLING_DAYS = 3;

/** Prior with a fifth spread evenly, so that rare cases do not starve: p′ = .8·p + .2/N. */
export function mixedPrior(prior: number, cases: number): number {
  return 0.8 * prior + 0.2 / cases;
}

/**
 * Wanted retention of a case: clip(1 − β/√(N·p′), .70, .98). The square-root law: for equal marginal cost
 * the accepted loss 1 − r goes as p^(−1/2).
 *
 * @param prior share of the programme's dealt cases, 0..1, before mixing
 * @param cases number N of cases in the programme, at least 1
 * @param beta the member's knob, at least 0
 */
export function wantedRecall(prior: number, cases: number, beta: number): number {
  return wantedOfMixed(mixedPrior(prior, cases), cases, beta);
}

/** As `wantedRecall`, for a prior that is already mixed. */
export function wantedOfMixed(mixed: number, cases: number, beta: number): number {
  return Math.min(Math.max(1 - beta / Math.sqrt(cases * mixed), WANTED_MIN), WANTED_MAX);
}

/** Chance, 0..1, that the case is held on training day `day`; 1 on the day it was last answered. */
export function recall(memory: CaseMemory, day: number, weights: Weights = DEFAULT_WEIGHTS): number {
  return memoryModel(weights).recall(Math.max(0, day - memory.lastDay), memory.stability);
}

/** Whole days, at least 1, after which recall is at or below what is wanted. */
export function daysUntilDue(model: MemoryModel, stability: number, wanted: number): number {
  const days = Math.max(1, Math.ceil(model.daysUntil(wanted, stability)));
  // Where the curve meets the wanted recall on a whole day, rounding must not cost that day.
  return days > 1 && model.recall(days - 1, stability) <= wanted ? days - 1 : days;
}

/** The first training day after the last answer on which recall is at or below what is wanted. */
export function dueDay(memory: CaseMemory, wanted: number, weights: Weights = DEFAULT_WEIGHTS): number {
  return memory.lastDay + daysUntilDue(memoryModel(weights), memory.stability, wanted);
}

export type CaseStateName = 'unmet' | 'settling' | 'holding' | 'slipping';

/**
 * A case's state for a member: unmet (no scored answer yet), settling (its first three training days), then
 * holding or slipping: recall above, or not above, what is wanted.
 */
export function caseStateName(
  memory: CaseMemory | null,
  day: number,
  wanted: number,
  weights: Weights = DEFAULT_WEIGHTS,
): CaseStateName {
  if (!memory) return 'unmet';
  if (day - memory.firstDay < SETTLING_DAYS) return 'settling';
  return recall(memory, day, weights) > wanted ? 'holding' : 'slipping';
}
