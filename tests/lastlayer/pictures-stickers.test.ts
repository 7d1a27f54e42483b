import { cube3x3x3 } from 'cubing/puzzles';
import { describe, expect, it } from 'vitest';
import { maskStickers, stickersOf } from '#shared/lastlayer/pictures/index.ts';
import { type LastLayerState, stateIndex } from '#shared/lastlayer/state.ts';
import { FaceletCube } from '#tests/support/facelet-cube.ts';

/** Last-layer algorithms whose products, with turns of the top, reach every kind of state (common practice). */
const PARTS = [
  "R U R' U R U2 R'",
  "F R U R' U' F'",
  "R U R' U' R' F R2 U' R' U' R U R' F'",
  "F U R U' R' F'",
  'U',
  'U2',
];

/** A small generator with a fixed seed, so that a failure can be repeated (mulberry32). */
function random(seed: number): () => number {
  let a = seed;
  return () => {
    a = (a + 0x6d2b79f5) | 0;
    let t = Math.imul(a ^ (a >>> 15), 1 | a);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

describe('stickers of a state', () => {
  it('agree with stickers turned in space, for 200 random states of the cubing puzzle model', async () => {
    const solved = (await cube3x3x3.kpuzzle()).defaultPattern();
    const next = random(16);
    const seen = new Set<number>();
    for (let k = 0; k < 200; k++) {
      const algorithm = Array.from(
        { length: 2 + Math.floor(next() * 8) },
        () => PARTS[Math.floor(next() * PARTS.length)],
      ).join(' ');
      const { CORNERS, EDGES } = solved.applyAlg(algorithm).patternData;
      const state: LastLayerState = {
        cp: CORNERS!.pieces.slice(0, 4),
        co: CORNERS!.orientation.slice(0, 4),
        ep: EDGES!.pieces.slice(0, 4),
        eo: EDGES!.orientation.slice(0, 4),
      };
      const turned = new FaceletCube().apply(algorithm).lastLayer();
      expect(stickersOf(state), algorithm).toEqual(turned);
      expect(stickersOf(stateIndex(state)), algorithm).toEqual(turned);
      seen.add(stateIndex(state));
    }
    expect(seen.size).toBeGreaterThan(150);
  });

  it('shows every face whole on a solved cube', () => {
    expect(stickersOf(0)).toEqual({ top: 'UUUUUUUUU', front: 'FFF', right: 'RRR', back: 'BBB', left: 'LLL' });
  });

  it('refuses what is not a state', () => {
    expect(() => stickersOf(62_208)).toThrow(RangeError);
    expect(() => stickersOf(-1)).toThrow(RangeError);
  });
});

describe('stickers a set does not tell apart', () => {
  // Corners UFR and UBR twisted, edges UF and UR flipped, and pieces moved: the state after this algorithm.
  const shown = new FaceletCube().apply("F R U R' U' F'").lastLayer();

  it('keeps all of them when everything is told apart', () => {
    expect(maskStickers(stickersOf(0), ['co', 'eo', 'cp', 'ep'])).toEqual(stickersOf(0));
  });

  it('leaves the top colour alone, wherever it sits, when only orientation is', () => {
    const masked = maskStickers(shown as ReturnType<typeof stickersOf>, ['co', 'eo']);
    for (const side of ['top', 'front', 'right', 'back', 'left'] as const) {
      expect(masked[side]).toBe(shown[side].replace(/[^U]/g, '?'));
    }
    expect(Object.values(masked).join('').match(/U/g)).toHaveLength(9);
  });

  it('leaves edges hatched when only corners are told apart, and the centre in place', () => {
    const masked = maskStickers(stickersOf(0), ['co', 'cp']);
    expect(masked).toEqual({ top: 'U?U?U?U?U', front: 'F?F', right: 'R?R', back: 'B?B', left: 'L?L' });
  });

  it('shows which piece it is, and hatches its top, when its orientation is not told apart', () => {
    // One corner turned clockwise where it stands: its stickers move on, the piece stays the same.
    const twisted = stickersOf({ cp: [0, 1, 2, 3], co: [1, 2, 0, 0], ep: [0, 1, 2, 3], eo: [1, 1, 0, 0] });
    const masked = maskStickers(twisted, ['cp', 'ep']);
    expect(masked).toEqual(maskStickers(stickersOf(0), ['cp', 'ep']));
    expect(masked).toEqual({ top: '????U????', front: 'FFF', right: 'RRR', back: 'BBB', left: 'LLL' });
  });
});
