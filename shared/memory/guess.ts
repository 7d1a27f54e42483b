import type { MemoryModel, Trace } from './fsrs.ts';
import { round8 } from './fsrs.ts';

/**
 * Chance that a case never asked before is known, taken when its first answer is right: half, the share of
 * first answers held that the simulations behind the scheduling policy assume.
 */
export const KNOWN_AT_FIRST = 0.5;

/**
 * Chance that a right answer was knowledge and not luck: R / (R + (1 − R)/k), by Bayes' rule with a guess
 * spread evenly over the keys.
 *
 * @param recall chance of recall before the answer, 0..1
 * @param keys names offered, at least 1
 */
export function knownGivenRight(recall: number, keys: number): number {
  return recall / (recall + (1 - recall) / keys);
}

/** Chance of a right answer when recall is `recall` and `keys` names are offered: 1/k + (1 − 1/k)·R. */
export function chanceOfRight(recall: number, keys: number): number {
  return 1 / keys + (1 - 1 / keys) * recall;
}

/**
 * State after a held answer, corrected for luck: the state whose recall at the next planned showing is the
 * mixture of both explanations, R(h, S̃) = q·R(h, S_pass) + (1 − q)·R(h, S_fail) with h = I(.9, S_pass);
 * difficulty is mixed likewise. Not held needs no correction: nobody misses a case by luck.
 */
export function traceAfterHeld(
  model: MemoryModel,
  trace: Trace | null,
  elapsedDays: number,
  keys: number,
): Trace {
  const pass = model.next(trace, elapsedDays, true);
  const before = trace ? model.recall(elapsedDays, trace.stability) : KNOWN_AT_FIRST;
  const known = knownGivenRight(before, keys);
  if (known === 1) return pass;
  const fail = model.next(trace, elapsedDays, false);
  const next = Math.max(1, Math.round(model.daysUntil(0.9, pass.stability)));
  const mixed = known * model.recall(next, pass.stability) + (1 - known) * model.recall(next, fail.stability);
  return {
    stability: round8(model.stabilityFor(next, mixed)),
    difficulty: round8(known * pass.difficulty + (1 - known) * fail.difficulty),
  };
}
