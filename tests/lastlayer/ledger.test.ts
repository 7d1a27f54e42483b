import { describe, expect, it } from 'vitest';
import { viewOf } from '#shared/lastlayer/aspects.ts';
import {
  ASPECTS,
  act,
  burnsideOf,
  countCases,
  inverse,
  isEntryState,
  type Ledger,
  type LedgerCount,
  ledgerOf,
  mirror,
  STATES,
} from '#shared/lastlayer/index.ts';
import { STEPS } from './support/steps.ts';

const numbers = (ledger: Ledger) =>
  [ledger.assemblies, ledger.solvable, ledger.withoutAufAfter, ledger.cases].map(({ value }) => value);
const worth = ({ factors, divisors }: LedgerCount) =>
  factors.reduce((all, one) => all * one, 1) / divisors.reduce((all, one) => all * one, 1);

describe('the four numbers of the Ledger', () => {
  it.each([
    // Common practice: PLL is 4!·4! ways to put pieces in, half of them solvable, 72 without AUF, 22 cases.
    ['co+eo', ['cp', 'ep'], [576, 288, 72, 22]],
    // Common practice: 3⁴·2⁴, 27·8, no permutation and so no AUF after, 57 cases and the skip.
    ['any', ['co', 'eo'], [1296, 216, 216, 58]],
    // Common practice: 4!·3⁴·4!·2⁴ and a twelfth of it; 3,916 by the lemma.
    ['any', ASPECTS, [746_496, 62_208, 15_552, 3916]],
    // Derived: corners in 4 turns, 4!·2⁴ edges, half by parity, half by flips; common practice has 29 and the skip.
    ['corners', ['eo', 'ep'], [1536, 384, 96, 30]],
    // Derived: nothing is told apart, so all that is left is the turn of the corners.
    ['corners', [], [4, 4, 1, 1]],
    ['any', [], [1, 1, 1, 1]],
  ] as const)('from %s, telling %j apart, are %j', (entry, aspects, wanted) => {
    expect(numbers(ledgerOf(entry, aspects))).toEqual(wanted);
  });

  it.each(STEPS)('$title: the formulas filled in give the numbers', ({ entry, aspects }) => {
    const ledger = ledgerOf(entry, aspects);
    for (const count of [ledger.assemblies, ledger.solvable, ledger.withoutAufAfter, ledger.cases])
      expect(worth(count)).toBe(count.value);
    expect(ledger.solvable.factors).toEqual(ledger.assemblies.factors);
    const perView = ledger.entryStates / ledger.solvable.value;
    expect(Number.isInteger(perView)).toBe(true);
    const angles = ledger.classes.reduce((sum, one) => sum + one.cases * one.angles, 0);
    expect(angles).toBe(ledger.withoutAufAfter.value);
    for (const one of ledger.classes)
      expect((one.weight * ledger.withoutAufAfter.value) / ledger.entryStates).toBe(one.angles);
  });
});

describe('Burnside’s count', () => {
  it.each(STEPS)('$title equals the count by listing cases', ({ entry, aspects }) => {
    const { burnside, cases, classes, entryStates } = ledgerOf(entry, aspects);
    expect(burnside.map(({ before, after }) => before * 4 + after)).toEqual([...Array(16).keys()]);
    const listed = countCases(entry, aspects);
    expect(burnside.reduce((sum, { fixed }) => sum + fixed, 0) / 16).toBe(listed.cases);
    expect(cases.value).toBe(listed.cases);
    expect(classes.reduce((sum, one) => sum + one.cases, 0)).toBe(listed.cases);
    expect(classes.reduce((sum, one) => sum + one.cases * one.weight, 0)).toBe(entryStates);
  });

  it.each([
    ['any', ASPECTS],
    ['co+eo', ['cp', 'ep']],
    ['cp+edges', ['co']],
    ['cp+eo', ['co', 'ep']],
    ['ep', ['co', 'cp']],
    ['any', ['eo', 'cp']],
  ] as const)('from %s, telling %j apart, counts what the turns leave as it is', (entry, aspects) => {
    const { seen } = ledgerOf(entry, aspects);
    const states = new Map<number, number>();
    for (let index = 0; index < STATES; index++)
      if (isEntryState(entry, index)) states.set(viewOf(index, seen), index);
    for (const { before, after, fixed } of burnsideOf(entry, aspects)) {
      let stay = 0;
      for (const [view, index] of states) if (viewOf(act(index, before, after), seen) === view) stay++;
      expect(stay, `${before} ${after}`).toBe(fixed);
    }
  });

  it('finds 84 cases and the skip with edges oriented and corners permuted', () => {
    // Common practice: the cases that turns of two neighbouring faces alone can reach.
    const ledger = ledgerOf('cp+eo', ASPECTS);
    expect(ledger.cases.value).toBe(85);
    expect(ledgerOf('cp+eo', ['co', 'ep']).classes).toEqual(ledger.classes);
  });
});

