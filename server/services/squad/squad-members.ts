import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';

export interface SquadMember {
  readonly memberId: string;
  readonly nickname: string;
  readonly role: 'member' | 'captain';
  readonly joinedAt: Date;
  readonly timeZone: string;
  readonly rolloverHour: number;
}

/** Everyone in the club now, captains too (they train like the others), by nickname. */
export async function squadMembers(tx: Transaction, clubId: string): Promise<SquadMember[]> {
  const { membership } = tables;
  return tx
    .select({
      memberId: membership.memberId,
      nickname: membership.nickname,
      role: membership.role,
      joinedAt: membership.joinedAt,
      timeZone: membership.timeZone,
      rolloverHour: membership.rolloverHour,
    })
    .from(membership)
    .where(and(eq(membership.clubId, clubId), isNull(membership.leftAt)))
    .orderBy(asc(sql`lower(${membership.nickname})`));
}
