import { describe, expect, it } from 'vitest';
import {
  act,
  buildCaseSet,
  CASE_SETS,
  type CaseSet,
  caseSet,
  hasInverse,
  inverse,
  inverseOf,
  mirrorInverseOf,
  orientationOf,
  permutationOf,
  readAlgorithm,
  stabiliser,
  stateAt,
  stateIndex,
} from '#shared/lastlayer/index.ts';
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { pick, seeded } from './support/random.ts';

const sets = CASE_SETS.map(({ key }) => caseSet(key));
const everyCase = (set: CaseSet) => [set.skip, ...set.cases];

const undone = (algorithm: string): string =>
  [...parseMoves(algorithm)]
    .reverse()
    .map(({ family, amount }) => family + ['', '2', "'"][3 - amount])
    .join(' ');

describe('inverses', () => {
  it('are defined where each orientation told apart comes with its pieces’ permutation', () => {
    const names = (defined: boolean) =>
      sets.filter((set) => hasInverse(set) === defined).map((set) => set.definition.name);
    // Derived from the aspects: CLL and COLL see corners whole, ELL edges whole, OLLCP edges flipped but not placed.
    expect(names(true)).toEqual(['PLL', 'CPLL', 'EPLL', 'COLL', 'CLL', 'ELL', 'ZBLL', '1LLL']);
    expect(names(false)).toEqual(['OLL', 'OCLL', 'EOLL', 'OLLCP']);
    const oll = caseSet('oll');
    expect(inverseOf(oll, oll.skip)).toBeNull();
    expect(mirrorInverseOf(oll, oll.skip)).toBeNull();
  });

  it.each(sets.filter(hasInverse))(
    '$definition.name: undone twice is done, and mirror and inverse commute',
    (set) => {
      for (const one of everyCase(set)) {
        const inverted = inverseOf(set, one)!;
        expect(inverseOf(set, inverted)).toBe(one);
        expect(inverted.weight).toBe(one.weight);
        expect(inverted.angles).toBe(one.angles);
        expect(set.mirrorOf(set.mirrorOf(one))).toBe(one);
        expect(mirrorInverseOf(set, one)).toBe(set.mirrorOf(inverted));
        expect(mirrorInverseOf(set, one)).toBe(inverseOf(set, set.mirrorOf(one)));
        expect(mirrorInverseOf(set, mirrorInverseOf(set, one)!)).toBe(one);
      }
      expect(inverseOf(set, set.skip)).toBe(set.skip);
    },
  );

  it.each(sets.filter(hasInverse))('$definition.name: any state of a case undoes to the same case', (set) => {
    const random = seeded(41);
    for (let run = 0; run < 300; run++) {
      const one = pick(random, everyCase(set));
      expect(set.caseOfState(inverse(set.drawState(one, random)))).toBe(inverseOf(set, one));
    }
  });

  it('are of no use where they are not defined: states of one case undo to different ones', () => {
    const random = seeded(42);
    for (const set of sets.filter((each) => !hasInverse(each))) {
      const undoes = set.cases.map((one) => {
        const states = Array.from({ length: 40 }, () => set.drawState(one, random));
        return new Set(states.map((state) => set.caseOfState(inverse(state)))).size;
      });
      expect(Math.max(...undoes), set.definition.name).toBeGreaterThan(1);
    }
  });

  it('of PLL are those of the trade', () => {
    const pll = caseSet('pll');
    const inverses = pll.cases.map((one) => `${one.name} ${inverseOf(pll, one)!.name}`);
    const pairs = inverses.filter((pair) => pair.split(' ')[0]! < pair.split(' ')[1]!);
    // Common practice: all other letters are their own inverses.
    expect(pairs.sort()).toEqual(['Aa Ab', 'Ga Gb', 'Gc Gd', 'Ua Ub']);
  });

  it('are what the algorithm solves when it is undone', () => {
    const full = caseSet('1lll');
    for (const algorithm of [...OLL_NAMES.map((row) => row[2]), ...PLL_NAMES.map((row) => row[1])]) {
      const [done, back] = [algorithm, undone(algorithm)].map((text) => readAlgorithm(text));
      if (done?.kind !== 'state') throw new Error(`${algorithm} is ${done?.kind}`);
      // Undone, an algorithm with trailing turns of the whole cube begins from another hold and may break the rest.
      if (back?.kind !== 'state') continue;
      expect(inverseOf(full, full.caseOfState(done.state)!), algorithm).toBe(full.caseOfState(back.state));
    }
    // Common practice: Antisune undoes Sune.
    const coll = caseSet('coll');
    for (const one of coll.cases.filter(({ group }) => group === 'Sune'))
      expect(inverseOf(coll, one)?.group).toBe('Antisune');
  });
});

