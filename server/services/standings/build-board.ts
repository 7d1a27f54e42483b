import { and, eq, isNull, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { StandingsBoard } from '#shared/contracts/member.ts';
import { type Estimate, lowerBound, periodMean, rank } from '#shared/standing/index.ts';
import { groupBy } from '../group-by.ts';
import { answeredBefore } from '../standing/answered-before.ts';
import { dayFigures, FEW_ANSWERS, presentFigure } from '../standing/read-figures.ts';
import { type ProgrammeEntry, readProgramme } from '../training/read-programme.ts';

/** Days a board looks back on unless told otherwise. */
export const BOARD_DAYS = 28;

export interface BoardRequest {
  readonly clubId: string;
  readonly setKey: string;
  /** Length of the period in days; it ends with the newest day that any member's rollups have reached. */
  readonly days: number;
  /** Whose row is marked as their own. */
  readonly meMemberId: string;
}

interface Standing {
  readonly nickname: string;
  readonly isMe: boolean;
  readonly estimate: Estimate;
  readonly answers: number;
  readonly daysCounted: number;
  /** Whether there are answers from before the period. */
  readonly before: boolean;
}

const NOTHING: Estimate = { theta: 0, se: 0 };

/**
 * One set's leaderboard: the mean of each member's daily dealt recall over the period, ranked by its lower
 * bound. Only members who have opted in and answer for the set; those under the floor of answers are listed
 * in the order of their names, without a rank. Null for a set that is not on the club's programme.
 *
 * Reads rollups only. All members of a club change edition and limit on the same day, so their days compare.
 */
export async function buildBoard(tx: Transaction, request: BoardRequest): Promise<StandingsBoard | null> {
  const { clubId, setKey, days, meMemberId } = request;
  const entry = (await readProgramme(tx, clubId)).find((one) => one.setKey === setKey);
  if (!entry) return null;
  const members = (await boardMembers(tx, clubId, entry)).filter((member) => member.onBoards);
  const toDay = await newestDay(tx, clubId, setKey);
  const figures =
    toDay === null ? [] : await dayFigures(tx, { clubId, setKey, fromDay: toDay - days + 1, toDay });
  const byMember = groupBy(figures, (figure) => figure.memberId);
  const before = await answeredBefore(
    tx,
    clubId,
    members.map(({ memberId }) => ({ memberId, setKey, group: null })),
  );
  const standings = members.map(({ memberId, nickname }): Standing => {
    const own = byMember.get(memberId) ?? [];
    return {
      nickname,
      isMe: memberId === meMemberId,
      estimate: own.length > 0 ? periodMean(own) : NOTHING,
      answers: own.reduce((sum, day) => sum + day.answers, 0),
      daysCounted: own.length,
      before: before({ memberId, setKey, group: null }),
    };
  });
  const ranked = rank(
    standings.filter((one) => one.answers >= FEW_ANSWERS),
    ({ estimate }) => lowerBound(estimate.theta, estimate.se),
    byNickname,
  );
  return {
    setKey,
    name: entry.setName,
    edition: entry.edition,
    limitMs: entry.limitMs,
    days,
    rows: ranked.map(({ row, rank }) => present(row, rank)),
    unranked: standings
      .filter((one) => one.answers < FEW_ANSWERS)
      .sort(byNickname)
      .map((one) => present(one, null)),
  };
}

function present(standing: Standing, rank: number | null): StandingsBoard['rows'][number] {
  const { nickname, isMe, estimate, answers, daysCounted, before } = standing;
  return { rank, nickname, isMe, daysCounted, figure: presentFigure(estimate, answers, before) };
}

function byNickname(a: Standing, b: Standing): number {
  return a.nickname.localeCompare(b.nickname, 'en');
}

/** The members who answer for a set now, and whether they have opted in to boards. */
export async function boardMembers(
  tx: Transaction,
  clubId: string,
  entry: ProgrammeEntry,
): Promise<{ memberId: string; nickname: string; onBoards: boolean }[]> {
  const { membership } = tables;
  const rows = await tx
    .select({
      memberId: membership.memberId,
      nickname: membership.nickname,
      onBoards: membership.onBoards,
    })
    .from(membership)
    .where(and(eq(membership.clubId, clubId), isNull(membership.leftAt)));
  return rows.filter(({ memberId }) => entry.memberIds === null || entry.memberIds.has(memberId));
}

async function newestDay(tx: Transaction, clubId: string, setKey: string): Promise<number | null> {
  const { rollup } = tables;
  const [row] = await tx
    .select({ day: rollup.day })
    .from(rollup)
    .where(and(eq(rollup.clubId, clubId), eq(rollup.setKey, setKey)))
    .orderBy(sql`${rollup.day} desc`)
    .limit(1);
  return row?.day ?? null;
}
