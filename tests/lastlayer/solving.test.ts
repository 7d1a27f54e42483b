import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  AUFS,
  act,
  CASE_SETS,
  caseSet,
  mirror,
  readAlgorithm,
  rightAufsAfter,
  rightAufsBefore,
  solvesCase,
  stateAt,
} from '#shared/lastlayer/index.ts';
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { puzzleIn, solvedOnCube, turnedBy } from './support/puzzle.ts';
import { pick, seeded } from './support/random.ts';

const TURNS = ['', 'U', 'U2', "U'"] as const;
const known = [
  ...OLL_NAMES.map(([, , algorithm]) => algorithm),
  ...PLL_NAMES.map(([, algorithm]) => algorithm),
];
const anyKnown = fc.constantFrom(...known);
const anyAuf = fc.constantFrom(...AUFS);

function stateOf(algorithm: string): number {
  const read = readAlgorithm(algorithm);
  if (read.kind !== 'state') throw new Error(`${algorithm} is ${read.kind}`);
  return read.state;
}

/** Left and right swapped in the text: R and L, M stays, everything the other way round but x and M. */
function mirrored(algorithm: string): string {
  const other: Record<string, string> = { R: 'L', L: 'R', r: 'l', l: 'r' };
  return parseMoves(algorithm)
    .map(({ family, amount }) => {
      const kept = family === 'M' || family === 'x';
      return (other[family] ?? family) + ['', '2', "'"][(kept ? amount : 4 - amount) - 1];
    })
    .join(' ');
}

