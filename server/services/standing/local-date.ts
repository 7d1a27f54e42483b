import { localDay } from '#shared/memory/index.ts';
import type { ClubActor, Ctx } from '../context.ts';

export { isoDate } from '#shared/memory/index.ts';

/** The member's training day now: it begins at their rollover hour, in their time zone. */
export function dayOf(ctx: Pick<Ctx, 'clock'>, actor: Pick<ClubActor, 'timeZone' | 'rolloverHour'>): number {
  return localDay(ctx.clock.now(), actor.timeZone, actor.rolloverHour);
}
