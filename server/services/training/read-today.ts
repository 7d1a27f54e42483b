import type { TodayView } from '#shared/contracts/today.ts';
import { asMember, type Ctx } from '../context.ts';
import { completeDays } from '../rollups/complete-days.ts';
import { presentToday } from './present-today.ts';
import { readTrainingDay } from './training-day.ts';

/** The member's queue of their local day; issues what is to come next. */
export async function readToday(ctx: Ctx): Promise<TodayView> {
  return asMember(ctx, async (tx, actor) => {
    const day = await readTrainingDay(ctx, tx, actor);
    await completeDays(tx, day, day.day);
    return presentToday(ctx, tx, day);
  });
}
