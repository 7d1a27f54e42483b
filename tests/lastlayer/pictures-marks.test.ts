import { describe, expect, it } from 'vitest';
import { faceletsAfter, parseAlgorithm, STATES } from '#shared/lastlayer/index.ts';
import { cubeSeatViewSvg, describeCube } from '#shared/lastlayer/pictures/cube-view.ts';
import {
  flatViewSvg,
  type Holding,
  maskStickers,
  PALETTES,
  type Site,
  seatViewSvg,
  sitesApart,
  stickersOf,
  TABLE_COLOURING,
} from '#shared/lastlayer/pictures/index.ts';
import { pictureText } from '#shared/text/pictures.ts';
import { seeded } from './support/random.ts';

const colouring = TABLE_COLOURING;
const rings = (svg: string, kind: string) =>
  [...svg.matchAll(new RegExp(`class="${kind}-mark-line" d="([^"]*)"`, 'g'))].map((match) => match[1]!);

describe('marks on pictures', () => {
  it('stand where two pictures differ, of the sides in view', () => {
    const random = seeded(61);
    for (let run = 0; run < 200; run++) {
      const [a, b] = [0, 1].map(() => stickersOf(Math.floor(random() * STATES)));
      for (const holding of ['right', 'left'] as const) {
        const apart = sitesApart(a!, b!, { kind: 'seat', holding });
        const sides = ['top', 'front', holding] as const;
        const expected = sides.flatMap((side) =>
          Array.from(a![side]).flatMap((letter, index) =>
            letter === b![side][index] ? [] : [[side, index]],
          ),
        );
        expect(apart).toEqual(expected);
        expect(rings(seatViewSvg({ stickers: a!, colouring, holding, marks: apart }), 'cube')).toHaveLength(
          apart.length,
        );
      }
      const flat = sitesApart(a!, b!, { kind: 'flat' });
      expect(rings(flatViewSvg({ stickers: a!, colouring, marks: flat }), 'flat')).toHaveLength(flat.length);
    }
  });

  it('pass over what is turned away and leave the drawing itself as it is', () => {
    const stickers = stickersOf(777);
    const marks: Site[] = [
      ['back', 0],
      ['left', 2],
      ['top', 4],
    ];
    const plain = seatViewSvg({ stickers, colouring, holding: 'right' });
    const marked = seatViewSvg({ stickers, colouring, holding: 'right', marks });
    expect(rings(marked, 'cube')).toHaveLength(1);
    expect(marked.replace(/<path class="cube-mark-[^>]*>/g, '')).toBe(plain);
    expect(marked).not.toMatch(/ style=| id=/);
  });

  it('are nowhere for what a set does not tell apart', () => {
    const [a, b] = [stickersOf(100), stickersOf(100 + 216 * 12)].map((all) =>
      maskStickers(all, ['co', 'eo']),
    );
    expect(sitesApart(a!, b!, { kind: 'flat' })).toEqual([]); // derived: 216 states share a permutation
  });
});

const fills = (svg: string) =>
  [...svg.matchAll(/class="cube-sticker" d="[^"]*" fill="([^"]*)"/g)].map((match) => match[1]!);

describe('the whole cube from the seat', () => {
  const cube = (algorithm: string, holding: Holding = 'right') => ({
    facelets: faceletsAfter(parseAlgorithm(algorithm).moves),
    colouring,
    holding,
  });

  it('shows nine stickers each of the top, the front and the side of the holder', () => {
    const { yellow, green, orange, red } = PALETTES.standard.colours;
    const nine = (shade: string) => Array<string>(9).fill(shade);
    expect(fills(cubeSeatViewSvg(cube('')))).toEqual([...nine(yellow), ...nine(green), ...nine(orange)]);
    expect(fills(cubeSeatViewSvg(cube('', 'left')))).toEqual([...nine(yellow), ...nine(green), ...nine(red)]);
  });

  it('reads the same in words as in colours, from either side', () => {
    const algorithms = ["R U R' F' M z", "y Lw2 S D' B E2", 'x U2 b'];
    for (const algorithm of algorithms)
      for (const holding of ['right', 'left'] as const) {
        const view = cube(algorithm, holding);
        const words = describeCube(view, pictureText);
        const letters = [...words.matchAll(/\b[WYGBOR]\b/g)].map((match) => match[0]);
        const shades = new Map(
          Object.entries(PALETTES.standard.colours).map(([name, shade]) => [
            shade,
            pictureText.letters[name as keyof typeof pictureText.letters],
          ]),
        );
        expect(letters).toHaveLength(27);
        expect([...letters].sort()).toEqual(
          fills(cubeSeatViewSvg(view))
            .map((shade) => shades.get(shade))
            .sort(),
        );
      }
    // Derived: U brings the right face's row to the front and the back's to the right.
    expect(describeCube(cube('U'), pictureText)).toBe(
      'Top, row by row: Y Y Y, Y Y Y, Y Y Y. Front, row by row: O O O, G G G, G G G. ' +
        'Right, row by row: B B B, O O O, O O O.',
    );
  });

  it('mirrors the drawing for the left-front view, not the cube', () => {
    const whiteAt = (holding: Holding) =>
      [
        ...cubeSeatViewSvg(cube('R', holding)).matchAll(
          /class="cube-sticker" d="M([\d.-]+) [^"]*" fill="([^"]*)"/g,
        ),
      ]
        .filter((match) => match[2] === PALETTES.standard.colours.white)
        .map((match) => Number(match[1]));
    // Derived: R brings the white bottom to the front's right column, drawn from 200 on of 300, mirrored from 341 on of 441.
    expect(whiteAt('right')).toHaveLength(3);
    expect(Math.min(...whiteAt('right'))).toBeGreaterThan(200);
    expect(whiteAt('left')).toHaveLength(3);
    expect(Math.min(...whiteAt('left'))).toBeGreaterThan(341);
  });

  it('refuses what is no cube', () => {
    expect(() => cubeSeatViewSvg({ ...cube(''), facelets: 'UUU' })).toThrow(/54 letters/u);
    expect(() => cubeSeatViewSvg({ ...cube(''), facelets: '"'.repeat(54) })).toThrow(RangeError);
  });
});