describe('reading is true to the cube', () => {
  it('AUF before and after are the two halves of the sixteen-fold action', () => {
    fc.assert(
      fc.property(anyKnown, anyAuf, anyAuf, (algorithm, i, j) => {
        const state = stateOf(`${TURNS[i]} ${algorithm} ${TURNS[j]}`);
        expect(state).toBe(act(stateOf(algorithm), AUFS[-i & 3]!, j));
        expect(caseSet('1lll').caseOfState(state)).toBe(caseSet('1lll').caseOfState(stateOf(algorithm)));
      }),
      { seed: 16 },
    );
  });

  it('turning the whole cube before and back after reads the same case from another side', () => {
    fc.assert(
      fc.property(anyKnown, anyAuf, (algorithm, k) => {
        const [turn, back] = [['', 'y', 'y2', "y'"][k], ['', "y'", 'y2', 'y'][k]];
        // The table's algorithms may end with the cube held otherwise: closed by their own trailing turns.
        if (!/^[ULFRBDx'2 ]+$/u.test(algorithm)) return;
        const state = stateOf(`${turn} ${algorithm} ${back}`);
        expect(state).toBe(act(stateOf(algorithm), AUFS[-k & 3]!, AUFS[-k & 3]!));
      }),
      { seed: 16 },
    );
  });

  it('a mirrored algorithm solves the mirrored state, and mirrored twice is itself', () => {
    for (const algorithm of known) {
      expect(stateOf(mirrored(algorithm)), algorithm).toBe(mirror(stateOf(algorithm)));
      expect(stateOf(mirrored(mirrored(algorithm)))).toBe(stateOf(algorithm));
    }
  });
});

describe('AUF before', () => {
  const random = seeded(5);
  const tables = [
    ...PLL_NAMES.map(([name, algorithm]) => ['pll', name, algorithm] as const),
    ...OLL_NAMES.map(([number, , algorithm]) => ['oll', String(number), algorithm] as const),
  ];

  it('every right one solves on the cube and every other does not, 4/m of four', () => {
    for (const [key, name, algorithm] of tables) {
      const set = caseSet(key);
      const one = set.byName(name)!;
      const state = set.drawState(one, random);
      const right = rightAufsBefore(set, algorithm, state);
      expect(right, name).toHaveLength(4 / one.angles);
      for (const auf of AUFS)
        expect(
          solvedOnCube(set.definition.solved, state, `${TURNS[auf]} ${algorithm}`),
          `${name} ${auf}`,
        ).toBe(right.includes(auf));
    }
  });

  it('is empty for an algorithm of another case, and for one that breaks the first two layers', () => {
    const set = caseSet('pll');
    const state = set.drawState(set.byName('T')!, random);
    for (const [name, algorithm] of PLL_NAMES)
      if (name !== 'T') expect(rightAufsBefore(set, algorithm, state), name).toEqual([]);
    expect(rightAufsBefore(set, 'R', state)).toEqual([]);
    expect(rightAufsBefore(set, '', state)).toEqual([]);
    expect(() => rightAufsBefore(set, 'R Q', state)).toThrow(/Character 3/u);
    expect(() => rightAufsBefore(set, 'R', 70_000)).toThrow(RangeError);
  });

  it('has the AUF after that finishes the cube', () => {
    const set = caseSet('pll');
    for (const [name, algorithm] of PLL_NAMES) {
      const state = set.drawState(set.byName(name)!, random);
      const [before] = rightAufsBefore(set, algorithm, state);
      const after = rightAufsAfter(set, algorithm, state, before!);
      expect(after, name).toHaveLength(1);
      const { CORNERS, EDGES } = turnedBy(
        puzzleIn(stateAt(state)),
        `${TURNS[before!]} ${algorithm} ${TURNS[after[0]!]}`,
      ).patternData;
      expect([...CORNERS!.pieces, ...EDGES!.pieces]).toEqual([...Array(8).keys(), ...Array(12).keys()]);
    }
    const oll = caseSet('oll');
    const sune = oll.byName('27')!;
    expect(rightAufsAfter(oll, "R U R' U R U2 R'", sune.canonical, 0).length % 4).toBe(0);
  });
});

describe('which case of a set an algorithm solves', () => {
  const T_ORIENTING = "F R U R' U' F'";
  const SUNE = "R U R' U R U2 R'";
  const T_PERM = "R U R' U' R' F R2 U' R' U' R U R' F'";

  it.each([
    ['oll', T_ORIENTING, 'case', '45'],
    ['pll', T_PERM, 'case', 'T'],
    ['pll', T_ORIENTING, 'not-in-set', ['co', 'eo']],
    ['pll', SUNE, 'not-in-set', ['co']],
    ['ocll', SUNE, 'case', 'Sune'],
    // Turns corners as a COLL case does, but flips edges on the way.
    ['coll', T_ORIENTING, 'not-in-set', ['eo']],
    ['ocll', T_ORIENTING, 'not-in-set', ['eo']],
    ['epll', T_PERM, 'not-in-set', ['cp']],
    ['ell', SUNE, 'not-in-set', ['co']],
    ['eoll', T_ORIENTING, 'case', 'line'],
    ['cpll', T_PERM, 'case', 'adjacent'],
    ['pll', 'U', 'skip', 'skip'],
    ['pll', '', 'skip', 'skip'],
    // An algorithm that orients all is the skip of OLL, whatever it permutes.
    ['oll', T_PERM, 'skip', 'skip'],
    // Edges only: corners are untouched, so the corner steps have nothing to do.
    ['coll', "M2 U M U2 M' U M2", 'skip', 'skip'],
    ['pll', 'R', 'first-two-layers-broken', null],
    ['pll', 'R Q', 'not-a-move', null],
  ] as const)('%s: %s is %s %j', (key, algorithm, kind, what) => {
    const solves = solvesCase(caseSet(key), algorithm);
    expect(solves.kind).toBe(kind);
    if ('case' in solves) expect(solves.case.name).toBe(what);
    if (solves.kind === 'not-in-set') expect(solves.undoes).toEqual(what);
  });

  it('a corner algorithm that flips edges is one of CLL and not of COLL', () => {
    const solves = solvesCase(caseSet('cll'), T_ORIENTING);
    expect(solves.kind).toBe('case');
    expect('case' in solves && solves.case.group).toBe('U');
  });

  it('holds by its definition: from every state of the case some AUF before solves', () => {
    const random = seeded(6);
    for (const { key } of CASE_SETS) {
      const set = caseSet(key);
      let solved = 0;
      for (const algorithm of known) {
        const solves = solvesCase(set, algorithm);
        if (solves.kind !== 'case') continue;
        solved++;
        const states = set.statesOf(solves.case);
        const some = Array.from({ length: 12 }, () => states[Math.floor(random() * states.length)]!);
        for (const state of [states[0]!, states[states.length - 1]!, ...some])
          expect(rightAufsBefore(set, algorithm, state).length, `${key} ${algorithm}`).toBe(
            4 / solves.case.angles,
          );
        const others = set.cases.filter((one) => one !== solves.case);
        const other = pick(random, others);
        expect(rightAufsBefore(set, algorithm, set.drawState(other, random))).toEqual([]);
      }
      expect(solved, key).toBeGreaterThan(0);
    }
  });
});
