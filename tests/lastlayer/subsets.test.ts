import { describe, expect, it } from 'vitest';
import {
  type CaseSet,
  caseSet,
  groupsOf,
  inverseOf,
  OFFERED_WHOLE,
  solvesCase,
  subsetOf,
} from '#shared/lastlayer/index.ts';
import { seeded } from './support/random.ts';

const keysOf = (set: CaseSet, wanted: (group: string) => boolean) =>
  set.cases.filter(({ group }) => wanted(group)).map(({ key }) => key);

describe('a subset', () => {
  const zbll = caseSet('zbll');
  const sunes = subsetOf(zbll, {
    key: 'sune-zbll',
    name: 'Sune ZBLL',
    caseKeys: keysOf(zbll, (group) => group.startsWith('Sune')),
  });
  const pll = caseSet('pll');
  const twoSided = subsetOf(pll, {
    key: 'mine',
    name: 'Mine',
    caseKeys: ['Ua', 'T', 'Ja', 'T'].map((name) => pll.byName(name)!.key),
  });

  it('has its parent’s cases as they are, in canonical order', () => {
    // Common practice: 72 cases of ZBLL have the corners of Sune.
    expect(sunes.cases).toHaveLength(72);
    for (const one of [sunes.skip, ...sunes.cases]) {
      const { cluster: _own, ...kept } = one;
      expect(zbll.byKey(one.key)).toMatchObject(kept);
    }
    expect(twoSided.cases.map(({ name }) => name).sort()).toEqual(['Ja', 'T', 'Ua']);
    expect(twoSided.cases.map(({ number }) => number)).toEqual(
      twoSided.cases.map(({ number }) => number).sort((a, b) => a - b),
    );
    expect([twoSided.parent, twoSided.total, twoSided.states]).toEqual([pll, 288, 288]);
    expect(twoSided.definition).toEqual({ ...pll.definition, key: 'mine', name: 'Mine' });
  });

  it('knows its own cases and the skip, and no others', () => {
    expect(twoSided.byName('skip')).toBe(twoSided.skip);
    expect(twoSided.byName('Mine T-perm')).toBe(twoSided.byName('T'));
    expect(twoSided.byName('F')).toBeUndefined();
    expect(twoSided.byKey(pll.byName('F')!.key)).toBeUndefined();
    expect(twoSided.caseOfState(pll.byName('F')!.canonical)).toBeNull();
    expect(twoSided.caseOfState(pll.byName('T')!.canonical)).toBe(twoSided.byName('T'));
    expect(twoSided.caseOfState(0)).toBe(twoSided.skip);
    const F = "R' U' F' R U R' U' R' F R2 U' R' U' R U R' U R";
    expect(solvesCase(twoSided, F)).toMatchObject({ kind: 'not-in-set', undoes: [] });
  });

  it('names mirrors and inverses that it has left out as its parent does', () => {
    const [T, Ja, Ua] = ['T', 'Ja', 'Ua'].map((name) => twoSided.byName(name)!);
    expect(twoSided.mirrorOf(T!)).toBe(T);
    expect(twoSided.mirrorOf(Ja!)).toBe(pll.byName('Jb'));
    expect(inverseOf(twoSided, Ja!)).toBe(Ja);
    expect(inverseOf(twoSided, Ua!)).toBe(pll.byName('Ub'));
  });

  it('draws states of its cases', () => {
    const random = seeded(31);
    for (const one of sunes.cases) {
      expect(sunes.caseOfState(sunes.drawState(one, random))).toBe(one);
      expect(sunes.statesOf(one)).toHaveLength(one.weight);
    }
  });

  it('can be chosen from a subset', () => {
    const one = subsetOf(sunes, { key: 'one', name: 'One', caseKeys: [sunes.cases[5]!.key] });
    expect(one.cases).toHaveLength(1);
    expect(one.cases[0]).toMatchObject({ number: sunes.cases[5]!.number, cluster: 0 });
    expect(one.parent).toBe(sunes);
    expect(inverseOf(one, one.cases[0]!)?.group).toMatch(/^Antisune/u);
  });

  it.each([
    [[], /No case is chosen for Wrong/u],
    [['no-such-key'], /PLL has no case "no-such-key"/u],
    [[pll.skip.key], /skip/u],
  ])('cannot be chosen from %j', (caseKeys, message) => {
    const choose = () => subsetOf(pll, { key: 'wrong', name: 'Wrong', caseKeys });
    expect(choose).toThrow(RangeError);
    expect(choose).toThrow(message);
  });

  it.each([
    ['zbll', 'Sune'],
    ['zbll', 'H'],
    ['coll', 'T'],
    ['1lll', 'OLL 4'],
    ['oll', 'fish'],
  ])(
    '%s, groups beginning with %s: clusters of 6 to 12, mirrors together, or all names offered',
    (key, start) => {
      const parent = caseSet(key);
      const set = subsetOf(parent, {
        key: 'part',
        name: 'Part',
        caseKeys: keysOf(parent, (group) => group.startsWith(start)),
      });
      const all = [set.skip, ...set.cases];
      if (set.cases.length <= OFFERED_WHOLE) {
        expect(all.every(({ cluster }) => cluster === 0)).toBe(true);
        return;
      }
      const sizes = new Map<number, number>();
      for (const { cluster } of all) sizes.set(cluster, (sizes.get(cluster) ?? 0) + 1);
      expect(Math.min(...sizes.values())).toBeGreaterThanOrEqual(6);
      expect(Math.max(...sizes.values())).toBeLessThanOrEqual(12);
      for (const one of set.cases) {
        const mirror = set.byKey(set.mirrorOf(one).key);
        if (mirror) expect(mirror.cluster).toBe(one.cluster);
      }
    },
  );
});

describe('what a subset can be chosen by', () => {
  const tally = (list: readonly (string | null)[]) => {
    const counts: Record<string, number> = {};
    for (const word of list) counts[String(word)] = (counts[String(word)] ?? 0) + 1;
    return counts;
  };

  it('is group, corner orientation, edge orientation and corner permutation', () => {
    const oll = groupsOf(caseSet('oll'));
    expect(oll.map((one) => one.case)).toEqual(caseSet('oll').cases);
    expect(oll.find((one) => one.case.name === '45')).toMatchObject({
      group: 'T',
      corners: 'U',
      edges: 'line',
      swap: null,
    });
    // Common practice: 8 dots, 15 with a line and 27 with an L, 7 with a cross.
    expect(tally(oll.map(({ edges }) => edges))).toEqual({ dot: 8, line: 15, L: 27, 'edges oriented': 7 });
    expect(tally(groupsOf(caseSet('pll')).map(({ swap }) => swap))).toEqual({
      'adjacent corners': 12,
      'diagonal corners': 5,
      'edges only': 4,
    });
    const zbll = groupsOf(caseSet('zbll'));
    expect(
      zbll.every(({ edges, corners, swap }) => edges === null && corners !== null && swap !== null),
    ).toBe(true);
    expect(tally(zbll.map(({ corners }) => corners))).toMatchObject({
      Sune: 72,
      H: 40,
      'corners oriented': 21,
    });
    expect(tally(groupsOf(caseSet('epll')).map(({ swap }) => swap))).toEqual({ null: 4 });
  });
});
