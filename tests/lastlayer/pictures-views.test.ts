import { describe, expect, it } from 'vitest';
import {
  COLOUR_LETTERS,
  colouringWith,
  describeStickers,
  flatViewSvg,
  maskStickers,
  PALETTES,
  type SeatViewOptions,
  seatViewSvg,
  stickersOf,
} from '#shared/lastlayer/pictures/index.ts';
import { contrast } from '#shared/lastlayer/pictures/palettes.ts';
import { INK } from '#shared/lastlayer/pictures/tiles.ts';
import { STATES } from '#shared/lastlayer/state.ts';
import { pictureText } from '#shared/text/pictures.ts';

const colouring = colouringWith('yellow', 'green');
const seat = (options: Partial<SeatViewOptions> = {}) =>
  seatViewSvg({ stickers: stickersOf(0), colouring, holding: 'right', ...options });

/** The fills of the layer's stickers, in drawing order. */
const fills = (svg: string) =>
  [...svg.matchAll(/class="cube-sticker" d="[^"]*" fill="([^"]*)"/g)].map((match) => match[1]);
/** The drawing without what a sticker's colour decides. */
const skeleton = (svg: string) =>
  svg
    .replace(/(class="(?:cube-sticker|cube-pale)" d="[^"]*") fill="[^"]*" stroke="[^"]*"/g, '$1')
    .replace(/(fill="[^"]*")>[A-Z]<\/text>/g, '></text>');

describe('the seat view', () => {
  it('is the same markup for every state but for the stickers', () => {
    for (const letters of [false, true]) {
      const first = skeleton(seat({ letters }));
      for (let state = 0; state < STATES; state += 997) {
        for (const held of [0, 7, 23]) {
          expect(skeleton(seat({ letters, stickers: stickersOf(state), colouring: held }))).toBe(first);
        }
      }
    }
  });

  it('carries a point k deep to (0.47 k, −0.42 k)', () => {
    // Corners of the layer in face units of 100: front edge, then three pieces deep (derived: 300 × 0.47, 0.42).
    expect(seat()).toContain('class="cube-body" d="M0 0L141 -126L441 -126L441 -26L300 100L0 100Z"');
    expect(seat({ holding: 'left' })).toContain(
      'class="cube-body" d="M441 0L300 -126L0 -126L0 -26L141 100L441 100Z"',
    );
  });

  it('shows top, front and the side of the holder, nine and three and three', () => {
    const colours = PALETTES.standard.colours;
    const top = Array(9).fill(colours.yellow);
    const front = Array(3).fill(colours.green);
    expect(fills(seat())).toEqual([...top, ...front, ...Array(3).fill(colours.orange)]);
    expect(fills(seat({ holding: 'left' }))).toEqual([...top, ...front, ...Array(3).fill(colours.red)]);
  });

  it('draws each sticker where it is, also mirrored', () => {
    const stickers = { top: 'UUUUUUUUF', front: 'UUR', right: 'BUU', back: 'UUU', left: 'UUL' };
    const x = (svg: string, fill: string) =>
      [...svg.matchAll(/class="cube-sticker" d="M([\d.-]+) [^"]*" fill="([^"]*)"/g)]
        .filter((match) => match[2] === fill)
        .map((match) => Number(match[1]));
    const { green, orange, red, blue } = PALETTES.standard.colours;
    // Right-front: the front right corner's stickers meet near x = 300; left-front: x = 441 − 0 … 441.
    const right = seat({ stickers });
    expect(x(right, green)[0]).toBeGreaterThan(200);
    expect(x(right, orange)[0]).toBeGreaterThan(200);
    expect(x(right, blue)[0]).toBeLessThan(350);
    const left = seat({ stickers, holding: 'left' });
    expect(x(left, green)[0]).toBeGreaterThan(300);
    expect(x(left, orange)[0]).toBeGreaterThan(300);
    expect(x(left, red)[0]).toBeGreaterThan(94); // the left side's front sticker, next to the front face
  });

  it('outlines every shade that is near the plastic in lightness', () => {
    for (const palette of Object.values(PALETTES)) {
      for (let held = 0; held < 24; held += 5) {
        const svg = seat({ palette, colouring: held, stickers: stickersOf(31_337) });
        for (const [, fill, stroke] of svg.matchAll(
          /class="cube-sticker" d="[^"]*" fill="([^"]*)" stroke="([^"]*)"/g,
        )) {
          const edge = stroke === 'none' ? fill : stroke;
          expect(contrast(edge!, INK)).toBeGreaterThanOrEqual(3); // WCAG 2.2, 1.4.11
        }
      }
    }
  });

  it('lays letters on greys without being asked', () => {
    expect(seat().match(/<text/g)).toBeNull();
    expect(seat({ palette: PALETTES.greys }).match(/<text/g)).toHaveLength(21);
  });

  it('names itself only with a title, and escapes it', () => {
    expect(seat()).toContain('aria-hidden="true"');
    expect(seat({ title: 'a "b" <c>' })).toContain('role="img" aria-label="a &quot;b&quot; &lt;c&gt;"');
  });

  it('uses no style attributes and no ids', () => {
    const masked = maskStickers(stickersOf(4242), ['co']);
    for (const svg of [
      seat({ stickers: masked, letters: true }),
      flatViewSvg({ stickers: masked, colouring }),
    ]) {
      expect(svg).not.toMatch(/ style=| id=|url\(/);
    }
  });
});

describe('the flat view', () => {
  it('has nine stickers, twelve bars and a notch', () => {
    const svg = flatViewSvg({ stickers: stickersOf(1234), colouring });
    expect(svg.match(/class="flat-sticker"/g)).toHaveLength(21);
    expect(svg.match(/class="flat-notch"/g)).toHaveLength(1);
  });

  it('hatches what is not told apart', () => {
    const stickers = maskStickers(stickersOf(1234), ['co', 'eo']);
    const svg = flatViewSvg({ stickers, colouring });
    expect(svg.match(/class="flat-sticker"/g)).toHaveLength(9);
    expect(svg.match(/class="flat-hatch"/g)).toHaveLength(12);
  });
});

describe('the text form', () => {
  const view = { kind: 'seat', holding: 'right' } as const;

  it('names each piece by its place and the letter of every sticker in sight', () => {
    expect(describeStickers({ stickers: stickersOf(0), colouring, view, words: pictureText })).toBe(
      'Front left corner: top Y, front G. Front edge: top Y, front G. ' +
        'Front right corner: top Y, right O, front G. Right edge: top Y, right O. ' +
        'Back right corner: top Y, right O. Back edge: top Y. Back left corner: top Y. Left edge: top Y. ' +
        'Centres: front G, right O.',
    );
  });

  it('has the same form for every state but for the letters', () => {
    const form = (state: number) =>
      describeStickers({ stickers: stickersOf(state), colouring, view, words: pictureText }).replace(
        / [A-Z](?=[,.])/g,
        ' _',
      );
    for (let state = 0; state < STATES; state += 997) expect(form(state)).toBe(form(0));
  });

  it('says what is not told apart, and all sides of a flat picture', () => {
    const text = describeStickers({
      stickers: maskStickers(stickersOf(0), ['co', 'eo']),
      colouring,
      view: { kind: 'flat' },
      words: pictureText,
    });
    expect(text).toContain('Back edge: top Y, back not told apart.');
    expect(text).toContain('Centres: front G, right O, back B, left R.');
  });

  it('has a letter of its own for each colour', () => {
    expect(new Set(Object.values(COLOUR_LETTERS)).size).toBe(6);
  });
});
