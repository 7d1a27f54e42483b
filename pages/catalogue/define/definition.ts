import type { EntryPart, PreviewSetInput } from '#shared/contracts/case-sets.ts';
import { ASPECTS, ENTRIES } from '#shared/contracts/entries.ts';

type Aspect = (typeof ASPECTS)[number];

/** A definition as it is being made. Shares are as typed. */
export interface Definition {
  readonly entries: readonly { readonly entry: EntryPart['entry']; readonly parts: string }[];
  readonly toldApart: readonly Aspect[];
  readonly solved: readonly Aspect[];
}

/** Where the page begins: a set that the trade has no name for. */
const START = { entries: 'cp+eo:1', toldApart: 'co,ep', solved: 'co,eo,cp,ep' };

const isEntry = (word: string): word is EntryPart['entry'] => (ENTRIES as readonly string[]).includes(word);
const isAspect = (word: string): word is Aspect => (ASPECTS as readonly string[]).includes(word);
const words = (list: string): string[] => list.split(',').filter(Boolean);

/** The definition that an address asks for; what it does not know it leaves out. */
export function readDefinition(search: Readonly<Record<string, string>>): Definition {
  const { entries = START.entries, toldApart = START.toldApart, solved = START.solved } = search;
  return {
    entries: words(entries).flatMap((word) => {
      const [entry = '', parts = '1'] = word.split(':');
      return isEntry(entry) ? [{ entry, parts }] : [];
    }),
    toldApart: words(toldApart).filter(isAspect),
    solved: words(solved).filter(isAspect),
  };
}

/** Whether a share as typed is one: a whole number from 1 to 1000. */
export function isShare(typed: string): boolean {
  return /^\d{1,4}$/.test(typed) && Number(typed) >= 1 && Number(typed) <= 1000;
}

/** What the shares are parts of: their sum; null while one of them is none yet. */
export function wholeOf(entries: Definition['entries']): number | null {
  return entries.every(({ parts }) => isShare(parts))
    ? entries.reduce((sum, { parts }) => sum + Number(parts), 0)
    : null;
}

/** The definition as addresses and the preview write it; shares that are none yet count as 1. */
export function writeDefinition({ entries, toldApart, solved }: Definition): PreviewSetInput {
  return {
    entries: entries.map(({ entry, parts }) => `${entry}:${isShare(parts) ? Number(parts) : 1}`).join(','),
    toldApart: toldApart.join(','),
    solved: solved.join(','),
  };
}

/** The entries as the set is made of them. */
export function sharesOf({ entries }: Definition): EntryPart[] {
  return entries.map(({ entry, parts }) => ({ entry, parts: isShare(parts) ? Number(parts) : 1 }));
}
