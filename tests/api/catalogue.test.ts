import { expect, it } from 'vitest';
import type { CatalogueView, EditionView } from '#shared/contracts/catalogue.ts';
import { caseSet, solvesCase } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';
import { intakeSteps } from '#tests/support/intake.ts';

const api = useApi();
const { upload, read, publish } = intakeSteps(api);

it('lists every set with what it is and its editions', async () => {
  const admin = await api.factory.administrator();
  const res = await api.as(admin.claims).get('/api/catalogue');
  expect(res.status).toBe(200);
  const { sets } = res.body as CatalogueView;
  expect(sets.map(({ name }) => name).slice(0, 3)).toEqual(['OLL', 'PLL', 'OCLL']);
  expect(sets.find(({ setKey }) => setKey === 'pll')).toEqual({
    setKey: 'pll',
    name: 'PLL',
    entry: 'co+eo',
    mix: [],
    toldApart: ['cp', 'ep'],
    solved: ['co', 'eo', 'cp', 'ep'],
    cases: 21,
    ofClub: false,
    parent: null,
    editions: [
      {
        number: 1,
        publishedAt: expect.any(Number),
        note: expect.any(String),
        cases: 21,
        algorithms: expect.any(Number),
      },
    ],
  });
  // 493 cases of ZBLL beside the skip (common practice, derived by the engine's tests).
  expect(sets.find(({ setKey }) => setKey === 'zbll')).toMatchObject({ cases: 493, editions: [] });
});

it('shows the cases of an edition by name, with priors that add up', async () => {
  const admin = await api.factory.administrator();
  const res = await api.as(admin.claims).get('/api/catalogue/sets/oll/editions/1');
  expect(res.status).toBe(200);
  const view = res.body as EditionView;
  expect(view).toMatchObject({ setKey: 'oll', setName: 'OLL', number: 1, numbers: [1], missing: [] });
  expect(view.cases.map(({ name }) => name)).toEqual(Array.from({ length: 57 }, (_, n) => String(n + 1)));
  const total = view.cases.reduce((sum, { prior }) => sum + prior.weight, 0);
  // All but the skip, 1/216 of 62,208 states (domain of the set: OLL).
  expect(total).toBe(62_208 - 288);
  // The shown algorithm's own angle: dot cases have no sticker of the top colour up but the centre.
  expect(view.cases[0]).toMatchObject({ name: '1', group: 'dot' });
  expect(view.cases[0]?.picture.stickers.top.replaceAll('?', '')).toBe('U');
  expect(view.cases.every(({ algorithms }) => algorithms.length > 0)).toBe(true);
});

it('knows no edition that was never published', async () => {
  const admin = await api.factory.administrator();
  const as = api.as(admin.claims);
  expect((await as.get('/api/catalogue/sets/oll/editions/99')).status).toBe(404);
  expect((await as.get('/api/catalogue/sets/no-such-set/editions/1')).status).toBe(404);
  expect((await as.get('/api/catalogue/sets/oll/editions/0')).status).toBe(400);
  expect((await as.get('/api/catalogue/sets/oll/editions/one')).status).toBe(400);
});

it('counts editions as they are published, newest first', async () => {
  const admin = await api.factory.administrator();
  const cll = caseSet('cll');
  const line = (algorithm: string) => {
    const solves = solvesCase(cll, algorithm);
    return `${'case' in solves ? solves.case.name : ''},${algorithm}`;
  };
  const file = (algorithm: string) => `case,algorithm\n${line(algorithm)}\n`;
  const res = await upload(admin, file("R U R' U R U2 R'"), { setKey: 'cll' });
  const view = await read(admin, (res.body as { draftId: string }).draftId);
  expect((await publish(admin, view)).status).toBe(200);
  const again = await upload(admin, file("L' U' L U' L' U2 L"), { setKey: 'cll' });
  const second = await read(admin, (again.body as { draftId: string }).draftId);
  expect((await publish(admin, second, { note: 'Its mirror too.' })).status).toBe(200);
  const { sets } = (await api.as(admin.claims).get('/api/catalogue')).body as CatalogueView;
  expect(
    sets
      .find(({ setKey }) => setKey === 'cll')
      ?.editions.map(({ number, note, cases, algorithms }) => ({ number, note, cases, algorithms })),
  ).toEqual([
    { number: 2, note: 'Its mirror too.', cases: 2, algorithms: 2 },
    { number: 1, note: '', cases: 1, algorithms: 1 },
  ]);
});

it('is open to members and captains, closed to the signed-out, and knows no other input', async () => {
  const member = await api.factory.person();
  const captain = await api.factory.person({ role: 'captain' });
  for (const path of ['/api/catalogue', '/api/catalogue/sets/oll/editions/1']) {
    for (const { claims } of [member, captain]) expect((await api.as(claims).get(path)).status).toBe(200);
    expect((await api.as(null).get(path)).status).toBe(401);
    const odd = await api.as(member.claims).get(`${path}?colour=red`);
    expect(odd.status).toBe(400);
    expect(odd.body.errors[0].detail).toContain('colour');
  }
});
