import { describe, expect, it } from 'vitest';
import {
  AUFS,
  act,
  buildCaseSet,
  CASE_SETS,
  type CaseOfSet,
  type CaseSet,
  caseSet,
  OFFERED_WHOLE,
  readAlgorithm,
  STATES,
} from '#shared/lastlayer/index.ts';
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';
import { seeded } from './support/random.ts';

const sets = CASE_SETS.map(({ key }) => caseSet(key));
const namesOf = (set: CaseSet) => set.cases.map(({ name }) => name);
const mirrorName = (set: CaseSet, name: string) => set.mirrorOf(set.byName(name)!).name;

describe('every case set', () => {
  it.each(sets)('$definition.name partitions its entry states', (set) => {
    const weights = new Map<CaseOfSet, number>();
    for (let index = 0; index < STATES; index++) {
      const found = set.caseOfState(index);
      if (found) weights.set(found, (weights.get(found) ?? 0) + 1);
    }
    expect(weights.size).toBe(set.cases.length + 1);
    expect([...weights].every(([found, weight]) => found.weight === weight)).toBe(true);
    expect([...weights.values()].reduce((sum, weight) => sum + weight, 0)).toBe(set.states);
    expect(set.total).toBe(set.states);
    expect(set.caseOfState(0)).toBe(set.skip);
  });

  it.each(sets)('$definition.name has keys, names and numbers that tell its cases apart', (set) => {
    const all = [set.skip, ...set.cases];
    for (const property of ['key', 'name', 'number', 'canonical'] as const)
      expect(new Set(all.map((one) => one[property])).size).toBe(all.length);
    expect(all.map(({ number }) => number)).toEqual(all.map((_, at) => at));
    expect(all.every(({ key }) => /^[a-z0-9.-]{1,60}$/u.test(key))).toBe(true);
    expect(all.every((one) => set.byKey(one.key) === one && set.byName(one.name) === one)).toBe(true);
    expect(set.byKey('no-such-key')).toBeUndefined();
  });

  it.each(sets)('$definition.name pairs each case with its mirror', (set) => {
    for (const one of [set.skip, ...set.cases]) expect(set.mirrorOf(set.mirrorOf(one))).toBe(one);
    expect(set.mirrorOf(set.skip)).toBe(set.skip);
  });

  it('gives a case the same key in a set that shares its definition', () => {
    const copy = buildCaseSet({ ...caseSet('pll').definition, key: 'mine', name: 'Mine' });
    expect(copy.cases.map(({ key }) => key)).toEqual(caseSet('pll').cases.map(({ key }) => key));
    expect(caseSet('PLL ').byName('Ua')?.key).toBe('co-eo.cp-ep.all.60');
  });

  it('knows the sets of the trade and no other', () => {
    expect(() => caseSet('f2l')).toThrow(/no set "f2l".*PLL/u);
    expect(caseSet(' oll ')).toBe(caseSet('OLL'));
  });

  it('refuses sets whose algorithms could not be said to solve one case', () => {
    const set = { key: 'x', name: 'X', entry: 'any' as const, mix: [] };
    expect(() => buildCaseSet({ ...set, toldApart: ['co'], solved: ['co', 'eo'] })).toThrow(
      /solves edge orientation/u,
    );
    expect(() => buildCaseSet({ ...set, toldApart: ['co', 'eo'], solved: ['co'] })).toThrow(
      /tells edge orientation apart/u,
    );
  });
});

describe('drawing a state of a case', () => {
  it.each(sets)('$definition.name: the states of a case are all of it', (set) => {
    for (const one of [set.skip, ...set.cases.slice(0, 60)]) {
      const states = Array.from(set.statesOf(one));
      expect(states).toHaveLength(one.weight);
      expect(states[0]).toBe(one.canonical);
      expect(states.every((state) => set.caseOfState(state) === one)).toBe(true);
    }
  });

  it('draws every state of the weight equally often', () => {
    // 16 states of T, 16,000 draws: χ² with 15 degrees of freedom is below 37.7 in 999 of 1,000 runs.
    const set = caseSet('pll');
    const one = set.byName('T')!;
    const random = seeded(4);
    const counts = new Map<number, number>();
    for (let draw = 0; draw < 16_000; draw++) {
      const state = set.drawState(one, random);
      counts.set(state, (counts.get(state) ?? 0) + 1);
    }
    expect(counts.size).toBe(16);
    expect([...counts.values()].reduce((sum, count) => sum + (count - 1000) ** 2 / 1000, 0)).toBeLessThan(
      37.7,
    );
    expect(set.drawState(one, () => 0)).toBe(one.canonical);
    expect(set.caseOfState(set.drawState(one, () => 1 - 2 ** -53))).toBe(one);
  });
});

