import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { AssignSetInput, ProgrammeView } from '#shared/contracts/desk.ts';
import { useApi } from '#tests/support/api.ts';
import type { Person } from '#tests/support/factories.ts';
import { insertAnswer, insertMemory, insertRollup, londonDay } from '#tests/support/figures.ts';

const api = useApi();

const PLL: AssignSetInput = {
  setKey: 'pll',
  pinnedEdition: null,
  limitMs: 3000,
  asksAuf: true,
  forEveryone: true,
  memberIds: [],
  version: 0,
};

async function club() {
  const made = await api.factory.club();
  const captain = await api.factory.person({ club: made, role: 'captain' });
  const member = await api.factory.person({ club: made });
  return { club: made, captain, member };
}

function assign(person: Person, change: Partial<AssignSetInput> = {}) {
  const { setKey, ...body } = { ...PLL, ...change };
  return api.as(person.claims).put(`/api/desk/programme/${setKey}`, body);
}

function withdraw(person: Person, setKey: string, version: number) {
  return api.as(person.claims).delete(`/api/desk/programme/${setKey}`, { version });
}

async function read(person: Person): Promise<ProgrammeView> {
  const res = await api.as(person.claims).get('/api/desk/programme');
  expect(res.status).toBe(200);
  return res.body as ProgrammeView;
}

async function setsOfToday(person: Person): Promise<string[]> {
  const res = await api.as(person.claims).get('/api/today');
  expect(res.status).toBe(200);
  return (res.body as { sets: { setKey: string }[] }).sets.map(({ setKey }) => setKey);
}

describe('reading', () => {
  it('offers the sets that have an edition and are not assigned, smallest first', async () => {
    const { captain, member } = await club();
    const view = await read(captain);
    expect(view.rows).toEqual([]);
    // Cases without the skip: common practice.
    expect(view.available).toEqual([
      { setKey: 'cpll', name: 'CPLL', editions: [1], cases: 2 },
      { setKey: 'eoll', name: 'EOLL', editions: [1], cases: 3 },
      { setKey: 'epll', name: 'EPLL', editions: [1], cases: 4 },
      { setKey: 'ocll', name: 'OCLL', editions: [1], cases: 7 },
      { setKey: 'pll', name: 'PLL', editions: [1], cases: 21 },
      { setKey: 'ell', name: 'ELL', editions: [1], cases: 29 },
      { setKey: 'coll', name: 'COLL', editions: [1], cases: 42 },
      { setKey: 'oll', name: 'OLL', editions: [1], cases: 57 },
    ]);
    expect(view.members.map(({ memberId }) => memberId).sort()).toEqual(
      [captain.memberId, member.memberId].sort(),
    );
  });
});

describe('assigning', () => {
  it('puts the set on the programme and on the members’ Today at once', async () => {
    const { captain, member } = await club();
    expect(await setsOfToday(member)).toEqual([]);
    const res = await assign(captain);
    expect(res.status).toBe(200);
    expect((res.body as ProgrammeView).rows).toEqual([
      {
        setKey: 'pll',
        name: 'PLL',
        pinnedEdition: null,
        newestEdition: 1,
        limitMs: 3000,
        asksAuf: true,
        forEveryone: true,
        memberIds: [],
        version: 1,
      },
    ]);
    const available = (res.body as ProgrammeView).available.map(({ setKey }) => setKey);
    expect(available).toContain('oll');
    expect(available).not.toContain('pll');
    expect(await setsOfToday(member)).toEqual(['pll']);
  });

  it('keeps the order of assigning', async () => {
    const { captain } = await club();
    await assign(captain);
    await assign(captain, { setKey: 'oll' });
    expect((await read(captain)).rows.map(({ setKey }) => setKey)).toEqual(['pll', 'oll']);
  });

  it('hands it to chosen members only', async () => {
    const { captain, member } = await club();
    const res = await assign(captain, {
      forEveryone: false,
      memberIds: [member.memberId, member.memberId],
      pinnedEdition: 1,
      limitMs: 2500,
      asksAuf: false,
    });
    expect((res.body as ProgrammeView).rows[0]).toMatchObject({
      forEveryone: false,
      memberIds: [member.memberId],
      pinnedEdition: 1,
      limitMs: 2500,
      asksAuf: false,
    });
    expect(await setsOfToday(member)).toEqual(['pll']);
    expect(await setsOfToday(captain)).toEqual([]);
  });

  it('refuses what cannot be, naming the field', async () => {
    const { captain } = await club();
    const refused = async (change: Partial<AssignSetInput>, status: number, pointer: string) => {
      const res = await assign(captain, change);
      expect(res.status).toBe(status);
      expect(res.body.errors).toEqual([expect.objectContaining({ pointer })]);
    };
    await refused({ limitMs: 499 }, 400, '/limitMs');
    await refused({ limitMs: 60_001 }, 400, '/limitMs');
    await refused({ limitMs: 2500.5 }, 400, '/limitMs');
    await refused({ memberIds: ['me'] }, 400, '/memberIds/0');
    await refused({ pinnedEdition: 7 }, 422, '/pinnedEdition');
    await refused({ forEveryone: false, memberIds: [] }, 422, '/memberIds');
    // A set that the engine knows but nobody has published.
    await refused({ setKey: 'zbll' }, 422, '/setKey');
    expect((await assign(captain, { setKey: 'none' })).status).toBe(404);
    expect((await read(captain)).rows).toEqual([]);
  });

  it('refuses members of another club, people who left and people who do not exist', async () => {
    const { captain, member } = await club();
    const other = await club();
    await api.factory.sql('update membership set left_at = now() where member_id = $1', [member.memberId]);
    for (const memberId of [other.member.memberId, member.memberId, randomUUID()]) {
      const res = await assign(captain, { forEveryone: false, memberIds: [captain.memberId, memberId] });
      expect(res.status).toBe(422);
      expect(res.body.errors).toEqual([expect.objectContaining({ pointer: '/memberIds' })]);
    }
    expect(
      await api.factory.sql('select 1 from programme_member where club_id = $1', [captain.clubId]),
    ).toEqual([]);
  });

  it('cannot be made to write into another club, whatever the body says', async () => {
    const [mine, other] = [await club(), await club()];
    const res = await api
      .as(mine.captain.claims)
      .put('/api/desk/programme/pll', { ...PLL, clubId: other.club.clubId });
    expect(res.status).toBe(400);
    await assign(mine.captain);
    expect((await read(other.captain)).rows).toEqual([]);
  });
});

