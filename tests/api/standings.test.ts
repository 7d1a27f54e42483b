import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { StandingsView } from '#shared/contracts/desk.ts';
import { dealtFromSums, interval, lowerBound, periodMean } from '#shared/standing/index.ts';
import { useApi } from '#tests/support/api.ts';
import type { ClubOfTest, Person } from '#tests/support/factories.ts';
import { insertRollup, londonDay } from '#tests/support/figures.ts';

const api = useApi();

async function club() {
  const made = await api.factory.club();
  const captain = await api.factory.person({ club: made, role: 'captain', onBoards: false });
  await api.factory.assign(made, 'pll');
  return { club: made, captain, today: londonDay(api.clock.now()) };
}

async function read(person: Person, query = ''): Promise<StandingsView> {
  const res = await api.as(person.claims).get(`/api/desk/standings${query}`);
  expect(res.status).toBe(200);
  return res.body as StandingsView;
}

/** Days of one member: newest last, ending `endsAgo` days before today. */
async function train(
  person: Person,
  today: number,
  days: { sumPe: number; sumPee?: number; information?: number; answers: number }[],
): Promise<void> {
  for (const [index, row] of days.entries()) {
    await insertRollup(api.factory, person, { day: today - days.length + 1 + index, ...row });
  }
}

describe('the board', () => {
  it('ranks by the lower bound of the mean of daily figures', async () => {
    const { club: made, captain, today } = await club();
    const high = await api.factory.person({ club: made });
    const sure = await api.factory.person({ club: made });
    // The higher mean rests on next to nothing (wide), the lower one on much (narrow).
    const wide = [
      { sumPe: 260, sumPee: 90, information: 4, answers: 10 },
      { sumPe: 240, sumPee: 90, information: 4, answers: 12 },
    ];
    const narrow = [
      { sumPe: 238, sumPee: 20, information: 40, answers: 40 },
      { sumPe: 242, sumPee: 20, information: 40, answers: 60 },
    ];
    await train(high, today, wide);
    await train(sure, today, narrow);
    const { board } = await read(captain);

    const figureOf = (days: typeof wide) =>
      periodMean(
        days.map((d) => dealtFromSums([{ sumP: 284, sumPe: d.sumPe, sumPee: d.sumPee }], d.information)),
      );
    const [a, b] = [figureOf(wide), figureOf(narrow)];
    expect(a.theta).toBeGreaterThan(b.theta);
    expect(lowerBound(a.theta, a.se)).toBeLessThan(lowerBound(b.theta, b.se));
    expect(board).toMatchObject({ setKey: 'pll', name: 'PLL', edition: 1, limitMs: 3000, days: 28 });
    expect(board?.rows.map(({ rank, nickname }) => [rank, nickname])).toEqual([
      [1, sure.nickname],
      [2, high.nickname],
    ]);
    const [low, top] = interval(b.theta, b.se);
    expect(board?.rows[0]).toEqual({
      rank: 1,
      nickname: sure.nickname,
      isMe: false,
      daysCounted: 2,
      figure: {
        value: expect.closeTo(b.theta, 12),
        low: expect.closeTo(low, 12),
        high: expect.closeTo(top, 12),
        answers: 100,
        few: false,
        rests: 'here',
      },
    });
  });

  it('counts the 28 days that end with the newest, and no day before', async () => {
    const { club: made, captain, today } = await club();
    const member = await api.factory.person({ club: made });
    await insertRollup(api.factory, member, { day: today - 28, sumPe: 284, answers: 500 });
    await insertRollup(api.factory, member, { day: today - 27, sumPe: 142, answers: 20 });
    await insertRollup(api.factory, member, { day: today, sumPe: 71, answers: 5 });
    const { board } = await read(captain);
    expect(board?.rows[0]).toMatchObject({ daysCounted: 2, figure: { value: 0.375, answers: 25 } });
  });

  it('lists members under the floor of 20 answers without a rank, and those who never answered', async () => {
    const { club: made, captain, today } = await club();
    const few = await api.factory.person({ club: made });
    const none = await api.factory.person({ club: made });
    const enough = await api.factory.person({ club: made });
    await train(few, today, [{ sumPe: 280, answers: 19 }]);
    await train(enough, today, [{ sumPe: 100, answers: 20 }]);
    const { board } = await read(captain);
    expect(board?.rows.map((row) => row.nickname)).toEqual([enough.nickname]);
    expect(board?.unranked.map(({ rank, nickname }) => [rank, nickname])).toEqual(
      [few.nickname, none.nickname].sort((a, b) => a.localeCompare(b, 'en')).map((name) => [null, name]),
    );
    expect(board?.unranked.find((row) => row.nickname === none.nickname)?.figure).toMatchObject({
      value: 0,
      answers: 0,
      few: true,
      rests: 'nothing',
    });
  });

  it('shares a rank between equals and skips the next', async () => {
    const { club: made, captain, today } = await club();
    const people = [];
    for (const sumPe of [200, 200, 100]) {
      const person = await api.factory.person({ club: made });
      await train(person, today, [{ sumPe, answers: 30 }]);
      people.push(person);
    }
    const { board } = await read(captain);
    expect(board?.rows.map((row) => row.rank)).toEqual([1, 1, 3]);
  });

  it('shows only members who opted in and answer for the set, and counts those who did not', async () => {
    const { club: made, captain, today } = await club();
    const shown = await api.factory.person({ club: made });
    const shy = await api.factory.person({ club: made, onBoards: false });
    const gone = await api.factory.person({ club: made });
    for (const person of [shown, shy, gone]) await train(person, today, [{ sumPe: 200, answers: 30 }]);
    await api.factory.sql('update membership set left_at = now() where member_id = $1', [gone.memberId]);
    const view = await read(captain);
    expect(view.board?.rows.map((row) => row.nickname)).toEqual([shown.nickname]);
    // The member who keeps off, and the captain of this test.
    expect(view.notOptedIn).toBe(2);
    expect(JSON.stringify(view)).not.toContain(shy.nickname);
    expect(JSON.stringify(view)).not.toContain(shown.memberId);

    await api.factory.assign(made, 'oll', { memberIds: [shy.memberId] });
    const oll = await read(captain, '?setKey=oll');
    expect(oll.board).toMatchObject({ setKey: 'oll', rows: [], unranked: [] });
    expect(oll.notOptedIn).toBe(1);
  });
});

