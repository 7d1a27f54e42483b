import { sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import { teamFigure } from '#shared/standing/index.ts';
import { latestFigures } from '../standing/read-figures.ts';

/** memory.md, section 5: a team is all members active in the last 30 days. */
const ACTIVE_DAYS = 30;

/**
 * Publishes a club's team figure on the boards it shares, for the day: of the team, never of a person.
 * Runs as the owner or in a session of the club.
 */
export async function publishTeamRows(tx: Transaction, clubId: string, day: number): Promise<number> {
  const { rows: boards } = await tx.execute<{ board_id: string; set_key: string }>(sql`
    select b.board_id, b.set_key from shared_board_club c join shared_board b on b.board_id = c.board_id
    where c.club_id = ${clubId}::uuid`);
  if (boards.length === 0) return 0;
  const { rows: active } = await tx.execute<{ member_id: string; set_key: string }>(sql`
    select r.member_id, r.set_key from rollup r
    join membership m on m.club_id = r.club_id and m.member_id = r.member_id and m.left_at is null
    where r.club_id = ${clubId}::uuid and r.day > ${day - ACTIVE_DAYS}
    group by 1, 2 having sum(r.answers) > 0`);
  const figures = await latestFigures(tx, { clubId });
  let published = 0;
  for (const { board_id: boardId, set_key: setKey } of boards) {
    const who = new Set(active.filter((a) => a.set_key === setKey).map((a) => a.member_id));
    const members = figures.filter((f) => f.setKey === setKey && who.has(f.memberId));
    if (members.length === 0) continue;
    // The plain mean goes out; the board draws it towards the mean of all teams when it is read.
    const { mean: theta, se } = teamFigure(members, 0);
    await tx
      .insert(tables.publishedTeamRow)
      .values({ clubId, boardId, day, members: members.length, theta, standardError: se })
      .onConflictDoUpdate({
        target: [
          tables.publishedTeamRow.clubId,
          tables.publishedTeamRow.boardId,
          tables.publishedTeamRow.day,
        ],
        set: { members: members.length, theta, standardError: se },
      });
    published += 1;
  }
  return published;
}
