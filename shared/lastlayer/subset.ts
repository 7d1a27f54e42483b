/** Sets chosen from the cases of another, and what to choose by. */
import { clusterFinder, lookUps } from './case-look-ups.ts';
import type { CaseOfSet, CaseSet } from './case-set.ts';
import { classify } from './classes.ts';
import { type Traits, traitsOf } from './naming.ts';

export interface SubsetChoice {
  readonly key: string;
  readonly name: string;
  /** Cases of the parent, the skip apart; in any order, each counted once. */
  readonly caseKeys: readonly string[];
}

function chosenNumbers(parent: CaseSet, { name, caseKeys }: SubsetChoice): Set<number> {
  if (caseKeys.length === 0) throw new RangeError(`No case is chosen for ${name}.`);
  const numbers = new Set<number>();
  for (const key of caseKeys) {
    const found = parent.byKey(key);
    if (!found) throw new RangeError(`${parent.definition.name} has no case "${key}".`);
    if (found.skip) throw new RangeError('The skip needs no algorithm: it cannot be chosen.');
    numbers.add(found.number);
  }
  return numbers;
}

/**
 * A set of some of a parent's cases. They keep their key, number, weight, name and group, and the total stays the
 * parent's: a prior is the chance of the case in the parent's step. Clusters are found anew among the cases
 * chosen, so that a showing never offers fewer than six names.
 * @throws RangeError naming a key that the parent does not have, or if none is chosen.
 */
export function subsetOf(parent: CaseSet, choice: SubsetChoice): CaseSet {
  const numbers = chosenNumbers(parent, choice);
  const definition = { ...parent.definition, key: choice.key, name: choice.name };
  const kept = [parent.skip, ...parent.cases.filter(({ number }) => numbers.has(number))];
  const clusterAt = clusterFinder(
    definition,
    () => classify(definition.entry, definition.toldApart),
    kept.map(({ number }) => number),
  );
  // Field by field: spreading a case would have its parent find its clusters.
  const all: readonly CaseOfSet[] = kept.map(
    ({ key, number, canonical, weight, angles, name, group, skip }) => ({
      key,
      number,
      canonical,
      weight,
      angles,
      name,
      group,
      skip,
      get cluster() {
        return clusterAt(number);
      },
    }),
  );
  const byNumber: CaseOfSet[] = [];
  for (const one of all) byNumber[one.number] = one;
  const own = (of: CaseOfSet | null): CaseOfSet | null => (of && byNumber[of.number]) ?? null;

  return {
    definition,
    parent,
    cases: all.slice(1),
    skip: all[0]!,
    states: parent.states,
    total: parent.total,
    caseOfState: (index) => own(parent.caseOfState(index)),
    ...lookUps(definition, all),
    statesOf: parent.statesOf,
    drawState: parent.drawState,
    mirrorOf: (of) => {
      const mirrored = parent.mirrorOf(of);
      return own(mirrored) ?? mirrored;
    },
  };
}

export interface Grouped extends Traits {
  readonly case: CaseOfSet;
  /** As the set groups it; empty if it does not. */
  readonly group: string;
}

/** What a subset can be chosen by: for each case, the skip apart, its group and what it shows of each aspect. */
export const groupsOf = (set: CaseSet): readonly Grouped[] =>
  set.cases.map((one) => ({ case: one, group: one.group, ...traitsOf(set.definition, one.canonical) }));
