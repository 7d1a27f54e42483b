import { and, eq, max } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { EditionContent } from '../catalogue/read-edition.ts';
import type { MemberDay } from '../training/member-day.ts';
import { readCalibrations } from './read-calibration.ts';
import { rebuildRollups } from './rebuild-rollups.ts';
import { type RollupRow, rollupRows } from './rollup-rows.ts';

const NO_ANSWERS = { answers: [], misTaps: new Set<string>() } as const;
/** A member who was away longer gets the last of it only: the days between are written by a rebuild. */
const MOST_DAYS = 400;

/**
 * Writes the rows of the days on which nothing was answered, from the last that stands up to `toDay`: memory has
 * not moved since, only time has passed, unless another set has the same cases; then they are made from the log.
 * A set that is new on the programme begins on `toDay`.
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
  const moved: { setKey: string; fromDay: number }[] = [];
  for (const { entry, set, content } of day.sets) {
    const fromDay = Math.max((last.get(entry.setKey) ?? toDay - 1) + 1, toDay - MOST_DAYS);
    if (fromDay > toDay) continue;
    const calibration = await readCalibrations(tx, day.actor, { set, fromDay, toDay });
    if (movedSince(day, content, { fromDay, toDay })) moved.push({ setKey: entry.setKey, fromDay });
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
  for (const { setKey, fromDay } of moved) await rebuildRollups(tx, day.actor, setKey, { fromDay, toDay });
  return rows.length;
}

/** Whether cases of the set were answered on a day to be filled: through another set that has them too. */
function movedSince(
  { memory }: MemberDay,
  { cases }: EditionContent,
  { fromDay, toDay }: { fromDay: number; toDay: number },
): boolean {
  return [...cases.keys()].some((key) => {
    const lastDay = memory.get(key)?.lastDay;
    return lastDay !== undefined && lastDay >= fromDay && lastDay < toDay;
  });
}
