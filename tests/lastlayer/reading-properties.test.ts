import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  AUFS,
  act,
  CASE_SETS,
  type CaseSet,
  caseSet,
  isSolvedIn,
  readAlgorithm,
  rightAufsBefore,
  solvesCase,
} from '#shared/lastlayer/index.ts';
import { anyTurns, lastLayerAlgorithm } from './support/algorithms.ts';
import { solvedOnCube } from './support/puzzle.ts';
import { pick, seeded } from './support/random.ts';
import { respell, turnedInside } from './support/respelling.ts';

const TURNS = ['', 'U', 'U2', "U'"] as const;
const WHOLE = ['', 'y', 'y2', "y'"] as const;
const sets = CASE_SETS.map(({ key }) => caseSet(key));

/** A source of random numbers, so that fast-check can say which run failed. */
const anySource = fc.integer({ min: 1, max: 2 ** 30 }).map(seeded);
const RUNS = { seed: 16, numRuns: 300 };

function stateOf(algorithm: string): number {
  const read = readAlgorithm(algorithm);
  if (read.kind !== 'state') throw new Error(`${algorithm} is ${read.kind}`);
  return read.state;
}
/** The case, or what is wrong, in every set. */
const solvedIn = (algorithm: string) =>
  sets.map((set) => {
    const solves = solvesCase(set, algorithm);
    return 'case' in solves ? solves.case.key : solves.kind;
  });
const spaced = (...parts: readonly string[]) => parts.filter((part) => part !== '').join(' ');

describe('reading any algorithm', () => {
  it('is not moved by turns of the top or the whole cube before it: the same case of every set', () => {
    fc.assert(
      fc.property(anySource, (random) => {
        const algorithm = lastLayerAlgorithm(random);
        const before = pick(random, TURNS);
        expect(solvedIn(spaced(before, algorithm))).toEqual(solvedIn(algorithm));
        expect(solvedIn(spaced(pick(random, WHOLE), before, algorithm))).toEqual(solvedIn(algorithm));
      }),
      RUNS,
    );
  });

  it('is not moved by a turn of the top behind it, whichever face the top has become', () => {
    fc.assert(
      fc.property(anySource, (random) => {
        const algorithm = lastLayerAlgorithm(random);
        const state = stateOf(algorithm);
        const amount = pick(random, AUFS.slice(1));
        const turned = Array.from('ULFRBD', (face) =>
          readAlgorithm(`${algorithm} ${face}${['', '2', "'"][amount - 1]}`),
        ).flatMap((read) => (read.kind === 'state' ? [read.state] : []));
        // One face is the top; turning any other breaks the first two layers.
        expect(turned).toEqual([act(state, 0, amount)]);
        expect(caseSet('1lll').caseOfState(turned[0]!)).toBe(caseSet('1lll').caseOfState(state));
      }),
      RUNS,
    );
  });

  it('is not moved by turns of the whole cube: behind, in front about the upright axis, and anywhere inside', () => {
    fc.assert(
      fc.property(anySource, (random) => {
        const algorithm = lastLayerAlgorithm(random);
        const state = stateOf(algorithm);
        for (const turn of ['x', "y'", 'z2', "x y'"]) expect(stateOf(spaced(algorithm, turn))).toBe(state);
        for (const k of AUFS)
          expect(stateOf(spaced(WHOLE[k], algorithm))).toBe(act(state, AUFS[-k & 3]!, AUFS[-k & 3]!));
        let inside = algorithm;
        for (let turns = 0; turns < 3; turns++) {
          inside = turnedInside(random, inside);
          expect(stateOf(inside), inside).toBe(state);
        }
      }),
      RUNS,
    );
  });

  it('is not moved by notation: r, Rw and L x; M and x′ R L′; R and l x', () => {
    fc.assert(
      fc.property(anySource, (random) => {
        const algorithm = lastLayerAlgorithm(random);
        const other = respell(random, algorithm, 0.6);
        expect(stateOf(other), other).toBe(stateOf(algorithm));
        const both = turnedInside(random, respell(random, other, 0.3));
        expect(stateOf(both), both).toBe(stateOf(algorithm));
      }),
      RUNS,
    );
  });

  it('finds the first two layers broken however it is written', () => {
    fc.assert(
      fc.property(anySource, (random) => {
        const algorithm = anyTurns(random, 1 + Math.floor(random() * 12));
        const read = readAlgorithm(algorithm);
        const other = readAlgorithm(turnedInside(random, respell(random, algorithm, 0.5)));
        expect({ ...other, normalised: '' }).toEqual({ ...read, normalised: '' });
      }),
      RUNS,
    );
  });
});

describe('the right AUFs', () => {
  /** Algorithms that solve a case of the set, told by the definition of the set alone. */
  function algorithmsOf(set: CaseSet, random: () => number, wanted: number): string[] {
    const found: string[] = [];
    while (found.length < wanted) {
      const algorithm = lastLayerAlgorithm(random);
      if (solvesCase(set, algorithm).kind === 'case') found.push(algorithm);
    }
    return found;
  }

  it.each(sets)('$definition.name: every right one solves on the cube and every other does not', (set) => {
    const random = seeded(51);
    for (const algorithm of algorithmsOf(set, random, 12)) {
      const solves = solvesCase(set, algorithm);
      if (solves.kind !== 'case') throw new Error(`${algorithm} is ${solves.kind}`);
      const state = set.drawState(solves.case, random);
      const right = rightAufsBefore(set, algorithm, state);
      expect(right).toHaveLength(4 / solves.case.angles);
      for (const auf of AUFS)
        expect(solvedOnCube(set.definition.solved, state, spaced(TURNS[auf], algorithm)), algorithm).toBe(
          right.includes(auf),
        );
      const other = pick(
        random,
        set.cases.filter((one) => one !== solves.case),
      );
      const elsewhere = set.drawState(other, random);
      for (const auf of AUFS)
        expect(solvedOnCube(set.definition.solved, elsewhere, spaced(TURNS[auf], algorithm))).toBe(false);
      expect(rightAufsBefore(set, algorithm, elsewhere)).toEqual([]);
    }
  });
});

describe('COLL and CLL', () => {
  it('tell apart an algorithm that flips edges: CLL takes it, COLL does not', () => {
    const [coll, cll] = [caseSet('coll'), caseSet('cll')];
    let broke = 0;
    fc.assert(
      fc.property(anySource, (random) => {
        const algorithm = lastLayerAlgorithm(random);
        const keepsEdges = isSolvedIn(stateOf(algorithm), ['eo']);
        const [asColl, asCll] = [solvesCase(coll, algorithm), solvesCase(cll, algorithm)];
        if (!keepsEdges) broke++;
        expect(asCll.kind).toMatch(/^(?:case|skip)$/u);
        expect(asColl.kind).toBe(keepsEdges ? asCll.kind : 'not-in-set');
        if (asColl.kind === 'not-in-set') expect(asColl.undoes).toEqual(['eo']);
        if ('case' in asColl && 'case' in asCll) expect(asColl.case.group).toBe(asCll.case.group);
      }),
      RUNS,
    );
    expect(broke).toBeGreaterThan(50);
  });
});
