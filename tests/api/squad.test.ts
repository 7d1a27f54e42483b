import { describe, expect, it } from 'vitest';
import type { SquadView } from '#shared/contracts/desk.ts';
import { caseSet, rightAufsBefore } from '#shared/lastlayer/index.ts';
import { DEFAULT_WEIGHTS, recall } from '#shared/memory/index.ts';
import { dealtFromSums, interval } from '#shared/standing/index.ts';
import { useApi } from '#tests/support/api.ts';
import { insertAnswer, insertMemory, insertRollup, londonDay } from '#tests/support/figures.ts';

const api = useApi();
const pll = caseSet('pll');

/** A club with a captain and one member, PLL for everyone. */
async function squad() {
  const club = await api.factory.club();
  const captain = await api.factory.person({ club, role: 'captain' });
  const member = await api.factory.person({ club });
  await api.factory.sql("update membership set joined_at = now() - interval '100 days' where club_id = $1", [
    club.clubId,
  ]);
  await api.factory.assign(club, 'pll');
  return { club, captain, member, today: londonDay(api.clock.now()) };
}

async function read(person: { claims: Parameters<typeof api.as>[0] }, query = ''): Promise<SquadView> {
  const res = await api.as(person.claims).get(`/api/desk/squad${query}`);
  expect(res.status).toBe(200);
  return res.body as SquadView;
}

describe('the grid', () => {
  it('gives each figure as shared/standing makes it from the newest rollup rows', async () => {
    const { captain, member, today } = await squad();
    const yesterday = { day: today - 1, answers: 30, spentMs: 280 * 60_000 };
    await insertRollup(api.factory, member, { ...yesterday, group: 'a', sumP: 100, sumPe: 80, sumPee: 12 });
    await insertRollup(api.factory, member, {
      ...yesterday,
      group: 'b',
      sumP: 184,
      sumPe: 92,
      sumPee: 30,
      answers: 4,
      spentMs: 0,
    });
    await insertRollup(api.factory, member, { day: today - 28, sumPe: 142, answers: 0 });

    const view = await read(captain);
    const row = view.rows.find((one) => one.memberId === member.memberId);
    const { theta, se } = dealtFromSums(
      [
        { sumP: 100, sumPe: 80, sumPee: 12 },
        { sumP: 184, sumPe: 92, sumPee: 30 },
      ],
      4,
    );
    const [low, high] = interval(theta, se);
    expect(row?.cells).toHaveLength(1);
    expect(row?.cells[0]?.figure).toEqual({
      value: expect.closeTo(theta, 12),
      low: expect.closeTo(low, 12),
      high: expect.closeTo(high, 12),
      answers: 34,
      few: false,
      rests: 'here',
    });
    // 172/284 now, 142/284 when the period began.
    expect(row?.cells[0]?.change).toBeCloseTo((30 / 284) * 100, 9);
    expect(row?.answers).toBe(34);
    expect(row?.minutesPerDay).toBeCloseTo(10, 9);
  });

  it('lists captains too, and marks who has answered little', async () => {
    const { captain, member, today } = await squad();
    await insertRollup(api.factory, captain, { day: today, sumPe: 200, answers: 19 });
    const view = await read(captain);
    expect(view.rows.map((row) => row.role).sort()).toEqual(['captain', 'member']);
    const own = view.rows.find((row) => row.memberId === captain.memberId);
    expect(own?.cells[0]?.figure).toMatchObject({ answers: 19, few: true });
    expect(own?.cells[0]?.change).toBeNull();
    const other = view.rows.find((row) => row.memberId === member.memberId);
    expect(other).toMatchObject({ answers: 0, lastTrained: null, minutesPerDay: 0 });
    expect(other?.cells[0]?.figure).toEqual({
      value: 0,
      low: 0,
      high: 0,
      answers: 0,
      few: true,
      rests: 'nothing',
    });
  });

  it('leaves the cell empty for a set a member does not answer for', async () => {
    const { club, captain, member } = await squad();
    await api.factory.assign(club, 'oll', { memberIds: [member.memberId] });
    const view = await read(captain);
    const column = view.columns.findIndex(({ key }) => key === 'oll');
    const own = view.rows.find((row) => row.memberId === captain.memberId);
    const other = view.rows.find((row) => row.memberId === member.memberId);
    expect(own?.cells[column]?.figure).toBeNull();
    expect(other?.cells[column]?.figure).not.toBeNull();
  });

  it('takes answers older than 28 days for what they are', async () => {
    const { captain, member, today } = await squad();
    await insertRollup(api.factory, member, { day: today - 28, sumPe: 100, answers: 50 });
    await insertRollup(api.factory, member, { day: today - 27, sumPe: 100, answers: 7 });
    const view = await read(captain);
    expect(view.rows.find((row) => row.memberId === member.memberId)?.answers).toBe(7);
  });

  it('says on which local day somebody last trained', async () => {
    const { captain, member, today } = await squad();
    for (const ago of [9, 3]) {
      await insertAnswer(api.factory, member, {
        caseName: 'T',
        at: api.clock.now() - ago * 86_400_000,
        localDay: today - ago,
        outcome: 'held',
      });
    }
    const view = await read(captain);
    const row = view.rows.find((one) => one.memberId === member.memberId);
    expect(row?.lastTrained).toBe(new Date((today - 3) * 86_400_000).toISOString().slice(0, 10));
  });

  it('opens one set by its groups, with all of it in the last column', async () => {
    const { captain, member, today } = await squad();
    const groups = [...new Set(pll.cases.map((c) => c.group))];
    expect(groups.length).toBeGreaterThan(1);
    await insertRollup(api.factory, member, {
      day: today,
      group: groups[0] ?? '',
      sumP: 10,
      sumPe: 5,
      sumPee: 1,
      answers: 3,
    });
    await insertRollup(api.factory, member, {
      day: today,
      group: groups[1] ?? '',
      sumP: 30,
      sumPe: 27,
      sumPee: 2,
      answers: 4,
    });
    const view = await read(captain, '?setKey=pll');
    expect(view.setKey).toBe('pll');
    expect(
      view.columns
        .map(({ key }) => key)
        .slice(0, -1)
        .sort(),
    ).toEqual([...groups].sort());
    expect(view.columns.at(-1)?.key).toBe('*');
    // All non-skip states of the set: 288 less the 4 of the skip (domain: Burnside's table).
    const dealt = view.columns.reduce((sum, column) => sum + (column.dealt ?? 0), 0);
    expect(dealt).toBeCloseTo(284 / 288, 12);
    const row = view.rows.find((one) => one.memberId === member.memberId);
    const at = (key: string) => row?.cells[view.columns.findIndex((column) => column.key === key)]?.figure;
    expect(at(groups[0] ?? '')).toMatchObject({ value: 0.5, answers: 3 });
    expect(at(groups[1] ?? '')).toMatchObject({ value: 0.9, answers: 4 });
    expect(at('*')).toMatchObject({ value: 0.8, answers: 7 });
    expect(row?.answers).toBe(7);
  });
});

