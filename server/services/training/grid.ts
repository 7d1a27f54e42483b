import type { AnswerKey } from '#shared/contracts/today.ts';
import type { CaseOfSet, CaseSet } from '#shared/lastlayer/index.ts';
import { todayWords } from '#shared/text/today-words.ts';
import type { EditionContent } from '../catalogue/read-edition.ts';

/** Up to this many cases a set offers every name, in a fixed grid (product.md's rule for answers). */
const ALL_NAMES = 24;

/** Raw choices that are no case. */
export const SOLVED = 'solved';
export const OTHER_CHOICES = ['lost', 'unrecognised', 'left'] as const;

/** Key of the grid whose names a showing of this case offers. */
export function gridOf(c: CaseOfSet): string {
  return c.cluster === 0 ? 'all' : `c${c.cluster}`;
}

/**
 * The names an edition offers, by grid, in fixed places. Sets of up to 24 offer all of them and "solved"; larger
 * ones the fixed cluster of the case, so that the choices tell nothing beyond the cluster.
 */
export function gridsOf(set: CaseSet, content: EditionContent): Record<string, AnswerKey[]> {
  const grids: Record<string, AnswerKey[]> = {};
  for (const { key, name, tradeName = null, algorithms } of content.cases.values()) {
    const c = set.byKey(key);
    if (!c) continue;
    const grid = gridOf(c);
    grids[grid] ??= [];
    grids[grid].push({ key, label: name, tradeName, algorithm: algorithms[0]?.algorithm ?? '' });
  }
  const all = grids.all;
  if (all && set.cases.length <= ALL_NAMES)
    all.push({ key: SOLVED, label: todayWords.solved, tradeName: null, algorithm: '' });
  return grids;
}
