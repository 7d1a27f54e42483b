import type { Aspect } from '../aspects.ts';
import {
  blankStickers,
  CORNER_SITES,
  EDGE_SITES,
  finishStickers,
  type Site,
  type Sticker,
  type Stickers,
  stickerAt,
} from './stickers.ts';

/**
 * The stickers with everything hatched that the given aspects do not tell apart.
 * Pass the aspects a set tells apart together with those its entry condition fixes
 * (`seenThrough`). Orientation alone leaves the top colour wherever it sits;
 * permutation alone leaves the side colours of each piece as if it lay the right way up,
 * and hatches the top.
 */
export function maskStickers(stickers: Stickers, seen: readonly Aspect[]): Stickers {
  const draft = blankStickers();
  const put = (sites: readonly Site[], oriented: boolean, placed: boolean) => {
    const letters = sites.map((site) => stickerAt(stickers, site));
    mask(letters, oriented, placed).forEach((letter, k) => {
      const site = sites[k];
      if (site) draft[site[0]][site[1]] = letter;
    });
  };
  for (const sites of CORNER_SITES) put(sites, seen.includes('co'), seen.includes('cp'));
  for (const sites of EDGE_SITES) put(sites, seen.includes('eo'), seen.includes('ep'));
  return finishStickers(draft);
}

/** One piece's letters, its place's top sticker first. */
function mask(letters: readonly Sticker[], oriented: boolean, placed: boolean): Sticker[] {
  if (oriented && placed) return [...letters];
  if (oriented) return letters.map((letter) => (letter === 'U' ? 'U' : '?'));
  if (!placed) return letters.map(() => '?');
  const top = Math.max(0, letters.indexOf('U'));
  return letters.map((_, k) => (k === 0 ? '?' : (letters[(k + top) % letters.length] ?? '?')));
}
