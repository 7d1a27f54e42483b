import { renderToStaticMarkup } from 'react-dom/server';
import { expect, it } from 'vitest';
import { DrawnAnswer } from '#pages/catalogue/draw/drawn-answer.tsx';
import type { DrawnView } from '#shared/contracts/catalogue-search.ts';

const pll = { setKey: 'pll', name: 'PLL' };
const sets: DrawnView['sets'] = [{ set: pll, cases: 21, found: 6, rows: [] }];
const drawing = '---------------------';
const said = (view: DrawnView | undefined) => renderToStaticMarkup(<DrawnAnswer view={view} />);

it('says beside the grid how many cases look like the drawing, the skip among them', () => {
  expect(said({ drawing, problems: [], sets })).toContain('PLL: 6 of 22');
});

it('says what is wrong instead of any count', () => {
  const html = said({
    problems: [{ says: 'One edge is flipped.', sites: [] }],
    sets,
  } as unknown as DrawnView);
  expect(html).toContain('There is no such cube');
  expect(html).toContain('One edge is flipped.');
  expect(html).not.toContain('PLL');
});

it('keeps its place while nothing is known yet', () => {
  expect(said(undefined)).toMatch(/^<div role="status"[^>]*><\/div>$/);
});
