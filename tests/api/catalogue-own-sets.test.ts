import { describe, expect, it } from 'vitest';
import type { DefineSetInput } from '#shared/contracts/case-sets.ts';
import type { CatalogueSetView, CatalogueView } from '#shared/contracts/catalogue.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import type { CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';

const api = useApi();
const pll = caseSet('pll');
const keyOf = (name: string) => pll.byName(name)?.key ?? '';

/** The cases with the corners done: one of a pair of mirrors is left out. */
const SOME: DefineSetInput = {
  kind: 'subset',
  name: 'Some edges',
  parentKey: 'pll',
  caseKeys: ['Ua', 'H', 'Z'].map(keyOf),
};

async function clubWith(input: DefineSetInput) {
  const club = await api.factory.club();
  const captain = await api.factory.person({ club, role: 'captain' });
  const member = await api.factory.person({ club });
  const res = await api.as(captain.claims).post('/api/case-sets', input);
  expect(res.status, res.text).toBe(200);
  return { captain, member, setKey: (res.body as { setKey: string }).setKey };
}

describe('a part of a set', () => {
  it('has its own page, with the algorithms and priors of the whole', async () => {
    const { member, setKey } = await clubWith(SOME);
    const as = api.as(member.claims);
    const view = (await as.get(`/api/catalogue/sets/${setKey}`)).body as CatalogueSetView;
    expect(view).toMatchObject({
      setName: 'Some edges',
      cases: 3,
      edition: 1,
      withAlgorithm: 3,
      parent: { setKey: 'pll', name: 'PLL' },
    });
    expect(view.rows.map(({ name }) => name)).toEqual(['H', 'Ua', 'Z']);
    // H is dealt once in 72 solves, in a part of PLL as in PLL (common practice).
    expect(view.rows[0]?.prior).toEqual({ weight: 4, total: 288 });
    const sheet = (await as.get(`/api/catalogue/sets/${setKey}/sheet`)).body as CatalogueSheetView;
    expect(sheet.groups.flatMap(({ cases }) => cases.map(({ name }) => name))).toEqual(['H', 'Ua', 'Z']);
    expect((await as.get(`/api/catalogue/sets/${setKey}/editions/1`)).body.cases).toHaveLength(3);
  });

  it('points to the whole for a relation it has left out', async () => {
    const { member, setKey } = await clubWith(SOME);
    const path = `/api/catalogue/sets/${setKey}/cases/${encodeURIComponent(keyOf('Ua'))}`;
    const view = (await api.as(member.claims).get(path)).body as CatalogueCaseView;
    expect(view.mirror).toMatchObject({ setKey: 'pll', name: 'Ub' });
    expect(view.algorithms.length).toBeGreaterThan(0);
    const h = `/api/catalogue/sets/${setKey}/cases/${encodeURIComponent(keyOf('H'))}`;
    expect((await api.as(member.claims).get(h)).body.mirror).toMatchObject({ setKey, name: 'H' });
    const left = `/api/catalogue/sets/${setKey}/cases/${encodeURIComponent(keyOf('T'))}`;
    expect((await api.as(member.claims).get(left)).status).toBe(404);
  });

  it('is listed after the trade’s sets, to its club and to administrators', async () => {
    const { member, setKey } = await clubWith(SOME);
    const stranger = await api.factory.person({ role: 'captain' });
    const admin = await api.factory.administrator();
    const listed = async ({ claims }: Pick<typeof admin, 'claims'>) =>
      ((await api.as(claims).get('/api/catalogue')).body as CatalogueView).sets;
    expect((await listed(member)).at(-1)).toMatchObject({
      setKey,
      ofClub: true,
      cases: 3,
      parent: { setKey: 'pll', name: 'PLL' },
      editions: [{ number: 1, cases: 3 }],
    });
    expect((await listed(admin)).map((set) => set.setKey)).toContain(setKey);
    expect((await listed(stranger)).map((set) => set.setKey)).not.toContain(setKey);
    for (const path of ['', '/cases', '/sheet', '/editions/1', `/cases/${encodeURIComponent(keyOf('H'))}`]) {
      expect((await api.as(stranger.claims).get(`/api/catalogue/sets/${setKey}${path}`)).status).toBe(404);
      expect((await api.as(admin.claims).get(`/api/catalogue/sets/${setKey}${path}`)).status).toBe(200);
    }
  });
});

it('says of a mix how its solves come to it', async () => {
  const { captain, setKey } = await clubWith({
    kind: 'whole',
    name: 'Often oriented',
    entries: [
      { entry: 'any', parts: 3 },
      { entry: 'eo', parts: 2 },
    ],
    toldApart: ['co', 'eo'],
    solved: ['co', 'eo'],
  });
  const { body } = await api.as(captain.claims).get(`/api/catalogue/sets/${setKey}`);
  const view = body as CatalogueSetView;
  expect(view.mix).toEqual([
    { entry: 'any', parts: 3 },
    { entry: 'eo', parts: 2 },
  ]);
  const sum = view.rows.reduce((weight, { prior }) => weight + prior.weight, view.skip.prior.weight);
  expect(sum).toBe(view.skip.prior.total);
});
