import { describe, expect, it } from 'vitest';
import {
  ASPECTS,
  act,
  caseSet,
  confusableWith,
  type Difference,
  differsAt,
  lostBy,
  nearestView,
  STATES,
  seenThrough,
} from '#shared/lastlayer/index.ts';
import { stickersOf } from '#shared/lastlayer/pictures/stickers.ts';
import { findingsText } from '#shared/text/findings.ts';
import { pick, seeded } from './support/random.ts';

const pll = caseSet('pll');
const oll = caseSet('oll');

describe('what a showing was lost by', () => {
  it.each([
    // Derived from what each case permutes or turns: common practice.
    ['pll', 'Ja', 'Jb', 'mirror'],
    ['pll', 'Ga', 'Gc', 'mirror'],
    ['pll', 'Ua', 'Ub', 'mirror'],
    ['pll', 'T', 'Ra', 'edge permutation'],
    ['pll', 'H', 'Z', 'edge permutation'],
    ['pll', 'Y', 'V', 'edge permutation'],
    ['pll', 'T', 'Y', 'corner permutation'],
    ['pll', 'Ua', 'skip', 'edge permutation'],
    ['oll', '26', '27', 'mirror'],
    ['oll', '21', '22', 'corner orientation'],
    ['oll', '28', '57', 'edge orientation'],
    ['oll', '20', 'skip', 'edge orientation'],
    ['ocll', 'T', 'U', 'corner orientation'],
    ['eoll', 'L', 'line', 'edge orientation'],
    ['cpll', 'adjacent', 'diagonal', 'corner permutation'],
  ])('%s: %s named %s is lost by %s', (key, shown, named, by) => {
    const set = caseSet(key);
    const one = set.byName(shown)!;
    const random = seeded(7);
    for (let draw = 0; draw < 8; draw++)
      expect(lostBy(set, set.drawState(one, random), set.byName(named)!)).toBe(by);
  });

  it('is nothing where the case was named rightly', () => {
    const one = pll.byName('T')!;
    expect(lostBy(pll, one.canonical, one)).toBeNull();
  });

  it('is something for any two cases of a set, the same from every angle', () => {
    const random = seeded(8);
    for (const set of ['pll', 'oll', 'coll', 'ell', 'eoll'].map(caseSet))
      for (const one of set.cases)
        for (let run = 0; run < 6; run++) {
          const other = pick(random, [set.skip, ...set.cases]);
          if (one === other) continue;
          const shown = set.drawState(one, random);
          const by = lostBy(set, shown, other);
          expect(by).not.toBeNull();
          expect(lostBy(set, act(shown, 1, 2), other)).toBe(by);
        }
  });
});

/** Visible stickers in which two states differ, counted on the pictures' own strings. */
function visiblyApart(one: number, other: number, holding: 'right' | 'left'): number {
  const [a, b] = [stickersOf(one), stickersOf(other)];
  return (['top', 'front', holding] as const).reduce(
    (sum, side) => sum + Array.from(a[side]).filter((letter, at) => letter !== b[side][at]).length,
    0,
  );
}

describe('the nearest view of another case', () => {
  it.each(['right', 'left'] as const)('is a state of that case that no other beats, held %s', (holding) => {
    const random = seeded(9);
    for (const set of [pll, oll, caseSet('coll')])
      for (let run = 0; run < 12; run++) {
        const shown = set.drawState(pick(random, set.cases), random);
        const named = pick(random, [...set.cases, set.skip]);
        const near = nearestView(set, shown, named, holding);
        expect(set.caseOfState(near)).toBe(named);
        const least = Math.min(
          ...Array.from(set.statesOf(named), (state) => visiblyApart(shown, state, holding)),
        );
        expect(visiblyApart(shown, near, holding)).toBe(least);
      }
  });

  it('of the case itself is the very state', () => {
    const one = oll.byName('33')!;
    const shown = oll.drawState(one, seeded(10));
    expect(nearestView(oll, shown, one)).toBe(shown);
  });
});

