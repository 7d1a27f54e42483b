/** Counts of cases for any step, and the lemma they are checked against. */
import { AUFS, type Auf, act } from './action.ts';
import { type Aspect, type Entry, inOrder } from './aspects.ts';
import { classify } from './classes.ts';
import { STATES } from './state.ts';

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

export interface FixedStates {
  readonly before: Auf;
  readonly after: Auf;
  /** States that this element of the sixteen-fold action leaves as they are. */
  readonly fixed: number;
}

/**
 * Burnside's table by enumeration: the number of states fixed by each of the sixteen elements. Their mean
 * is the number of cases of the full last layer (Cauchy–Frobenius lemma).
 */
export function burnsideTable(): readonly FixedStates[] {
  return AUFS.flatMap((before) =>
    AUFS.map((after) => {
      let fixed = 0;
      for (let index = 0; index < STATES; index++) if (act(index, before, after) === index) fixed++;
      return { before, after, fixed };
    }),
  );
}
