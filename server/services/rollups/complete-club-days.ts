import { and, eq, isNull } from 'drizzle-orm';
import { type Database, tables } from '#database/client.ts';
import type { Clock, ClubActor } from '../context.ts';
import { dayOf } from '../standing/local-date.ts';
import { publishTeamRows } from '../standings/publish-team-rows.ts';
import { readMemberDay } from '../training/member-day.ts';
import { solveMemberBeta } from '../training/solve-beta.ts';
import { completeDays } from './complete-days.ts';

/**
 * Closes every member's days up to now, solves their β for the day, and publishes the team figures of the clubs that share a board. As the
 * owner: it goes from club to club. One transaction a member, so that nobody waits for the whole.
 */
export async function completeClubDays(
  owner: Database,
  clock: Clock,
): Promise<{ rows: number; teams: number }> {
  const { club, membership } = tables;
  let rows = 0;
  let teams = 0;
  for (const { clubId, name, timeZone } of await owner.select().from(club)) {
    const members = await owner
      .select()
      .from(membership)
      .where(and(eq(membership.clubId, clubId), isNull(membership.leftAt)));
    for (const member of members) {
      const actor: ClubActor = { ...member, clubName: name };
      rows += await owner.transaction(async (tx) => {
        const day = await readMemberDay({ clock }, tx, actor, { hold: true });
        await solveMemberBeta(tx, day);
        return completeDays(tx, day, day.day);
      });
    }
    const today = dayOf({ clock }, { timeZone, rolloverHour: 4 });
    teams += await owner.transaction((tx) => publishTeamRows(tx, clubId, today));
  }
  return { rows, teams };
}
