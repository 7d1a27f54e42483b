import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';

/** A member's rollup row of one set and group on one day, as the figures are summed from. */
export interface GroupSums {
  readonly memberId: string;
  readonly setKey: string;
  readonly group: string;
  readonly day: number;
  readonly sumP: number;
  readonly sumPe: number;
  readonly sumPee: number;
  readonly shift: number;
  readonly information: number;
}

interface Whose {
  readonly clubId: string;
  readonly memberIds: readonly string[];
  readonly setKeys: readonly string[];
}

interface SumsRow extends Record<string, unknown> {
  member_id: string;
  set_key: string;
  group_name: string;
  day: number;
  sum_p: number;
  sum_pe: number;
  sum_pee: number;
  shift: number;
  information: number;
}

/**
 * Rows of the newest day in the span of every member × set, a row for each group. Finds each newest day by one
 * step in the index, whatever the length of the history.
 */
export async function newestSums(
  tx: Transaction,
  { clubId, memberIds, setKeys }: Whose,
  span: { fromDay: number; toDay: number },
): Promise<GroupSums[]> {
  const { rows } = await tx.execute<SumsRow>(sql`
    select r.member_id, r.set_key, r.group_name, r.day, r.sum_p, r.sum_pe, r.sum_pee, r.shift, r.information
    from unnest(${sql.param(memberIds)}::uuid[]) as m(member_id)
    cross join unnest(${sql.param(setKeys)}::text[]) as s(set_key)
    cross join lateral (
      select n.day from rollup n
      where n.club_id = ${clubId}::uuid and n.member_id = m.member_id and n.set_key = s.set_key
        and n.day between ${span.fromDay} and ${span.toDay}
      order by n.day desc limit 1
    ) newest
    join rollup r on r.club_id = ${clubId}::uuid and r.member_id = m.member_id and r.set_key = s.set_key
      and r.day = newest.day
    order by r.group_name`);
  return rows.map((row) => ({
    memberId: row.member_id,
    setKey: row.set_key,
    group: row.group_name,
    day: row.day,
    sumP: row.sum_p,
    sumPe: row.sum_pe,
    sumPee: row.sum_pee,
    shift: row.shift,
    information: row.information,
  }));
}

/** What a member did for one set and group over a period. */
export interface Activity {
  readonly memberId: string;
  readonly setKey: string;
  readonly group: string;
  readonly answers: number;
  readonly spentMs: number;
}

/** Answers and time spent from a day on, by member, set and group. */
export async function activitySince(
  tx: Transaction,
  { clubId, memberIds }: Pick<Whose, 'clubId' | 'memberIds'>,
  fromDay: number,
): Promise<Activity[]> {
  const { rows } = await tx.execute<{
    member_id: string;
    set_key: string;
    group_name: string;
    answers: number;
    spent_ms: number;
  }>(sql`
    select member_id, set_key, group_name, sum(answers)::int as answers, sum(spent_ms)::float8 as spent_ms
    from rollup
    where club_id = ${clubId}::uuid and member_id = any(${sql.param(memberIds)}::uuid[]) and day >= ${fromDay}
    group by member_id, set_key, group_name`);
  return rows.map((row) => ({
    memberId: row.member_id,
    setKey: row.set_key,
    group: row.group_name,
    answers: row.answers,
    spentMs: row.spent_ms,
  }));
}

/** The local day of each member's last answer in this club; members without any are left out. */
export async function lastTrainedDays(
  tx: Transaction,
  { clubId, memberIds }: Pick<Whose, 'clubId' | 'memberIds'>,
): Promise<Map<string, number>> {
  const { rows } = await tx.execute<{ member_id: string; day: number }>(sql`
    select m.member_id, last.local_day as day
    from unnest(${sql.param(memberIds)}::uuid[]) as m(member_id)
    cross join lateral (
      select r.local_day from review r
      where r.club_id = ${clubId}::uuid and r.member_id = m.member_id and not r.carried
      order by r.local_day desc limit 1
    ) last`);
  return new Map(rows.map((row) => [row.member_id, row.day]));
}
