import { and, eq } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { TrainedSet } from '../training/member-day.ts';
import type { TrainingDay } from '../training/training-day.ts';
import { readCalibrations } from './read-calibration.ts';
import { rollupRows } from './rollup-rows.ts';

/** Writes today's rows of one set anew from the member's memory and the day's answers. */
export async function writeDay(
  tx: Transaction,
  day: TrainingDay,
  { entry, set, content }: TrainedSet,
): Promise<void> {
  const { rollup } = tables;
  const { clubId, memberId } = day.actor;
  const calibration = await readCalibrations(tx, day.actor, {
    set,
    fromDay: day.day,
    toDay: day.day,
  });
  const rows = rollupRows({
    clubId,
    memberId,
    day: day.day,
    set,
    content,
    memory: day.memory,
    calibration: calibration(day.day),
    answers: day.answers.filter((a) => a.setKey === entry.setKey),
    misTaps: day.misTaps,
  });
  await tx
    .delete(rollup)
    .where(
      and(
        eq(rollup.clubId, clubId),
        eq(rollup.memberId, memberId),
        eq(rollup.setKey, entry.setKey),
        eq(rollup.day, day.day),
      ),
    );
  if (rows.length > 0) await tx.insert(rollup).values(rows);
}
