import { and, eq, max } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { MemberDay } from '../training/member-day.ts';
import { readCalibrations } from './read-calibration.ts';
import { type RollupRow, rollupRows } from './rollup-rows.ts';

const NO_ANSWERS = { answers: [], misTaps: new Set<string>() } as const;
/** A member who was away longer gets the last of it only: the days between are written by a rebuild. */
const MOST_DAYS = 400;

/**
 * Writes the rows of the days on which nothing was answered, from the last that stands up to `toDay`: memory has
 * not moved since, only time has passed. A set that is new on the programme begins on `toDay`.
 */
export async function completeDays(tx: Transaction, day: MemberDay, toDay: number): Promise<number> {
  const { rollup } = tables;
  const { clubId, memberId } = day.actor;
  const last = new Map(
    (
      await tx
        .select({ setKey: rollup.setKey, day: max(rollup.day) })
        .from(rollup)
        .where(and(eq(rollup.clubId, clubId), eq(rollup.memberId, memberId)))
        .groupBy(rollup.setKey)
    ).map((row) => [row.setKey, row.day]),
  );
  const rows: RollupRow[] = [];
  for (const { entry, set, content } of day.sets) {
    const fromDay = Math.max((last.get(entry.setKey) ?? toDay - 1) + 1, toDay - MOST_DAYS);
    if (fromDay > toDay) continue;
    const calibration = await readCalibrations(tx, day.actor, { setKey: entry.setKey, fromDay, toDay });
    for (let d = fromDay; d <= toDay; d++) {
      rows.push(
        ...rollupRows({
          clubId,
          memberId,
          day: d,
          set,
          content,
          memory: day.memory,
          calibration: calibration(d),
          ...NO_ANSWERS,
        }),
      );
    }
  }
  if (rows.length > 0) await tx.insert(rollup).values(rows).onConflictDoNothing();
  return rows.length;
}
