import { and, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { newCaseCap, solveBeta } from '#shared/memory/index.ts';
import { cardsOf } from './cards.ts';
import { COSTS } from './issue-showings.ts';
import type { MemberDay } from './member-day.ts';

/**
 * Solves the member's β for their minutes, once a local day: the load forecast over the coming weeks fits what
 * they give. Says whether it did.
 */
export async function solveMemberBeta(tx: Transaction, day: MemberDay): Promise<boolean> {
  if (day.member.betaDay === day.day || day.sets.length === 0) return false;
  const seconds = day.member.minutesPerDay * 60;
  const beta = solveBeta({
    cards: cardsOf(day),
    day: day.day,
    newPerDay: newCaseCap(seconds, COSTS),
    costs: COSTS,
    seconds,
  });
  const { membership } = tables;
  await tx
    .update(membership)
    .set({ beta, betaDay: day.day })
    .where(and(eq(membership.clubId, day.actor.clubId), eq(membership.memberId, day.actor.memberId)));
  return true;
}
