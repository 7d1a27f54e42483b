import { sql } from 'drizzle-orm';
import type { Database } from '#database/client.ts';

/** The seed is complete when the database says so itself: written last. */
const MARK = 'demonstration complete';

export async function isSeeded(owner: Database): Promise<boolean> {
  const { rows } = await owner.execute<{ comment: string | null }>(
    sql`select obj_description('public.club'::regclass, 'pg_class') as comment`,
  );
  return rows[0]?.comment === MARK;
}

export async function markSeeded(owner: Database): Promise<void> {
  await owner.execute(sql.raw(`comment on table club is '${MARK}'`));
}

/** Takes away what a broken-off seed left. Refuses where there are people it did not make. */
export async function clearDemo(owner: Database): Promise<void> {
  const { rows } = await owner.execute<{ strangers: number }>(sql`
    select count(*)::int as strangers from account
    where email not like '%.example' and sign_in_name !~ '-(harbour|quay)$'`);
  if ((rows[0]?.strangers ?? 0) > 0) {
    throw new Error('This database holds people who are not of the demonstration. Nothing was changed.');
  }
  await owner.execute(sql`delete from shared_board`);
  await owner.execute(sql`delete from club`);
  await owner.execute(sql`delete from account`);
}
