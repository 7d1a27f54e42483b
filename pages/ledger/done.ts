import type { Aspect, Entry } from '#shared/lastlayer/index.ts';

const WORDS: Readonly<Record<string, readonly Aspect[]>> = {
  any: [],
  corners: ['co', 'cp'],
  edges: ['eo', 'ep'],
};

/** The aspects that an entry condition has done already, as its own words say. */
export function doneOn(entry: Entry): readonly Aspect[] {
  return entry.split('+').flatMap((word) => WORDS[word] ?? [word as Aspect]);
}
