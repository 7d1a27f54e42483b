import { and, eq, inArray } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { ClubActor } from '../context.ts';

export type ReviewRow = typeof tables.review.$inferSelect;

/** A local day's answers of one member, oldest first. */
export async function answersOfDay(tx: Transaction, actor: ClubActor, day: number): Promise<ReviewRow[]> {
  const { review } = tables;
  return tx
    .select()
    .from(review)
    .where(
      and(eq(review.clubId, actor.clubId), eq(review.memberId, actor.memberId), eq(review.localDay, day)),
    )
    .orderBy(review.answeredAt, review.reviewId);
}

/** Which of a local day's answers were mis-taps. */
export async function misTapsOfDay(tx: Transaction, actor: ClubActor, day: number): Promise<Set<string>> {
  const { misTap } = tables;
  const rows = await tx
    .select({ id: misTap.reviewId })
    .from(misTap)
    .where(
      and(eq(misTap.clubId, actor.clubId), eq(misTap.memberId, actor.memberId), eq(misTap.localDay, day)),
    );
  return new Set(rows.map((row) => row.id));
}

/** What the fold and the rollups need of an answer: the hot path reads no more. */
const logColumns = {
  reviewId: tables.review.reviewId,
  setKey: tables.review.setKey,
  caseKey: tables.review.caseKey,
  answeredAt: tables.review.answeredAt,
  localDay: tables.review.localDay,
  outcome: tables.review.outcome,
  scored: tables.review.scored,
  keysOffered: tables.review.keysOffered,
  onBoards: tables.review.onBoards,
  carried: tables.review.carried,
  recognitionMs: tables.review.recognitionMs,
  namingMs: tables.review.namingMs,
};

export type LoggedAnswer = Pick<ReviewRow, keyof typeof logColumns>;

/** The whole log of some cases of one member, and which of its answers were mis-taps. */
export async function logOfCases(
  tx: Transaction,
  actor: Pick<ClubActor, 'clubId' | 'memberId'>,
  caseKeys: readonly string[],
): Promise<{ rows: LoggedAnswer[]; misTaps: Set<string> }> {
  if (caseKeys.length === 0) return { rows: [], misTaps: new Set() };
  const { review, misTap } = tables;
  const rows = await tx
    .select(logColumns)
    .from(review)
    .where(
      and(
        eq(review.clubId, actor.clubId),
        eq(review.memberId, actor.memberId),
        inArray(review.caseKey, [...caseKeys]),
      ),
    );
  const taps = await tx
    .select({ reviewId: misTap.reviewId })
    .from(misTap)
    .where(
      and(
        eq(misTap.clubId, actor.clubId),
        eq(misTap.memberId, actor.memberId),
        inArray(misTap.caseKey, [...caseKeys]),
      ),
    );
  return { rows, misTaps: new Set(taps.map((t) => t.reviewId)) };
}

/** Milliseconds a showing took its member: recognition and naming. */
export function spentMs(row: Pick<ReviewRow, 'recognitionMs' | 'namingMs'>): number {
  return (row.recognitionMs ?? 0) + (row.namingMs ?? 0);
}
