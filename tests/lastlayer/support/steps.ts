import { ASPECTS, type Aspect, EVERY_ENTRY } from '#shared/lastlayer/index.ts';

/** Every choice of aspects to tell apart, the empty one first. */
export const CHOICES: readonly (readonly Aspect[])[] = Array.from({ length: 16 }, (_, choice) =>
  ASPECTS.filter((_aspect, at) => (choice >> at) & 1),
);

/** Every entry with every choice of at least one aspect: 15 · 15. */
export const STEPS = EVERY_ENTRY.flatMap((entry) =>
  CHOICES.slice(1).map((aspects) => ({ entry, aspects, title: `${entry} / ${aspects.join()}` })),
);
