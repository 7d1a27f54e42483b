import { describe, expect, it } from 'vitest';
import {
  ASPECTS,
  type Aspect,
  buildCaseSet,
  CASE_SETS,
  type CaseSetDefinition,
  caseSet,
  type Entry,
  EVERY_ENTRY,
  entryFixing,
  fixedBy,
  isEntryState,
  isSolvedIn,
  meetOf,
  openIn,
  rightAufsBefore,
  STATES,
  seenThrough,
  solvesCase,
  tradeSetLike,
} from '#shared/lastlayer/index.ts';
import { seeded } from './support/random.ts';
import { STEPS } from './support/steps.ts';

const own = (changes: Partial<CaseSetDefinition>): CaseSetDefinition => ({
  key: 'own',
  name: 'Own',
  entry: 'any',
  toldApart: ['co'],
  solved: ['co'],
  mix: [],
  ...changes,
});
/** A set that solves all it sees. */
const through = (entry: Entry, toldApart: readonly Aspect[]) =>
  own({ entry, toldApart, solved: seenThrough(entry, toldApart) });

describe('entry conditions', () => {
  it('are all the choices of aspects but the four together, each once', () => {
    expect(EVERY_ENTRY).toHaveLength(15);
    for (const entry of EVERY_ENTRY) expect(entryFixing(fixedBy(entry))).toBe(entry);
    expect(entryFixing(ASPECTS)).toBeNull();
    expect(entryFixing(['ep', 'eo'])).toBe('edges');
  });

  it.each([
    // Derived: a permutation done is one of 4 turns of 24; both done are one of 4 of the 288 pairs of one parity.
    ['cp', 62_208 / 6],
    ['ep', 62_208 / 6],
    ['cp+eo', 7776 / 6],
    ['co+ep', 2304 / 6],
    ['edges', 7776 / 6],
    ['co+edges', 288 / 6],
    ['cp+ep', 62_208 / 72],
    ['corners+ep', 2304 / 72],
    ['cp+edges', 7776 / 72],
  ] as const)('%s is met by %i states', (entry, states) => {
    let met = 0;
    for (let index = 0; index < STATES; index++) if (isEntryState(entry, index)) met++;
    expect(met).toBe(states);
  });

  it('have in common what both have done', () => {
    expect(meetOf(['eo', 'any'])).toBe('any');
    expect(meetOf(['corners+eo', 'co+edges'])).toBe('co+eo');
    expect(meetOf(['cp+edges', 'corners+ep', 'cp+ep'])).toBe('cp+ep');
    expect(() => meetOf([])).toThrow(RangeError);
  });
});

