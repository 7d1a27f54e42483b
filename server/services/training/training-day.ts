import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { ClubActor, Ctx } from '../context.ts';
import { answersOfDay, misTapsOfDay, type ReviewRow } from './day-counts.ts';
import { type MemberDay, readMemberDay } from './member-day.ts';

export type ShowingRow = typeof tables.showing.$inferSelect;

/** All that a member's queue of one local day is made from; it changes as answers are folded in. */
export interface TrainingDay extends MemberDay {
  /** The day's answers, oldest first; new ones are added as they are stored. */
  readonly answers: ReviewRow[];
  /** Ids of the day's answers that were mis-taps. */
  readonly misTaps: Set<string>;
  /** Showings issued and not yet answered, in the order they are to be shown. */
  readonly open: ShowingRow[];
}

/** Reads a member's training day and holds their membership row until the transaction ends. */
export async function readTrainingDay(ctx: Ctx, tx: Transaction, actor: ClubActor): Promise<TrainingDay> {
  const day = await readMemberDay(ctx, tx, actor, { hold: true });
  return {
    ...day,
    answers: await answersOfDay(tx, actor, day.day),
    misTaps: await misTapsOfDay(tx, actor, day.day),
    open: await openShowings(tx, day),
  };
}

async function openShowings(tx: Transaction, { actor, day, sets }: MemberDay): Promise<ShowingRow[]> {
  const { showing } = tables;
  if (sets.length === 0) return [];
  const rows = await tx
    .select()
    .from(showing)
    .where(
      and(
        eq(showing.clubId, actor.clubId),
        eq(showing.memberId, actor.memberId),
        eq(showing.localDay, day),
        isNull(showing.reviewId),
        inArray(
          showing.setKey,
          sets.map(({ entry }) => entry.setKey),
        ),
      ),
    )
    .orderBy(asc(showing.position));
  // An edition published since may have dropped the case, or the club may have pinned another one.
  return rows.filter((row) =>
    sets.some((s) => s.entry.setKey === row.setKey && s.content.cases.has(row.caseKey)),
  );
}