describe('where solves are lost', () => {
  it('weighs each case by its prior and the recall at the day’s end, the costliest first', async () => {
    const { captain, member, today } = await squad();
    for (const c of pll.cases) {
      for (const person of [captain, member]) {
        await insertMemory(api.factory, person, {
          caseName: c.name,
          stability: c.name === 'Ga' ? 1 : 2_000,
          lastDay: today - 4,
        });
      }
    }
    await insertRollup(api.factory, captain, { day: today, sumPe: 0 });
    await insertRollup(api.factory, member, { day: today, sumPe: 0 });
    const view = await read(captain);
    const [first, second] = view.lost;
    const memory = { stability: 1, lastDay: today - 4 } as Parameters<typeof recall>[0];
    // Ga is 1 in 18 by the engine's weights; recall at the day's end by the published forgetting curve.
    expect(first).toMatchObject({ name: 'Ga', setKey: 'pll' });
    expect(first?.share).toBeCloseTo((1 - recall(memory, today + 1, DEFAULT_WEIGHTS)) / 18, 9);
    expect(second?.share ?? 1).toBeLessThan(first?.share ?? 0);
  });

  it('says what a case is lost by most', async () => {
    const { captain, member, today } = await squad();
    const lose = async (name: string, stability = 1) => {
      for (const person of [captain, member]) {
        await insertMemory(api.factory, person, { caseName: name, stability, lastDay: today - 9 });
      }
    };
    const rest = pll.cases.filter((c) => !['Ga', 'V', 'Y', 'Nb', 'F', 'T'].includes(c.name));
    for (const { name } of rest) await lose(name, 20_000);
    for (const name of ['Ga', 'V', 'Y', 'Nb', 'F', 'T']) await lose(name);
    const at = api.clock.now() - 3_600_000;
    const answer = { at, localDay: today };
    await insertAnswer(api.factory, member, { ...answer, caseName: 'Ga', named: 'Rb', outcome: 'missed' });
    await insertAnswer(api.factory, member, { ...answer, caseName: 'Ga', named: 'Rb', outcome: 'missed' });
    await insertAnswer(api.factory, member, {
      ...answer,
      caseName: 'Ga',
      outcome: 'late',
      recognitionMs: 5000,
    });
    await insertAnswer(api.factory, member, {
      ...answer,
      caseName: 'Y',
      outcome: 'late',
      recognitionMs: 4100,
    });
    await insertAnswer(api.factory, member, { ...answer, caseName: 'Nb', named: 'Na', outcome: 'missed' });
    await insertAnswer(api.factory, member, {
      ...answer,
      caseName: 'F',
      named: 'unrecognised',
      outcome: 'missed',
    });
    const algorithm = "R' U R' U' y R' F' R2 U' R' U R' F R F";
    const v = pll.byName('V');
    if (!v) throw new Error('PLL has a V.');
    const state = Array.from(pll.statesOf(v)).find(
      (one) => rightAufsBefore(pll, algorithm, one).length === 1,
    );
    const right = rightAufsBefore(pll, algorithm, state ?? 0)[0] ?? 0;
    await insertAnswer(api.factory, member, {
      ...answer,
      caseName: 'V',
      outcome: 'missed',
      aufBefore: (right + 1) % 4,
      aufRight: false,
      caseRight: true,
      algorithm,
      state: state ?? 0,
    });
    const words = new Map((await read(captain)).lost.map(({ name, mostly }) => [name, mostly]));
    expect(Object.fromEntries(words)).toEqual({
      Ga: 'named Rb',
      V: 'AUF before off by U',
      Y: 'late: 4.1 s',
      Nb: 'mirror, named Na',
      F: 'not recognised',
      T: 'not asked lately, fading',
    });
  });

  it('does not count mis-taps, abandoned showings or answers older than 28 days', async () => {
    const { captain, member, today } = await squad();
    for (const c of pll.cases) {
      for (const person of [captain, member]) {
        await insertMemory(api.factory, person, {
          caseName: c.name,
          stability: c.name === 'T' ? 1 : 20_000,
          lastDay: today - 9,
        });
      }
    }
    const at = api.clock.now() - 3_600_000;
    const slip = await insertAnswer(api.factory, member, {
      caseName: 'T',
      named: 'F',
      at,
      localDay: today,
      outcome: 'missed',
    });
    await api.factory.sql(
      'insert into mis_tap (club_id, member_id, review_id, case_key, local_day, at, received_at) values ($1, $2, $3, $4, $5, now(), now())',
      [member.clubId, member.memberId, slip, pll.byName('T')?.key, today],
    );
    await insertAnswer(api.factory, member, {
      caseName: 'T',
      named: 'left',
      at,
      localDay: today,
      outcome: 'left',
      recognitionMs: null,
    });
    await insertAnswer(api.factory, member, {
      caseName: 'T',
      named: 'Y',
      at: at - 30 * 86_400_000,
      localDay: today - 30,
      outcome: 'missed',
    });
    const [worst] = (await read(captain)).lost;
    expect(worst).toMatchObject({ name: 'T', mostly: 'not asked lately, fading' });
  });

  it('says so when a case is unmet', async () => {
    const { captain, member, today } = await squad();
    for (const c of pll.cases) {
      await insertMemory(api.factory, member, { caseName: c.name, stability: 100, lastDay: today });
    }
    const view = await read(captain);
    expect(view.lost[0]?.mostly).toBe(`not met yet by ${captain.nickname}`);
  });
});

