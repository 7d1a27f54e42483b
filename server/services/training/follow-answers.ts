import { and, between, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { loadCaseSet } from '../catalogue/load-set.ts';
import type { Ctx } from '../context.ts';
import { completeDays } from '../rollups/complete-days.ts';
import { rebuildRollups } from '../rollups/rebuild-rollups.ts';
import { writeDay } from '../rollups/write-day.ts';
import type { ReviewRow } from './day-counts.ts';
import { foldCases } from './fold-cases.ts';
import { COSTS, lastPosition, makeShowing, STEP } from './issue-showings.ts';
import type { TrainingDay } from './training-day.ts';

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
  const folded = await foldCases(
    tx,
    day.actor,
    [...new Set(stored.map((row) => row.caseKey))],
    Math.min(day.day, ...stored.map((row) => row.localDay)),
  );
  for (const [key, memory] of folded) day.memory.set(key, memory);
  day.answers.push(...stored.filter((row) => row.localDay === day.day));
  await writeRollups(tx, day, stored);
  return { returning: await bringBack(ctx, tx, day, stored) };
}

/**
 * Rollups of the days these answers touch, today's always: of every set that has their cases, whichever of them
 * the answers came through, because memory hangs on the case.
 */
export async function writeRollups(
  tx: Transaction,
  day: TrainingDay,
  touched: readonly ReviewRow[],
): Promise<void> {
  if (touched.length === 0) return;
  for (const trained of day.sets) {
    const rows = touched.filter((row) => trained.set.byKey(row.caseKey));
    if (rows.length === 0) continue;
    const earliest = Math.min(...rows.map((row) => row.localDay));
    if (earliest < day.day) {
      await rebuildRollups(tx, day.actor, trained.entry.setKey, { fromDay: earliest, toDay: day.day - 1 });
    }
    await writeDay(tx, day, trained);
  }
  const fromDay = Math.min(...touched.map((row) => row.localDay));
  for (const setKey of await laidAside(tx, day, fromDay)) {
    const set = await loadCaseSet(tx, setKey);
    if (!touched.some((row) => set.byKey(row.caseKey))) continue;
    await rebuildRollups(tx, day.actor, setKey, { fromDay, toDay: day.day });
  }
}

/** Sets the member no longer answers for that have rows of these days: one moves from a subset to the whole. */
async function laidAside(tx: Transaction, day: TrainingDay, fromDay: number): Promise<string[]> {
  const { rollup } = tables;
  const rows = await tx
    .selectDistinct({ setKey: rollup.setKey })
    .from(rollup)
    .where(
      and(
        eq(rollup.clubId, day.actor.clubId),
        eq(rollup.memberId, day.actor.memberId),
        between(rollup.day, fromDay, day.day),
      ),
    );
  return rows
    .map(({ setKey }) => setKey)
    .filter((key) => !day.sets.some(({ entry }) => entry.setKey === key));
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
  const rows: (typeof tables.showing.$inferInsert)[] = [];
  let end = missed.length > 0 ? await lastPosition(tx, day) : 0;
  for (const row of missed) {
    const trained = day.sets.find((s) => s.content.cases.has(row.caseKey));
    const times = day.answers.filter((a) => a.caseKey === row.caseKey).length;
    if (!trained || returning.has(row.caseKey)) continue;
    if (times > MOST_RETURNS || day.open.some((s) => s.caseKey === row.caseKey)) continue;
    const after: number = day.open[Math.min(RETURNS_AFTER, day.open.length) - 1]?.position ?? end + STEP;
    // Several that come back at the same place keep their order.
    const position = after + 10 * (rows.length + 1);
    end = Math.max(end, position);
    rows.push(
      makeShowing(ctx, day, trained, {
        caseKey: row.caseKey,
        reason: 'retest',
        plannedSeconds: COSTS.retest,
        position,
      }),
    );
    returning.add(row.caseKey);
  }
  if (rows.length > 0) {
    day.open.push(...(await tx.insert(tables.showing).values(rows).returning()));
    day.open.sort((a, b) => a.position - b.position);
  }
  return returning;
}