describe('a set of any definition', () => {
  const buildable = STEPS.filter(({ entry, aspects }) => openIn({ entry, toldApart: aspects }).length > 0);

  it.each(buildable.filter((_, at) => at % 3 === 0))(
    '$title has its cases told apart by name and key',
    (step) => {
      const set = buildCaseSet(through(step.entry, step.aspects));
      const all = [set.skip, ...set.cases];
      for (const property of ['key', 'name', 'number'] as const)
        expect(new Set(all.map((one) => one[property])).size, property).toBe(all.length);
      expect(all.reduce((sum, { weight }) => sum + weight, 0)).toBe(set.total);
      expect(set.total).toBe(set.states);
      expect(all.every(({ key }) => /^[a-z0-9.-]{1,60}$/u.test(key))).toBe(true);
      expect(all.every((one) => set.byName(one.name) === one)).toBe(true);
      for (const one of all.slice(0, 50)) expect(set.mirrorOf(set.mirrorOf(one))).toBe(one);
    },
  );

  it('has the 84 cases and the skip of edges oriented and corners permuted', () => {
    // Common practice: the group of two neighbouring faces.
    expect(buildCaseSet(through('cp+eo', ['co', 'ep'])).cases).toHaveLength(84);
  });

  it('is named by what it tells apart, not by its key', () => {
    const names = (entry: Entry, toldApart: readonly Aspect[]) =>
      buildCaseSet(through(entry, toldApart))
        .cases.map(({ name }) => name)
        .sort();
    const tradeNames = (key: string) =>
      caseSet(key)
        .cases.map(({ name }) => name)
        .sort();
    expect(names('any', ['co', 'eo'])).toEqual(tradeNames('oll'));
    expect(names('cp', ['co', 'eo'])).toEqual(tradeNames('oll'));
    expect(names('any', ['cp', 'ep'])).toEqual(tradeNames('pll'));
    expect(names('corners', ['ep'])).toEqual(tradeNames('epll'));
    expect(names('any', ['co'])).toEqual(tradeNames('ocll'));
    expect(names('edges', ['cp', 'co']).every((name) => name.startsWith('#'))).toBe(true);
    // Common practice: with the edges done, corners go round in threes, or swap in two pairs.
    expect(names('co+edges', ['cp'])).toEqual(['Aa', 'Ab', 'E', 'H']);
  });

  it('is like the trade’s set that has the same cases', () => {
    for (const set of CASE_SETS) expect(tradeSetLike(own({ ...set, key: 'k', name: 'K' }))).toBe(set);
    expect(tradeSetLike({ entry: 'eo', toldApart: ['eo', 'cp', 'co'] })?.key).toBe('coll');
    expect(tradeSetLike({ entry: 'eo', toldApart: ['co'], solved: ['co'] })).toBeUndefined();
    expect(tradeSetLike({ entry: 'cp', toldApart: ['co'] })).toBeUndefined();
    const again = buildCaseSet(own({ entry: 'eo', toldApart: ['co', 'eo'], solved: ['co', 'eo'] }));
    expect(again.cases.map(({ key }) => key)).toEqual(caseSet('ocll').cases.map(({ key }) => key));
  });

  it.each([
    [{ key: 'Key!' }, /key "Key!"/u],
    [{ name: ' ' }, /no name/u],
    [{ entry: 'cross' as Entry }, /no entry condition "cross"/u],
    [{ toldApart: ['xo' as Aspect] }, /no aspect "xo"/u],
    [{ toldApart: [] as Aspect[], solved: [] as Aspect[] }, /tells nothing apart/u],
    [{ entry: 'corners' as const }, /tells nothing apart/u],
    [{ solved: ['co', 'eo'] as const }, /solves edge orientation, which is neither/u],
    [{ toldApart: ['co', 'eo'] as const }, /tells edge orientation apart but does not solve it/u],
    [{ entry: 'corners' as const, toldApart: ['ep'] as const, solved: ['ep'] as const }, /must solve both/u],
    [{ mix: [{ entry: 'any', parts: 1 }] as const }, /two or more entries/u],
    [
      {
        mix: [
          { entry: 'any', parts: 1 },
          { entry: 'any', parts: 2 },
        ] as const,
      },
      /each of them once/u,
    ],
    [
      {
        mix: [
          { entry: 'any', parts: 1.5 },
          { entry: 'eo', parts: 2 },
        ] as const,
      },
      /share of "any"/u,
    ],
    [
      {
        mix: [
          { entry: 'any', parts: 1 },
          { entry: 'eo', parts: 1001 },
        ] as const,
      },
      /share of "eo".*1000/u,
    ],
    [
      {
        mix: [
          { entry: 'co+eo', parts: 1 },
          { entry: 'eo', parts: 1 },
        ] as const,
      },
      /have "eo" in common/u,
    ],
  ])('is refused in one sentence: %j', (changes, message) => {
    const refused = () => buildCaseSet(own(changes));
    expect(refused).toThrow(RangeError);
    expect(refused).toThrow(message);
  });

  it('accepts what leaves done aspects as it likes only if its set does not solve them', () => {
    const T_ORIENTING = "F R U R' U' F'";
    // From edges oriented, corners turned; edges may be flipped on the way or not.
    const loose = buildCaseSet(own({ entry: 'eo' }));
    const solves = solvesCase(loose, T_ORIENTING);
    expect(solves.kind === 'case' && solves.case.name).toBe('U');
    // H leaves each permutation of corners and edges a turn of the top, but not the same turn.
    const H = 'M2 U M2 U2 M2 U M2';
    expect(solvesCase(buildCaseSet(through('cp+ep', ['co'])), H)).toMatchObject({
      kind: 'not-in-set',
      undoes: ['ep'],
    });
    expect(solvesCase(buildCaseSet(own({ entry: 'cp+ep' })), H).kind).toBe('skip');
    expect(solvesCase(buildCaseSet(own({ entry: 'cp' })), "R U R' U' R' F R2 U' R' U' R U R' F'").kind).toBe(
      'skip',
    );
  });
});