describe('classes of cases', () => {
  it('have exact priors and what they are dealt once in', () => {
    // Common practice: PLL has four cases in 72, the skip among them, two in 36, sixteen in 18.
    expect(
      ledgerOf('co+eo', ['cp', 'ep']).classes.map(({ caseNumbers, ...rest }) => ({
        ...rest,
        numbered: caseNumbers.length,
      })),
    ).toEqual([
      {
        angles: 1,
        weight: 4,
        cases: 4,
        numbered: 4,
        prior: { numerator: 1, denominator: 72 },
        dealtOnceIn: { numerator: 72, denominator: 1 },
      },
      {
        angles: 2,
        weight: 8,
        cases: 2,
        numbered: 2,
        prior: { numerator: 1, denominator: 36 },
        dealtOnceIn: { numerator: 36, denominator: 1 },
      },
      {
        angles: 4,
        weight: 16,
        cases: 16,
        numbered: 16,
        prior: { numerator: 1, denominator: 18 },
        dealtOnceIn: { numerator: 18, denominator: 1 },
      },
    ]);
    // Derived: 2/27 and 4/27 do not come to 1 in a whole number of solves.
    expect(ledgerOf('eo', ['co']).classes.map(({ dealtOnceIn }) => dealtOnceIn)).toEqual([
      { numerator: 27, denominator: 1 },
      { numerator: 27, denominator: 2 },
      { numerator: 27, denominator: 4 },
    ]);
  });
});

describe('cases up to mirror and inverse', () => {
  const upTo = ({ upToMirror, upToInverse, upToMirrorAndInverse }: Ledger) => [
    upToMirror,
    upToInverse,
    upToMirrorAndInverse,
  ];

  it('are 1,212 for the full last layer', () => {
    // Common practice: 1,211 and the skip.
    expect(ledgerOf('any', ASPECTS).upToMirrorAndInverse).toBe(1212);
  });

  it('of PLL are what pairing its letters gives', () => {
    // Common practice: seven pairs of mirrors; inverses are Aa Ab, Ga Gb, Gc Gd, Ua Ub, and Ja, Jb their own.
    expect(upTo(ledgerOf('co+eo', ['cp', 'ep']))).toEqual([22 - 7, 22 - 4, 14]);
  });

  it('have no inverse where an orientation comes without its pieces’ permutation', () => {
    // Common practice: 58 cases of OLL in 17 pairs of mirrors and 24 alone.
    expect(upTo(ledgerOf('any', ['co', 'eo']))).toEqual([58 - 17, null, null]);
    expect(ledgerOf('any', ['co', 'cp']).upToInverse).not.toBeNull();
    expect(ledgerOf('any', ['co', 'ep']).upToInverse).toBeNull();
    expect(ledgerOf('ep', ['eo']).upToInverse).not.toBeNull();
  });

  it.each(STEPS)(
    '$title: counted by joining cases that mirror and inverse carry over',
    ({ entry, aspects }) => {
      const ledger = ledgerOf(entry, aspects);
      const { seen } = ledger;
      // One step in eight, the full last layer among them: each takes its time. Cases by their smallest view, and a forest of cases joined so far.
      const least = (state: number): number => {
        let view = Number.POSITIVE_INFINITY;
        for (let turn = 0; turn < 16; turn++)
          view = Math.min(view, viewOf(act(state, (turn >> 2) as 0, (turn & 3) as 0), seen));
        return view;
      };
      const parent = new Map<number, number>();
      const root = (view: number): number => {
        let at = view;
        while (parent.get(at) !== at) at = parent.get(at)!;
        return at;
      };
      const states = new Map<number, number>();
      for (let index = 0; index < STATES; index += 1)
        if (isEntryState(entry, index) && !states.has(viewOf(index, seen)))
          states.set(viewOf(index, seen), index);
      const representatives = new Map<number, number>();
      for (const state of states.values()) representatives.set(least(state), state);
      for (const view of representatives.keys()) parent.set(view, view);
      for (const [view, state] of representatives) {
        parent.set(root(least(mirror(state))), root(view));
        if (ledger.upToInverse !== null) parent.set(root(least(inverse(state))), root(view));
      }
      const joined = [...parent.keys()].filter((view) => root(view) === view).length;
      expect(joined).toBe(ledger.upToMirrorAndInverse ?? ledger.upToMirror);
    },
  );
});