describe('PLL letters', () => {
  const set = caseSet('pll');

  it('are the 21 of the trade, each of one case', () => {
    // Common practice.
    const letters = 'Aa Ab E F Ga Gb Gc Gd H Ja Jb Na Nb Ra Rb T Ua Ub V Y Z'.split(' ');
    expect(PLL_NAMES.map(([name]) => name)).toEqual(letters);
    expect(namesOf(set).sort()).toEqual(letters);
  });

  it.each([
    // Common practice: which are each other's mirror, and which their own.
    ...['Aa Ab', 'Ga Gc', 'Gb Gd', 'Ja Jb', 'Na Nb', 'Ra Rb', 'Ua Ub'].map((pair) => pair.split(' ')),
    ...'E F H T V Y Z'.split(' ').map((own) => [own, own]),
  ])('%s is the mirror of %s', (one, other) => {
    expect(mirrorName(set, one!)).toBe(other);
    expect(mirrorName(set, other!)).toBe(one);
  });

  it('have the angles and groups that everyone knows', () => {
    // Common practice: H and the Ns look the same from everywhere, E and Z from two sides.
    const angles = (m: number) => set.cases.filter((one) => one.angles === m).map(({ name }) => name);
    expect(angles(1).sort()).toEqual(['H', 'Na', 'Nb']);
    expect(angles(2).sort()).toEqual(['E', 'Z']);
    const group = (name: string) => set.cases.filter((one) => one.group === name).map((one) => one.name);
    expect(group('edges only').sort()).toEqual(['H', 'Ua', 'Ub', 'Z']);
    expect(group('diagonal corners').sort()).toEqual(['E', 'Na', 'Nb', 'V', 'Y']);
    expect(group('adjacent corners')).toHaveLength(12);
  });

  it.each(['T', 't', 'T perm', 'T-perm', 'Tperm', 'PLL T', 'pll: t', ' T ', 'PLL T-Perm', 'T permutation'])(
    '%j is T',
    (text) => {
      expect(set.byName(text)?.name).toBe('T');
    },
  );

  it('are found as people write them, and nothing else is', () => {
    expect(set.byName('J b')?.name).toBe('Jb');
    expect(set.byName('ga')?.name).toBe('Ga');
    for (const skip of ['skip', 'solved', 'PLL skip', 'Skip']) expect(set.byName(skip)).toBe(set.skip);
    for (const none of ['', 'J', 'G', 'Q', 'OLL 21', 'perm', 'T T']) expect(set.byName(none)).toBeUndefined();
  });
});

describe('OLL numbers', () => {
  const set = caseSet('oll');
  const groupOf = (number: number) => set.byName(String(number))!.group;

  it('are 1 to 57, each of one case', () => {
    expect(OLL_NAMES.map(([number]) => number)).toEqual(Array.from({ length: 57 }, (_, at) => at + 1));
    expect(
      namesOf(set)
        .map(Number)
        .sort((a, b) => a - b),
    ).toEqual(OLL_NAMES.map(([number]) => number));
  });

  it.each([
    // Common practice: mirror pairs of the numbering; the rest are their own mirrors.
    ...['3 4', '5 6', '7 8', '9 10', '11 12', '13 14', '15 16', '26 27', '29 30', '31 32', '36 38', '39 40'],
    ...['41 42', '43 44', '47 48', '49 50', '53 54'],
  ])('%s are mirrors', (pair) => {
    const [one, other] = pair.split(' ') as [string, string];
    expect(mirrorName(set, one)).toBe(other);
    expect(mirrorName(set, other)).toBe(one);
  });

  it.each([1, 2, 17, 18, 19, 20, 21, 22, 23, 24, 25, 28, 33, 34, 35, 37, 45, 46, 51, 52, 55, 56, 57])(
    '%i is its own mirror',
    (number) => {
      expect(mirrorName(set, String(number))).toBe(String(number));
    },
  );

  it('have 14 shape groups of the sizes of the trade', () => {
    const sizes: Record<string, number> = {};
    for (const { group } of set.cases) sizes[group] = (sizes[group] ?? 0) + 1;
    expect(sizes).toEqual({
      dot: 8,
      line: 4,
      L: 6,
      'corners oriented': 2,
      T: 2,
      square: 2,
      C: 2,
      P: 4,
      W: 2,
      fish: 4,
      knight: 4,
      lightning: 6,
      awkward: 4,
      cross: 7,
    });
  });

  it('have groups that fit the pieces: dots, lines, crosses and oriented corners', () => {
    const edges = caseSet('eoll');
    for (const one of set.cases) {
      const left = edges.caseOfState(one.canonical)!.name;
      const number = Number(one.name);
      if (one.group === 'dot') expect(left, one.name).toBe('dot');
      else if (one.group === 'cross') expect(left, one.name).toBe('skip');
      // Common practice: shapes built on two edges facing each other.
      else if (['line', 'T', 'C', 'knight'].includes(one.group) || [39, 40, 57].includes(number))
        expect(left, one.name).toBe('line');
      else expect(left, one.name).toBe('L');
    }
    expect([20, 28, 57].map(groupOf)).toEqual(['dot', 'corners oriented', 'corners oriented']);
  });

  it('look the same from everywhere or from two sides where everyone knows they do', () => {
    // Common practice: only the skip and 20 have one angle, and five have two.
    const angles = (m: number) => set.cases.filter((one) => one.angles === m).map(({ name }) => name);
    expect(angles(1)).toEqual(['20']);
    expect(angles(2).sort()).toEqual(['1', '21', '55', '56', '57']);
  });

  it.each(['7', '07', 'OLL 7', 'oll07', '#7', 'OLL #7', 'case 7', 'No. 7', 'OLL case 7'])(
    '%j is 7',
    (text) => {
      expect(set.byName(text)?.name).toBe('7');
    },
  );
});

