import { describe, expect, it } from 'vitest';
import type { CaseChoices, DefineSetInput, SetPreview } from '#shared/contracts/case-sets.ts';
import type { IntakeView } from '#shared/contracts/intake.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';
import type { Person } from '#tests/support/factories.ts';
import { intakeSteps } from '#tests/support/intake.ts';
import { Phone } from '#tests/support/training.ts';

const api = useApi();

/** The cases of the two-face group with edges oriented: corners permuted, the rest told apart. */
const TWO_FACE: DefineSetInput = {
  kind: 'whole',
  name: 'Two-face',
  entries: [{ entry: 'cp+eo', parts: 1 }],
  toldApart: ['co', 'ep'],
  solved: ['co', 'eo', 'cp', 'ep'],
};
const pll = caseSet('pll');
const keysOf = (...names: string[]) =>
  names.map((name) => {
    const c = pll.byName(name);
    if (!c) throw new Error(`PLL has no case ${name}.`);
    return c.key;
  });
const edgesOnly = (name = 'Edges only'): DefineSetInput => ({
  kind: 'subset',
  name,
  parentKey: 'pll',
  caseKeys: keysOf('Ua', 'Ub', 'H', 'Z'),
});

async function club() {
  const made = await api.factory.club();
  const captain = await api.factory.person({ club: made, role: 'captain' });
  const member = await api.factory.person({ club: made });
  return { club: made, captain, member };
}

async function define(person: Pick<Person, 'claims'>, input: DefineSetInput): Promise<string> {
  const res = await api.as(person.claims).post('/api/case-sets', input);
  expect(res.status, res.text).toBe(200);
  return (res.body as { setKey: string }).setKey;
}

const namesIn = async (claims: Person['claims']) =>
  ((await api.as(claims).get('/api/catalogue')).body as { sets: { name: string }[] }).sets.map(
    ({ name }) => name,
  );

describe('looking at a definition before it is made', () => {
  const preview = async (claims: Person['claims'] | null, query: string) =>
    api.as(claims).get(`/api/case-set-preview?${query}`);

  it('counts its cases and says how likely they are', async () => {
    const { captain } = await club();
    const res = await preview(captain.claims, 'entries=cp%2Beo&toldApart=co,ep&solved=co,eo,cp,ep');
    expect(res.status).toBe(200);
    const view = res.body as SetPreview;
    expect(view.problem).toBeNull();
    // 84 cases and the skip: the two-face group (common practice); 1,296 = 4 turns · 27 twists · 12 permutations of
    // the edges that agree with the parity of the turn (derived).
    expect(view.counts).toMatchObject({ entry: 'cp+eo', cases: 84, states: 1296, total: 1296 });
    const { classes, skip } = view.counts ?? { classes: [], skip: { weight: 0 } };
    expect(classes.reduce((sum, one) => sum + one.cases, 0)).toBe(84);
    expect(classes.reduce((sum, one) => sum + one.cases * one.prior.weight, skip.weight)).toBe(1296);
    expect(view.algorithmsFrom).toBeNull();
  });

  it('names the set that a definition is already, and the one that serves a mix', async () => {
    const { captain } = await club();
    const same = await preview(captain.claims, 'entries=any&toldApart=co,eo&solved=co,eo');
    expect(same.body).toMatchObject({ problem: '“OLL” is this very set already.', like: 'OLL' });
    const mix = await preview(captain.claims, 'entries=any:3,eo:2&toldApart=co,eo&solved=co,eo');
    expect(mix.body).toMatchObject({ problem: null, algorithmsFrom: { setKey: 'oll', name: 'OLL' } });
  });

  it('tells what stands in the way, and refuses words that are none', async () => {
    const { captain } = await club();
    const unsolved = await preview(captain.claims, 'entries=any&toldApart=co,eo&solved=co');
    expect(unsolved.status).toBe(200);
    expect(unsolved.body).toMatchObject({
      counts: null,
      problem: expect.stringContaining('edge orientation'),
    });
    const none = await preview(captain.claims, 'entries=&toldApart=&solved=');
    expect(none.body).toMatchObject({ counts: null, problem: expect.any(String) });
    for (const query of [
      'entries=f2l&toldApart=co&solved=co',
      'entries=any&toldApart=colour&solved=co',
      'entries=any:x&toldApart=co&solved=co',
      'entries=any',
    ]) {
      expect((await preview(captain.claims, query)).status, query).toBe(400);
    }
  });

  it('is for captains and administrators', async () => {
    const { member } = await club();
    const query = 'entries=any&toldApart=co&solved=co';
    expect((await preview(null, query)).status).toBe(401);
    expect((await preview(member.claims, query)).status).toBe(403);
    expect((await preview((await api.factory.administrator()).claims, query)).status).toBe(200);
  });
});