describe('where two pictures differ', () => {
  const say = (at: Difference | null, shown: string, other: string) =>
    at ? findingsText.differs(at, shown, other) : findingsText.differsOutOfView;

  it('is nowhere for the same state, and somewhere in view for any two PLL or OLL views', () => {
    expect(differsAt(5, 5)).toBeNull();
    const random = seeded(11);
    for (const set of [pll, oll]) {
      const seen = seenThrough(set.definition.entry, set.definition.toldApart);
      for (const one of set.cases)
        for (let run = 0; run < 8; run++) {
          const other = pick(random, [set.skip, ...set.cases]);
          if (one === other) continue;
          const shown = set.drawState(one, random);
          const at = differsAt(shown, nearestView(set, shown, other), 'right', seen);
          expect(at, `${one.name} ${other.name}`).not.toBeNull();
          expect(say(at, one.name, other.name)).toMatch(/^(?:top|front face|right face): /u);
        }
    }
  });

  it('tells a run from a run on the side that is turned to the holder', () => {
    const t = pll.byName('T')!;
    const f = pll.byName('F')!;
    for (const holding of ['right', 'left'] as const) {
      const at = differsAt(t.canonical, nearestView(pll, t.canonical, f, holding), holding)!;
      expect(['front', holding]).toContain(at.face);
    }
  });

  it.each([
    [
      { face: 'right', kind: 'run', shown: 'ends-alike', other: 'different' },
      'right face: T ends in two alike, Ra has three different',
    ],
    [
      { face: 'front', kind: 'top-colour', shown: [0, 2], other: [] },
      'front face: T has the top colour at left and at right, Ra has no top colour',
    ],
    [{ face: 'top', kind: 'up', shown: [1, 3], other: [] }, 'top: back and left face up in T, not in Ra'],
    [{ face: 'top', kind: 'places', places: [2] }, 'top: back right is of another colour'],
    [{ face: 'top', kind: 'places', places: [0, 7] }, 'top: back left and front are of another colour'],
    [{ face: 'top', kind: 'up', shown: [], other: [8] }, 'top: front right faces up in Ra, not in T'],
    [
      { face: 'left', kind: 'relation', run: 'outer-alike', shown: 'opposite', other: 'neighbour' },
      'left face: T has the odd one opposite in colour, Ra has the odd one of a neighbouring colour',
    ],
    [{ face: 'front', kind: 'colours' }, 'front face: the same pattern in other colours'],
  ] satisfies [Difference, string][])('is said in a sentence: %j', (at, sentence) => {
    expect(say(at, 'T', 'Ra')).toBe(sentence);
  });

  it('is somewhere in view wherever the views of two cases of the whole last layer differ in view', () => {
    const random = seeded(13);
    const full = caseSet('1lll');
    for (let run = 0; run < 40; run++) {
      const [one, other] = [pick(random, full.cases), pick(random, full.cases)];
      for (const near of confusableWith(full, one, { count: 2 })) {
        expect(
          differsAt(near.shown, near.other, near.holding),
          `${one.name} ${near.case.name}`,
        ).not.toBeNull();
      }
      const shown = full.drawState(one, random);
      const view = nearestView(full, shown, other);
      expect(differsAt(shown, view) === null).toBe(visiblyApart(shown, view, 'right') === 0);
    }
  });

  it('is true to the stickers for random states', () => {
    const random = seeded(12);
    for (let run = 0; run < 300; run++) {
      const [one, other] = [Math.floor(random() * STATES), Math.floor(random() * STATES)];
      const at = differsAt(one, other, 'right', ASPECTS);
      expect(at === null).toBe(visiblyApart(one, other, 'right') === 0);
      if (at && at.face !== 'top') expect(stickersOf(one)[at.face]).not.toBe(stickersOf(other)[at.face]);
    }
  });
});
