import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { renderToStaticMarkup as markup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { OwnShadesFields } from '#pages/pictures/own-shades.tsx';
import { PicturesForm } from '#pages/pictures/pictures-form.tsx';
import { trainingTop } from '#pages/pictures/training-top.ts';
import { lookOf, PersonPicturesProvider } from '#renderer/person-pictures.tsx';
import { FlatView, SeatView } from '#renderer/ui/index.ts';
import type { PictureSettings } from '#shared/contracts/pictures.ts';
import {
  type CrossColours,
  colouringsFor,
  PALETTES,
  paint,
  stickersOf,
  TABLE_COLOURING,
} from '#shared/lastlayer/pictures/index.ts';

const stickers = stickersOf(0);
const { standard, safe, greys } = PALETTES;
const own = { ...standard.colours, yellow: '#F0E000' };

const usual: PictureSettings = { palette: 'standard', letters: false, ownShades: null };
const seenBy = (settings: PictureSettings | null, children: ReactNode) =>
  markup(<PersonPicturesProvider settings={settings}>{children}</PersonPicturesProvider>);
const both = (
  <>
    <FlatView stickers={stickers} />
    <SeatView stickers={stickers} colouring={TABLE_COLOURING} holding="left" />
  </>
);

describe('pictures', () => {
  it('are drawn as the person wants them, in both views', () => {
    for (const [palette, shades] of [
      ['safe', safe.colours],
      ['greys', greys.colours],
      ['own', own],
    ] as const) {
      const html = seenBy({ ...usual, palette, ownShades: own }, both);
      const [flat = '', seat = ''] = html.split('</svg>');
      for (const view of [flat, seat]) {
        expect(view).toContain(shades.yellow);
        expect(view).not.toContain(standard.colours.yellow);
      }
    }
    expect(seenBy({ ...usual, letters: true }, both)).toContain('>Y</text>');
    expect(seenBy(usual, both)).not.toContain('</text>');
  });

  it('are the usual ones for one who is not signed in, and outside of any area', () => {
    expect(seenBy(null, both)).toBe(markup(both));
    expect(markup(both)).toContain(standard.colours.yellow);
  });

  it('follow what is said at one of them', () => {
    const html = seenBy({ ...usual, palette: 'greys' }, <FlatView stickers={stickers} palette={safe} />);
    expect(html).toContain(safe.colours.yellow);
  });

  it('fall back on the standard shades where own ones were never chosen', () => {
    expect(lookOf({ ...usual, palette: 'own' }).palette).toBe(standard);
  });
});

describe('the form', () => {
  it('offers five palettes, each with its shades, and shows what is saved', () => {
    const html = seenBy(
      { palette: 'safe', letters: true, ownShades: null },
      <QueryClientProvider client={new QueryClient()}>
        <PicturesForm />
      </QueryClientProvider>,
    );
    expect(html.match(/type="radio"/g)).toHaveLength(5);
    expect(html).toMatch(/value="safe"[^>]*checked|checked=""[^>]*value="safe"/);
    for (const { colours } of Object.values(PALETTES)) expect(html).toContain(`fill="${colours.blue}"`);
    expect(html).not.toContain('type="color"');
    // The content security policy lets no style attribute through.
    expect(html).not.toContain('style=');
  });

  it('shows the cube as training does for the cross colours', () => {
    const form = (cross: CrossColours) =>
      seenBy(
        usual,
        <QueryClientProvider client={new QueryClient()}>
          <PicturesForm cross={cross} />
        </QueryClientProvider>,
      );
    // Opposite colours: white and yellow, green and blue, orange and red (common practice).
    for (const [cross, says] of [
      ['white', 'yellow on top'],
      ['yellow', 'white on top'],
      ['green', 'blue on top'],
      ['red', 'orange on top'],
      ['white+yellow', 'white or yellow on top'],
      ['all', 'any colour on top'],
    ] as const) {
      expect(form(cross)).toContain(`As in training, ${says}`);
      const { tops, colouring } = trainingTop(cross);
      expect(tops).toContain(paint('U', colouring));
      expect(colouringsFor(cross)).toContain(colouring);
    }
    expect(paint('U', trainingTop('white').colouring)).toBe('yellow');
    expect(paint('U', trainingTop('white+yellow').colouring)).toBe('white');
  });

  it('names the shades that come too near each other', () => {
    const fields = (shades: typeof own) =>
      markup(<OwnShadesFields shades={shades} onChange={() => undefined} />);
    // White and a white next to it differ by almost nothing in any kind of vision.
    const near = fields({ ...safe.colours, yellow: '#FFFFFE' });
    expect(near).toContain('Hard to tell apart');
    expect(near).toContain('white and yellow: 0');
    // The safe shades were chosen to be 20 apart in all four kinds of vision.
    expect(fields({ ...safe.colours })).not.toContain('Hard to tell apart');
    expect(near.match(/type="color"/g)).toHaveLength(6);
  });
});
