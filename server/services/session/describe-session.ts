import { sql } from 'drizzle-orm';
import type { Database, Transaction } from '#database/client.ts';
import type { SessionView } from '#shared/contracts/session.ts';
import type { Role } from '../context.ts';

interface MembershipRow extends Record<string, unknown> {
  club_id: string;
  club_name: string;
  member_id: string;
  role: 'member' | 'captain';
  nickname: string;
}

export async function membershipsOf(db: Database | Transaction, accountId: string): Promise<MembershipRow[]> {
  const { rows } = await db.execute<MembershipRow>(sql`select * from memberships_of(${accountId}::uuid)`);
  return rows;
}

/** What pages show of a session: the club one is in, and the ones one can switch to. */
export function presentSession(
  memberships: readonly MembershipRow[],
  session: { role: Role; clubId: string | null },
  { isAdministrator, pictures }: Pick<SessionView, 'isAdministrator' | 'pictures'>,
): SessionView {
  const here = memberships.find((m) => m.club_id === session.clubId);
  return {
    role: session.role,
    nickname: here?.nickname ?? null,
    club: here ? { clubId: here.club_id, name: here.club_name } : null,
    clubs: memberships.map((m) => ({
      clubId: m.club_id,
      name: m.club_name,
      role: m.role,
      nickname: m.nickname,
    })),
    isAdministrator,
    pictures,
  };
}

/** The first place of a role. */
export function homeOf(role: Role): string {
  return role === 'administrator' ? '/admin/intake' : role === 'captain' ? '/desk/squad' : '/today';
}
