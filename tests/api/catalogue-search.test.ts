import { describe, expect, it } from 'vitest';
import type { ConfusableView, DrawnView, SearchView } from '#shared/contracts/catalogue-search.ts';
import { caseSet, EMPTY_DRAWING, painted, readAlgorithm, writeDrawing } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';

const api = useApi();
const pll = caseSet('pll');
const keyOf = (set: string, name: string) => caseSet(set).byName(name)!.key;

/** The catalogue's T, its angle turned by a U in front (common practice). */
const T = "R U R' U' R' F R2 U' R' U' R U R' F'";

async function search(q: string): Promise<SearchView> {
  const member = await api.factory.person();
  const res = await api.as(member.claims).get(`/api/catalogue/search?q=${encodeURIComponent(q)}`);
  expect(res.status).toBe(200);
  return res.body as SearchView;
}
const solved = ({ moves }: SearchView, setKey: string) =>
  moves?.kind === 'read' ? moves.sets.find(({ set }) => set.setKey === setKey) : undefined;

describe('search by moves', () => {
  it('says which case an algorithm solves, of which sets, and at which AUF', async () => {
    const found = await search(T);
    expect(found.moves).toMatchObject({
      kind: 'read',
      moves: T,
      counts: { htm: 14, qtm: 15, stm: 14, etm: 14 },
    });
    const hit = solved(found, 'pll')!.solves!;
    expect(hit.case).toMatchObject({ setKey: 'pll', key: keyOf('pll', 'T'), name: 'T' });
    const turned = solved(await search(`U2 ${T}`), 'pll')!.solves!;
    const reading = readAlgorithm(hit.algorithm!);
    const known = reading.kind === 'state' && reading.state;
    const own = readAlgorithm(T);
    // Derived: half a turn of the top in front of it puts the right AUF half a turn on.
    if (own.kind === 'state' && known === own.state) expect([hit.aufs, turned.aufs]).toEqual([[0], [2]]);
    else expect(turned.aufs).toEqual(hit.aufs.map((auf) => (auf + 2) % 4));
    // A PLL algorithm solves a ZBLL and the full last layer too, and skips what it does not touch.
    expect(solved(found, 'zbll')!.solves!.case.skip).toBe(false);
    expect(solved(found, '1lll')).toBeDefined();
    expect(solved(found, 'oll')).toBeUndefined();
  });

  it('says what a scramble leads to: the inverse of what it solves', async () => {
    const sune = await search("R U R' U R U2 R'");
    expect(solved(sune, 'ocll')).toMatchObject({
      // Common practice: Sune solves Sune and leads to Antisune.
      solves: { case: { name: 'Sune' } },
      leadsTo: { case: { name: 'Antisune' } },
    });
  });

  it('knows what the catalogue has already, however it is spelled', async () => {
    const first = solved(await search('T'), 'pll');
    expect(first).toBeUndefined();
    const hit = solved(await search(T), 'pll')!.solves!;
    const spelled = hit.algorithm!.replaceAll("'", '′').replaceAll(' ', '');
    expect(solved(await search(spelled), 'pll')!.solves).toMatchObject({ known: true, aufs: [0] });
    expect(solved(await search(`U2 ${T} U`), 'pll')!.solves).toMatchObject({ known: false });
  });

  it('says what is wrong: the character that is no move, the pieces out of place', async () => {
    expect((await search("R U R' Q")).moves).toEqual({ kind: 'not-a-move', column: 8, token: 'Q' });
    const broken = (await search("R U R'")).moves;
    expect(broken).toMatchObject({ kind: 'first-two-layers-broken', moves: "R U R'" });
    // Derived: R U R' takes a corner and an edge out of the front right slot.
    expect(broken?.kind === 'first-two-layers-broken' && broken.pieces).toEqual(['DFR', 'FR']);
  });

  it('expands brackets', async () => {
    expect(solved(await search("(R U R' U R U2 R')2"), 'ocll')).toBeDefined();
    expect((await search("[R U R', U]")).moves).toMatchObject({ kind: 'first-two-layers-broken' });
  });
});

