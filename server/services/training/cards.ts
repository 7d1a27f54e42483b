import type { CaseOfSet } from '#shared/lastlayer/index.ts';
import { DEFAULT_BETA, type QueueCard, wantedRecall } from '#shared/memory/index.ts';
import type { MemberDay, TrainedSet } from './member-day.ts';

/** β of the square-root law until a member's own is fitted to their minutes. */
export const BETA = DEFAULT_BETA;

export interface DayCard extends QueueCard {
  readonly trained: TrainedSet;
  readonly case: CaseOfSet;
  /** Recall below which the case wants a showing. */
  readonly wanted: number;
}

/**
 * A card for every case the member answers for. Its prior is the case's chance within its set times the share
 * of solves that reach the set (each set of the programme alike), normalised over the programme.
 */
export function cardsOf(day: Pick<MemberDay, 'sets' | 'memory'>): DayCard[] {
  const found = day.sets.flatMap((trained) =>
    [...trained.content.cases.keys()].flatMap((key) => {
      const c = trained.set.byKey(key);
      return c && !c.skip ? [{ trained, case: c, chance: c.weight / trained.set.states }] : [];
    }),
  );
  const all = found.reduce((sum, { chance }) => sum + chance, 0);
  return found.map(({ trained, case: c, chance }) => {
    const prior = chance / all;
    return {
      key: c.key,
      prior,
      memory: day.memory.get(c.key) ?? null,
      trained,
      case: c,
      wanted: wantedRecall(prior, found.length, BETA),
    };
  });
}
