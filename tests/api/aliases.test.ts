import { describe, expect, it } from 'vitest';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import type { MemberPageView, SquadView } from '#shared/contracts/desk.ts';
import type { MyCaseView } from '#shared/contracts/member.ts';
import type { TodayView } from '#shared/contracts/today.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';
import type { Person } from '#tests/support/factories.ts';
import { insertAnswer, londonDay } from '#tests/support/figures.ts';

const api = useApi();

const keyOf = (name: string, setKey = 'pll') => caseSet(setKey).byName(name)?.key ?? '';
const path = (name: string, setKey = 'pll') => `/api/aliases/${setKey}/${keyOf(name, setKey)}`;

async function club() {
  const made = await api.factory.club();
  const captain = await api.factory.person({ club: made, role: 'captain' });
  const member = await api.factory.person({ club: made });
  return { club: made, captain, member };
}

async function aliasesSeen({ claims }: Pick<Person, 'claims'>): Promise<Record<string, string>> {
  const res = await api.as(claims).get('/api/catalogue/sets/pll');
  expect(res.status).toBe(200);
  return Object.fromEntries(
    (res.body as CatalogueSetView).rows.flatMap(({ name, alias }) => (alias === null ? [] : [[name, alias]])),
  );
}

describe('what a club calls a case', () => {
  it('is given by its captain, seen by its people and by nobody else', async () => {
    const [mine, other] = [await club(), await club()];
    const res = await api.as(mine.captain.claims).put(path('Ja'), { alias: ' Little hook ' });
    expect(res.status).toBe(200);
    expect(res.body).toEqual({ alias: 'Little hook' });
    expect(await aliasesSeen(mine.member)).toEqual({ Ja: 'Little hook' });
    expect(await aliasesSeen(other.captain)).toEqual({});
    expect(await aliasesSeen(await api.factory.administrator())).toEqual({});
    // Another club is free to call another case so.
    expect((await api.as(other.captain.claims).put(path('Jb'), { alias: 'Little hook' })).status).toBe(200);
  });

  it('is changed by giving another, and taken away', async () => {
    const { captain, member } = await club();
    await api.as(captain.claims).put(path('Y'), { alias: 'Sails' });
    await api.as(captain.claims).put(path('Y'), { alias: 'Sail' });
    expect(await aliasesSeen(member)).toEqual({ Y: 'Sail' });
    const res = await api.as(captain.claims).delete(path('Y'));
    expect(res.status).toBe(200);
    expect(res.body).toEqual({ alias: null });
    expect(await aliasesSeen(member)).toEqual({});
    expect((await api.as(captain.claims).delete(path('Y'))).status).toBe(200);
  });

  it('goes with the case into subsets', async () => {
    const { captain, member } = await club();
    const res = await api.as(captain.claims).post('/api/case-sets', {
      kind: 'subset',
      name: 'Edges',
      parentKey: 'pll',
      caseKeys: ['Ua', 'Ub', 'H', 'Z'].map((name) => keyOf(name)),
    });
    const { setKey } = res.body as { setKey: string };
    const given = await api
      .as(captain.claims)
      .put(`/api/aliases/${setKey}/${keyOf('H')}`, { alias: 'Double swap' });
    expect(given.status).toBe(200);
    expect(await aliasesSeen(member)).toEqual({ H: 'Double swap' });
    // Within the whole set it is taken, though the subset does not have that case.
    expect((await api.as(captain.claims).put(path('T'), { alias: 'double swap' })).status).toBe(422);
  });

  it('is what Today, My cases and the captain’s pages call the case, the trade’s name beside it', async () => {
    const { club: made, captain, member } = await club();
    await api.factory.assign(made, 'pll');
    const before = (await api.as(member.claims).get('/api/today')).body as TodayView;
    await api.as(captain.claims).put(path('Ua'), { alias: 'Round trip' });
    const today = (await api.as(member.claims).get('/api/today')).body as TodayView;
    const grid = today.sets[0]?.grids.all ?? [];
    expect(grid.find(({ key }) => key === keyOf('Ua'))).toMatchObject({
      label: 'Round trip',
      tradeName: 'Ua',
    });
    // Everything stays in its place.
    expect(grid.map(({ key }) => key)).toEqual(before.sets[0]?.grids.all?.map(({ key }) => key));
    const mine = (await api.as(member.claims).get(`/api/cases/${keyOf('Ua')}`)).body as MyCaseView;
    expect(mine.case).toMatchObject({ name: 'Round trip', tradeName: 'Ua' });
    const mirrored = (await api.as(member.claims).get(`/api/cases/${keyOf('Ub')}`)).body as MyCaseView;
    expect(mirrored.case).toMatchObject({ name: 'Ub', tradeName: null });
    expect(mirrored.mirror?.name).toBe('Round trip');

    const at = api.clock.now();
    const localDay = londonDay(at);
    await insertAnswer(api.factory, member, { caseName: 'T', named: 'Ua', at, localDay, outcome: 'missed' });
    const page = (await api.as(captain.claims).get(`/api/desk/members/${member.memberId}`))
      .body as MemberPageView;
    expect(page.lately[0]).toMatchObject({ name: 'T', named: 'Round trip' });
    expect(page.cases.find(({ key }) => key === keyOf('Ua'))).toMatchObject({ tradeName: 'Ua' });
    const squad = async () => (await api.as(captain.claims).get('/api/desk/squad')).body as SquadView;
    const costliest = (await squad()).lost[0];
    await api.as(captain.claims).put(`/api/aliases/pll/${costliest?.key}`, { alias: 'Costly' });
    expect((await squad()).lost[0]).toMatchObject({
      name: 'Costly',
      tradeName: costliest?.tradeName ?? costliest?.name,
    });
  });

  it('refuses what is no alias or another’s name, naming the field', async () => {
    const { captain } = await club();
    await api.as(captain.claims).put(path('F'), { alias: 'Flag' });
    const refused = async (alias: unknown, status: number) => {
      const res = await api.as(captain.claims).put(path('T'), { alias });
      expect({ alias, status: res.status }).toEqual({ alias, status });
      expect(res.body.errors).toEqual([expect.objectContaining({ pointer: '/alias' })]);
    };
    await refused('', 400);
    await refused('   ', 400);
    await refused('x'.repeat(25), 400);
    await refused('two\nlines', 400);
    await refused(7, 400);
    await refused('FLAG', 422);
    await refused('Ja', 422);
    await refused('skip', 422);
    await refused('t', 422);
    const skip = await api
      .as(captain.claims)
      .put(`/api/aliases/pll/${caseSet('pll').skip.key}`, { alias: 'Done' });
    expect(skip.status).toBe(422);
    for (const nowhere of [
      '/api/aliases/none/x',
      '/api/aliases/pll/x',
      path('21', 'oll').replace('oll', 'pll'),
    ]) {
      expect((await api.as(captain.claims).put(nowhere, { alias: 'Fine' })).status).toBe(404);
      expect((await api.as(captain.claims).delete(nowhere)).status).toBe(404);
    }
  });

  it('gives an alias once when two captains ask at the same time', async () => {
    const { club: made, captain } = await club();
    const second = await api.factory.person({ club: made, role: 'captain' });
    const both = await Promise.all([
      api.as(captain.claims).put(path('Ra'), { alias: 'Twin' }),
      api.as(second.claims).put(path('Rb'), { alias: 'Twin' }),
    ]);
    expect(both.map((res) => res.status).sort()).toEqual([200, 422]);
  });

  it('asks for a captain of the club', async () => {
    const { member } = await club();
    const { claims } = await api.factory.administrator();
    for (const [who, status] of [
      [null, 401],
      [member.claims, 403],
      [claims, 403],
    ] as const) {
      expect((await api.as(who).put(path('T'), { alias: 'Fine' })).status).toBe(status);
      expect((await api.as(who).delete(path('T'))).status).toBe(status);
    }
  });
});