describe('defining a set', () => {
  it('makes a captain’s set their club’s own, and nobody else sees it', async () => {
    const [mine, other] = [await club(), await club()];
    const setKey = await define(mine.captain, TWO_FACE);
    expect(setKey).toMatch(/^two-face-[a-z0-9]{6}$/);
    const cases = await api.factory.sql('select 1 from set_case where set_key = $1', [setKey]);
    expect(cases).toHaveLength(85);
    expect(await namesIn(mine.member.claims)).toContain('Two-face');
    expect(await namesIn(other.captain.claims)).not.toContain('Two-face');
    expect((await api.as(other.captain.claims).get(`/api/catalogue/sets/${setKey}`)).status).toBe(404);
    expect((await api.as(other.captain.claims).get(`/api/case-sets/${setKey}/choices`)).status).toBe(404);
    expect((await api.as(mine.member.claims).get(`/api/catalogue/sets/${setKey}`)).status).toBe(200);
    // The same name in another club is nobody's business, and an administrator sees both.
    await define(other.captain, TWO_FACE);
    const { claims } = await api.factory.administrator();
    expect((await namesIn(claims)).filter((name) => name === 'Two-face')).toHaveLength(2);
  });

  it('makes an administrator’s set everyone’s', async () => {
    const { member } = await club();
    await define(await api.factory.administrator(), {
      kind: 'whole',
      name: 'Edges last',
      entries: [{ entry: 'co', parts: 1 }],
      toldApart: ['eo'],
      solved: ['co', 'eo'],
    });
    expect(await namesIn(member.claims)).toContain('Edges last');
  });

  it('mixes entries: priors of both, algorithms and cases of the set they share', async () => {
    const { captain, club: made, member } = await club();
    const setKey = await define(captain, {
      kind: 'whole',
      name: 'OLL, edges two times in five',
      entries: [
        { entry: 'any', parts: 3 },
        { entry: 'eo', parts: 2 },
      ],
      toldApart: ['co', 'eo'],
      solved: ['co', 'eo'],
    });
    const [row] = await api.factory.sql<{ parent_key: string }>(
      'select parent_key from case_set where set_key = $1',
      [setKey],
    );
    expect(row?.parent_key).toBe('oll');
    await api.factory.assign(made, setKey);
    const res = await api.as(member.claims).get('/api/cases');
    const cases = (res.body as { cases: { name: string; prior: { weight: number; total: number } }[] }).cases;
    expect(cases).toHaveLength(57);
    const prior = (name: string) => {
      const found = cases.find((one) => one.name === name)?.prior;
      return found ? found.weight / found.total : 0;
    };
    // OLL 27 is one case in 54 of any last layer and four in 27 of those with edges oriented (common practice);
    // OLL 1 (a dot) is one in 108 of any and none of the others.
    expect(prior('27')).toBeCloseTo(0.6 / 54 + 0.4 * (4 / 27), 12);
    expect(prior('1')).toBeCloseTo(0.6 / 108, 12);
  });

  it('chooses a subset’s cases from another set, and a subset of a subset from its whole', async () => {
    const { captain } = await club();
    const setKey = await define(captain, edgesOnly());
    const inner = await define(captain, {
      kind: 'subset',
      name: 'U perms',
      parentKey: setKey,
      caseKeys: keysOf('Ua', 'Ub'),
    });
    const rows = await api.factory.sql(
      `select s.parent_key, c.case_key, c.weight from set_case c join case_set s using (set_key)
       where set_key = $1 and not is_skip order by case_key`,
      [inner],
    );
    expect(rows).toEqual(
      keysOf('Ua', 'Ub')
        .sort()
        .map((key) => ({ parent_key: 'pll', case_key: key, weight: pll.byKey(key)?.weight })),
    );
  });

  it('refuses what cannot be, naming the field', async () => {
    const { captain } = await club();
    await define(captain, edgesOnly());
    const refused = async (input: object, status: number, pointer: string) => {
      const res = await api.as(captain.claims).post('/api/case-sets', input);
      expect({ status: res.status, errors: res.body.errors }).toEqual({
        status,
        errors: [expect.objectContaining({ pointer })],
      });
    };
    await refused({ ...TWO_FACE, name: '   ' }, 400, '/name');
    await refused({ ...TWO_FACE, name: 'x'.repeat(41) }, 400, '/name');
    await refused({ ...TWO_FACE, name: 'pll' }, 422, '/name');
    await refused(edgesOnly('EDGES ONLY'), 422, '/name');
    await refused({ ...TWO_FACE, entries: [] }, 400, '/entries');
    await refused({ ...TWO_FACE, entries: [{ entry: 'eo', parts: 0 }] }, 400, '/entries/0/parts');
    await refused({ ...TWO_FACE, toldApart: ['co'], solved: ['co', 'ep'] }, 422, '/toldApart');
    await refused(
      { ...TWO_FACE, entries: [{ entry: 'any', parts: 1 }], toldApart: ['co', 'eo'], solved: ['eo', 'co'] },
      422,
      '/toldApart',
    );
    const odd = { ...TWO_FACE, name: 'Nothing', toldApart: [], solved: [] };
    expect((await api.as(captain.claims).post('/api/case-sets', odd)).body.errors).toEqual([
      { pointer: '/toldApart', detail: expect.stringMatching(/^This set /u) },
    ]);
    const mixed = [
      { entry: 'eo', parts: 1 },
      { entry: 'eo', parts: 2 },
    ];
    await refused({ ...TWO_FACE, entries: mixed }, 422, '/toldApart');
    await refused({ ...edgesOnly('Other'), caseKeys: [] }, 400, '/caseKeys');
    await refused({ ...edgesOnly('Other'), caseKeys: ['no.such.case.1'] }, 422, '/caseKeys');
    await refused({ ...edgesOnly('Other'), caseKeys: [pll.skip.key] }, 422, '/caseKeys');
    await refused({ ...edgesOnly('Other'), caseKeys: pll.cases.map(({ key }) => key) }, 422, '/caseKeys');
    const nowhere = await api
      .as(captain.claims)
      .post('/api/case-sets', { ...edgesOnly('Other'), parentKey: 'none' });
    expect(nowhere.status).toBe(404);
  });

  it('asks for a captain or an administrator, and takes no parent from another club', async () => {
    const [mine, other] = [await club(), await club()];
    expect((await api.as(null).post('/api/case-sets', TWO_FACE)).status).toBe(401);
    expect((await api.as(mine.member.claims).post('/api/case-sets', TWO_FACE)).status).toBe(403);
    const theirs = await define(other.captain, edgesOnly());
    const res = await api
      .as(mine.captain.claims)
      .post('/api/case-sets', { ...edgesOnly('Mine'), parentKey: theirs, caseKeys: keysOf('H') });
    expect(res.status).toBe(404);
  });

  it('gives a name once when two ask for it at the same time', async () => {
    const { captain } = await club();
    const both = await Promise.all(
      [1, 2].map(() => api.as(captain.claims).post('/api/case-sets', edgesOnly())),
    );
    expect(both.map((res) => res.status).sort()).toEqual([200, 422]);
  });
});

