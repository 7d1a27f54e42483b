import { describe, expect, it } from 'vitest';
import type { DraftView } from '#shared/contracts/intake.ts';
import { useApi } from '#tests/support/api.ts';
import { intakeSteps, KNOWN } from '#tests/support/intake.ts';

const api = useApi();
const { read, draftOf, settle, discard } = intakeSteps(api);

const lineOf = (view: DraftView, line: number) => view.lines.find((one) => one.line === line);

describe('settling a line', () => {
  it('takes a mislabelled line as what it solves, and takes that back', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `Ra,${KNOWN.F}`);
    expect(view).toMatchObject({ toDecide: 1, covered: 0 });
    const taken = (await settle(admin, view, { line: 2, decision: 'take' })).body as DraftView;
    expect(taken).toMatchObject({ version: 2, toDecide: 0, cannot: 0, covered: 1 });
    expect(lineOf(taken, 2)).toMatchObject({
      decision: 'take',
      standing: 'fine',
      caseName: 'Ra',
      solves: 'F',
    });
    expect(await read(admin, view.draft.draftId)).toEqual(taken);
    const back = (await settle(admin, taken, { line: 2, decision: 'none' })).body as DraftView;
    expect(back).toMatchObject({ version: 3, toDecide: 1, covered: 0 });
  });

  it('drops a line and takes it in again', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, 'T,R U', `T,${KNOWN.T}`);
    expect(view).toMatchObject({ cannot: 1 });
    const dropped = (await settle(admin, view, { line: 2, decision: 'drop' })).body as DraftView;
    expect(dropped).toMatchObject({ cannot: 0, covered: 1 });
    expect(lineOf(dropped, 2)).toMatchObject({ decision: 'drop', standing: 'out' });
    const back = (await settle(admin, dropped, { line: 2, decision: 'none' })).body as DraftView;
    expect(back).toMatchObject({ cannot: 1 });
  });

  it('reads an edited line anew, keeps the words of the file, and gives them back', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, "T,R U'' R'");
    expect(lineOf(view, 2)).toMatchObject({
      finding: 'not-a-move',
      says: 'U′′ is not a move',
      hint: 'character 5',
      column: 5,
      token: "U''",
    });
    const edited = (await settle(admin, view, { line: 2, decision: 'none', algorithm: KNOWN.T }))
      .body as DraftView;
    expect(lineOf(edited, 2)).toMatchObject({
      finding: 'agrees',
      standing: 'fine',
      algorithm: KNOWN.T,
      original: { caseName: 'T', algorithm: "R U'' R'" },
    });
    expect(lineOf(edited, 2)?.picture).not.toBeNull();
    const renamed = (await settle(admin, edited, { line: 2, decision: 'none', caseName: 'F' }))
      .body as DraftView;
    expect(lineOf(renamed, 2)).toMatchObject({ finding: 'solves-other', algorithm: KNOWN.T, caseName: 'F' });
    const back = (
      await settle(admin, renamed, { line: 2, decision: 'none', caseName: 'T', algorithm: "R U'' R'" })
    ).body as DraftView;
    expect(lineOf(back, 2)).toMatchObject({ original: null, finding: 'not-a-move' });
  });

  it('finds duplicates that an edit makes or mends', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`, `T,${KNOWN.T}`);
    expect(lineOf(view, 3)).toMatchObject({
      finding: 'duplicate',
      says: 'The same as line 2',
      standing: 'decide',
    });
    const mended = (
      await settle(admin, view, { line: 2, decision: 'none', caseName: 'H', algorithm: KNOWN.H })
    ).body as DraftView;
    expect(mended.lines.map(({ finding }) => finding)).toEqual(['agrees', 'agrees']);
    const again = (await settle(admin, mended, { line: 2, decision: 'none', algorithm: `${KNOWN.T} U U'` }))
      .body as DraftView;
    expect(lineOf(again, 3)).toMatchObject({ finding: 'duplicate' });
  });

  it('takes only what solves another case of the set', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`, 'F,R U', "H,U U'", `T,${KNOWN.T}`);
    for (const line of [2, 3, 4, 5]) {
      const res = await settle(admin, view, { line, decision: 'take' });
      expect(res.status).toBe(422);
      expect(res.body.detail).toContain(`Line ${line} cannot be taken`);
    }
    expect((await read(admin, view.draft.draftId)).version).toBe(1);
  });

  it('refuses steps that make no sense', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`);
    expect((await settle(admin, view, { line: 9, decision: 'drop' })).status).toBe(404);
    expect((await settle(admin, view, { line: 0, decision: 'drop' })).status).toBe(400);
    const path = `/api/admin/intake/${view.draft.draftId}/lines/2`;
    const bad = [
      { version: 1, decision: 'publish' },
      { decision: 'drop' },
      { version: 1, decision: 'none', algorithm: 'R'.repeat(1001) },
      { version: 1, decision: 'none', algorithm: 'R\u0000' },
      { version: 1, decision: 'none', caseName: 'T\n' + 'x' },
    ];
    for (const body of bad) expect((await api.as(admin.claims).patch(path, body)).status).toBe(400);
    expect((await read(admin, view.draft.draftId)).version).toBe(1);
  });
});

describe('two administrators on one draft', () => {
  it('tells the second to look again, and writes nothing of theirs', async () => {
    const [one, other] = [await api.factory.administrator(), await api.factory.administrator()];
    const view = await draftOf(one, `Ra,${KNOWN.F}`, 'T,R U');
    expect((await settle(one, view, { line: 2, decision: 'take' })).status).toBe(200);
    const late = await settle(other, view, { line: 2, decision: 'drop' });
    expect(late.status).toBe(412);
    expect(late.body.detail).toMatch(/changed meanwhile/);
    expect(lineOf(await read(other, view.draft.draftId), 2)).toMatchObject({ decision: 'take' });
  });

  it('lets exactly one of many simultaneous steps through', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `Ra,${KNOWN.F}`);
    const all = await Promise.all(
      Array.from({ length: 5 }, (_, n) =>
        settle(admin, view, { line: 2, decision: n % 2 === 0 ? 'take' : 'drop' }),
      ),
    );
    expect(all.map(({ status }) => status).sort()).toEqual([200, 412, 412, 412, 412]);
    expect((await read(admin, view.draft.draftId)).version).toBe(2);
  });
});

describe('discarding', () => {
  it('closes the draft for good, keeping its file', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`);
    const res = await discard(admin, view);
    expect(res.status).toBe(200);
    expect(
      res.body.drafts.find(({ draftId }: { draftId: string }) => draftId === view.draft.draftId).state,
    ).toBe('discarded');
    const closed = await read(admin, view.draft.draftId);
    expect(closed.draft.state).toBe('discarded');
    expect((await settle(admin, closed, { line: 2, decision: 'drop' })).status).toBe(409);
    expect((await discard(admin, closed)).status).toBe(409);
    const [row] = await api.factory.sql(
      'select closed_at, length(file) > 0 as kept from intake_draft where draft_id = $1',
      [view.draft.draftId],
    );
    expect(row).toMatchObject({ kept: true, closed_at: expect.any(Date) });
  });

  it('is refused on a draft that has changed', async () => {
    const admin = await api.factory.administrator();
    const view = await draftOf(admin, `T,${KNOWN.T}`);
    await settle(admin, view, { line: 2, decision: 'drop' });
    expect((await discard(admin, view)).status).toBe(412);
  });
});
