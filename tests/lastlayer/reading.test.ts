import { describe, expect, it } from 'vitest';
import { cubeAfter } from '#shared/lastlayer/cube.ts';
import { readAlgorithm, stateAt } from '#shared/lastlayer/index.ts';
import { parseMoves } from '#shared/lastlayer/notation.ts';
import { anyTurns, lastLayerAlgorithm } from './support/algorithms.ts';
import { piecesAfter, stateSolvedByPuzzle } from './support/puzzle.ts';
import { seeded } from './support/random.ts';

/** What is at each place, from where each piece went. */
function placesOf(cubies: readonly number[], ways: number) {
  const pieces: number[] = [];
  const orientation: number[] = [];
  cubies.forEach((cubie, piece) => {
    pieces[Math.floor(cubie / ways)] = piece;
    orientation[Math.floor(cubie / ways)] = cubie % ways;
  });
  return { pieces, orientation };
}

describe('the cube model', () => {
  it('agrees with the puzzle model on 500 random algorithms of every kind of turn', () => {
    const random = seeded(1);
    for (let run = 0; run < 500; run++) {
      const algorithm = anyTurns(random, 1 + Math.floor(random() * 30));
      const ours = cubeAfter(parseMoves(algorithm));
      const { corners, edges } = piecesAfter(algorithm);
      expect(placesOf(ours.corners, 3), algorithm).toEqual({
        pieces: corners.pieces,
        orientation: corners.orientation,
      });
      expect(placesOf(ours.edges, 2), algorithm).toEqual({
        pieces: edges.pieces,
        orientation: edges.orientation,
      });
    }
  });

  it.each([
    // Common practice: where the centres are after one turn, told as the faces at U L F R B D.
    ['x', 'F L D R U B'],
    ['y', 'U F R B L D'],
    ['z', 'L D F U B R'],
    ['M', 'B L U R D F'],
    ['r', 'F L D R U B'],
    ["x y' z2 R U", null],
  ])('carries the centres as the turn %s does', (algorithm, centres) => {
    const ours = cubeAfter(parseMoves(algorithm)).centres;
    if (centres) expect(ours.join(' ')).toBe(centres);
    expect(new Set(ours).size).toBe(6);
  });
});

describe('reading the case an algorithm solves', () => {
  it('agrees with the puzzle model on 1,000 last-layer algorithms with rotations, wides, slices and trailing rotations', () => {
    const random = seeded(2);
    const seen = new Set<number>();
    for (let run = 0; run < 1000; run++) {
      const algorithm = lastLayerAlgorithm(random);
      const read = readAlgorithm(algorithm);
      expect(read.kind, algorithm).toBe('state');
      if (read.kind !== 'state') continue;
      expect(read.state, algorithm).toBe(stateSolvedByPuzzle(algorithm));
      seen.add(read.state);
    }
    expect(seen.size).toBeGreaterThan(500);
  });

  it('agrees with the puzzle model on which random algorithms break the first two layers', () => {
    const random = seeded(3);
    for (let run = 0; run < 300; run++) {
      const algorithm = anyTurns(random, 1 + Math.floor(random() * 4));
      const read = readAlgorithm(algorithm);
      expect(read.kind === 'state' ? read.state : null, algorithm).toBe(stateSolvedByPuzzle(algorithm));
    }
  });

  it('reads a trailing rotation at the right angle, and one that is left out', () => {
    // The two traps of inverting before the centres are brought home.
    const fPll = "R' U' F' R U R' U' R' F R2 U' R' U' R U R' U R";
    expect(readAlgorithm(`${fPll} y`)).toMatchObject({ kind: 'state', state: stateOf(fPll) });
    const open = "x R' U R' D2 R U' R' D2 R2";
    expect(stateOf(open)).toBe(stateOf(`${open} x'`));
  });

  it('solves the state it reads: U is solved by a cube that was turned back', () => {
    // Derived: the state that U solves is U' of a solved cube, where place p holds piece p − 1.
    const read = readAlgorithm('U');
    expect(read.kind === 'state' && stateAt(read.state)).toEqual({
      cp: [3, 0, 1, 2],
      co: [0, 0, 0, 0],
      ep: [3, 0, 1, 2],
      eo: [0, 0, 0, 0],
    });
  });

  it('names the pieces that a broken algorithm leaves displaced', () => {
    const read = readAlgorithm('R');
    expect(read).toMatchObject({ kind: 'first-two-layers-broken', pieces: ['DFR', 'DBR', 'DR', 'FR', 'BR'] });
  });

  it('never throws on hostile text', () => {
    for (const text of [
      '(',
      ')'.repeat(1000),
      '💥',
      '\0',
      'R'.repeat(501),
      '['.repeat(10_000),
      '\u2028R',
      '٣',
    ])
      expect(readAlgorithm(text).kind).toMatch(/^(?:not-a-move|first-two-layers-broken)$/u);
  });
});

function stateOf(algorithm: string): number {
  const read = readAlgorithm(algorithm);
  if (read.kind !== 'state') throw new Error(`${algorithm} is ${read.kind}`);
  return read.state;
}