describe('algorithms of a club’s own set', () => {
  const { upload, read, publish } = intakeSteps(api);

  it('come through Intake, from an administrator, and then the club trains it', async () => {
    const { captain, member, club: made } = await club();
    const setKey = await define(captain, {
      kind: 'whole',
      name: 'Edges alone',
      entries: [{ entry: 'corners', parts: 1 }],
      toldApart: ['eo'],
      solved: ['co', 'eo', 'cp'],
    });
    const none = await api.as(captain.claims).put(`/api/desk/programme/${setKey}`, {
      pinnedEdition: null,
      limitMs: 3000,
      asksAuf: true,
      forEveryone: true,
      memberIds: [],
      version: 0,
    });
    expect(none.status).toBe(422);
    const administrator = await api.factory.administrator();
    const { body: intake } = await api.as(administrator.claims).get('/api/admin/intake');
    const listed = (intake as IntakeView).sets.find((set) => set.setKey === setKey);
    // Three ways to flip an even number of four edges beside none, from every side (common practice).
    expect(listed).toMatchObject({
      name: `Edges alone (a club’s own, key ${setKey})`,
      cases: 3,
      newestEdition: null,
    });
    // From memory; that it leaves the corners as they are and flips two edges is proved by the draft's finding.
    const csv = "case,algorithm\nline,R U R' U' M' U R U' r'\n";
    const sent = await upload(administrator, csv, { setKey });
    expect(sent.status).toBe(200);
    const draft = await read(administrator, sent.body.draftId);
    expect(draft.draft.setName).toBe(`Edges alone (a club’s own, key ${setKey})`);
    expect(draft.lines).toMatchObject([{ finding: 'agrees', solves: 'line' }]);
    expect((await publish(administrator, draft)).body).toEqual({ setKey, edition: 1 });
    await api.factory.assign(made, setKey);
    const { verdicts } = await new Phone(api, member).answerNext();
    expect(verdicts[0]).toMatchObject({ outcome: 'held', was: { name: 'line', setName: 'Edges alone' } });
    // What has an edition stays.
    await api.factory.sql('delete from programme where set_key = $1', [setKey]);
    const retired = await api.as(captain.claims).delete(`/api/case-sets/${setKey}`);
    expect(retired.status).toBe(409);
    expect(retired.body.detail).toContain('has editions');
  });

  it('a subset has none of its own: the file goes to its whole', async () => {
    const { captain } = await club();
    const setKey = await define(captain, edgesOnly());
    const administrator = await api.factory.administrator();
    const { body } = await api.as(administrator.claims).get('/api/admin/intake');
    expect((body as IntakeView).sets.map((set) => set.setKey)).not.toContain(setKey);
    const sent = await upload(administrator, 'case,algorithm\nH,M2 U M2 U2 M2 U M2\n', { setKey });
    expect(sent.status).toBe(422);
    expect(sent.body.errors).toEqual([expect.objectContaining({ pointer: '/setKey' })]);
  });
});