describe('the turns that leave a case as it is', () => {
  it.each(sets)('$definition.name: sixteen by orbit size, the identity first', (set) => {
    const seesPermutation = set.definition.toldApart.some((aspect) => aspect === 'cp' || aspect === 'ep');
    for (const one of everyCase(set).slice(0, 400)) {
      const turns = stabiliser(set, one);
      expect(turns[0]).toEqual({ before: 0, after: 0 });
      expect(turns).toHaveLength(seesPermutation ? 4 / one.angles : 16 / one.angles);
      for (const { before, after } of turns)
        expect(set.caseOfState(act(one.canonical, before, after))).toBe(one);
    }
  });

  it('of H are the four quarters of the whole, of T none but the identity', () => {
    const pll = caseSet('pll');
    const turns = (name: string) =>
      stabiliser(pll, pll.byName(name)!).map(({ before, after }) => [before, after]);
    // Common practice: H and the Ns from everywhere, E and Z from two sides, T from one only.
    expect(turns('H').map(([before]) => before)).toEqual([0, 1, 2, 3]);
    expect(turns('Z').map(([before]) => before)).toEqual([0, 2]);
    expect(turns('T')).toEqual([[0, 0]]);
    expect(stabiliser(caseSet('oll'), caseSet('oll').byName('20')!)).toHaveLength(16);
  });
});

describe('the OLL and the PLL a case is made of', () => {
  it('are those of its orientation and of its permutation', () => {
    const [full, oll, pll] = [caseSet('1lll'), caseSet('oll'), caseSet('pll')];
    const tally = new Map<string, number>();
    for (const one of everyCase(full)) {
      const kind = `${orientationOf(full, one)!.name} ${permutationOf(full, one)!.name}`;
      tally.set(kind, (tally.get(kind) ?? 0) + 1);
      expect(orientationOf(full, one)).toBe(oll.caseOfState(one.canonical));
    }
    // The crossing rule, derived: an orientation with a angles and a permutation with b make a·b pictures, in
    // gcd(a, b) cases of lcm(a, b) each; of 1, 2 and 4 the gcd is the smaller.
    for (const a of everyCase(oll))
      for (const b of everyCase(pll))
        expect(tally.get(`${a.name} ${b.name}`), `${a.name} ${b.name}`).toBe(Math.min(a.angles, b.angles));
  });

  it('do not hang on which state of the case is looked at', () => {
    const [zbll, pll] = [caseSet('zbll'), caseSet('pll')];
    const random = seeded(43);
    const none = [0, 0, 0, 0];
    for (const one of zbll.cases) {
      const state = zbll.drawState(one, random);
      const permuted = stateIndex({ ...stateAt(state), co: none, eo: none });
      expect(pll.caseOfState(permuted)).toBe(permutationOf(zbll, one));
      expect(caseSet('oll').caseOfState(state)).toBe(orientationOf(zbll, one));
    }
  });

  it('are told only where the set sees them', () => {
    const told = (key: string) => {
      const set = caseSet(key);
      const one = set.cases[0]!;
      return [orientationOf(set, one) !== null, permutationOf(set, one) !== null];
    };
    expect(told('oll')).toEqual([true, false]);
    expect(told('pll')).toEqual([true, true]);
    expect(told('coll')).toEqual([true, false]);
    expect(told('cll')).toEqual([false, false]);
    expect(told('ell')).toEqual([true, true]);
    const pll = caseSet('pll');
    expect(orientationOf(pll, pll.byName('T')!)?.skip).toBe(true);
    expect(permutationOf(pll, pll.byName('T')!)).toBe(pll.byName('T'));
    const loose = buildCaseSet({
      key: 'loose',
      name: 'Loose',
      entry: 'any',
      toldApart: ['cp', 'ep'],
      solved: ['cp', 'ep'],
      mix: [],
    });
    expect(loose.cases.map((one) => permutationOf(loose, one)?.name)).toEqual(
      loose.cases.map(({ name }) => name),
    );
  });
});
