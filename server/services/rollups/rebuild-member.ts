import { and, eq, max, min } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { ClubActor } from '../context.ts';
import { foldCases } from '../training/fold-cases.ts';
import { rebuildRollups } from './rebuild-rollups.ts';

/**
 * Makes all that is derived of one member again from the log: memory, first answers, rollups. What stands is
 * expected to be the same already; a difference is a fault somewhere else.
 */
export async function rebuildMember(
  tx: Transaction,
  actor: Pick<ClubActor, 'clubId' | 'memberId'>,
): Promise<{ cases: number; rollups: number }> {
  const { review, rollup } = tables;
  const keys = await tx
    .selectDistinct({ key: review.caseKey })
    .from(review)
    .where(and(eq(review.clubId, actor.clubId), eq(review.memberId, actor.memberId)));
  const folded = await foldCases(
    tx,
    actor,
    keys.map(({ key }) => key),
  );
  const spans = await tx
    .select({ setKey: rollup.setKey, fromDay: min(rollup.day), toDay: max(rollup.day) })
    .from(rollup)
    .where(and(eq(rollup.clubId, actor.clubId), eq(rollup.memberId, actor.memberId)))
    .groupBy(rollup.setKey);
  let rollups = 0;
  for (const { setKey, fromDay, toDay } of spans) {
    if (fromDay === null || toDay === null) continue;
    rollups += (await rebuildRollups(tx, actor, setKey, { fromDay, toDay })).length;
  }
  return { cases: folded.size, rollups };
}
