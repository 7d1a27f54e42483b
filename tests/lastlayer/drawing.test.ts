import { describe, expect, it } from 'vitest';
import {
  AUFS,
  act,
  CASE_SETS,
  type Cell,
  caseSet,
  casesDrawn,
  colouringOf,
  type Drawing,
  drawingProblems,
  EMPTY_DRAWING,
  painted,
  readDrawing,
  STATES,
  topColour,
  writeDrawing,
} from '#shared/lastlayer/index.ts';
import {
  COLOUR_NAMES,
  type Colouring,
  type Face,
  maskStickers,
  paint,
  type Stickers,
  stickersOf,
} from '#shared/lastlayer/pictures/index.ts';
import { pick, seeded } from './support/random.ts';

const SIDES = ['top', 'front', 'right', 'back', 'left'] as const;
function drawn(stickers: Stickers, colouring: Colouring): Drawing {
  const cells = (letters: string) =>
    Array.from(letters, (letter): Cell => (letter === '?' ? null : paint(letter as Face, colouring)));
  const { top, front, right, back, left } = stickers;
  return {
    top: cells(top),
    front: cells(front),
    right: cells(right),
    back: cells(back),
    left: cells(left),
  };
}

/** Some cells forgotten, some said to be any colour but the top's. */
function blurred(drawing: Drawing, random: () => number): Drawing {
  const top = topColour(drawing);
  let left = drawing;
  for (const side of SIDES)
    drawing[side].forEach((cell, index) => {
      if (side === 'top' && index === 4) return;
      const chance = random();
      if (chance < 0.4) left = painted(left, side, index, null);
      else if (chance < 0.6 && cell !== top) left = painted(left, side, index, 'other');
    });
  return left;
}

const looksLike = (drawing: Drawing, other: Drawing): boolean => {
  const top = topColour(drawing);
  return SIDES.every((side) =>
    drawing[side].every((cell, index) => {
      const colour = other[side][index]!;
      return cell === null || cell === colour || (cell === 'other' && colour !== top);
    }),
  );
};

describe('finding cases by a drawing', () => {
  it.each(CASE_SETS.map(({ key }) => key))('%s: a full drawing finds its case and no other', (key) => {
    const set = caseSet(key);
    const random = seeded(71);
    for (let run = 0; run < 10; run++) {
      const one = pick(random, [set.skip, ...set.cases]);
      const state = set.drawState(one, random);
      const colouring = Math.floor(random() * 24);
      const found = casesDrawn(set, drawn(stickersOf(state), colouring));
      // Derived: the four AUFs after give the same stickers with another centre in front.
      expect(found).toEqual([{ case: one, states: 4, example: found[0]!.example }]);
      expect(AUFS.map((auf) => act(state, 0, auf))).toContain(found[0]!.example);
    }
  });

  it('counts the states that fit, as trying each of them in each colouring does', () => {
    const random = seeded(72);
    const set = caseSet('pll');
    for (let run = 0; run < 8; run++) {
      const whole = drawn(stickersOf(set.drawState(pick(random, set.cases), random)), run % 24);
      const drawing = blurred(whole, random);
      const counts = new Map<string, number>();
      for (const one of [set.skip, ...set.cases])
        for (const state of Array.from(set.statesOf(one)))
          if (
            Array.from({ length: 24 }, (_, colouring) => colouring).some(
              (colouring) =>
                paint('U', colouring) === topColour(drawing) &&
                looksLike(drawing, drawn(stickersOf(state), colouring)),
            )
          )
            counts.set(one.name, (counts.get(one.name) ?? 0) + 1);
      const found = casesDrawn(set, drawing);
      expect(Object.fromEntries(found.map(({ case: of, states }) => [of.name, states]))).toEqual(
        Object.fromEntries(counts),
      );
    }
  });

  it('shows an example that looks like the drawing, of the case', () => {
    const random = seeded(73);
    for (const set of ['oll', 'coll', '1lll'].map(caseSet))
      for (let run = 0; run < 10; run++) {
        const whole = drawn(stickersOf(set.drawState(pick(random, set.cases), random)), run);
        const drawing = blurred(whole, random);
        for (const { case: of, example } of casesDrawn(set, drawing).slice(0, 40)) {
          expect(set.caseOfState(example)).toBe(of);
          expect(looksLike(drawing, drawn(stickersOf(example), colouringOf(drawing)))).toBe(true);
        }
      }
  });

  it('finds an OLL by where the top colour is, of any colour', () => {
    const set = caseSet('oll');
    for (const one of set.cases) {
      const seen = maskStickers(stickersOf(one.canonical), ['co', 'eo']);
      const drawing = drawn(seen, 13);
      expect(casesDrawn(set, drawing).map(({ case: of }) => of)).toEqual([one]);
    }
  });

  it('of nothing fits every state of every case', () => {
    for (const { key } of CASE_SETS) {
      const set = caseSet(key);
      const found = casesDrawn(set, EMPTY_DRAWING);
      expect(found).toHaveLength(set.cases.length + 1);
      expect(found.every(({ case: of, states }) => of.weight === states)).toBe(true);
    }
    expect(topColour(EMPTY_DRAWING)).toBe('yellow');
  });

  it('can be written into an address and read again', () => {
    const random = seeded(74);
    for (let run = 0; run < 50; run++) {
      const state = Math.floor(random() * STATES);
      const drawing = blurred(drawn(stickersOf(state), Math.floor(random() * 24)), random);
      expect(writeDrawing(drawing)).toMatch(/^[wygborx-]{21}$/u);
      expect(readDrawing(writeDrawing(drawing))).toEqual(drawing);
    }
    for (const wrong of ['', 'y', '?'.repeat(21), 'y'.repeat(22)]) expect(readDrawing(wrong)).toBeNull();
  });
});

