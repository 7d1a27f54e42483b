import { describe, expect, it } from 'vitest';
import { AUFS, act, caseSet, STATES, stateAt, twoLookRoutes } from '#shared/lastlayer/index.ts';
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import { PLL_NAMES } from '#shared/lastlayer/names-pll.ts';
import { readAlgorithm } from '#shared/lastlayer/reading.ts';
import { puzzleIn, turnedBy } from './support/puzzle.ts';
import { seeded } from './support/random.ts';

const TURNS = ['', 'U', 'U2', "U'"] as const;
const pll = caseSet('pll');
const firstLook = OLL_NAMES.map(([, , algorithm]) => algorithm);
const secondLook = new Map(PLL_NAMES.map(([name, algorithm]) => [pll.byName(name)!.key, [algorithm]]));

function stateOf(algorithm: string): number {
  const read = readAlgorithm(algorithm);
  if (read.kind !== 'state') throw new Error(`${algorithm} is ${read.kind}`);
  return read.state;
}

describe('routes in two looks', () => {
  it('solve the cube, turn for turn, from 200 random states, shortest first', () => {
    const random = seeded(21);
    const solved = [...Array(8).keys(), ...Array(12).keys()];
    for (let run = 0; run < 200; run++) {
      const state = Math.floor(random() * STATES);
      const routes = twoLookRoutes(state, firstLook, secondLook);
      expect(routes.length).toBeGreaterThan(0);
      expect(routes.map(({ moves }) => moves)).toEqual(
        routes.map(({ moves }) => moves).sort((a, b) => a - b),
      );
      for (const { first, second, after } of routes) {
        let pattern = puzzleIn(stateAt(state));
        // Each look begins with the cube held as before: trailing turns of the whole cube are taken back.
        if (first) pattern = turnedBy(pattern, `${TURNS[first.before]} ${first.algorithm}`.trim());
        if (second) pattern = turnedBy(pattern, `${TURNS[second.before]} ${second.algorithm}`.trim());
        if (after) pattern = turnedBy(pattern, TURNS[after]!);
        const { CORNERS, EDGES } = pattern.patternData;
        expect([...CORNERS!.pieces, ...EDGES!.pieces]).toEqual(solved);
        expect([...CORNERS!.orientation, ...EDGES!.orientation].every((value) => value === 0)).toBe(true);
      }
    }
  });

  it('take every right AUF for the first look: 4/m of them for its case', () => {
    const oll = caseSet('oll');
    const random = seeded(22);
    for (const one of oll.cases) {
      const state = oll.drawState(one, random);
      const aufs = twoLookRoutes(state, firstLook, secondLook).map(({ first }) => first?.before);
      expect(aufs.length, one.name).toBe(4 / one.angles);
      expect(new Set(aufs).size).toBe(4 / one.angles);
    }
  });

  it('leave out the look there is nothing for, and count turns of the top as moves', () => {
    const sune = "R U R' U R U2 R'";
    expect(twoLookRoutes(0, firstLook, secondLook)).toEqual([
      { first: null, leaves: pll.skip, second: null, after: 0, moves: 0 },
    ]);
    // Common practice: Sune is seven moves; with the turn of the top before it eight.
    const turned = act(stateOf(sune), 1, 0);
    expect(twoLookRoutes(turned, [sune], secondLook)[0]).toMatchObject({
      first: { before: 3, algorithm: sune },
      second: null,
      moves: 8,
    });
    const T = "R U R' U' R' F R2 U' R' U' R U R' F'";
    expect(twoLookRoutes(stateOf(T), firstLook, secondLook)).toEqual([
      { first: null, leaves: pll.byName('T'), second: { before: 0, algorithm: T }, after: 0, moves: 14 },
    ]);
    for (const auf of AUFS)
      expect(twoLookRoutes(act(0, auf, 0), [], new Map())[0]?.moves).toBe(auf === 0 ? 0 : 1);
  });

  it('end where the catalogue has no algorithm', () => {
    expect(twoLookRoutes(stateOf("R U R' U R U2 R'"), [], secondLook)).toEqual([]);
    expect(twoLookRoutes(stateOf('M2 U M2 U2 M2 U M2'), firstLook, new Map())).toEqual([]);
    expect(() => twoLookRoutes(STATES, firstLook, secondLook)).toThrow(RangeError);
  });

  it('choose the turns of the top that are fewest', () => {
    // Common practice: H looks the same from everywhere, so no turn is needed before it.
    const routes = twoLookRoutes(act(stateOf('M2 U M2 U2 M2 U M2'), 2, 2), firstLook, secondLook);
    expect(routes).toHaveLength(1);
    expect(routes[0]).toMatchObject({ second: { before: 0 }, after: 0 });
  });
});
