import { openDatabase } from '#database/client.ts';
import { rebuildMember } from '#server/services/rollups/rebuild-member.ts';
import type { TestApi } from './api.ts';
import type { Person } from './factories.ts';

/** All that is folded from a member's log: memory, first answers and rollups, in a fixed order. */
export async function derivedOf(api: TestApi, person: Person): Promise<Record<string, unknown[]>> {
  const { clubId, memberId } = person;
  const read = (table: string, order: string) =>
    api.factory.sql(`select * from ${table} where club_id = $1 and member_id = $2 order by ${order}`, [
      clubId,
      memberId,
    ]);
  return {
    states: await read('case_state', 'case_key'),
    firsts: await read('first_answer', 'case_key, local_day'),
    rollups: await read('rollup', 'set_key, day, group_name'),
  };
}

/** Rebuilds as a job does: as the owner, in one transaction. */
export async function rebuild(api: TestApi, person: Person): Promise<void> {
  const owner = openDatabase(api.urls.ownerUrl, { max: 1 });
  try {
    await owner.db.transaction((tx) => rebuildMember(tx, person));
  } finally {
    await owner.pool.end();
  }
}