describe('editing', () => {
  it('counts versions, and refuses an edit made on an older one', async () => {
    const { captain, member } = await club();
    await assign(captain);
    const edited = await assign(captain, { limitMs: 2000, version: 1 });
    expect(edited.status).toBe(200);
    expect((edited.body as ProgrammeView).rows[0]).toMatchObject({ limitMs: 2000, version: 2 });
    const late = await assign(captain, {
      limitMs: 5000,
      version: 1,
      forEveryone: false,
      memberIds: [member.memberId],
    });
    expect(late.status).toBe(412);
    expect((await read(captain)).rows[0]).toMatchObject({ limitMs: 2000, version: 2, forEveryone: true });
  });

  it('refuses to assign what is assigned, and to edit what was withdrawn', async () => {
    const { captain } = await club();
    await assign(captain);
    expect((await assign(captain)).status).toBe(412);
    expect((await withdraw(captain, 'pll', 1)).status).toBe(200);
    expect((await assign(captain, { version: 1 })).status).toBe(412);
  });

  it('lets one of two edits at the same time through', async () => {
    const { captain } = await club();
    await assign(captain);
    const answers = await Promise.all([
      assign(captain, { limitMs: 1000, version: 1 }),
      assign(captain, { limitMs: 2000, version: 1 }),
    ]);
    expect(answers.map((res) => res.status).sort()).toEqual([200, 412]);
    const raced = await club();
    const first = await Promise.all([assign(raced.captain), assign(raced.captain)]);
    expect(first.map((res) => res.status).sort()).toEqual([200, 412]);
  });

  it('moves from chosen members back to everyone', async () => {
    const { captain, member } = await club();
    await assign(captain, { forEveryone: false, memberIds: [member.memberId] });
    const res = await assign(captain, { version: 1 });
    expect((res.body as ProgrammeView).rows[0]).toMatchObject({ forEveryone: true, memberIds: [] });
    expect(await setsOfToday(captain)).toEqual(['pll']);
  });
});

describe('withdrawing', () => {
  it('takes the set out of Today and keeps answers, memory and figures', async () => {
    const { captain, member } = await club();
    await assign(captain);
    const today = londonDay(api.clock.now());
    await insertAnswer(api.factory, member, {
      caseName: 'T',
      at: api.clock.now(),
      localDay: today,
      outcome: 'held',
    });
    await insertMemory(api.factory, member, { caseName: 'T', stability: 10, lastDay: today });
    await insertRollup(api.factory, member, { day: today - 1, sumPe: 100, answers: 1 });
    const res = await withdraw(captain, 'pll', 1);
    expect(res.status).toBe(200);
    expect((res.body as ProgrammeView).rows).toEqual([]);
    expect(await setsOfToday(member)).toEqual([]);
    for (const table of ['review', 'case_state', 'rollup']) {
      const kept = await api.factory.sql(`select 1 from ${table} where member_id = $1`, [member.memberId]);
      expect(kept.length, table).toBeGreaterThan(0);
    }
  });

  it('is refused on an older version, and for a set that is not there', async () => {
    const { captain } = await club();
    await assign(captain);
    await assign(captain, { version: 1, limitMs: 2000 });
    expect((await withdraw(captain, 'pll', 1)).status).toBe(412);
    expect((await withdraw(captain, 'oll', 1)).status).toBe(404);
    expect((await withdraw(captain, 'pll', 0)).status).toBe(400);
    expect((await read(captain)).rows).toHaveLength(1);
  });
});

describe('who may', () => {
  it('asks for a sign-in, and for a captain of this club', async () => {
    const { captain, member } = await club();
    const other = await club();
    await assign(captain);
    for (const [claims, status] of [
      [null, 401],
      [member.claims, 403],
    ] as const) {
      expect((await api.as(claims).get('/api/desk/programme')).status).toBe(status);
      expect(
        (await api.as(claims).put('/api/desk/programme/pll', { ...PLL, setKey: undefined, version: 1 }))
          .status,
      ).toBe(status);
      expect((await api.as(claims).delete('/api/desk/programme/pll', { version: 1 })).status).toBe(status);
    }
    expect((await withdraw(other.captain, 'pll', 1)).status).toBe(404);
    expect((await assign(other.captain, { version: 1 })).status).toBe(412);
    expect((await read(captain)).rows).toMatchObject([{ setKey: 'pll', version: 1, limitMs: 3000 }]);
  });
});
