import { describe, expect, it } from 'vitest';
import { deltaE2000, type Lab } from '#shared/lastlayer/pictures/colour-difference.ts';
import {
  COLOURING_COUNT,
  colouringsFor,
  colouringWith,
  oppositeColour,
  ownPalette,
  PALETTES,
  paint,
  pale,
} from '#shared/lastlayer/pictures/index.ts';
import { contrast, letterShade } from '#shared/lastlayer/pictures/palettes.ts';
import { shadesApart, tooNear } from '#shared/lastlayer/pictures/shade-warnings.ts';

describe('ways of holding a cube', () => {
  it('has 24, all different, each with six colours and opposite faces opposite', () => {
    expect(COLOURING_COUNT).toBe(24); // common practice: a cube has 24 rotations
    const all = new Set<string>();
    for (let colouring = 0; colouring < COLOURING_COUNT; colouring++) {
      const [u, d, f, b, l, r] = (['U', 'D', 'F', 'B', 'L', 'R'] as const).map((face) =>
        paint(face, colouring),
      );
      expect(new Set([u, d, f, b, l, r]).size).toBe(6);
      expect([d, b, l]).toEqual([oppositeColour(u!), oppositeColour(f!), oppositeColour(r!)]);
      all.add(`${u} ${f} ${r}`);
    }
    expect(all.size).toBe(24);
  });

  it.each([
    // top, front, right of the usual scheme (common practice)
    ['white', 'green', 'red'],
    ['white', 'red', 'blue'],
    ['yellow', 'green', 'orange'],
    ['yellow', 'blue', 'red'],
    ['green', 'white', 'orange'],
    ['red', 'white', 'green'],
    ['blue', 'orange', 'white'],
  ] as const)('has with %s on top and %s in front %s on the right', (top, front, right) => {
    expect(paint('R', colouringWith(top, front))).toBe(right);
  });

  it('puts the cross colour at the bottom', () => {
    expect(colouringsFor('white').map((colouring) => paint('U', colouring))).toEqual(Array(4).fill('yellow'));
    expect(new Set(colouringsFor('white').map((colouring) => paint('F', colouring))).size).toBe(4);
    const dual = colouringsFor('orange+red');
    expect(dual).toHaveLength(8);
    expect(new Set(dual.map((colouring) => paint('D', colouring)))).toEqual(new Set(['orange', 'red']));
    expect(colouringsFor('all')).toHaveLength(24);
  });

  it('refuses colours that never meet and colourings that do not exist', () => {
    expect(() => colouringWith('white', 'yellow')).toThrow(RangeError);
    expect(() => paint('U', 24)).toThrow(RangeError);
  });
});

describe('palettes', () => {
  it('measures colour differences as published', () => {
    // Six pairs of the test data of Sharma, Wu and Dalal (2005), table 1 (from memory).
    const pairs: [Lab, Lab, number][] = [
      [[50, 2.6772, -79.7751], [50, 0, -82.7485], 2.0425],
      [[50, -1.3802, -84.2814], [50, 0, -82.7485], 1.0],
      [[50, 2.5, 0], [50, 0, -2.5], 4.3065],
      [[50, 2.5, 0], [73, 25, -18], 27.1492],
      [[50, 2.5, 0], [50, 1.8634, 0.5757], 1.0],
      [[60.2574, -34.0099, 36.2677], [60.4626, -34.1751, 39.4387], 1.2644],
    ];
    for (const [a, b, expected] of pairs) expect(deltaE2000(a, b)).toBeCloseTo(expected, 4);
  });

  it('keeps every pair of the safe one at least 20 apart, in normal and deficient vision', () => {
    const pairs = shadesApart(PALETTES.safe.colours);
    expect(pairs).toHaveLength(60); // derived: 15 pairs of six, in four kinds of vision
    expect(Math.min(...pairs.map(({ difference }) => difference))).toBeGreaterThanOrEqual(20);
    expect(tooNear(PALETTES.safe.colours)).toEqual([]);
  });

  it('warns of own shades that come too near each other, each pair once and in its worst vision', () => {
    const own = { ...PALETTES.safe.colours, red: '#CD6421' };
    const [first, ...rest] = tooNear(own);
    expect(first).toMatchObject({ one: 'orange', other: 'red' });
    expect(first!.difference).toBeLessThan(1);
    expect(new Set(rest.map(({ one, other }) => `${one} ${other}`)).size).toBe(rest.length);
    // The usual saturated shades: red and green are near for those without long-wave cones (common practice).
    expect(tooNear({ ...own, red: '#C8313A', green: '#2E8B57' })).toContainEqual(
      expect.objectContaining({ one: 'green', other: 'red' }),
    );
    expect(() => tooNear({ ...own, blue: 'navy' })).toThrow(/blue must look like #RRGGBB/);
  });

  it('can lay a readable letter on every shade', () => {
    for (const { colours } of Object.values(PALETTES)) {
      for (const shade of Object.values(colours)) {
        expect(contrast(shade, letterShade(shade))).toBeGreaterThanOrEqual(4.5); // WCAG 2.2, 1.4.3
        expect(contrast(pale(shade), letterShade(pale(shade)))).toBeGreaterThanOrEqual(4.5);
      }
    }
  });

  it('pales and never darkens', () => {
    for (const shade of Object.values(PALETTES.standard.colours)) {
      expect(contrast(pale(shade), '#000000')).toBeGreaterThanOrEqual(contrast(shade, '#000000'));
    }
    expect(pale('#2E8B57')).toBe('#8CBFA3'); // derived: 0.55 of each channel + 0.45 of 255
  });

  it('takes own shades only as six-digit hex', () => {
    const own = { ...PALETTES.standard.colours, red: '#ff0000' };
    expect(ownPalette(own).colours.red).toBe('#ff0000');
    expect(() => ownPalette({ ...own, blue: 'blue' })).toThrow(/blue must look like #RRGGBB/);
    expect(() => ownPalette({ ...own, blue: '#00f"/><script>' })).toThrow(RangeError);
  });
});
