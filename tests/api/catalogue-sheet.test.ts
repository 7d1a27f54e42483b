import { expect, it } from 'vitest';
import type { CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { useApi } from '#tests/support/api.ts';

const api = useApi();

it('has every case of the edition once, by group, for whoever is signed in', async () => {
  const member = await api.factory.person();
  const captain = await api.factory.person({ role: 'captain' });
  const admin = await api.factory.administrator();
  for (const { claims } of [member, captain, admin]) {
    const res = await api.as(claims).get('/api/catalogue/sets/oll/sheet');
    expect(res.status).toBe(200);
    const view = res.body as CatalogueSheetView;
    const cases = view.groups.flatMap((group) => group.cases);
    // 57 OLL cases, eight of them dots: common practice.
    expect(new Set(cases.map(({ name }) => name)).size).toBe(57);
    expect(cases).toHaveLength(57);
    expect(view.groups.find(({ name }) => name === 'dot')?.cases).toHaveLength(8);
    expect(cases.every(({ algorithms }) => algorithms.length > 0)).toBe(true);
  }
});

it('has the AUF that each algorithm needs from the picture', async () => {
  const { claims } = await api.factory.person();
  const res = await api.as(claims).get('/api/catalogue/sets/oll/sheet');
  const view = res.body as CatalogueSheetView;
  const oll27 = view.groups.flatMap(({ cases }) => cases).find(({ name }) => name === '27');
  // Derived: the first is what the picture is taken from; the puzzle model shows U' to be right for the second.
  expect(oll27?.algorithms).toEqual([
    { algorithm: "R U R' U R U2 R'", auf: 0 },
    { algorithm: "R' U2 R U R' U R", auf: 3 },
  ]);
});

it('can be of one group only, and still knows the others', async () => {
  const { claims } = await api.factory.person();
  const res = await api.as(claims).get('/api/catalogue/sets/oll/sheet?group=dot');
  const view = res.body as CatalogueSheetView;
  expect(view.groups.map(({ name }) => name)).toEqual(['dot']);
  expect(view.groupNames).toContain('fish');
});

it('is not there without an edition, nor for an unknown set', async () => {
  const { claims } = await api.factory.person();
  const none = await api.as(claims).get('/api/catalogue/sets/1lll/sheet');
  expect(none.status).toBe(404);
  expect(none.body.detail).toContain('no edition');
  expect((await api.as(claims).get('/api/catalogue/sets/nope/sheet')).status).toBe(404);
  expect((await api.as(claims).get('/api/catalogue/sets/pll/sheet?edition=9')).status).toBe(404);
});

it('says what is wrong with its input', async () => {
  const { claims } = await api.factory.person();
  const res = await api.as(claims).get('/api/catalogue/sets/pll/sheet?edition=first');
  expect(res.status).toBe(400);
  expect(res.body.errors).toHaveLength(1);
});

it('is for the signed-in only', async () => {
  expect((await api.as(null).get('/api/catalogue/sets/pll/sheet')).status).toBe(401);
});
