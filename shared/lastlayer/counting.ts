/** Counts of cases for any step. */
import { type Aspect, type Entry, inOrder } from './aspects.ts';
import { classify } from './classes.ts';

export interface CaseCount {
  readonly entry: Entry;
  readonly aspects: readonly Aspect[];
  /** Number of cases, the solved class included. */
  readonly cases: number;
  /** Number of full states that meet the entry condition. */
  readonly states: number;
  /** How many cases have each weight, in full entry states, rising by weight. */
  readonly weights: readonly { readonly weight: number; readonly cases: number }[];
}

/** How many cases a step has, and how likely they are: a case's prior is weight / states. */
export function countCases(entry: Entry, aspects: readonly Aspect[]): CaseCount {
  const classes = classify(entry, aspects);
  const byWeight = new Map<number, number>();
  for (const weight of classes.weight) byWeight.set(weight, (byWeight.get(weight) ?? 0) + 1);
  return {
    entry,
    aspects: inOrder(aspects),
    cases: classes.canonical.length,
    states: classes.states,
    weights: [...byWeight]
      .map(([weight, cases]) => ({ weight, cases }))
      .sort((one, other) => one.weight - other.weight),
  };
}
