import type { Site } from './site.ts';

/** A member as the tables know them. */
export interface MemberRecord {
  readonly memberId: string;
  readonly clubId: string;
  /** Today's rows of the log, oldest first. */
  reviewsToday(): Promise<{ review_id: string; showing_id: string; outcome: string; named: string }[]>;
  answersToday(): Promise<number>;
}

/** A member of a club by nickname. */
export async function memberOf(
  { sql }: Site,
  nickname: string,
  club = 'Harbour Lane Cubers',
): Promise<MemberRecord> {
  const [row] = await sql<{ club_id: string; member_id: string }>(
    'select m.club_id, m.member_id from membership m join club c using (club_id) where m.nickname = $1 and c.name = $2',
    [nickname, club],
  );
  if (!row) throw new Error(`${club} has no ${nickname}.`);
  const { club_id: clubId, member_id: memberId } = row;
  const reviewsToday: MemberRecord['reviewsToday'] = () =>
    sql(
      `select review_id, showing_id, outcome, named from review
       where club_id = $1 and member_id = $2 and received_at > now() - interval '1 hour'
       order by answered_at, review_id`,
      [clubId, memberId],
    );
  return {
    memberId,
    clubId,
    reviewsToday,
    answersToday: async () => (await reviewsToday()).length,
  };
}

/** Gives a member time for twenty showings and more. */
export async function manyMinutes({ sql }: Site, { clubId, memberId }: MemberRecord): Promise<void> {
  await sql('update membership set minutes_per_day = 20 where club_id = $1 and member_id = $2', [
    clubId,
    memberId,
  ]);
}

/** Limits that no slow machine runs into: what a story tests is not how fast it runs. */
export async function longLimits({ sql }: Site, { clubId }: MemberRecord): Promise<void> {
  await sql('update programme set limit_ms = 60000 where club_id = $1', [clubId]);
}

const TABLES = ['review', 'mis_tap', 'case_state', 'first_answer', 'rollup', 'showing'] as const;

/** Every row that belongs to a member's training, in a fixed order. */
export async function everythingOf(
  { sql }: Site,
  { clubId, memberId }: MemberRecord,
): Promise<Record<string, string[]>> {
  const all: Record<string, string[]> = {};
  for (const table of TABLES) {
    const rows = await sql<{ row: string }>(
      `select to_jsonb(t)::text as row from ${table} t where club_id = $1 and member_id = $2 order by 1`,
      [clubId, memberId],
    );
    all[table] = rows.map(({ row }) => row);
  }
  return all;
}
