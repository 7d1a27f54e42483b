/** Partition of the entry states into cases: orbits of what is seen. */
import { type Aspect, type Entry, fixedBy, isTurnOfTop, seenThrough, VIEWS, viewTurner } from './aspects.ts';
import { edgeRankOf, FLIPS, indexOf, PERMUTATIONS, STATES, TWISTS } from './state.ts';

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
  const seen = seenThrough(entry, toldApart);
  const [cornersSeen, edgesSeen] = [seen.includes('cp'), seen.includes('ep')];
  const [twistsSeen, flipsSeen] = [seen.includes('co'), seen.includes('eo')];
  const turned = viewTurner(seen);
  const perAngle = cornersSeen || edgesSeen ? 4 : 1;
  const fixed = fixedBy(entry);
  const [cornersDone, edgesDone] = [fixed.includes('cp'), fixed.includes('ep')];
  const twists = fixed.includes('co') ? 1 : TWISTS;
  const flips = fixed.includes('eo') ? 1 : FLIPS;

  const caseOfView = new Int16Array(VIEWS).fill(-1);
  const caseOf = new Int16Array(STATES).fill(-1);
  const canonical: number[] = [];
  const weight: number[] = [];
  const angles: (1 | 2 | 4)[] = [];
  let states = 0;

  const newCase = (view: number, index: number): number => {
    const number = canonical.length;
    let orbit = 0;
    for (let turn = 0; turn < 16; turn++) {
      const image = turned(view, turn);
      if (caseOfView[image]! >= 0) continue;
      caseOfView[image] = number;
      orbit++;
    }
    canonical.push(index);
    weight.push(0);
    angles.push((orbit / perAngle) as 1 | 2 | 4);
    return number;
  };

  // In the order of the index, so that the first state met of a case is its smallest.
  for (let corners = 0; corners < PERMUTATIONS; corners++) {
    if (cornersDone && !isTurnOfTop(corners)) continue;
    for (let half = 0; half < PERMUTATIONS / 2; half++) {
      const edges = edgeRankOf(corners, half);
      if (edgesDone && !isTurnOfTop(edges)) continue;
      // Both done are done together: turned by the same AUF.
      if (cornersDone && edgesDone && edges !== corners) continue;
      const permutations = (cornersSeen ? corners : 0) * PERMUTATIONS + (edgesSeen ? edges : 0);
      for (let twist = 0; twist < twists; twist++) {
        for (let flip = 0; flip < flips; flip++) {
          const index = indexOf(corners, twist, edges, flip);
          const view = (permutations * TWISTS + (twistsSeen ? twist : 0)) * FLIPS + (flipsSeen ? flip : 0);
          let found = caseOfView[view]!;
          if (found < 0) found = newCase(view, index);
          caseOf[index] = found;
          weight[found]!++;
          states++;
        }
      }
    }
  }
  return { caseOf, canonical, weight, angles, states };
}
