import type { CaseOfSet } from '#shared/lastlayer/index.ts';
import { type CaseMemory, DEFAULT_BETA, type QueueCard, wantedRecall } from '#shared/memory/index.ts';
import type { MemberDay, TrainedSet } from './member-day.ts';

/**
 * The day recall is told for: today, or for a case answered today the coming one. On the day itself it is 1 whatever
 * happened, and nobody believes that of a case they have just lost.
 */
export function tellingDay(day: number, memory: CaseMemory): number {
  return Math.max(day, memory.lastDay + 1);
}

/** The member's β: solved nightly for their minutes, the model's default until then. */
export function betaOf({ member }: MemberDay): number {
  return member.beta ?? DEFAULT_BETA;
}

export interface DayCard extends QueueCard {
  readonly trained: TrainedSet;
  readonly case: CaseOfSet;
  /** Recall below which the case wants a showing. */
  readonly wanted: number;
  /**
   * Recall below which the case is said to slip. Minutes to spare raise what is wanted, down to showings of what is
   * nearly sure; that is polish, not slipping.
   */
  readonly slipsBelow: number;
}

/**
 * A card for every case the member answers for. Its prior is the case's chance within its set times the share
 * of solves that reach the set (each set of the programme alike), normalised over the programme.
 */
export function cardsOf(day: MemberDay): DayCard[] {
  const found = day.sets.flatMap((trained) =>
    [...trained.content.cases.keys()].flatMap((key) => {
      const c = trained.set.byKey(key);
      return c && !c.skip ? [{ trained, case: c, chance: c.weight / trained.set.total }] : [];
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
      order: trained.entry.position,
      partner: trained.set.mirrorOf(c).key,
      group: trained.content.cases.get(c.key)?.group ?? '',
      wanted: wantedRecall(prior, found.length, betaOf(day)),
      slipsBelow: wantedRecall(prior, found.length, Math.max(betaOf(day), DEFAULT_BETA)),
    };
  });
}
