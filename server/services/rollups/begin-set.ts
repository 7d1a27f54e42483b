import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';
import type { ClubActor, Ctx } from '../context.ts';
import { dayOfMember } from '../squad/day-of-member.ts';
import { dayOf } from '../standing/local-date.ts';
import { completeDays } from './complete-days.ts';

/**
 * Writes the figures of a set that was assigned for the members who know cases of it already, through another set or
 * from before: their figure is true at once and not first when they open Today. Who knows none has no row: not begun.
 * Their membership rows are held until the transaction ends, as when they answer.
 */
export async function beginSet(ctx: Ctx, tx: Transaction, captain: ClubActor, setKey: string): Promise<void> {
  // A member west of the captain may be a day behind: a row of the day before is as new as theirs can be.
  const since = dayOf(ctx, captain) - 1;
  const { rows } = await tx.execute<{ member_id: string }>(sql`
    select m.member_id
    from membership m
    join programme p on p.club_id = m.club_id and p.set_key = ${setKey}
    where m.club_id = ${captain.clubId}::uuid and m.left_at is null
      and (p.for_everyone or exists (
        select 1 from programme_member c
        where c.club_id = m.club_id and c.set_key = p.set_key and c.member_id = m.member_id))
      and exists (
        select 1 from case_state s
        join set_case c on c.set_key = p.set_key and c.case_key = s.case_key
        where s.club_id = m.club_id and s.member_id = m.member_id)
      and not exists (
        select 1 from rollup r
        where r.club_id = m.club_id and r.member_id = m.member_id and r.set_key = p.set_key and r.day >= ${since})
    order by m.member_id`);
  for (const { member_id: memberId } of rows) {
    const day = await dayOfMember(ctx, tx, captain, memberId, { hold: true });
    await completeDays(tx, day, day.day);
  }
}