describe('names and groups of other sets', () => {
  it('follow from OLL and PLL', () => {
    expect(namesOf(caseSet('ocll')).sort()).toEqual(['Antisune', 'H', 'L', 'Pi', 'Sune', 'T', 'U']);
    expect(namesOf(caseSet('eoll')).sort()).toEqual(['L', 'dot', 'line']);
    expect(namesOf(caseSet('cpll')).sort()).toEqual(['adjacent', 'diagonal']);
    expect(namesOf(caseSet('epll')).sort()).toEqual(['H', 'Ua', 'Ub', 'Z']);
    // Common practice: H has four COLL cases, the other six have six each; two have corners oriented.
    const sizes: Record<string, number> = {};
    for (const { group } of caseSet('coll').cases) sizes[group] = (sizes[group] ?? 0) + 1;
    expect(sizes).toEqual({ Antisune: 6, H: 4, L: 6, Pi: 6, Sune: 6, T: 6, U: 6, 'corners oriented': 2 });
    // Common practice: 72 ZBLL cases for each but 40 for H; 21 are PLL.
    const zbll: Record<string, number> = {};
    for (const { group } of caseSet('zbll').cases) {
      const twist = group.replace(/ \d$/u, '');
      zbll[twist] = (zbll[twist] ?? 0) + 1;
    }
    expect(zbll).toEqual({
      Antisune: 72,
      H: 40,
      L: 72,
      Pi: 72,
      Sune: 72,
      T: 72,
      U: 72,
      'corners oriented': 21,
    });
  });

  it('has Sune for the algorithm everyone knows by that name', () => {
    // Common practice: R U R' U R U2 R' is Sune, its inverse Antisune.
    const read = readAlgorithm("R U R' U R U2 R'");
    expect(read.kind === 'state' && caseSet('ocll').caseOfState(read.state)?.name).toBe('Sune');
  });
});

describe('fixed clusters', () => {
  it.each(sets)('$definition.name: 6 to 12 cases each, mirrors together, or all names offered', (set) => {
    if (set.cases.length <= OFFERED_WHOLE) {
      expect([set.skip, ...set.cases].every(({ cluster }) => cluster === 0)).toBe(true);
      return;
    }
    const sizes = new Map<number, number>();
    for (const { cluster } of [set.skip, ...set.cases]) sizes.set(cluster, (sizes.get(cluster) ?? 0) + 1);
    expect(Math.min(...sizes.values())).toBeGreaterThanOrEqual(6);
    expect(Math.max(...sizes.values())).toBeLessThanOrEqual(12);
    expect([...sizes.keys()].sort((a, b) => a - b)).toEqual(Array.from(sizes, (_, at) => at + 1));
    expect(set.cases.every((one) => set.mirrorOf(one).cluster === one.cluster)).toBe(true);
  });

  it('of OLL never change: showings in the log were asked over these', () => {
    const set = caseSet('oll');
    const all = [set.skip, ...set.cases];
    const numbers = [...new Set(all.map(({ cluster }) => cluster))].sort((a, b) => a - b);
    const namesIn = (number: number) =>
      all.filter(({ cluster }) => cluster === number).map(({ name }) => name);
    expect(numbers.map((number) => namesIn(number).sort().join(' '))).toMatchInlineSnapshot(`
      [
        "28 33 39 40 43 44 45 46 57",
        "1 17 18 19 2 20 3 4",
        "21 22 23 24 25 26 27 34 skip",
        "10 29 30 35 37 41 42 9",
        "11 12 31 32 36 38 7 8",
        "47 48 49 5 50 53 54 6",
        "13 14 15 16 51 52 55 56",
      ]
    `);
    const again = buildCaseSet(set.definition);
    expect(again.cases.map(({ cluster }) => cluster)).toEqual(set.cases.map(({ cluster }) => cluster));
  });

  it('do not depend on the angle a state is seen from', () => {
    const set = caseSet('oll');
    for (const one of set.cases.slice(0, 10))
      for (const before of AUFS)
        expect(set.caseOfState(act(one.canonical, before, 0))?.cluster).toBe(one.cluster);
  });
});
