import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  AUFS,
  act,
  canonical,
  inverse,
  mirror,
  product,
  STATES,
  stateAt,
  stateIndex,
} from '#shared/lastlayer/index.ts';

const anyState = fc.integer({ min: 0, max: STATES - 1 });
const anyAuf = fc.constantFrom(...AUFS);

describe('the index of states', () => {
  it('numbers all 62,208 states without gap or repeat, the solved one 0', () => {
    // 4!·3⁴·4!·2⁴ / 12, common practice.
    expect(STATES).toBe((24 * 81 * 24 * 16) / 12);
    const astray: number[] = [];
    for (let index = 0; index < STATES; index++) if (stateIndex(stateAt(index)) !== index) astray.push(index);
    expect(astray).toEqual([]);
    const none = [0, 0, 0, 0];
    expect(stateIndex({ cp: [0, 1, 2, 3], co: none, ep: [0, 1, 2, 3], eo: none })).toBe(0);
  });

  it.each([
    [{ cp: [0, 1, 2, 2] }, 'exactly one place'],
    [{ ep: [0, 1, 2] }, 'exactly one place'],
    [{ co: [1, 0, 0, 0] }, 'multiple of 3'],
    [{ co: [3, 0, 0, 0] }, 'multiple of 3'],
    [{ eo: [1, 0, 0, 0] }, 'even number'],
    [{ cp: [1, 0, 2, 3] }, 'oddly permuted'],
  ])('refuses what no cube can be: %j', (wrong, why) => {
    const none = [0, 0, 0, 0];
    const state = { cp: [0, 1, 2, 3], co: none, ep: [0, 1, 2, 3], eo: none, ...wrong };
    expect(() => stateIndex(state)).toThrow(why);
  });

  it.each([-1, STATES, 1.5, Number.NaN])('has no state %s', (index) => {
    expect(() => stateAt(index)).toThrow(RangeError);
    expect(() => act(index, 0, 0)).toThrow(RangeError);
  });
});

describe('the sixteen-fold action', () => {
  it('fixes as many states as the lemma needs, and has 3,916 orbits', () => {
    // Published in the subject's literature as 3,916 (common practice); the fixed states are derived.
    const fixed = new Map<string, number>();
    for (const before of AUFS)
      for (const after of AUFS) {
        let states = 0;
        for (let index = 0; index < STATES; index++) if (act(index, before, after) === index) states++;
        fixed.set(`${before}${after}`, states);
      }
    expect([...fixed.values()].reduce((sum, value) => sum + value, 0) / 16).toBe(3916);
    expect(Object.fromEntries([...fixed].filter(([, value]) => value > 0))).toEqual({
      '00': 62_208,
      '11': 16,
      '13': 16,
      '22': 384,
      '31': 16,
      '33': 16,
    });
    const sizes = new Map<number, number>();
    for (let index = 0; index < STATES; index++) {
      if (canonical(index) !== index) continue;
      const orbit = new Set(AUFS.flatMap((before) => AUFS.map((after) => act(index, before, after))));
      sizes.set(orbit.size, (sizes.get(orbit.size) ?? 0) + 1);
    }
    expect([...sizes].sort((a, b) => a[0] - b[0])).toEqual([
      [4, 8],
      [8, 44],
      [16, 3864],
    ]);
  });

  it('leaves 15,552 states when the AUF after is left out', () => {
    const least = new Set<number>();
    for (let index = 0; index < STATES; index++)
      least.add(Math.min(...AUFS.map((after) => act(index, 0, after))));
    expect(least.size).toBe(15_552);
  });

  it('has 1,212 orbits up to mirror and inverse', () => {
    // Common practice: 1,211 cases and the solved one.
    const found = new Set<number>();
    for (let index = 0; index < STATES; index++) {
      if (canonical(index) !== index) continue;
      const alike = [index, inverse(index), mirror(index), mirror(inverse(index))];
      found.add(Math.min(...alike.map(canonical)));
    }
    expect(found.size).toBe(1212);
  });

  it('is an action: turns add up, and both kinds commute', () => {
    fc.assert(
      fc.property(anyState, anyAuf, anyAuf, anyAuf, anyAuf, (index, i, j, k, l) => {
        const sum = (a: number, b: number) => AUFS[(a + b) & 3]!;
        expect(act(act(index, i, j), k, l)).toBe(act(index, sum(i, k), sum(j, l)));
        expect(act(0, k, k)).toBe(0);
      }),
    );
  });

  it('has one canonical form for all sixteen images', () => {
    fc.assert(
      fc.property(anyState, anyAuf, anyAuf, (index, i, j) => {
        expect(canonical(act(index, i, j))).toBe(canonical(index));
      }),
    );
  });
});

describe('products, inverses and mirrors', () => {
  it('form a group with the solved state as its unit', () => {
    fc.assert(
      fc.property(anyState, anyState, anyState, (a, b, c) => {
        expect(product(product(a, b), c)).toBe(product(a, product(b, c)));
        expect(product(a, inverse(a))).toBe(0);
        expect(product(inverse(a), a)).toBe(0);
        expect(product(0, a)).toBe(a);
      }),
    );
  });

  it('mirror twice gives the state again, and mirrors turn the other way round', () => {
    fc.assert(
      fc.property(anyState, anyState, anyAuf, anyAuf, (a, b, i, j) => {
        expect(mirror(mirror(a))).toBe(a);
        expect(mirror(product(a, b))).toBe(product(mirror(a), mirror(b)));
        const back = (auf: number) => AUFS[-auf & 3]!;
        expect(mirror(act(a, i, j))).toBe(act(mirror(a), back(i), back(j)));
      }),
    );
  });
});
