import type { Transaction } from '#database/client.ts';
import { readCalibrations } from '../rollups/read-calibration.ts';
import type { MemberDay } from '../training/member-day.ts';

/** By set: the shift that turns the model's recall of today into this member's. */
export async function readShifts(tx: Transaction, day: MemberDay): Promise<Map<string, number>> {
  const shifts = new Map<string, number>();
  for (const { entry, set } of day.sets) {
    const span = { set, fromDay: day.day, toDay: day.day };
    const calibration = await readCalibrations(tx, day.actor, span);
    shifts.set(entry.setKey, calibration(day.day).b);
  }
  return shifts;
}