describe('who may read it', () => {
  it('asks for a sign-in, and for a captain', async () => {
    const { member } = await squad();
    const administrator = await api.factory.administrator();
    expect((await api.as(null).get('/api/desk/squad')).status).toBe(401);
    expect((await api.as(member.claims).get('/api/desk/squad')).status).toBe(403);
    expect((await api.as(administrator.claims).get('/api/desk/squad')).status).toBe(403);
    // A token that claims more than the membership grants: the tables are asked, not the token.
    expect((await api.as({ ...member.claims, role: 'captain' }).get('/api/desk/squad')).status).toBe(401);
  });

  it('shows a captain their own club and nothing of another', async () => {
    const mine = await squad();
    const other = await squad();
    await insertRollup(api.factory, other.member, { day: other.today, sumPe: 200, answers: 30 });
    const view = await read(mine.captain);
    const ids = view.rows.map((row) => row.memberId);
    expect(ids.sort()).toEqual([mine.captain.memberId, mine.member.memberId].sort());
    expect(view.rows.every((row) => row.answers === 0)).toBe(true);
  });

  it('refuses a set that is not on the programme, and input it does not know', async () => {
    const { captain } = await squad();
    expect((await api.as(captain.claims).get('/api/desk/squad?setKey=oll')).status).toBe(404);
    expect((await api.as(captain.claims).get('/api/desk/squad?setKey=')).status).toBe(404);
    expect((await api.as(captain.claims).get('/api/desk/squad?all=1')).status).toBe(400);
  });

  it('is empty, not broken, before a set is assigned', async () => {
    const club = await api.factory.club();
    const captain = await api.factory.person({ club, role: 'captain' });
    const view = await read(captain);
    expect(view).toMatchObject({ sets: [], columns: [], lost: [], board: null });
    expect(view.rows).toHaveLength(1);
  });

  it('leaves out people who have left', async () => {
    const { captain, member } = await squad();
    await api.factory.sql('update membership set left_at = now() where member_id = $1', [member.memberId]);
    expect((await read(captain)).rows.map((row) => row.memberId)).toEqual([captain.memberId]);
  });
});