describe('between clubs', () => {
  async function share(clubs: ClubOfTest[]): Promise<string> {
    const boardId = randomUUID();
    await api.factory.sql("insert into shared_board (board_id, name, set_key) values ($1, 'North', 'pll')", [
      boardId,
    ]);
    for (const { clubId } of clubs) {
      await api.factory.sql('insert into shared_board_club (club_id, board_id) values ($1, $2)', [
        clubId,
        boardId,
      ]);
    }
    return boardId;
  }

  it('shows team figures, drawn towards the mean of the board, with the own club marked', async () => {
    const [mine, theirs] = [await club(), await club()];
    const person = await api.factory.person({ club: theirs.club });
    const boardId = await share([mine.club, theirs.club]);
    const publish = (clubId: string, day: number, members: number, theta: number, se: number) =>
      api.factory.sql(
        `insert into published_team_row (club_id, board_id, day, members, theta, standard_error)
         values ($1, $2, $3, $4, $5, $6)`,
        [clubId, boardId, day, members, theta, se],
      );
    await publish(mine.club.clubId, mine.today - 1, 1, 0.1, 0.5);
    await publish(mine.club.clubId, mine.today, 9, 0.8, 0.02);
    await publish(theirs.club.clubId, mine.today, 3, 0.9, 0.03);
    const view = await read(mine.captain);
    // By hand: mean of all twelve (9·.8 + 3·.9)/12 = .825; (9·.8 + 3·.825)/12 and (3·.9 + 3·.825)/6.
    expect(view.sharedBoards).toEqual([
      {
        name: 'North',
        setName: 'PLL',
        rows: [
          {
            club: theirs.club.name,
            isMine: false,
            members: 3,
            value: expect.closeTo(0.8625, 12),
            low: expect.closeTo(0.8625 - 1.645 * 0.015, 12),
            high: expect.closeTo(0.8625 + 1.645 * 0.015, 12),
          },
          {
            club: mine.club.name,
            isMine: true,
            members: 9,
            value: expect.closeTo(0.80625, 12),
            low: expect.closeTo(0.80625 - 1.645 * 0.015, 12),
            high: expect.closeTo(0.80625 + 1.645 * 0.015, 12),
          },
        ],
      },
    ]);
    expect(JSON.stringify(view)).not.toContain(person.nickname);
  });

  it('keeps a board from clubs that are not on it', async () => {
    const [mine, other] = [await club(), await club()];
    await share([other.club]);
    expect((await read(mine.captain)).sharedBoards).toEqual([]);
  });
});

describe('who may read it', () => {
  it('asks for a sign-in, and for a captain', async () => {
    const { club: made } = await club();
    const member = await api.factory.person({ club: made });
    expect((await api.as(null).get('/api/desk/standings')).status).toBe(401);
    expect((await api.as(member.claims).get('/api/desk/standings')).status).toBe(403);
  });

  it('never shows another club, and refuses a set that is not on the programme', async () => {
    const [mine, other] = [await club(), await club()];
    const stranger = await api.factory.person({ club: other.club });
    await train(stranger, other.today, [{ sumPe: 200, answers: 30 }]);
    const view = await read(mine.captain);
    expect(view.board).toMatchObject({ rows: [], unranked: [] });
    expect((await api.as(mine.captain.claims).get('/api/desk/standings?setKey=oll')).status).toBe(404);
    expect((await api.as(mine.captain.claims).get('/api/desk/standings?set=oll')).status).toBe(400);
  });

  it('is empty, not broken, before a set is assigned', async () => {
    const captain = await api.factory.person({ role: 'captain' });
    expect(await read(captain)).toEqual({ sets: [], board: null, notOptedIn: 0, sharedBoards: [] });
  });
});
