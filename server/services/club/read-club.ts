import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { ClubView } from '#shared/contracts/member.ts';
import { interval } from '#shared/standing/index.ts';
import { asMember, type ClubActor, type Ctx } from '../context.ts';
import { BOARD_DAYS, buildBoard } from '../standings/build-board.ts';
import { readProgramme } from '../training/read-programme.ts';
import { presentSettings } from './present-settings.ts';

/** The club as its members see it: boards, team boards, people by nickname, and one's own settings. */
export async function readClub(ctx: Ctx): Promise<ClubView> {
  return asMember(ctx, async (tx, actor) => {
    const { membership } = tables;
    const members = await tx
      .select()
      .from(membership)
      .where(and(eq(membership.clubId, actor.clubId), isNull(membership.leftAt)))
      .orderBy(asc(sql`lower(${membership.nickname})`));
    const me = members.find((member) => member.memberId === actor.memberId);
    if (!me) throw new Error('A session was opened for a membership that is not there.');
    return {
      name: actor.clubName,
      people: members.map(({ nickname, role, memberId }) => ({
        nickname,
        role,
        isMe: memberId === actor.memberId,
      })),
      boards: await boardsOf(tx, actor),
      sharedBoards: await sharedBoardsOf(tx, actor),
      settings: presentSettings(me),
    };
  });
}

async function boardsOf(tx: Transaction, { clubId, memberId }: ClubActor): Promise<ClubView['boards']> {
  const boards: ClubView['boards'] = [];
  for (const { setKey } of await readProgramme(tx, clubId)) {
    const board = await buildBoard(tx, { clubId, setKey, days: BOARD_DAYS, meMemberId: memberId });
    if (board) boards.push(board);
  }
  return boards;
}

interface TeamRow extends Record<string, unknown> {
  club_id: string;
  club_name: string;
  members: number;
  theta: number;
  standard_error: number;
}

/** The boards this club shares with others, the best lower bound first. */
async function sharedBoardsOf(tx: Transaction, { clubId }: ClubActor): Promise<ClubView['sharedBoards']> {
  const { sharedBoard, sharedBoardClub, caseSet } = tables;
  const boards = await tx
    .select({ boardId: sharedBoard.boardId, name: sharedBoard.name, setName: caseSet.name })
    .from(sharedBoardClub)
    .innerJoin(sharedBoard, eq(sharedBoard.boardId, sharedBoardClub.boardId))
    .innerJoin(caseSet, eq(caseSet.setKey, sharedBoard.setKey))
    .where(eq(sharedBoardClub.clubId, clubId))
    .orderBy(asc(sharedBoard.name));
  const views: ClubView['sharedBoards'] = [];
  for (const { boardId, name, setName } of boards) {
    const { rows } = await tx.execute<TeamRow>(sql`select * from published_team_rows(${boardId}::uuid)`);
    const teams = rows.map((row) => {
      const [low, high] = interval(row.theta, row.standard_error);
      return {
        club: row.club_name,
        isMine: row.club_id === clubId,
        members: row.members,
        value: row.theta,
        low,
        high,
      };
    });
    views.push({
      name,
      setName,
      rows: teams.sort((a, b) => b.low - a.low || a.club.localeCompare(b.club, 'en')),
    });
  }
  return views;
}
