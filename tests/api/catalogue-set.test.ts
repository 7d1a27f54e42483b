import { describe, expect, it } from 'vitest';
import type { CatalogueCasesView, CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { useApi } from '#tests/support/api.ts';

const api = useApi();

const read = async (path: string): Promise<CatalogueSetView> => {
  const { claims } = await api.factory.person();
  const res = await api.as(claims).get(`/api/catalogue/sets/${path}`);
  expect(res.status).toBe(200);
  return res.body as CatalogueSetView;
};

describe('a set', () => {
  it('shows its cases to whoever is signed in, in the newest edition', async () => {
    const captain = await api.factory.person({ role: 'captain' });
    const admin = await api.factory.administrator();
    for (const { claims } of [captain, admin]) {
      const res = await api.as(claims).get('/api/catalogue/sets/pll');
      expect(res.status).toBe(200);
      const view = res.body as CatalogueSetView;
      // 21 cases and a skip that is dealt once in 72: common practice.
      expect(view).toMatchObject({
        setName: 'PLL',
        edition: 1,
        cases: 21,
        found: 21,
        from: 1,
        withAlgorithm: 21,
        next: null,
        previous: null,
      });
      expect(view.skip.prior.total / view.skip.prior.weight).toBe(72);
      expect(view.rows.map(({ name }) => name).slice(0, 3)).toEqual(['Aa', 'Ab', 'E']);
      expect(view.angles).toEqual([
        { angles: 4, cases: 16 },
        { angles: 2, cases: 2 },
        { angles: 1, cases: 3 },
      ]);
    }
  });

  it('pages through a set of thousands, each case once', async () => {
    const first = await read('1lll?sort=number');
    // 3,915 cases beside the skip, no edition: common practice for the count.
    expect(first).toMatchObject({
      cases: 3_915,
      found: 3_915,
      edition: null,
      withAlgorithm: 0,
      previous: null,
    });
    expect(first.rows).toHaveLength(100);
    const second = await read(`1lll?sort=number&after=${first.next}`);
    expect(second.rows[0]?.number).toBe(101);
    expect(second.from).toBe(101);
    const back = await read(`1lll?sort=number&before=${second.previous}`);
    expect(back.rows.map(({ number }) => number)).toEqual(first.rows.map(({ number }) => number));
    const last = await read('1lll?sort=-number');
    expect(last.rows[0]?.number).toBe(3_915);
  });

  it('filters by group, angles, algorithms and words', async () => {
    const groups = (await read('oll')).groups;
    const dots = groups.find(({ name }) => name === 'dot');
    // Eight dot cases among the 57: common practice.
    expect(dots?.cases).toBe(8);
    expect((await read('oll?group=dot')).found).toBe(8);
    expect((await read('pll?angles=1')).rows.map(({ name }) => name)).toEqual(['H', 'Na', 'Nb']);
    expect((await read('pll?algorithms=without')).found).toBe(0);
    const q = encodeURIComponent('M2 U M2 U2');
    expect((await read(`pll?q=${q}`)).rows.map(({ name }) => name)).toContain('H');
    expect((await read('pll?q=nothing')).rows).toEqual([]);
  });

  it('has prior after prior add up to one, the skip among them', async () => {
    for (const set of ['pll', 'ocll', 'coll']) {
      const { rows, skip } = await read(set);
      const sum = rows.reduce((weight, row) => weight + row.prior.weight, skip.prior.weight);
      expect(sum).toBe(skip.prior.total);
    }
  });

  it('is not there when it is unknown, nor in an edition it does not have', async () => {
    const { claims } = await api.factory.person();
    expect((await api.as(claims).get('/api/catalogue/sets/nope')).status).toBe(404);
    expect((await api.as(claims).get('/api/catalogue/sets/pll?edition=9')).status).toBe(404);
  });

  it('says what is wrong with a filter', async () => {
    const { claims } = await api.factory.person();
    for (const query of ['angles=3', 'sort=colour', 'algorithms=some', 'edition=0', 'colour=red']) {
      const res = await api.as(claims).get(`/api/catalogue/sets/pll?${query}`);
      expect(res.status).toBe(400);
      expect(res.body.errors).toHaveLength(1);
    }
  });

  it('is for the signed-in only', async () => {
    expect((await api.as(null).get('/api/catalogue/sets/pll')).status).toBe(401);
  });
});

describe('all cases that a filter finds', () => {
  it('come at once, in the order asked for, without pictures', async () => {
    const { claims } = await api.factory.person();
    const res = await api.as(claims).get('/api/catalogue/sets/1lll/cases?sort=-number&angles=2');
    expect(res.status).toBe(200);
    const { rows } = res.body as CatalogueCasesView;
    // 44 orbits of eight states (derived: Burnside's lemma, tests of the counts).
    expect(rows).toHaveLength(44);
    expect(rows[0]?.number).toBeGreaterThan(rows[1]?.number ?? 0);
    expect(rows[0]).not.toHaveProperty('picture');
  });

  it('are refused for an unknown set, a filter that is none, and the signed-out', async () => {
    const { claims } = await api.factory.person();
    expect((await api.as(claims).get('/api/catalogue/sets/nope/cases')).status).toBe(404);
    const odd = await api.as(claims).get('/api/catalogue/sets/pll/cases?after=x');
    expect(odd.status).toBe(400);
    expect(odd.body.errors[0].detail).toContain('after');
    expect((await api.as(null).get('/api/catalogue/sets/pll/cases')).status).toBe(401);
  });
});
