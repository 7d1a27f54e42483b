import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { useApi } from '#tests/support/api.ts';
import { answerAll, member } from './member-support.ts';

const api = useApi();

const settings = { minutesPerDay: 8, onBoards: true, holding: 'left', crossColours: 'white+yellow' };

describe('the club page', () => {
  it('shows people by nickname and nothing else of them', async () => {
    const me = await member(api, ['pll']);
    const captain = await api.factory.person({ club: me.club, role: 'captain' });
    const { status, body, text } = await api.as(me.claims).get('/api/club');
    expect(status).toBe(200);
    expect(body.name).toBe(me.club.name);
    expect(body.people).toEqual(
      expect.arrayContaining([
        { nickname: me.nickname, role: 'member', isMe: true },
        { nickname: captain.nickname, role: 'captain', isMe: false },
      ]),
    );
    for (const secret of [captain.signIn, captain.accountId, captain.memberId])
      expect(text).not.toContain(secret);
  });

  it('leaves out those who have left, and other clubs', async () => {
    const me = await member(api, ['pll']);
    const gone = await member(api, [], me.club);
    await api.factory.sql('update membership set left_at = now() where member_id = $1', [gone.memberId]);
    const stranger = await member(api, []);
    const { text } = await api.as(me.claims).get('/api/club');
    expect(text).not.toContain(`"${gone.nickname}"`);
    expect(text).not.toContain(`"${stranger.nickname}"`);
  });

  it('shows on boards only members who chose to be shown', async () => {
    const me = await member(api, ['pll']);
    const hidden = await api.factory.person({ club: me.club, onBoards: false });
    await answerAll(api, me.claims, { count: 2, named: 'unrecognised' });
    await answerAll(api, hidden.claims, { count: 2, named: 'unrecognised' });
    const { body } = await api.as(me.claims).get('/api/club');
    expect(body.boards).toMatchObject([
      { setKey: 'pll', rows: [], unranked: [{ nickname: me.nickname, isMe: true }] },
    ]);
    expect(JSON.stringify(body.boards)).not.toContain(`"${hidden.nickname}"`);
  });

  it('shows shared boards the club is on, as team figures, and no others', async () => {
    const me = await member(api, ['pll']);
    const friends = await api.factory.club();
    const strangers = await api.factory.club();
    const boards = { ours: randomUUID(), theirs: randomUUID() };
    for (const [name, boardId] of Object.entries(boards)) {
      await api.factory.sql('insert into shared_board (board_id, name, set_key) values ($1, $2, $3)', [
        boardId,
        `Board ${name}`,
        'pll',
      ]);
    }
    const publish = async (clubId: string, boardId: string, theta: number) => {
      await api.factory.sql('insert into shared_board_club (club_id, board_id) values ($1, $2)', [
        clubId,
        boardId,
      ]);
      await api.factory.sql(
        `insert into published_team_row (club_id, board_id, day, members, theta, standard_error) values ($1, $2, 20788, 5, $3, 0.01)`,
        [clubId, boardId, theta],
      );
    };
    await publish(me.clubId, boards.ours, 0.7);
    await publish(friends.clubId, boards.ours, 0.8);
    await publish(strangers.clubId, boards.theirs, 0.9);
    const { body, text } = await api.as(me.claims).get('/api/club');
    expect(body.sharedBoards).toMatchObject([
      {
        name: 'Board ours',
        setName: 'PLL',
        rows: [
          { club: friends.name, isMine: false, members: 5, value: 0.8 },
          { club: me.club.name, isMine: true, members: 5, value: 0.7 },
        ],
      },
    ]);
    expect(text).not.toContain('Board theirs');
    expect(text).not.toContain(strangers.name);
  });

  it('is refused to the signed-out and to administrators', async () => {
    expect((await api.as(null).get('/api/club')).status).toBe(401);
    expect((await api.as((await api.factory.administrator()).claims).get('/api/club')).status).toBe(403);
  });
});

describe('settings', () => {
  it('are changed, kept, and hold from the next showing', async () => {
    const me = await member(api, ['pll']);
    const res = await api.as(me.claims).put('/api/settings', settings);
    expect(res.status).toBe(200);
    expect(res.body).toEqual(settings);
    expect((await api.as(me.claims).get('/api/club')).body.settings).toEqual(settings);
    expect((await api.as(me.claims).get('/api/today')).body.holding).toBe('left');
  });

  it('are one’s own: nobody else’s move, and none can be named', async () => {
    const me = await member(api, ['pll']);
    const other = await member(api, [], me.club);
    const before = (await api.as(other.claims).get('/api/club')).body.settings;
    await api.as(me.claims).put('/api/settings', settings);
    expect((await api.as(other.claims).get('/api/club')).body.settings).toEqual(before);
    const named = await api.as(me.claims).put('/api/settings', { ...settings, memberId: other.memberId });
    expect(named.status).toBe(400);
  });

  it.each([
    ['no minutes', { minutesPerDay: 0 }, '/minutesPerDay'],
    ['too many minutes', { minutesPerDay: 121 }, '/minutesPerDay'],
    ['half a minute', { minutesPerDay: 5.5 }, '/minutesPerDay'],
    ['a word for minutes', { minutesPerDay: 'six' }, '/minutesPerDay'],
    ['a third hand', { holding: 'middle' }, '/holding'],
    ['a colour no cube has', { crossColours: 'pink' }, '/crossColours'],
    ['a maybe', { onBoards: 'maybe' }, '/onBoards'],
    ['something missing', { holding: undefined }, '/holding'],
  ])('refuse %s, and say where', async (_what, wrong, pointer) => {
    const me = await member(api, []);
    const res = await api.as(me.claims).put('/api/settings', { ...settings, ...wrong });
    expect(res.status).toBe(400);
    expect(res.body.errors.map((e: { pointer: string }) => e.pointer)).toContain(pointer);
    expect((await api.as(me.claims).get('/api/club')).body.settings.minutesPerDay).toBe(6);
  });

  it('leave the boards at once when turned off', async () => {
    const me = await member(api, ['pll']);
    await answerAll(api, me.claims, { count: 1, named: 'unrecognised' });
    await api.as(me.claims).put('/api/settings', { ...settings, onBoards: false });
    const [board] = (await api.as(me.claims).get('/api/club')).body.boards;
    expect([...board.rows, ...board.unranked]).toEqual([]);
  });

  it('are refused to the signed-out', async () => {
    expect((await api.as(null).put('/api/settings', settings)).status).toBe(401);
  });
});