describe('choosing cases', () => {
  it('lists them with what they can be chosen by', async () => {
    const { captain } = await club();
    const res = await api.as(captain.claims).get('/api/case-sets/coll/choices');
    expect(res.status).toBe(200);
    const view = res.body as CaseChoices;
    // 42 and the skip; the corner orientations of the trade, seven and the oriented ones (common practice).
    expect(view.cases).toHaveLength(42);
    expect(new Set(view.cases.map(({ corners }) => corners))).toEqual(
      new Set(['Sune', 'Antisune', 'T', 'U', 'L', 'H', 'Pi', 'corners oriented']),
    );
    expect(view.cases.every(({ edges, swap }) => edges === null && swap !== null)).toBe(true);
    expect(view.cases.reduce((sum, { weight }) => sum + weight, 0)).toBeLessThan(view.total);
  });

  it('is not found for no set, and not for members', async () => {
    const { captain, member } = await club();
    expect((await api.as(captain.claims).get('/api/case-sets/none/choices')).status).toBe(404);
    expect((await api.as(captain.claims).get(`/api/case-sets/${'x'.repeat(61)}/choices`)).status).toBe(400);
    expect((await api.as(member.claims).get('/api/case-sets/pll/choices')).status).toBe(403);
    expect((await api.as(null).get('/api/case-sets/pll/choices')).status).toBe(401);
  });
});

