import { describe, expect, it } from 'vitest';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { type CaseOfSet, caseSet, solvesCase } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';
import { intakeSteps } from '#tests/support/intake.ts';

const api = useApi();
const { upload, read, publish } = intakeSteps(api);

const pathOf = (setKey: string, c: CaseOfSet | undefined) =>
  `/api/catalogue/sets/${setKey}/cases/${encodeURIComponent(c?.key ?? '')}`;

async function caseOf(setKey: string, name: string): Promise<CatalogueCaseView> {
  const { claims } = await api.factory.person();
  const res = await api.as(claims).get(pathOf(setKey, caseSet(setKey).byName(name)));
  expect(res.status).toBe(200);
  return res.body as CatalogueCaseView;
}

describe('a case of the catalogue', () => {
  it('shows each really different angle once, with the AUFs that are right there', async () => {
    // T differs from all sides, Z from two, H from none: common practice.
    for (const [name, angles] of [
      ['T', 4],
      ['Z', 2],
      ['H', 1],
    ] as const) {
      const view = await caseOf('pll', name);
      expect(view.views).toHaveLength(angles);
      expect(new Set(view.views.map((picture) => JSON.stringify(picture))).size).toBe(angles);
      expect(view.stabiliser).toHaveLength(4 / angles);
      for (const [at, { rightAufs }] of view.algorithms.entries()) {
        expect(rightAufs).toHaveLength(angles);
        // 4/m of the four are right (derived: they are a coset of the case's symmetry).
        for (const right of rightAufs) expect(right).toHaveLength(4 / angles);
        // The first view is the one that the first algorithm solves as it is.
        if (at === 0) expect(rightAufs[0]).toContain(0);
      }
    }
  });

  it('tells its prior, its relations, and counts its algorithms', async () => {
    const ja = await caseOf('pll', 'Ja');
    expect(ja.case.prior).toEqual({ weight: 16, total: 288 });
    // Mirror images by their names: common practice.
    expect(ja.mirror.name).toBe('Jb');
    // Each of the two swaps is its own inverse: common practice.
    expect(ja.inverse?.name).toBe('Ja');
    expect(ja.mirrorInverse?.name).toBe('Jb');
    expect((await caseOf('pll', 'Ua')).inverse?.name).toBe('Ub');
    const h = await caseOf('pll', 'H');
    // M2 U M2 U2 M2 U M2: seven slice turns; a slice is two half turns, M2 four quarters (derived by hand).
    expect(h.algorithms.find(({ algorithm }) => algorithm === 'M2 U M2 U2 M2 U M2')?.counts).toEqual({
      htm: 11,
      qtm: 20,
      stm: 7,
      etm: 7,
    });
  });

  it('says where inverses are not defined', async () => {
    const sune = await caseOf('oll', '27');
    expect(sune.inverse).toBeNull();
    expect(sune.mirrorInverse).toBeNull();
    // Sune and Antisune mirror each other: common practice.
    expect(sune.mirror.name).toBe('26');
    expect(sune).toMatchObject({ orientation: null, permutation: null, twoLook: null });
  });

  it('is made of an OLL and a PLL case, and its two looks really solve it', async () => {
    const { claims } = await api.factory.person();
    const full = caseSet('1lll');
    for (const c of [full.cases[100], full.cases[2_000], full.cases[3_900]]) {
      const res = await api.as(claims).get(pathOf('1lll', c));
      expect(res.status).toBe(200);
      const view = res.body as CatalogueCaseView;
      expect(view.orientation?.setKey).toBe('oll');
      expect(view.permutation?.setKey).toBe('pll');
      expect(view.twoLook?.length).toBeGreaterThan(0);
      const auf = (turns: number) => ['', 'U ', 'U2 ', "U' "][turns] ?? '';
      for (const { before, orient, between, permute, after } of view.twoLook ?? []) {
        expect(orient?.case.key).toBe(view.orientation?.key);
        const moves = `${auf(before)}${orient?.algorithm ?? ''} ${auf(between)}${permute?.algorithm ?? ''} ${auf(after)}`;
        const solves = solvesCase(full, moves);
        expect('case' in solves && solves.case.key).toBe(view.case.key);
      }
    }
  });

  it('has a page for the skip, without algorithms', async () => {
    const skip = await caseOf('pll', 'skip');
    expect(skip.case).toMatchObject({ skip: true, number: 0 });
    expect(skip).toMatchObject({ algorithms: [], previous: null, next: null });
    expect(skip.mirror.skip).toBe(true);
  });

  it('leads to the case before and the one after by name', async () => {
    const first = await caseOf('pll', 'Aa');
    expect(first.previous).toBeNull();
    expect(first.next?.name).toBe('Ab');
    const seventh = await caseOf('oll', '7');
    expect([seventh.previous?.name, seventh.next?.name]).toEqual(['6', '8']);
  });

  it('tells in which editions its algorithms changed', async () => {
    const admin = await api.factory.administrator();
    const cll = caseSet('cll');
    const nameOf = (algorithm: string) => {
      const solves = solvesCase(cll, algorithm);
      return 'case' in solves ? solves.case.name : '';
    };
    const take = async (algorithm: string) => {
      const csv = `case,algorithm\n${nameOf(algorithm)},${algorithm}\n`;
      const { body } = await upload(admin, csv, { setKey: 'cll' });
      const view = await read(admin, (body as { draftId: string }).draftId);
      expect((await publish(admin, view)).status).toBe(200);
    };
    // Sune and its mirror: two algorithms from memory, each in an edition of its own.
    const [sune, antisune] = ["R U R' U R U2 R'", "L' U' L U' L' U2 L"];
    await take(sune);
    await take(antisune);
    expect((await caseOf('cll', nameOf(sune))).changes).toEqual([
      { edition: 1, publishedAt: expect.any(Number), added: [sune], removed: [], reordered: false },
    ]);
    expect((await caseOf('cll', nameOf(antisune))).changes).toMatchObject([
      { edition: 2, added: [antisune] },
    ]);
  });

  it('is not there for an unknown set or case, nor under another set', async () => {
    const { claims } = await api.factory.person();
    const as = api.as(claims);
    const t = caseSet('pll').byName('T');
    expect((await as.get(pathOf('oll', t))).status).toBe(404);
    expect((await as.get('/api/catalogue/sets/pll/cases/nope')).status).toBe(404);
    expect((await as.get('/api/catalogue/sets/nope/cases/nope')).status).toBe(404);
  });

  it('says what is wrong with its input', async () => {
    const { claims } = await api.factory.person();
    const long = await api.as(claims).get(`/api/catalogue/sets/pll/cases/${'x'.repeat(121)}`);
    expect(long.status).toBe(400);
    const odd = await api.as(claims).get(`${pathOf('pll', caseSet('pll').byName('T'))}?edition=1`);
    expect(odd.status).toBe(400);
    expect(odd.body.errors[0].detail).toContain('edition');
  });

  it('is for the signed-in only, whichever their role', async () => {
    const path = pathOf('pll', caseSet('pll').byName('T'));
    expect((await api.as(null).get(path)).status).toBe(401);
    const captain = await api.factory.person({ role: 'captain' });
    const admin = await api.factory.administrator();
    for (const { claims } of [captain, admin]) expect((await api.as(claims).get(path)).status).toBe(200);
  });
});