describe('search by words', () => {
  it.each([
    ['T', 'pll', 'T'],
    ['PLL Ua', 'pll', 'Ua'],
    ['oll 07', 'oll', '7'],
    ['sune', 'ocll', 'Sune'],
  ])('%s finds %s %s first', async (q, setKey, name) => {
    const { names, moves } = await search(q);
    expect(names.slice(0, 3)).toContainEqual(
      expect.objectContaining({ case: expect.objectContaining({ setKey, name }), algorithm: null }),
    );
    expect(moves === null || moves.kind === 'read').toBe(true);
  });

  it('finds what a club calls a case, for that club alone', async () => {
    const owner = await api.factory.person({ role: 'captain' });
    const other = await api.factory.person();
    const put = await api
      .as(owner.claims)
      .put(`/api/aliases/pll/${keyOf('pll', 'T')}`, { alias: 'Lighthouse' });
    expect(put.status).toBe(200);
    const found = (await api.as(owner.claims).get('/api/catalogue/search?q=lighthouse')).body as SearchView;
    expect(found.names[0]).toMatchObject({ case: { name: 'T', alias: 'Lighthouse' } });
    const nothing = (await api.as(other.claims).get('/api/catalogue/search?q=lighthouse')).body as SearchView;
    expect(nothing).toMatchObject({ names: [], moves: null, more: 0 });
  });

  it.each([
    // Common practice: these are the trade's families of permutations.
    ['J', ['Ja', 'Jb']],
    ['J perm', ['Ja', 'Jb']],
    ['PLL J-perms', ['Ja', 'Jb']],
    ['G', ['Ga', 'Gb', 'Gc', 'Gd']],
    ['PLL U', ['Ua', 'Ub']],
  ])('%s finds the permutations whose names begin so', async (q, wanted) => {
    const { names } = await search(q);
    const found = names.filter(({ set }) => set.setKey === 'pll').map(({ case: of }) => of.name);
    expect(found).toEqual(wanted);
    expect(names[0]?.set.setKey).toBe('pll');
  });

  it('tells what is called so before what only has it inside', async () => {
    const { names } = await search('sune');
    const found = names.map(({ case: of }) => of.name);
    expect(found[0]).toBe('Sune');
    // More cases stand in groups called Sune than are told, so none that only has it inside is among them.
    expect(found.some((name) => name.startsWith('Antisune'))).toBe(false);
    for (const { case: of } of names) expect(`${of.group} ${of.name}`).toMatch(/\bSune\b/);
  });

  it('counts what it does not tell', async () => {
    const { names, more } = await search('sune');
    expect(names).toHaveLength(24);
    // Six cases of COLL and 72 of ZBLL are in the group (common practice).
    expect(names.length + more).toBeGreaterThanOrEqual(78);
  });

  it('refuses nothing and too much, and asks the signed-out to sign in', async () => {
    const member = await api.factory.person();
    expect((await api.as(member.claims).get('/api/catalogue/search?q=')).status).toBe(400);
    expect((await api.as(member.claims).get(`/api/catalogue/search?q=${'R'.repeat(301)}`)).status).toBe(400);
    expect((await api.as(null).get('/api/catalogue/search?q=T')).status).toBe(401);
  });
});

describe('search by a drawing', () => {
  const drawn = async (drawing: string, sets: string) => {
    const member = await api.factory.person();
    return api.as(member.claims).get(`/api/catalogue/drawn?drawing=${drawing}&sets=${sets}`);
  };

  it('finds the cases that look like it, each at its angle', async () => {
    const bars = painted(painted(EMPTY_DRAWING, 'front', 0, 'red'), 'front', 1, 'red');
    const res = await drawn(writeDrawing(painted(bars, 'front', 2, 'red')), 'pll,oll');
    expect(res.status).toBe(200);
    const view = res.body as DrawnView;
    expect(view.problems).toEqual([]);
    const names = view.sets[0]!.rows.map(({ case: of }) => of.name);
    // Common practice: a side of three alike is seen in U, J and F, and never in H.
    expect(names).toEqual(expect.arrayContaining(['Ua', 'Ub', 'Ja', 'Jb', 'F', 'skip']));
    expect(names).not.toContain('H');
    for (const { picture } of view.sets[0]!.rows) expect(new Set(picture.stickers.front).size).toBe(1);
    expect(view.sets[1]).toMatchObject({ set: { setKey: 'oll' }, cases: 57 });
  });

  it('says why a drawing is of no cube', async () => {
    const twice = painted(painted(EMPTY_DRAWING, 'front', 1, 'green'), 'top', 7, 'green');
    const view = (await drawn(writeDrawing(twice), 'pll')).body as DrawnView;
    expect(view.problems[0]).toEqual({
      says: 'Front edge: no piece has one colour twice.',
      sites: [
        { side: 'top', index: 7 },
        { side: 'front', index: 1 },
      ],
    });
    expect(view.sets[0]).toMatchObject({ found: 0, rows: [] });
  });

  it('refuses what is no drawing and sets that are not there, and asks the signed-out to sign in', async () => {
    const empty = writeDrawing(EMPTY_DRAWING);
    expect((await drawn('yyy', 'pll')).status).toBe(400);
    expect((await drawn(empty, 'no-such-set')).status).toBe(404);
    expect((await drawn(empty, '')).body).toMatchObject({ sets: [] });
    expect((await api.as(null).get(`/api/catalogue/drawn?drawing=${empty}`)).status).toBe(401);
  });
});

describe('what a case is mistaken for', () => {
  const path = (set: string, key: string) => `/api/catalogue/sets/${set}/cases/${key}/confusable`;

  it('names the nearest cases, with both pictures and where they differ', async () => {
    const member = await api.factory.person();
    const res = await api.as(member.claims).get(path('pll', keyOf('pll', 'Ra')));
    expect(res.status).toBe(200);
    const { name, rows } = res.body as ConfusableView;
    expect(name).toBe('Ra');
    expect(rows).toHaveLength(6);
    expect(rows.map(({ apart }) => apart)).toEqual(rows.map(({ apart }) => apart).sort((a, b) => a - b));
    for (const { shown, other, holding, apart, differs, case: of } of rows) {
      const sides = ['top', 'front', holding] as const;
      const differing = sides.reduce(
        (sum, side) =>
          sum +
          Array.from(shown.stickers[side]).filter((letter, at) => letter !== other.stickers[side][at]).length,
        0,
      );
      expect(differing).toBe(apart);
      expect(differs).toMatch(/^(?:top|front face|right face|left face): /u);
      expect(pll.byKey(of.key)).toBeDefined();
    }
  });

  it('knows no case of another set, no set that is not there, and asks the signed-out to sign in', async () => {
    const member = await api.factory.person();
    const as = api.as(member.claims);
    expect((await as.get(path('pll', keyOf('oll', '1')))).status).toBe(404);
    expect((await as.get(path('no-such-set', 'x'))).status).toBe(404);
    expect((await api.as(null).get(path('pll', keyOf('pll', 'T')))).status).toBe(401);
  });
});