describe('retiring a set', () => {
  const retire = (claims: Person['claims'] | null, setKey: string) =>
    api.as(claims).delete(`/api/case-sets/${setKey}`);

  it('takes it out of lists and choices, and frees its name', async () => {
    const { captain } = await club();
    const setKey = await define(captain, edgesOnly());
    expect((await retire(captain.claims, setKey)).status).toBe(200);
    expect(await namesIn(captain.claims)).not.toContain('Edges only');
    const programme = await api.as(captain.claims).get('/api/desk/programme');
    expect(programme.body.available.map(({ name }: { name: string }) => name)).not.toContain('Edges only');
    const assigned = await api.as(captain.claims).put(`/api/desk/programme/${setKey}`, {
      pinnedEdition: null,
      limitMs: 3000,
      asksAuf: true,
      forEveryone: true,
      memberIds: [],
      version: 0,
    });
    expect(assigned.status).toBe(404);
    expect((await retire(captain.claims, setKey)).status).toBe(409);
    await define(captain, edgesOnly());
  });

  it('is refused while the set is in use, saying for what', async () => {
    const { captain, club: made } = await club();
    const onProgramme = await define(captain, edgesOnly());
    await api.factory.assign(made, onProgramme);
    const whole = await define(captain, TWO_FACE);
    const choices = (await api.as(captain.claims).get(`/api/case-sets/${whole}/choices`)).body as CaseChoices;
    const caseKeys = choices.cases.slice(0, 3).map(({ key }) => key);
    await define(captain, { kind: 'subset', name: 'Three of them', parentKey: whole, caseKeys });
    const { claims } = await api.factory.administrator();
    const forAll = await define({ claims }, edgesOnly('Edges for all'));
    await api.factory.assign(await api.factory.club(), forAll);
    for (const [who, setKey, says] of [
      [captain.claims, onProgramme, 'It is on your programme: withdraw it there first.'],
      [captain.claims, whole, 'Three of them'],
      [claims, forAll, 'programme of 1 club'],
      [claims, 'zbll', 'the trade’s own'],
    ] as const) {
      const res = await retire(who, setKey);
      expect(res.status).toBe(409);
      expect(res.body.detail).toContain(says);
    }
    // The set's own page knows it before anyone asks.
    const page = await api.as(captain.claims).get(`/api/catalogue/sets/${onProgramme}`);
    expect(page.body).toMatchObject({
      retirable: true,
      inUse: 'It is on your programme: withdraw it there first.',
    });
  });

  it('is told on its page, which still opens, with how much of its whole it is', async () => {
    const { captain } = await club();
    const setKey = await define(captain, edgesOnly());
    const page = async () => (await api.as(captain.claims).get(`/api/catalogue/sets/${setKey}`)).body;
    expect(await page()).toMatchObject({
      ofClub: true,
      retiredAt: null,
      retirable: true,
      inUse: null,
      cases: 4,
      // 21 permutations beside the skip (common practice).
      parent: { setKey: 'pll', name: 'PLL', cases: 21 },
    });
    expect((await retire(captain.claims, setKey)).status).toBe(200);
    expect(await page()).toMatchObject({ retiredAt: expect.any(Number), retirable: false, inUse: null });
  });

  it('is for the club’s captain; everyone’s sets are an administrator’s', async () => {
    const [mine, other] = [await club(), await club()];
    const setKey = await define(mine.captain, edgesOnly());
    const { claims } = await api.factory.administrator();
    const forAll = await define({ claims }, edgesOnly('Edges for everyone'));
    expect((await retire(null, setKey)).status).toBe(401);
    expect((await retire(mine.member.claims, setKey)).status).toBe(403);
    expect((await retire(other.captain.claims, setKey)).status).toBe(404);
    expect((await retire(mine.captain.claims, forAll)).status).toBe(403);
    expect((await retire(claims, setKey)).status).toBe(200);
    expect((await retire(claims, forAll)).status).toBe(200);
    expect((await retire(claims, 'none')).status).toBe(404);
    expect((await retire(claims, 'x'.repeat(61))).status).toBe(400);
  });
});
