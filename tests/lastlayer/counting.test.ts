import { describe, expect, it } from 'vitest';
import { classify } from '#shared/lastlayer/classes.ts';
import {
  ASPECTS,
  type Aspect,
  CASE_SETS,
  countCases,
  ENTRIES,
  isEntryState,
  STATES,
} from '#shared/lastlayer/index.ts';

/**
 * Cases with the skip, and how many cases have each prior 1/n. Common practice for the counts; the priors
 * follow from the definitions and are written here as fractions, never as the engine gave them.
 */
const TABLE: Readonly<
  Record<string, { cases: number; priors: readonly (readonly [number, number, number])[] }>
> = {
  OLL: {
    cases: 58,
    priors: [
      [2, 1, 216],
      [5, 1, 108],
      [51, 1, 54],
    ],
  },
  PLL: {
    cases: 22,
    priors: [
      [4, 1, 72],
      [2, 1, 36],
      [16, 1, 18],
    ],
  },
  OCLL: {
    cases: 8,
    priors: [
      [1, 1, 27],
      [1, 2, 27],
      [6, 4, 27],
    ],
  },
  EOLL: {
    cases: 4,
    priors: [
      [2, 1, 8],
      [1, 1, 4],
      [1, 1, 2],
    ],
  },
  CPLL: {
    cases: 3,
    priors: [
      [2, 1, 6],
      [1, 2, 3],
    ],
  },
  EPLL: {
    cases: 5,
    priors: [
      [2, 1, 12],
      [1, 1, 6],
      [2, 1, 3],
    ],
  },
  COLL: {
    cases: 43,
    priors: [
      [2, 1, 162],
      [2, 1, 81],
      [39, 2, 81],
    ],
  },
  CLL: {
    cases: 43,
    priors: [
      [2, 1, 162],
      [2, 1, 81],
      [39, 2, 81],
    ],
  },
  ELL: {
    cases: 30,
    priors: [
      [4, 1, 96],
      [6, 1, 48],
      [20, 1, 24],
    ],
  },
  ZBLL: {
    cases: 494,
    priors: [
      [4, 1, 1944],
      [10, 1, 972],
      [480, 1, 486],
    ],
  },
  OLLCP: {
    cases: 332,
    priors: [
      [4, 1, 1296],
      [10, 1, 648],
      [318, 1, 324],
    ],
  },
  '1LLL': {
    cases: 3916,
    priors: [
      [8, 1, 15_552],
      [44, 1, 7776],
      [3864, 1, 3888],
    ],
  },
};

const choices: readonly (readonly Aspect[])[] = Array.from({ length: 16 }, (_, choice) =>
  ASPECTS.filter((_aspect, at) => (choice >> at) & 1),
);

describe('counting cases', () => {
  it.each(CASE_SETS)('$name has the cases and priors of the trade', ({ name, entry, toldApart }) => {
    const counted = countCases(entry, toldApart);
    const wanted = TABLE[name]!;
    expect(counted.cases).toBe(wanted.cases);
    expect(counted.weights).toEqual(
      wanted.priors.map(([cases, share, of]) => ({ weight: (counted.states * share) / of, cases })),
    );
  });

  it('covers every set of the table', () => {
    expect(CASE_SETS.map(({ name }) => name).sort()).toEqual(Object.keys(TABLE).sort());
  });

  it.each([
    // Derived: 24·12·27·8 states, or those with the flips, twists or corners done (corners up to AUF: 4 of 24).
    ['any', 62_208],
    ['eo', 7776],
    ['co', 2304],
    ['co+eo', 288],
    ['corners', 384],
    ['corners+eo', 48],
  ] as const)('%s is met by %i states', (entry, states) => {
    expect(countCases(entry, []).states).toBe(states);
    let met = 0;
    for (let index = 0; index < STATES; index++) if (isEntryState(entry, index)) met++;
    expect(met).toBe(states);
  });

  it('accounts for every entry state in every step', () => {
    for (const entry of ENTRIES)
      for (const aspects of choices) {
        const { cases, states, weights } = countCases(entry, aspects);
        expect(weights.reduce((sum, row) => sum + row.cases, 0)).toBe(cases);
        expect(weights.reduce((sum, row) => sum + row.cases * row.weight, 0)).toBe(states);
      }
  });

  it('sees one case where nothing is told apart, and no fewer with more told apart', () => {
    expect(countCases('any', [])).toEqual({
      entry: 'any',
      aspects: [],
      cases: 1,
      states: 62_208,
      weights: [{ weight: 62_208, cases: 1 }],
    });
    for (const entry of ENTRIES) {
      const cases = choices.map((aspects) => countCases(entry, aspects).cases);
      for (let choice = 0; choice < 16; choice++)
        for (let more = 0; more < 16; more++)
          if ((choice & more) === choice) expect(cases[more]).toBeGreaterThanOrEqual(cases[choice]!);
    }
  });

  it('gives weights in proportion to angles where all that is not seen is free', () => {
    for (const { entry, toldApart } of CASE_SETS) {
      const { weight, angles, states } = classify(entry, toldApart);
      const perAngle = states / angles.reduce<number>((sum, each) => sum + each, 0);
      expect(weight).toEqual(angles.map((each) => perAngle * each));
    }
  });

  it('obeys the crossing rule between orientation and permutation', () => {
    // Published values: Σ a·b = 15,552 and Σ gcd(a, b) = 3,916; the classes are those of OLL and PLL.
    const orientation = classify('any', ['co', 'eo']).angles;
    const permutation = classify('co+eo', ['cp', 'ep']).angles;
    let products = 0;
    let divisors = 0;
    for (const a of orientation)
      for (const b of permutation) {
        products += a * b;
        divisors += Math.min(a, b); // of 1, 2, 4 the smaller divides the larger
      }
    expect(products).toBe(15_552);
    expect(divisors).toBe(3916);
    const tally = (angles: readonly number[]) =>
      [1, 2, 4].map((m) => angles.filter((each) => each === m).length);
    expect(tally(orientation)).toEqual([2, 5, 51]);
    expect(tally(permutation)).toEqual([4, 2, 16]);
  });
});
