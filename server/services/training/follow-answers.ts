import { and, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { Ctx } from '../context.ts';
import { completeDays } from '../rollups/complete-days.ts';
import { rebuildRollups } from '../rollups/rebuild-rollups.ts';
import { writeDay } from '../rollups/write-day.ts';
import { answersOfDay, type ReviewRow } from './day-counts.ts';
import { foldCases } from './fold-cases.ts';
import { lastPosition, makeShowing, STEP } from './issue-showings.ts';
import { openShowings, type TrainingDay } from './training-day.ts';

/** A missed case comes back after this many others, at most twice a day. */
const RETURNS_AFTER = 4;
const MOST_RETURNS = 2;

/**
 * What follows from new answers, in their transaction: memory and first answers of their cases, rollups of
 * their days (later days too when an answer came late), and the return of what was missed.
 */
export async function followAnswers(
  ctx: Ctx,
  tx: Transaction,
  day: TrainingDay,
  stored: readonly ReviewRow[],
): Promise<{ returning: Set<string> }> {
  // Days without an answer are closed with the memory of before.
  await completeDays(tx, day, day.day - 1);
  const folded = await foldCases(tx, day.actor, [...new Set(stored.map((row) => row.caseKey))]);
  for (const [key, memory] of folded) day.memory.set(key, memory);
  await writeRollups(tx, day, stored);
  return { returning: await bringBack(ctx, tx, day, stored) };
}

/** Rollups of the days these answers touch, today's always. */
export async function writeRollups(
  tx: Transaction,
  day: TrainingDay,
  touched: readonly ReviewRow[],
): Promise<void> {
  const answers = await answersOfDay(tx, day.actor, day.day);
  const misTaps = await misTapsOf(tx, day);
  for (const trained of day.sets) {
    const rows = touched.filter((row) => row.setKey === trained.entry.setKey);
    if (rows.length === 0) continue;
    const earliest = Math.min(...rows.map((row) => row.localDay));
    if (earliest < day.day) {
      await rebuildRollups(tx, day.actor, trained.entry.setKey, { fromDay: earliest, toDay: day.day - 1 });
    }
    await writeDay(tx, day, trained, answers, misTaps);
  }
}

async function misTapsOf(tx: Transaction, day: TrainingDay): Promise<Set<string>> {
  const { misTap, review } = tables;
  const rows = await tx
    .select({ id: misTap.reviewId })
    .from(misTap)
    .innerJoin(
      review,
      and(
        eq(review.clubId, misTap.clubId),
        eq(review.memberId, misTap.memberId),
        eq(review.reviewId, misTap.reviewId),
      ),
    )
    .where(
      and(
        eq(misTap.clubId, day.actor.clubId),
        eq(misTap.memberId, day.actor.memberId),
        eq(review.localDay, day.day),
      ),
    );
  return new Set(rows.map((row) => row.id));
}

/** Issues a missed case again, a few showings on, from a newly drawn angle. */
async function bringBack(
  ctx: Ctx,
  tx: Transaction,
  day: TrainingDay,
  stored: readonly ReviewRow[],
): Promise<Set<string>> {
  const returning = new Set<string>();
  const missed = stored.filter(
    (row) => row.localDay === day.day && (row.outcome === 'missed' || row.outcome === 'late'),
  );
  if (missed.length === 0) return returning;
  const answers = await answersOfDay(tx, day.actor, day.day);
  for (const row of missed) {
    const trained = day.sets.find((s) => s.entry.setKey === row.setKey);
    const open = await openShowings(tx, day);
    const times = answers.filter((a) => a.caseKey === row.caseKey).length;
    if (!trained?.content.cases.has(row.caseKey)) continue;
    if (times > MOST_RETURNS || open.some((s) => s.caseKey === row.caseKey)) continue;
    const after = open[Math.min(RETURNS_AFTER, open.length) - 1]?.position;
    const position = (after ?? (await lastPosition(tx, day)) + STEP) + Math.floor(STEP / 4);
    await tx.insert(tables.showing).values(makeShowing(ctx, day, trained, row.caseKey, 'retest', position));
    returning.add(row.caseKey);
  }
  return returning;
}
