import { and, asc, eq } from 'drizzle-orm';
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
  /** The day's showings that have been answered, by id. */
  readonly answered: Map<string, ShowingRow>;
}

/** Reads a member's training day and holds their membership row until the transaction ends. */
export async function readTrainingDay(ctx: Ctx, tx: Transaction, actor: ClubActor): Promise<TrainingDay> {
  const day = await readMemberDay(ctx, tx, actor, { hold: true });
  const showings = await showingsOfDay(tx, day);
  return {
    ...day,
    answers: await answersOfDay(tx, actor, day.day),
    misTaps: await misTapsOfDay(tx, actor, day.day),
    open: openOnes(day, showings),
    answered: new Map(showings.filter((s) => s.reviewId !== null).map((s) => [s.showingId, s])),
  };
}

async function showingsOfDay(tx: Transaction, { actor, day }: MemberDay): Promise<ShowingRow[]> {
  const { showing } = tables;
  return tx
    .select()
    .from(showing)
    .where(
      and(eq(showing.clubId, actor.clubId), eq(showing.memberId, actor.memberId), eq(showing.localDay, day)),
    )
    .orderBy(asc(showing.position));
}

/** Those still to be answered. An edition published since may have dropped the case, or the club the whole set. */
function openOnes({ sets }: MemberDay, showings: readonly ShowingRow[]): ShowingRow[] {
  return showings.filter(
    (row) =>
      row.reviewId === null &&
      sets.some((s) => s.entry.setKey === row.setKey && s.content.cases.has(row.caseKey)),
  );
}
