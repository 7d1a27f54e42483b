import { and, eq, isNull } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { uuid } from '#shared/contracts/common.ts';
import { notFound } from '../../http/problem.ts';
import type { ClubActor, Ctx } from '../context.ts';
import { type MemberDay, readMemberDay } from '../training/member-day.ts';

const NOT_HERE = 'There is no such member in your club.';

/**
 * A member's day as their captain looks at it: the same as the member's own, but nothing is issued, and nothing is
 * held unless `hold` asks for it.
 * @throws Problem not-found for somebody who is not in the club (any more).
 */
export async function dayOfMember(
  ctx: Ctx,
  tx: Transaction,
  captain: ClubActor,
  memberId: string,
  { hold = false } = {},
): Promise<MemberDay> {
  const { membership } = tables;
  if (!uuid.safeParse(memberId).success) throw notFound(NOT_HERE);
  const [member] = await tx
    .select()
    .from(membership)
    .where(
      and(
        eq(membership.clubId, captain.clubId),
        eq(membership.memberId, memberId),
        isNull(membership.leftAt),
      ),
    );
  if (!member) throw notFound(NOT_HERE);
  const { accountId, role, nickname, timeZone, rolloverHour } = member;
  const actor = { ...captain, accountId, memberId, role, nickname, timeZone, rolloverHour };
  return readMemberDay(ctx, tx, actor, { hold });
}
