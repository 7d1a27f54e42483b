import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { contrast } from '#shared/lastlayer/pictures/palettes.ts';
import { INK } from '#shared/lastlayer/pictures/tiles.ts';

const css = readFileSync(new URL('../../renderer/styles/tokens.css', import.meta.url), 'utf8');

/** Every token's shade in one theme; a shade given once is the same in both. */
function tokens(theme: 'light' | 'dark'): Map<string, string> {
  const found = new Map<string, string>();
  for (const [, name, light, dark] of css.matchAll(/--([\w-]+):\s*light-dark\(([^,]+),\s*([^)]+)\)/g)) {
    found.set(name!, (theme === 'light' ? light! : dark!).trim());
  }
  for (const [, name, shade] of css.matchAll(/--([\w-]+):\s*(#[0-9a-f]{6});/g)) found.set(name!, shade!);
  return found;
}

/** WCAG 2.2, 1.4.3: text and what it stands on. */
const TEXT_PAIRS: readonly (readonly [string, string])[] = [
  ...['ink', 'ink-2', 'rose', 'ochre', 'link'].flatMap((text) => [
    [text, 'paper'] as const,
    [text, 'sheet'] as const,
  ]),
  ['ink', 'hair'],
  ['ink', 'line'],
  ['rose', 'hair'],
  ['ink', 'ochre-weak'],
  ['ink', 'rose-weak'],
  ['ochre', 'ochre-weak'],
  ['rose', 'rose-weak'],
  ['link', 'ochre-weak'],
  ['link', 'rose-weak'],
  ['paper', 'ink'],
  ['paper', 'rose'],
];

/** WCAG 2.2, 1.4.11: edges of controls and of what a picture or a figure says, and the focus ring. */
const EDGE_PAIRS: readonly (readonly [string, string])[] = [
  ...['ink', 'ink-2', 'rose', 'ochre', 'bar', 'hatch', 'flat-edge', 'link'].flatMap((edge) => [
    [edge, 'paper'] as const,
    [edge, 'sheet'] as const,
  ]),
];

describe.each(['light', 'dark'] as const)('the %s theme', (theme) => {
  const shades = tokens(theme);
  const of = (name: string) => {
    const shade = shades.get(name);
    if (!shade?.startsWith('#')) throw new Error(`no shade for --${name} in the ${theme} theme`);
    return shade;
  };

  it.each(TEXT_PAIRS)('has %s readable on %s', (text, ground) => {
    expect(contrast(of(text), of(ground))).toBeGreaterThanOrEqual(4.5);
  });

  it.each(EDGE_PAIRS)('has edges of %s visible on %s', (edge, ground) => {
    expect(contrast(of(edge), of(ground))).toBeGreaterThanOrEqual(3);
  });

  it('shows where the cube ends', () => {
    // In the light the plastic itself stands out; in the dark its outline does.
    const edge = theme === 'light' ? of('cube-body') : of('cube-rim');
    expect(contrast(edge, of('paper'))).toBeGreaterThanOrEqual(3);
    expect(contrast(edge, of('sheet'))).toBeGreaterThanOrEqual(3);
  });
});

describe('the cube in the dark', () => {
  it('has a hairline round each sticker that stands out from the plastic', () => {
    expect(contrast(tokens('dark').get('cube-hairline')!, INK)).toBeGreaterThanOrEqual(3);
  });

  it('is made of the same plastic as the drawing says by itself', () => {
    expect(tokens('dark').get('cube-body')).toBe(INK.toLowerCase());
  });
});

describe('the shades of the design', () => {
  it.each([
    // The design's own table of tokens, light and dark.
    ['paper', '#f4f2ec', '#14161b'],
    ['sheet', '#fffefb', '#1d2128'],
    ['ink', '#16191f', '#efece4'],
    ['ink-2', '#565d67', '#a9afb8'],
    ['line', '#cfcabd', '#3c434d'],
    ['hair', '#e2ded3', '#2a3038'],
    ['ochre', '#8a5200', '#e2b062'],
    ['ochre-weak', '#f7e7c9', '#40311a'],
    ['rose', '#9b2335', '#ee8e9b'],
    ['rose-weak', '#f5dcdd', '#45232a'],
    ['link', '#1f4fa3', '#8fb4f2'],
  ])('keeps %s', (name, light, dark) => {
    expect([tokens('light').get(name), tokens('dark').get(name)]).toEqual([light, dark]);
  });
});
