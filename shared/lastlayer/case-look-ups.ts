/** Finding the cases of a set by key or name, and their clusters. */
import type { CaseOfSet, CaseSet } from './case-set.ts';
import type { Classes } from './classes.ts';
import { clustersOf } from './clusters.ts';
import { plainName } from './naming.ts';
import type { CaseSetDefinition } from './sets.ts';

export function lookUps(
  definition: CaseSetDefinition,
  all: readonly CaseOfSet[],
): Pick<CaseSet, 'byKey' | 'byName'> {
  const keys = new Map(all.map((one) => [one.key, one]));
  const names = new Map(all.map((one) => [plainName(definition, one.name), one]));
  return {
    byKey: (key) => keys.get(key),
    byName: (name) => names.get(plainName(definition, name)),
  };
}

/** The classes of these numbers alone, the skip first, in their order. */
function chosen(classes: Classes, numbers: readonly number[]): Classes {
  if (numbers.length === classes.canonical.length) return classes;
  const places = new Int16Array(classes.canonical.length).fill(-1);
  numbers.forEach((number, place) => {
    places[number] = place;
  });
  const pick = <T>(list: readonly T[]): T[] => numbers.map((number) => list[number]!);
  return {
    caseOf: classes.caseOf.map((number) => places[number] ?? -1),
    canonical: pick(classes.canonical),
    weight: pick(classes.weight),
    angles: pick(classes.angles),
    states: classes.states,
  };
}

/**
 * The fixed clusters of a set that has these cases, by case number; found when first asked for.
 * @param numbers rising, the skip's 0 first.
 */
export function clusterFinder(
  definition: CaseSetDefinition,
  classesOf: () => Classes,
  numbers: readonly number[],
): (number: number) => number {
  let found: Map<number, number> | undefined;
  return (number) => {
    if (!found) {
      const clusters = clustersOf(definition, chosen(classesOf(), numbers));
      found = new Map(numbers.map((each, place) => [each, clusters[place]!]));
    }
    return found.get(number)!;
  };
}
