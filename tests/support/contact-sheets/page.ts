/** A contact sheet as an HTML document that needs nothing but itself. */
import { readFileSync } from 'node:fs';
import { escapeMarkup } from '#shared/lastlayer/pictures/geometry.ts';
import type { Sheet } from './sheets.ts';

export type Theme = 'light' | 'dark';

const read = (path: string, encoding: BufferEncoding): string =>
  readFileSync(new URL(`../../../${path}`, import.meta.url)).toString(encoding);

const face = (weight: 400 | 700): string => {
  const file = `node_modules/@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-${weight}-normal.woff2`;
  return `@font-face{font-family:Sheet;font-weight:${weight};src:url(data:font/woff2;base64,${read(file, 'base64')})}`;
};

/** The product's own colours and picture styles, so that a sheet shows what its pages show. */
const styles = (): string =>
  [
    face(400),
    face(700),
    read('renderer/styles/tokens.css', 'utf8'),
    read('renderer/styles/pictures.css', 'utf8'),
    `:root{--font-sans:Sheet}
body{margin:24px;background:var(--paper);color:var(--ink);font:15px Sheet}
h1{font-size:22px} h2{font-size:16px;border-top:1.5px solid var(--ink);padding-top:8px}
ul{display:flex;flex-wrap:wrap;gap:16px;list-style:none;padding:0} li{text-align:center}
svg{display:block;width:150px} svg.flat-view{width:84px}`,
  ].join('\n');

const figure = ({ svg, caption }: Sheet['sections'][number]['pictures'][number]): string =>
  `<li>${svg}${escapeMarkup(caption)}</li>`;

/** One sheet in one theme. */
export function sheetPage(sheet: Sheet, theme: Theme): string {
  const sections = sheet.sections.map(
    ({ title, pictures }) => `<h2>${escapeMarkup(title)}</h2><ul>${pictures.map(figure).join('')}</ul>`,
  );
  const title = escapeMarkup(`${sheet.name}, ${theme}`);
  return `<!doctype html><html lang="en" data-theme="${theme}"><meta charset="utf-8"><title>${title}</title>
<style>${styles()}</style><h1>${title}</h1>${sections.join('')}</html>`;
}
