/** Partition of the entry states into cases: orbits of what is seen. */
import { type Aspect, type Entry, isEntryState, seenThrough, VIEWS, viewer, viewTurner } from './aspects.ts';
import { STATES } from './state.ts';

export interface Classes {
  /** For each of the 62,208 states the place of its case below, −1 if the state is no entry state. */
  readonly caseOf: Int16Array;
  /** Smallest state of each case, rising; the solved class comes first. */
  readonly canonical: readonly number[];
  /** Full entry states in each case, AUF included. */
  readonly weight: readonly number[];
  /** Really different pictures of each case as one walks round the cube: 1, 2 or 4. */
  readonly angles: readonly (1 | 2 | 4)[];
  /** Number of entry states: the sum of the weights. */
  readonly states: number;
}

/**
 * Cases of a step: orbits under Z4×Z4 of the entry states seen through the aspects told apart together
 * with those the entry condition fixes. Angles are the orbit's size, a quarter of it where a permutation
 * is seen (the AUF after is left out).
 */
export function classify(entry: Entry, toldApart: readonly Aspect[]): Classes {
  const aspects = seenThrough(entry, toldApart);
  const view = viewer(aspects);
  const turned = viewTurner(aspects);
  const perAngle = aspects.includes('cp') || aspects.includes('ep') ? 4 : 1;

  const caseOfView = new Int16Array(VIEWS).fill(-1);
  const caseOf = new Int16Array(STATES).fill(-1);
  const canonical: number[] = [];
  const weight: number[] = [];
  const angles: (1 | 2 | 4)[] = [];
  let states = 0;
  for (let index = 0; index < STATES; index++) {
    if (!isEntryState(entry, index)) continue;
    const seen = view(index);
    let found = caseOfView[seen]!;
    if (found < 0) {
      found = canonical.length;
      let orbit = 0;
      for (let turn = 0; turn < 16; turn++) {
        const image = turned(seen, turn);
        if (caseOfView[image]! >= 0) continue;
        caseOfView[image] = found;
        orbit++;
      }
      canonical.push(index);
      weight.push(0);
      angles.push((orbit / perAngle) as 1 | 2 | 4);
    }
    caseOf[index] = found;
    weight[found]!++;
    states++;
  }
  return { caseOf, canonical, weight, angles, states };
}