describe('a mix of entries', () => {
  const mixed = buildCaseSet(
    own({
      entry: 'any',
      toldApart: ['co', 'eo'],
      solved: ['co', 'eo'],
      mix: [
        { entry: 'eo', parts: 2 },
        { entry: 'any', parts: 3 },
      ],
    }),
  );

  it('mixes the priors exactly', () => {
    const [oll, ocll] = [caseSet('oll'), caseSet('ocll')];
    expect(mixed.cases.map(({ key, number, name }) => [key, number, name])).toEqual(
      oll.cases.map(({ key, number, name }) => [key, number, name]),
    );
    expect([mixed.skip, ...mixed.cases].reduce((sum, { weight }) => sum + weight, 0)).toBe(mixed.total);
    for (const one of [mixed.skip, ...mixed.cases]) {
      const loose = oll.byKey(one.key)!.weight / oll.total;
      const oriented = ocll.caseOfState(one.canonical);
      const tight = oriented ? oriented.weight / ocll.total : 0;
      expect(one.weight / mixed.total, one.name).toBeCloseTo(0.4 * tight + 0.6 * loose, 12);
    }
    // Derived: the skip comes 2/5 · 1/27 + 3/5 · 1/216 = 19/1080 of the time, and all are whole 1080ths.
    expect([mixed.skip.weight, mixed.total]).toEqual([19, 1080]);
  });

  it('leaves out what no entry can deal, and keeps keys and numbers', () => {
    const set = buildCaseSet(
      own({
        toldApart: ['co', 'eo'],
        solved: ['co', 'eo'],
        mix: [
          { entry: 'eo', parts: 1 },
          { entry: 'co', parts: 1 },
        ],
      }),
    );
    // Derived: 7 with edges oriented, 3 with corners oriented (20, 28, 57 of common practice).
    expect(set.cases).toHaveLength(10);
    expect(set.cases.map(({ name }) => Number(name)).sort((a, b) => a - b)).toEqual([
      20, 21, 22, 23, 24, 25, 26, 27, 28, 57,
    ]);
    const oll = caseSet('oll');
    for (const one of set.cases) {
      expect(oll.byKey(one.key)?.number).toBe(one.number);
      expect(set.mirrorOf(set.mirrorOf(one))).toBe(one);
    }
    expect(set.caseOfState(oll.byName('1')!.canonical)).toBeNull();
    expect(set.states).toBe(7776 + 2304 - 288);
    expect(set.byName('1')).toBeUndefined();
    expect(tradeSetLike(set.definition)).toBeUndefined();
    expect(tradeSetLike(mixed.definition)?.key).toBe('oll');
  });

  it('draws states as often as its entries deal them', () => {
    const set = buildCaseSet(
      own({
        mix: [
          { entry: 'cp', parts: 3 },
          { entry: 'any', parts: 1 },
        ],
      }),
    );
    const one = set.byName('Sune')!;
    const random = seeded(8);
    let permuted = 0;
    const draws = 6000;
    for (let draw = 0; draw < draws; draw++) {
      const state = set.drawState(one, random);
      expect(set.caseOfState(state)).toBe(one);
      if (isSolvedIn(state, ['cp'])) permuted++;
    }
    // Derived: 3/4 by "cp", and a sixth of the rest. Four standard deviations of 6,000 draws are 0.022.
    expect(Math.abs(permuted / draws - (3 / 4 + 1 / 24))).toBeLessThan(0.022);
    expect(set.drawState(one, () => 1 - 2 ** -53)).toBeLessThan(STATES);
  });

  it('has all states that its entries deal, and right AUFs as any set', () => {
    const states = Array.from(mixed.statesOf(mixed.byName('27')!));
    expect(states).toEqual(Array.from(caseSet('oll').statesOf(caseSet('oll').byName('27')!)));
    expect(rightAufsBefore(mixed, "R U R' U R U2 R'", states[0]!)).toHaveLength(1);
  });
});