describe('a drawing of no cube', () => {
  const solved = drawn(stickersOf(0), colouringOf(EMPTY_DRAWING));
  const problems = (changes: readonly (readonly [(typeof SIDES)[number], number, Cell])[], from = solved) =>
    drawingProblems(changes.reduce((left, [side, index, cell]) => painted(left, side, index, cell), from));

  it('is never said of a real one, however much of it is known', () => {
    const random = seeded(75);
    for (let run = 0; run < 300; run++) {
      const whole = drawn(stickersOf(Math.floor(random() * STATES)), Math.floor(random() * 24));
      expect(drawingProblems(whole)).toEqual([]);
      expect(drawingProblems(blurred(whole, random))).toEqual([]);
    }
    expect(drawingProblems(EMPTY_DRAWING)).toEqual([]);
  });

  it('is said exactly where nothing fits', () => {
    const random = seeded(76);
    const whole = caseSet('1lll');
    for (let run = 0; run < 300; run++) {
      let drawing = blurred(drawn(stickersOf(Math.floor(random() * STATES)), run % 24), random);
      for (let change = 0; change < 2; change++)
        drawing = painted(
          drawing,
          pick(random, SIDES.slice(1)),
          Math.floor(random() * 3),
          pick(random, COLOUR_NAMES),
        );
      expect(drawingProblems(drawing).length > 0, writeDrawing(drawing)).toBe(
        casesDrawn(whole, drawing).length === 0,
      );
    }
  });

  it('names the piece and what is wrong with it', () => {
    expect(problems([['front', 1, 'yellow']])).toContainEqual(
      expect.objectContaining({ kind: 'same-twice', piece: 'UF' }),
    );
    expect(problems([['front', 1, 'white']])).toContainEqual(
      expect.objectContaining({ kind: 'bottom-colour', piece: 'UF' }),
    );
    expect(
      problems([
        ['front', 2, 'blue'],
        ['right', 0, 'green'],
      ]),
    ).toContainEqual(expect.objectContaining({ kind: 'opposite', piece: 'UFR' }));
    expect(problems([['top', 7, 'other']])).toContainEqual(
      expect.objectContaining({ kind: 'no-top-colour', piece: 'UF' }),
    );
    // Derived: two colours of a corner changed for each other make its mirror image.
    expect(
      problems([
        ['front', 2, 'orange'],
        ['right', 0, 'green'],
      ]),
    ).toContainEqual(expect.objectContaining({ kind: 'wrong-way-round', piece: 'UFR' }));
    expect(problems([['front', 1, 'red']])).toEqual([
      { kind: 'too-many', colour: 'red', count: 4, most: 3 }, // derived: three stickers of a side's colour
    ]);
    expect(
      problems([
        ['front', 0, null],
        ['front', 1, 'red'],
      ]),
    ).toContainEqual(expect.objectContaining({ kind: 'too-many' }));
    expect(
      problems([
        ['left', 0, null],
        ['front', 1, 'red'],
      ]),
    ).toEqual([{ kind: 'piece-twice', pieces: ['UF', 'UL'] }]);
  });

  it('tells a corner twisted, an edge flipped, two pieces swapped', () => {
    // Common practice: what a cube shows that was taken apart and put together wrongly.
    expect(
      problems([
        ['top', 8, 'green'],
        ['right', 0, 'yellow'],
        ['front', 2, 'orange'],
      ]),
    ).toEqual([{ kind: 'corner-twisted' }]);
    expect(
      problems([
        ['top', 7, 'green'],
        ['front', 1, 'yellow'],
      ]),
    ).toEqual([{ kind: 'edge-flipped' }]);
    expect(
      problems([
        ['front', 1, 'orange'],
        ['right', 1, 'green'],
      ]),
    ).toEqual([{ kind: 'two-swapped' }]);
  });
});
