import type { Aspect, Entry } from '../lastlayer/aspects.ts';

/** The aspects of a last layer, in the order they are offered. No schema and no tables here: pages read it too. */
export const ASPECTS = ['co', 'eo', 'cp', 'ep'] as const satisfies readonly Aspect[];

/** The entry conditions, in the order they are offered: the trade's own sets begin from the first six. */
export const ENTRIES = [
  'any',
  'eo',
  'co',
  'co+eo',
  'corners',
  'corners+eo',
  'cp',
  'cp+eo',
  'ep',
  'co+ep',
  'edges',
  'co+edges',
  'cp+ep',
  'corners+ep',
  'cp+edges',
] as const satisfies readonly Entry[];
