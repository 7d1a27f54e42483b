/** The Ledger: what a solve can deal at a step, counted three ways. */
import { inverse, mirror } from './action.ts';
import { type Aspect, type Entry, fixedBy, inOrder, seenThrough } from './aspects.ts';
import { burnsideOf, type FixedStates } from './burnside.ts';
import { type Classes, classify } from './classes.ts';
import { type Fraction, fraction } from './fractions.ts';
import { inverseDefined } from './relations.ts';

/** A count with its formula: the product of the factors by the product of the divisors. */
export interface LedgerCount {
  readonly value: number;
  readonly factors: readonly number[];
  readonly divisors: readonly number[];
}

/** Cases that look different from equally many sides and are dealt equally often. */
export interface LedgerClass {
  readonly angles: 1 | 2 | 4;
  /** Full entry states in each of its cases. */
  readonly weight: number;
  readonly cases: number;
  /** Of each of its cases, in lowest terms. */
  readonly prior: Fraction;
  /** Solves that reach the step for each time one of its cases comes: the prior turned over. */
  readonly dealtOnceIn: Fraction;
  /** Numbers of its cases in canonical order; the skip's is 0. */
  readonly caseNumbers: readonly number[];
}

export interface Ledger {
  readonly entry: Entry;
  /** Told apart, in the order co, eo, cp, ep. */
  readonly aspects: readonly Aspect[];
  /** The aspects told apart with those done on arrival. */
  readonly seen: readonly Aspect[];
  /** Full last-layer states that reach the step. */
  readonly entryStates: number;
  /** Ways to put the pieces together as far as they are seen, solvable or not. */
  readonly assemblies: LedgerCount;
  /** Those that turns of the cube can reach. */
  readonly solvable: LedgerCount;
  /** Those, the last turn of the top left out. */
  readonly withoutAufAfter: LedgerCount;
  /** Those, the side one looks from left out too; the skip is among them. */
  readonly cases: LedgerCount;
  /** 16 rows in the order before · 4 + after. */
  readonly burnside: readonly FixedStates[];
  /** Rarest first. */
  readonly classes: readonly LedgerClass[];
  /** Cases if mirrors count as one. */
  readonly upToMirror: number;
  /** Cases if inverses count as one; null where a case has no inverse among the cases. */
  readonly upToInverse: number | null;
  readonly upToMirrorAndInverse: number | null;
}

const product = (numbers: readonly number[]): number => numbers.reduce((all, one) => all * one, 1);
const counted = (factors: readonly number[], divisors: readonly number[]): LedgerCount => ({
  value: product(factors) / product(divisors),
  factors,
  divisors,
});

/**
 * Ways to put the pieces in, and what divides out of them: 4! for a permutation, or the 4 turns of one that is
 * done up to AUF (once for both together), 3⁴ and 2⁴ for orientations. Twists add up to 0 mod 3 (÷ 3), flips to
 * 0 mod 2 (÷ 2), and corners and edges are permuted with one parity where both are seen and one is open (÷ 2).
 */
function formulas(entry: Entry, seen: readonly Aspect[]): Pick<Ledger, 'assemblies' | 'solvable'> {
  const done = fixedBy(entry);
  const isOpen = (aspect: Aspect) => seen.includes(aspect) && !done.includes(aspect);
  const bothDone = done.includes('cp') && done.includes('ep');
  const bothSeen = seen.includes('cp') && seen.includes('ep');
  const permutation = (aspect: 'cp' | 'ep'): number[] =>
    seen.includes(aspect) ? [isOpen(aspect) ? 24 : 4] : [];
  const factors = [
    ...permutation('cp'),
    ...(isOpen('co') ? [81] : []),
    ...(bothDone ? [] : permutation('ep')),
    ...(isOpen('eo') ? [16] : []),
  ];
  const divisors = [
    ...(isOpen('co') ? [3] : []),
    ...(isOpen('eo') ? [2] : []),
    ...(bothSeen && !bothDone ? [2] : []),
  ];
  return { assemblies: counted(factors, []), solvable: counted(factors, divisors) };
}

function classesOf({ angles, weight, states }: Classes): LedgerClass[] {
  const numbers = new Map<string, number[]>();
  weight.forEach((each, number) => {
    const kind = `${angles[number]} ${each}`;
    const alike = numbers.get(kind);
    if (alike) alike.push(number);
    else numbers.set(kind, [number]);
  });
  return [...numbers.values()]
    .map((caseNumbers) => {
      const first = caseNumbers[0]!;
      return {
        angles: angles[first]!,
        weight: weight[first]!,
        cases: caseNumbers.length,
        prior: fraction(weight[first]!, states),
        dealtOnceIn: fraction(states, weight[first]!),
        caseNumbers,
      };
    })
    .sort((one, other) => one.weight - other.weight || one.angles - other.angles);
}

/** Cases with those counted as one that the mirror, the inverse or both carry into each other. */
function upTo(classes: Classes, withInverse: boolean): Pick<Ledger, `upTo${string}` & keyof Ledger> {
  const cases = classes.canonical.length;
  /** Cases that a map of states carries into themselves. */
  const own = (map: (state: number) => number): number =>
    classes.canonical.filter((state, number) => classes.caseOf[map(state)] === number).length;
  const mirrored = own(mirror);
  const upToMirror = (cases + mirrored) / 2;
  if (!withInverse) return { upToMirror, upToInverse: null, upToMirrorAndInverse: null };
  // Mirror and inverse are their own undoing and commute: a group of four, so Burnside's mean again.
  const inverted = own(inverse);
  const both = own((state) => mirror(inverse(state)));
  return {
    upToMirror,
    upToInverse: (cases + inverted) / 2,
    upToMirrorAndInverse: (cases + mirrored + inverted + both) / 4,
  };
}

/** Everything the Ledger says of a step; cold at most some tens of milliseconds. No aspects leave one case. */
export function ledgerOf(entry: Entry, aspects: readonly Aspect[]): Ledger {
  const seen = seenThrough(entry, aspects);
  const classes = classify(entry, aspects);
  const burnside = burnsideOf(entry, aspects);
  const { assemblies, solvable } = formulas(entry, seen);
  const turns = seen.includes('cp') || seen.includes('ep') ? [4] : [];
  return {
    entry,
    aspects: inOrder(aspects),
    seen,
    entryStates: classes.states,
    assemblies,
    solvable,
    withoutAufAfter: counted([solvable.value], turns),
    cases: counted([burnside.reduce((sum, { fixed }) => sum + fixed, 0)], [16]),
    burnside,
    classes: classesOf(classes),
    ...upTo(classes, inverseDefined(entry, aspects)),
  };
}
