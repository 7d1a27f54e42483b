import { and, eq } from 'drizzle-orm';
import { tables } from '#database/client.ts';
import type { MisTapInput, TodayView } from '#shared/contracts/today.ts';
import { notFound, Problem } from '../../http/problem.ts';
import { asMember, type Ctx } from '../context.ts';
import { completeDays } from '../rollups/complete-days.ts';
import { foldCases } from './fold-cases.ts';
import { writeRollups } from './follow-answers.ts';
import { presentToday } from './present-today.ts';
import { readTrainingDay } from './training-day.ts';

/** memory.md, decision 7: a mis-tap is said within ten seconds of the answer; a little more for the way here. */
const WITHIN_MS = 10_000;
const GRACE_MS = 5_000;

/**
 * Notes that an answer was a slip of the finger: memory is folded again without it, boards and calibration keep
 * the first outcome. Said twice, it counts once.
 * @throws Problem not-found for an answer that is not one's own; cannot-take when it comes too late.
 */
export async function reportMisTap(ctx: Ctx, input: MisTapInput): Promise<TodayView> {
  return asMember(ctx, async (tx, actor) => {
    const day = await readTrainingDay(ctx, tx, actor);
    const { review, misTap } = tables;
    const [row] = await tx
      .select()
      .from(review)
      .where(
        and(
          eq(review.clubId, actor.clubId),
          eq(review.memberId, actor.memberId),
          eq(review.reviewId, input.reviewId),
        ),
      );
    if (!row) throw notFound('There is no such answer of yours.');
    const answeredAt = row.answeredAt.getTime();
    const saidAt = Math.min(Math.max(input.at, answeredAt), ctx.clock.now());
    if (saidAt - answeredAt > WITHIN_MS + GRACE_MS) {
      throw new Problem('cannot-take', 'A mis-tap can be reported within ten seconds of the answer.');
    }
    const added = await tx
      .insert(misTap)
      .values({
        clubId: actor.clubId,
        memberId: actor.memberId,
        reviewId: row.reviewId,
        caseKey: row.caseKey,
        localDay: row.localDay,
        at: new Date(saidAt),
        receivedAt: new Date(ctx.clock.now()),
      })
      .onConflictDoNothing()
      .returning({ id: misTap.reviewId });
    if (added.length > 0) {
      day.misTaps.add(row.reviewId);
      await completeDays(tx, day, day.day - 1);
      const folded = await foldCases(tx, actor, [row.caseKey], row.localDay);
      const memory = folded.get(row.caseKey);
      if (memory) day.memory.set(row.caseKey, memory);
      else day.memory.delete(row.caseKey);
      await writeRollups(tx, day, [row]);
    }
    return presentToday(ctx, tx, day);
  });
}
