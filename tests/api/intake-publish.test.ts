import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import type { EditionView } from '#shared/contracts/catalogue.ts';
import type { DraftView } from '#shared/contracts/intake.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';
import { intakeSteps, KNOWN } from '#tests/support/intake.ts';

const api = useApi();
const { upload, read, draftOf, settle, publish } = intakeSteps(api);

type Administrator = Awaited<ReturnType<typeof api.factory.administrator>>;

async function edition(who: Administrator, setKey: string, number: number): Promise<EditionView> {
  const res = await api.as(who.claims).get(`/api/catalogue/sets/${setKey}/editions/${number}`);
  expect(res.status).toBe(200);
  return res.body as EditionView;
}

const newest = async (setKey: string): Promise<number> =>
  (
    await api.factory.sql<{ n: number }>('select max(number)::int as n from edition where set_key = $1', [
      setKey,
    ])
  )[0]!.n;

const algorithmsOf = (view: EditionView, name: string) =>
  view.cases.find((c) => c.name === name)?.algorithms.map(({ algorithm }) => algorithm);

describe('the whole story', () => {
  it('settles one broken and one mislabelled line and publishes what the file says', async () => {
    const admin = await api.factory.administrator();
    const before = await edition(admin, 'pll', 1);
    const file = readFileSync(
      fileURLToPath(new URL('../../database/seed/case-sets/pll.csv', import.meta.url)),
      'utf8',
    );
    const spoilt = file
      .replace(`T,${KNOWN.T}`, `T,${KNOWN.T.replace("F'", 'F')}`)
      .replace(`F,${KNOWN.F}`, `Ra,${KNOWN.F}`);
    const res = await upload(admin, spoilt, { fileName: 'pll.csv' });
    let view = await read(admin, (res.body as { draftId: string }).draftId);
    const broken = view.lines.find(({ standing }) => standing === 'cannot');
    const mislabelled = view.lines.find(({ standing }) => standing === 'decide');
    expect(view).toMatchObject({ cannot: 1, toDecide: 1, covered: 19, of: 21 });
    expect([...view.missing].sort()).toEqual(['F', 'T']);
    expect(broken).toMatchObject({ caseName: 'T', finding: 'first-two-layers-broken' });
    expect(mislabelled).toMatchObject({ caseName: 'Ra', solves: 'F' });

    const early = await publish(admin, view);
    expect(early.status).toBe(422);
    expect(early.body.detail).toMatch(/^2 lines are still to settle/);

    view = (await settle(admin, view, { line: mislabelled!.line, decision: 'take' })).body as DraftView;
    view = (await settle(admin, view, { line: broken!.line, decision: 'none', algorithm: KNOWN.T }))
      .body as DraftView;
    expect(view).toMatchObject({ cannot: 0, toDecide: 0, covered: 21, missing: [] });
    const done = await publish(admin, view, { note: 'Spring.' });
    expect(done.status).toBe(200);
    expect(done.body).toEqual({ setKey: 'pll', edition: 2 });

    const after = await edition(admin, 'pll', 2);
    expect(after).toMatchObject({ note: 'Spring.', numbers: [2, 1], missing: [] });
    // The file was edition 1 but for two spoilt lines that were mended: the contents agree.
    expect(after.cases).toEqual(before.cases);
    const closed = await read(admin, view.draft.draftId);
    expect(closed.draft).toMatchObject({ state: 'published', editionNumber: 2 });
    expect((await publish(admin, closed)).status).toBe(409);
    expect((await settle(admin, closed, { line: 2, decision: 'drop' })).status).toBe(409);
    const [row] = await api.factory.sql<{ published_by: string }>(
      "select published_by from edition where set_key = 'pll' and number = 2",
    );
    expect(row?.published_by).toBe(admin.accountId);
  });

  it('puts the file first, keeps the rest, and leaves other cases alone', async () => {
    const admin = await api.factory.administrator();
    const from = await newest('oll');
    const before = await edition(admin, 'oll', from);
    const res = await upload(
      admin,
      // Sune (27) from memory, with a turn before it that cancels; a second algorithm of the same case.
      "case,algorithm,group,note\n27,(R U R' U) R U2' R',,mine\n27,y L' U2 L U L' U L,crosses,\n",
      { setKey: 'oll' },
    );
    const view = await read(admin, (res.body as { draftId: string }).draftId);
    const [first, second] = view.lines;
    expect(first).toMatchObject({ finding: 'agrees', caseName: '27' });
    const settled =
      second?.standing === 'fine'
        ? view
        : ((await settle(admin, view, { line: 3, decision: 'drop' })).body as DraftView);
    expect((await publish(admin, settled)).body).toEqual({ setKey: 'oll', edition: from + 1 });
    const after = await edition(admin, 'oll', from + 1);
    const sune = after.cases.find((c) => c.name === '27')!;
    expect(sune.algorithms[0]).toEqual({ algorithm: "R U R' U R U2 R'", note: 'mine' });
    expect(new Set(sune.algorithms.map(({ algorithm }) => algorithm)).size).toBe(sune.algorithms.length);
    const others = (view: EditionView) => view.cases.filter((c) => c.name !== '27');
    expect(others(after)).toEqual(others(before));
  });

  it('makes a first edition of a set that has none', async () => {
    const admin = await api.factory.administrator();
    const zbll = caseSet('zbll');
    const name = zbll.caseOfState(caseSet('pll').byName('H')!.canonical)!.name;
    const res = await upload(admin, `case,algorithm\n${name},${KNOWN.H}\n`, { setKey: 'zbll' });
    const view = await read(admin, (res.body as { draftId: string }).draftId);
    // Common practice: ZBLL has 472 cases and the 21 of PLL.
    expect(view).toMatchObject({ newestEdition: null, covered: 1, of: 493 });
    expect((await publish(admin, view)).body).toEqual({ setKey: 'zbll', edition: 1 });
    const made = await edition(admin, 'zbll', 1);
    expect(algorithmsOf(made, name)).toEqual([KNOWN.H]);
    expect(made.missing).toHaveLength(492);
  });

  it('publishes no edition of dropped lines alone', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`);
    const dropped = (await settle(admin, view, { line: 2, decision: 'drop' })).body as DraftView;
    const res = await publish(admin, dropped);
    expect(res.status).toBe(422);
    expect(res.body.detail).toMatch(/Nothing would be published/);
  });

  it('gives a case at most 99 algorithms', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, ...detours().map((detour) => `T,${detour} ${KNOWN.T}`));
    expect(view).toMatchObject({ cannot: 0, toDecide: 0 });
    const res = await publish(admin, view);
    expect(res.status).toBe(422);
    expect(res.body.detail).toMatch(/^T would have \d+ algorithms; a case can have 99\.$/);
  });
});

/** A hundred ways to do nothing: (A B A' B') six times over, for faces A and B side by side (common practice). */
function detours(): string[] {
  const faces = ['U', 'D', 'L', 'R', 'F', 'B'];
  const opposite: Record<string, string> = { U: 'D', D: 'U', L: 'R', R: 'L', F: 'B', B: 'F' };
  const turns = (face: string) =>
    [
      [face, `${face}'`],
      [`${face}'`, face],
    ] as const;
  const all = faces.flatMap((a) =>
    faces
      .filter((b) => b !== a && b !== opposite[a])
      .flatMap((b) =>
        turns(a).flatMap(([first, firstBack]) =>
          turns(b).map(([second, secondBack]) => `(${first} ${second} ${firstBack} ${secondBack})6`),
        ),
      ),
  );
  return [...all, ...all.slice(0, 4).map((detour) => `${detour} y ${detour} y'`)];
}

describe('two publishers at once', () => {
  it('lets one of two drafts of a set through; the other is told and then merges into the new edition', async () => {
    const [one, other] = [await api.factory.administrator(), await api.factory.administrator()];
    const from = await newest('pll');
    // Two first algorithms that edition 1 lacks: a turn of the whole cube makes another algorithm.
    const first = await draftOf(one, `T,y ${KNOWN.T}`);
    const second = await draftOf(other, `Y,y ${KNOWN.Y}`);
    const results = await Promise.all([publish(one, first), publish(other, second)]);
    expect(results.map(({ status }) => status).sort()).toEqual([200, 412]);
    expect(await newest('pll')).toBe(from + 1);
    const [loser, theirs] = results[0]!.status === 412 ? [one, first] : [other, second];
    const told = results.find(({ status }) => status === 412);
    expect(told?.body.detail).toMatch(/another edition of its set was published/);
    const again = await read(loser, theirs.draft.draftId);
    expect(again).toMatchObject({ newestEdition: from + 1, version: theirs.version + 1 });
    expect((await publish(loser, again)).body).toEqual({ setKey: 'pll', edition: from + 2 });
    const merged = await edition(one, 'pll', from + 2);
    expect(algorithmsOf(merged, 'T')?.[0]).toBe(`y ${KNOWN.T}`);
    expect(algorithmsOf(merged, 'Y')?.[0]).toBe(`y ${KNOWN.Y}`);
  });

  it('publishes one draft once, however often it is asked to', async () => {
    const admin = await api.factory.administrator();
    const from = await newest('pll');
    const view = await draftOf(admin, `H,y ${KNOWN.H}`);
    const all = await Promise.all(Array.from({ length: 4 }, () => publish(admin, view)));
    expect(all.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
    expect(all.find(({ status }) => status === 409)?.body.detail).toMatch(
      new RegExp(`published already, as edition ${from + 1}`),
    );
    expect(await newest('pll')).toBe(from + 1);
  });

  it('leaves drafts of other sets alone', async () => {
    const admin = await api.factory.administrator();
    const res = await upload(admin, "case,algorithm\n27,R U R' U R U2 R'\n", { setKey: 'oll' });
    const oll = await read(admin, (res.body as { draftId: string }).draftId);
    expect((await publish(admin, await draftOf(admin, `T,${KNOWN.T}`))).status).toBe(200);
    expect((await read(admin, oll.draft.draftId)).version).toBe(oll.version);
  });

  it('refuses a draft that was settled further since it was read', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`, `F,${KNOWN.F}`);
    await settle(admin, view, { line: 3, decision: 'drop' });
    expect((await publish(admin, view)).status).toBe(412);
  });
});

describe('all or nothing', () => {
  it('leaves no trace of an edition whose last row could not be written', async () => {
    const admin = await api.factory.administrator();
    const from = await newest('pll');
    const view = await draftOf(admin, `T,${KNOWN.T}`);
    await api.factory.sql(`create function refuse_algorithm() returns trigger language plpgsql as
      $$ begin if new.edition_number > ${from} and new.rank = 2 then raise exception 'disk full'; end if; return new; end $$`);
    await api.factory.sql(
      'create trigger fault before insert on edition_algorithm for each row execute function refuse_algorithm()',
    );
    expect((await publish(admin, view)).status).toBe(500);
    await api.factory.sql('drop trigger fault on edition_algorithm');
    expect(await newest('pll')).toBe(from);
    const [left] = await api.factory.sql(
      'select count(*)::int as n from edition_case where set_key = $1 and edition_number > $2',
      ['pll', from],
    );
    expect(left).toEqual({ n: 0 });
    expect((await read(admin, view.draft.draftId)).draft.state).toBe('open');
    expect((await publish(admin, view)).body).toEqual({ setKey: 'pll', edition: from + 1 });
  });

  it('never changes an edition afterwards, not even as the owner', async () => {
    const statements = [
      "update edition set note = 'x'",
      'delete from edition_algorithm',
      "update edition_case set name = name || 'x'",
    ];
    for (const statement of statements) {
      await expect(api.factory.sql(statement)).rejects.toThrow(/append-only/);
    }
  });

  it('refuses a note that cannot be kept', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`);
    expect((await publish(admin, view, { note: 'x'.repeat(501) })).status).toBe(400);
    expect((await publish(admin, view, { note: 'x\u0000' })).status).toBe(400);
    expect((await publish(admin, view, { note: 'Two\nlines.' })).status).toBe(200);
  });
});
