/** How a case stands to others: inverse, symmetry, and the OLL and PLL it is made of. */
import { AUFS, type Auf, act, inverse, mirror } from './action.ts';
import { type Aspect, type Entry, fixedBy, seenThrough, viewOf } from './aspects.ts';
import { type CaseOfSet, type CaseSet, caseSet } from './case-set.ts';
import { cornerRank, edgeRank, flipOf, indexOf, twistOf } from './state.ts';

const CARRIED_BY = { co: 'cp', eo: 'ep' } as const;

/**
 * Whether the cases of a step have inverses among themselves: an orientation that is open must come with the
 * permutation of the same pieces, for undoing an algorithm carries each twist to where the piece came from.
 */
export function inverseDefined(entry: Entry, toldApart: readonly Aspect[]): boolean {
  const seen = seenThrough(entry, toldApart);
  return (['co', 'eo'] as const).every(
    (aspect) =>
      !seen.includes(aspect) || fixedBy(entry).includes(aspect) || seen.includes(CARRIED_BY[aspect]),
  );
}

/** Whether the cases of a set have inverses. */
export const hasInverse = ({ definition: { entry, toldApart } }: CaseSet): boolean =>
  inverseDefined(entry, toldApart);

/** A case reached from another; a subset looks among all its parent's cases. */
const among = (set: CaseSet, state: number): CaseOfSet | null =>
  set.caseOfState(state) ?? (set.parent ? among(set.parent, state) : null);

/**
 * The case that is solved by undoing an algorithm of this one; null where inverses are not defined. A subset may
 * have left it out; then it is the parent's.
 */
export const inverseOf = (set: CaseSet, of: CaseOfSet): CaseOfSet | null =>
  hasInverse(set) ? among(set, inverse(of.canonical)) : null;

/** The mirror of the inverse, which is the inverse of the mirror; null where inverses are not defined. */
export const mirrorInverseOf = (set: CaseSet, of: CaseOfSet): CaseOfSet | null =>
  hasInverse(set) ? among(set, mirror(inverse(of.canonical))) : null;

/**
 * The turns that leave the case as it is seen in its canonical state: quarter turns of the places before and of
 * the pieces after. Where no permutation is seen, turns after change nothing to be seen.
 */
export function stabiliser(set: CaseSet, of: CaseOfSet): readonly { before: Auf; after: Auf }[] {
  const { entry, toldApart } = set.definition;
  const seen = seenThrough(entry, toldApart);
  const view = viewOf(of.canonical, seen);
  return AUFS.flatMap((before) => AUFS.map((after) => ({ before, after }))).filter(
    ({ before, after }) => viewOf(act(of.canonical, before, after), seen) === view,
  );
}

const sees = ({ definition: { entry, toldApart } }: CaseSet, aspects: readonly Aspect[]): boolean => {
  const seen = seenThrough(entry, toldApart);
  return aspects.every((aspect) => seen.includes(aspect));
};

/** The OLL case, or its skip, that the case shows; null where the set does not see both orientations. */
export const orientationOf = (set: CaseSet, of: CaseOfSet): CaseOfSet | null =>
  sees(set, ['co', 'eo'])
    ? caseSet('oll').caseOfState(indexOf(0, twistOf(of.canonical), 0, flipOf(of.canonical)))
    : null;

/**
 * The PLL case, or its skip, that the pieces' permutation makes, their orientation taken as done; null where the
 * set does not see both permutations.
 */
export const permutationOf = (set: CaseSet, of: CaseOfSet): CaseOfSet | null =>
  sees(set, ['cp', 'ep'])
    ? caseSet('pll').caseOfState(indexOf(cornerRank(of.canonical), 0, edgeRank(of.canonical), 0))
    : null;
