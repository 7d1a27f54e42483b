import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { framesOf } from '#pages/catalogue/case/play.ts';
import { GRID, spotAfter } from '#pages/catalogue/draw/cells.ts';
import { addressOf, drawnInput, readAddress } from '#pages/catalogue/draw/draw-input.ts';
import { PaintGrid } from '#pages/catalogue/draw/paint-grid.tsx';
import { cellName, PAINTS, paintOfKey } from '#pages/catalogue/draw/paints.ts';
import { searchInput } from '#pages/catalogue/search/search-input.ts';
import { caseSet, EMPTY_DRAWING, painted } from '#shared/lastlayer/index.ts';
import { OLL_NAMES } from '#shared/lastlayer/names-oll.ts';
import type { Site } from '#shared/lastlayer/pictures/index.ts';

const cells = GRID.flatMap((line, row) =>
  line.flatMap((one, column) => (one ? [{ ...one, spot: { row, column } }] : [])),
);

describe('the grid that is painted', () => {
  it('has every sticker of the last layer once', () => {
    const sites = cells.map(({ site }) => site.join(' '));
    expect(sites).toHaveLength(21); // derived: nine on top, three on each of four sides
    expect(new Set(sites).size).toBe(21);
    expect(cells.filter(({ piece }) => piece === null).map(({ site }) => site)).toEqual([['top', 4]]);
  });

  it('can be walked through by arrows alone, there and back', () => {
    const back: Readonly<Record<string, string>> = {
      ArrowUp: 'ArrowDown',
      ArrowDown: 'ArrowUp',
      ArrowLeft: 'ArrowRight',
      ArrowRight: 'ArrowLeft',
    };
    const reached = new Set(['3 1']);
    const open = [{ row: 3, column: 1 }];
    for (const spot of open)
      for (const key of Object.keys(back)) {
        const to = spotAfter(key, spot);
        if (!to) continue;
        expect(spotAfter(back[key]!, to)).toEqual(spot);
        if (reached.has(`${to.row} ${to.column}`)) continue;
        reached.add(`${to.row} ${to.column}`);
        open.push(to);
      }
    expect(reached.size).toBe(21);
    expect(spotAfter('Home', { row: 0, column: 2 })).toEqual({ row: 0, column: 1 });
    expect(spotAfter('End', { row: 2, column: 2 })).toEqual({ row: 2, column: 4 });
    expect(spotAfter('ArrowUp', { row: 0, column: 1 })).toBeNull();
    expect(spotAfter('q', { row: 2, column: 2 })).toBeNull();
  });

  it('names every sticker by its piece, its side and its colour, with one tab stop', () => {
    const drawing = painted(painted(EMPTY_DRAWING, 'front', 1, 'red'), 'top', 0, 'other');
    const wrong: Site[] = [['front', 1]];
    const html = renderToStaticMarkup(<PaintGrid drawing={drawing} wrong={wrong} onPaint={() => {}} />);
    expect(html.match(/<button/g)).toHaveLength(21);
    expect(html.match(/tabindex="0"/g)).toHaveLength(1);
    expect(html).toContain('aria-label="Front edge, front: red"');
    expect(html).toContain('aria-label="Back left corner, top: any but the top colour"');
    expect(html).toContain('aria-label="Top centre: yellow"');
    expect(html.match(/border-rose/g)).toHaveLength(1);
    expect(html).not.toContain('style=');
  });

  it('has a key for every paint', () => {
    const keys = ['w', 'Y', 'g', 'b', 'o', 'r', 'x', '0'];
    expect(keys.map(paintOfKey)).toEqual(PAINTS);
    expect(paintOfKey('Delete')).toBeNull();
    expect(paintOfKey('q')).toBeUndefined();
    expect(new Set(PAINTS.map(cellName)).size).toBe(8);
  });
});

describe('addresses of the drawing page', () => {
  it('say the drawing and the sets, and nothing that makes no sense', () => {
    const drawing = painted(EMPTY_DRAWING, 'left', 2, 'green');
    const address = { drawing, sets: ['oll', 'zbll'] };
    const search = new URL(addressOf(address), 'http://club.example').searchParams;
    expect(readAddress(search)).toEqual(address);
    expect(drawnInput(address)).toEqual({ drawing: expect.stringMatching(/^-{20}g$/), sets: 'oll,zbll' });
    expect(readAddress(new URLSearchParams())).toEqual({ drawing: EMPTY_DRAWING, sets: ['oll', 'pll'] });
    expect(readAddress(new URLSearchParams({ d: 'q', sets: 'OLL?,pll,' }))).toEqual({
      drawing: EMPTY_DRAWING,
      sets: ['pll'],
    });
  });

  it('of a search are words, not too many', () => {
    expect(searchInput('  T ')).toEqual({ q: 'T' });
    expect(searchInput('   ')).toBeNull();
    expect(searchInput(undefined)).toBeNull();
    expect(searchInput('R'.repeat(400))?.q).toHaveLength(300);
  });
});

describe('an algorithm step by step', () => {
  it('begins as its case looks and ends with the top whole; what OLL does not tell apart stays open', () => {
    const { entry, toldApart } = caseSet('oll').definition;
    for (const [, , algorithm] of OLL_NAMES) {
      const frames = framesOf({ entry, toldApart: [...toldApart] }, algorithm)!;
      expect(frames[0]!.facelets.match(/\?/g)).toHaveLength(12); // derived: 21 stickers, nine of the top colour
      const faces = frames.at(-1)!.facelets.match(/.{9}/g)!;
      expect(faces).toContain('UUUUUUUUU');
    }
  });

  it('is not shown for what breaks the first two layers', () => {
    expect(framesOf({ entry: 'any', toldApart: ['co'] }, 'R U')).toBeNull();
  });
});
