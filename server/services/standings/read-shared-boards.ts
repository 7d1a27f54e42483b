import { asc, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';
import { type Transaction, tables } from '#database/client.ts';
import type { sharedBoardView } from '#shared/contracts/member.ts';
import { interval, TEAM_SHRINKAGE } from '#shared/standing/index.ts';

interface TeamRow extends Record<string, unknown> {
  club_id: string;
  club_name: string;
  members: number;
  theta: number;
  standard_error: number;
}

type Board = z.infer<typeof sharedBoardView>;

/**
 * The boards a club shares with others: the newest figure each club has published of itself, drawn towards the
 * mean of all members on the board, highest first. Only team figures pass the wall between clubs, through one
 * SQL function.
 */
export async function readSharedBoards(tx: Transaction, clubId: string): Promise<Board[]> {
  const { sharedBoard, sharedBoardClub, caseSet } = tables;
  const boards = await tx
    .select({ boardId: sharedBoard.boardId, name: sharedBoard.name, setName: caseSet.name })
    .from(sharedBoardClub)
    .innerJoin(sharedBoard, eq(sharedBoard.boardId, sharedBoardClub.boardId))
    .innerJoin(caseSet, eq(caseSet.setKey, sharedBoard.setKey))
    .where(eq(sharedBoardClub.clubId, clubId))
    .orderBy(asc(sharedBoard.name), asc(sharedBoard.boardId));
  const views: Board[] = [];
  for (const { boardId, name, setName } of boards) {
    const { rows } = await tx.execute<TeamRow>(
      sql`select club_id, club_name, members, theta, standard_error from published_team_rows(${boardId}::uuid)`,
    );
    views.push({ name, setName, rows: teamsOf(rows, clubId) });
  }
  return views;
}

/**
 * (Σ Θ + 3·Θ̄)/(M + 3) with Θ̄ the mean over all members of the board, and the error of the mean times
 * M/(M + 3): a small team does not lead, or trail, by chance alone.
 */
function teamsOf(rows: readonly TeamRow[], clubId: string): Board['rows'] {
  const people = rows.reduce((sum, row) => sum + row.members, 0);
  const mean = rows.reduce((sum, row) => sum + row.members * row.theta, 0) / Math.max(1, people);
  return rows
    .map((row) => {
      const weight = row.members / (row.members + TEAM_SHRINKAGE);
      const value = weight * row.theta + (1 - weight) * mean;
      const [low, high] = interval(value, weight * row.standard_error);
      return {
        club: row.club_name,
        isMine: row.club_id === clubId,
        members: row.members,
        value,
        low,
        high,
      };
    })
    .sort((a, b) => b.value - a.value || a.club.localeCompare(b.club, 'en'));
}
