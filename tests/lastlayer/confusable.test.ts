import { describe, expect, it } from 'vitest';
import { AUFS, act, CASE_SETS, caseSet, confusableWith, seenThrough } from '#shared/lastlayer/index.ts';
import { maskStickers, stickersOf } from '#shared/lastlayer/pictures/index.ts';
import { pick, seeded } from './support/random.ts';

/** Visible stickers in which two states differ through these aspects, counted on the pictures' own strings. */
function visiblyApart(set: ReturnType<typeof caseSet>, one: number, other: number, side: 'right' | 'left') {
  const seen = seenThrough(set.definition.entry, set.definition.toldApart);
  const [a, b] = [maskStickers(stickersOf(one), seen), maskStickers(stickersOf(other), seen)];
  return (['top', 'front', side] as const).reduce(
    (sum, face) => sum + Array.from(a[face]).filter((letter, at) => letter !== b[face][at]).length,
    0,
  );
}

const pll = caseSet('pll');
const named = (set: ReturnType<typeof caseSet>, name: string) =>
  confusableWith(set, set.byName(name)!).map((found) => found.case.name);

describe('what a case is confused with', () => {
  it.each(CASE_SETS.map(({ key }) => key))('%s: views of the two cases, really that far apart', (key) => {
    const set = caseSet(key);
    const random = seeded(31);
    for (let run = 0; run < 4; run++) {
      const one = pick(random, set.cases);
      const found = confusableWith(set, one);
      expect(found).toHaveLength(Math.min(6, set.cases.length));
      for (const near of found) {
        expect(set.caseOfState(near.shown)).toBe(one);
        expect(set.caseOfState(near.other)).toBe(near.case);
        expect(visiblyApart(set, near.shown, near.other, near.holding)).toBe(near.distance);
        expect(near.mirror).toBe(set.mirrorOf(one) === near.case);
      }
      expect(found.map(({ distance }) => distance)).toEqual(
        found.map(({ distance }) => distance).sort((a, b) => a - b),
      );
    }
  });

  it('is the least over every pair of full views: PLL tried out in full', () => {
    const random = seeded(32);
    for (let run = 0; run < 6; run++) {
      const one = pick(random, pll.cases);
      const far = confusableWith(pll, one, { count: 100 });
      expect(far).toHaveLength(21); // derived: 21 cases and the skip, without the case itself
      for (const { case: other, distance } of far) {
        let least = 15;
        for (const shown of Array.from(pll.statesOf(one)))
          for (const before of AUFS)
            for (const after of AUFS)
              for (const side of ['right', 'left'] as const)
                least = Math.min(least, visiblyApart(pll, shown, act(other.canonical, before, after), side));
        expect(distance).toBe(least);
      }
    }
  }, 60_000);

  it('agrees both ways round, and in the mirror', () => {
    const distanceTo = (set: ReturnType<typeof caseSet>, one: string, other: string) =>
      confusableWith(set, set.byName(one)!, { count: 100 }).find((found) => found.case.name === other)!
        .distance;
    const random = seeded(33);
    for (const set of [pll, caseSet('oll'), caseSet('coll')])
      for (let run = 0; run < 20; run++) {
        const [one, other] = [pick(random, set.cases), pick(random, set.cases)];
        if (one === other) continue;
        const there = distanceTo(set, one.name, other.name);
        expect(distanceTo(set, other.name, one.name)).toBe(there);
        expect(distanceTo(set, set.mirrorOf(one).name, set.mirrorOf(other).name)).toBe(there);
      }
  });

  it('knows what members mix up', () => {
    // Common practice: these are told apart last from two sides.
    expect(named(pll, 'Ra').slice(0, 4)).toContain('T');
    expect(named(pll, 'Ga')).toContain('Gc');
  });

  it('looks at the holdings asked for only', () => {
    const held = confusableWith(pll, pll.byName('V')!, { holdings: ['left'], count: 30 });
    expect(held.every(({ holding }) => holding === 'left')).toBe(true);
  });

  it('works in a set of thousands and refuses a case of another set', () => {
    const whole = caseSet('1lll');
    expect(confusableWith(whole, whole.cases[1234]!)[0]!.distance).toBeLessThan(6);
    expect(() => confusableWith(pll, caseSet('oll').cases[0]!)).toThrow(/PLL has no case/u);
  });
});
