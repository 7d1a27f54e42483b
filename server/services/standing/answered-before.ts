import { sql } from 'drizzle-orm';
import type { Transaction } from '#database/client.ts';

/** A figure of a member: of a set, or of one group of it (null: all of it). */
export interface FigureOf {
  readonly memberId: string;
  readonly setKey: string;
  readonly group: string | null;
}

/**
 * Of the figures asked about, which rest on a scored answer given through their own set, however long ago. The others
 * rest on answers to the same cases through another set: memory hangs on the case. One step in an index for each.
 */
export async function answeredBefore(
  tx: Transaction,
  clubId: string,
  asked: readonly FigureOf[],
): Promise<(figure: FigureOf) => boolean> {
  if (asked.length === 0) return () => false;
  const { rows } = await tx.execute<{ member_id: string; set_key: string; group_name: string | null }>(sql`
    select a.member_id, a.set_key, a.group_name
    from unnest(${sql.param(asked.map((one) => one.memberId))}::uuid[],
      ${sql.param(asked.map((one) => one.setKey))}::text[],
      ${sql.param(asked.map((one) => one.group))}::text[]) as a(member_id, set_key, group_name)
    where exists (
      select 1 from rollup r
      where r.club_id = ${clubId}::uuid and r.member_id = a.member_id and r.set_key = a.set_key
        and (a.group_name is null or r.group_name = a.group_name) and r.answers > 0)`);
  const found = new Set(
    rows.map((row) => nameOf({ memberId: row.member_id, setKey: row.set_key, group: row.group_name })),
  );
  return (figure) => found.has(nameOf(figure));
}

function nameOf({ memberId, setKey, group }: FigureOf): string {
  return JSON.stringify([memberId, setKey, group]);
}
