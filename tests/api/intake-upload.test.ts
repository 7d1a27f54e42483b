import { createHash, randomUUID } from 'node:crypto';
import { deflateRawSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { useApi } from '#tests/support/api.ts';
import { intakeSteps, KNOWN } from '#tests/support/intake.ts';

const api = useApi();
const { upload, read, draftOf } = intakeSteps(api);

const HEADER = 'case,algorithm\n';
const drafts = async () =>
  (await api.factory.sql<{ count: string }>('select count(*) from intake_draft'))[0]?.count;

describe('uploading', () => {
  it('keeps the bytes as they came, with their hash, and reads every line', async () => {
    const admin = await api.factory.administrator();
    const bytes = Buffer.from(
      `\uFEFFAlgorithm;Case;hint;note\r\n"${KNOWN.T}";T;;"by ""hand"""\r\n\r\n${KNOWN.F};F;;\r\n`,
    );
    const res = await upload(admin, bytes, { fileName: 'permutations-spring.csv' });
    expect(res.status).toBe(200);
    const { draftId } = res.body as { draftId: string };
    const [row] = await api.factory.sql<{ file: Buffer; file_hash: string; created_by: string }>(
      'select file, file_hash, created_by from intake_draft where draft_id = $1',
      [draftId],
    );
    expect(row?.file.equals(bytes)).toBe(true);
    expect(row?.file_hash).toBe(createHash('sha256').update(bytes).digest('hex'));
    expect(row?.created_by).toBe(admin.accountId);
    const view = await read(admin, draftId);
    expect(view.draft).toMatchObject({
      fileName: 'permutations-spring.csv',
      setKey: 'pll',
      setName: 'PLL',
      state: 'open',
      lines: 2,
      editionNumber: null,
    });
    expect(view.unknownColumns).toEqual(['hint']);
    expect(view.lines.map(({ line, caseName, note }) => [line, caseName, note])).toEqual([
      [2, 'T', 'by "hand"'],
      [4, 'F', ''],
    ]);
    expect(view).toMatchObject({ covered: 2, of: 21, newestEdition: 1, cannot: 0, toDecide: 0 });
  });

  it('shows each line with what it solves, its prior, its angles and its picture', async () => {
    const admin = await api.factory.administrator();
    const { lines, missing, effect } = await draftOf(admin, `H,${KNOWN.H}`, `Ra,${KNOWN.F}`, "T,R U R' U'");
    // Priors of PLL: H 1/72, F 1/18 of 288 states (common practice; domain of the set).
    expect(lines[0]).toMatchObject({
      finding: 'agrees',
      says: 'Agrees',
      hint: '1 angle',
      solves: 'H',
      prior: { weight: 4, total: 288 },
      angles: 1,
      standing: 'fine',
      original: null,
    });
    expect(lines[0]?.picture?.stickers.top).toBe('UUUUUUUUU');
    expect(lines[1]).toMatchObject({
      finding: 'solves-other',
      says: 'Solves F, the file says Ra',
      solves: 'F',
      prior: { weight: 16, total: 288 },
      standing: 'decide',
    });
    expect(lines[2]).toMatchObject({
      finding: 'first-two-layers-broken',
      says: 'Breaks the first two layers',
      solves: null,
      prior: null,
      picture: null,
      standing: 'cannot',
    });
    expect(missing).toHaveLength(20);
    expect(effect).toEqual({ newCases: 0, newAlgorithms: 0, keptCases: 20, alreadyThere: 1 });
  });

  it('lists open drafts first and says which sets there are', async () => {
    const admin = await api.factory.administrator();
    const { draft } = await draftOf(admin, `T,${KNOWN.T}`);
    const res = await api.as(admin.claims).get('/api/admin/intake');
    expect(res.status).toBe(200);
    expect(res.body.drafts[0]).toEqual(draft);
    expect(res.body.sets.slice(0, 2)).toEqual([
      { setKey: 'oll', name: 'OLL', cases: 57, newestEdition: 1 },
      { setKey: 'pll', name: 'PLL', cases: 21, newestEdition: 1 },
    ]);
    expect(res.body.sets.find(({ name }: { name: string }) => name === 'ZBLL')).toEqual({
      setKey: 'zbll',
      name: 'ZBLL',
      cases: 493,
      newestEdition: null,
    });
  });
});

/** Stored in the zip format by hand: one local header and deflated bytes are enough to be no text. */
function zip(text: string): Buffer {
  const body = deflateRawSync(text);
  const head = Buffer.alloc(30);
  head.writeUInt32LE(0x04034b50, 0);
  head.writeUInt16LE(8, 8);
  head.writeUInt32LE(body.length, 18);
  return Buffer.concat([head, body]);
}

describe('files that cannot be taken', () => {
  const hostile: [string, string | Uint8Array, RegExp, number?][] = [
    ['empty', '', /empty/],
    ['blank', ' \n\n\t\n', /empty/],
    ['header only', HEADER, /no line follows/],
    ['no header', `T,${KNOWN.T}\n`, /first line must name the columns/, 1],
    ['a column missing', 'case,group\nT,adjacent\n', /first line must name the columns/, 1],
    ['a column twice', `case,algorithm,Case\nT,${KNOWN.T},T\n`, /names the column case twice/, 1],
    ['NUL', `${HEADER}T,R\0U\n`, /not text/],
    ['a zip', zip(`${HEADER}T,${KNOWN.T}\n`), /not text/],
    ['quote never closed', `${HEADER}T,${KNOWN.T}\nF,"R U R'\nH,M2\n`, /Line 3: .*never closed/, 3],
    ['quote inside a field', `${HEADER}T,R "U" R\n`, /Line 2: .*quotation mark/, 2],
    ['too many fields', `${HEADER}T,R U,R',F\n`, /Line 2 has more fields/, 2],
    ['a line too long', `${HEADER}T,${'R U '.repeat(300)}\n`, /Line 2: the algorithm is longer/, 2],
    ['a name too long', `${HEADER}${'T'.repeat(61)},R\n`, /Line 2: the case is longer/, 2],
    ['over 50,000 lines', HEADER + 'T,R\n'.repeat(50_001), /more than 50000 lines/],
    ['over 5 MB', `${HEADER}T,${' '.repeat(5_000_001)}R\n`, /larger than 5 MB/],
  ];

  it.each(hostile)('%s: a clear sentence, and nothing is written', async (_name, file, says, row) => {
    const admin = await api.factory.administrator();
    const before = await drafts();
    const res = await upload(admin, file);
    expect(res.status).toBe(422);
    expect(res.headers['content-type']).toContain('application/problem+json');
    expect(res.body.detail).toMatch(says);
    expect(res.body.errors).toEqual([
      { pointer: '/content', detail: res.body.detail, ...(row === undefined ? {} : { row }) },
    ]);
    expect(await drafts()).toBe(before);
  });

  it('refuses what is no upload at all', async () => {
    const admin = await api.factory.administrator();
    expect((await upload(admin, 'x', { content: 'not base64!' })).status).toBe(400);
    expect((await upload(admin, 'x', { setKey: '' })).body.detail).toBe('Choose the set the file is for.');
    expect((await upload(admin, 'x', { fileName: ' ' })).status).toBe(400);
    expect((await upload(admin, 'x', { fileName: 'a\u0000b.csv' })).status).toBe(422);
    expect((await upload(admin, `${HEADER}T,R\n`, { fileName: 'a\u0000b.csv' })).status).toBe(400);
    expect((await upload(admin, 'x', { extra: 1 })).status).toBe(400);
    expect((await upload(admin, 'x', { setKey: 'no-such-set' })).status).toBe(404);
    expect((await upload(admin, 'x', { content: 'A'.repeat(7_000_004) })).body.detail).toContain('5 MB');
    expect((await upload(admin, 'x', { content: 'A'.repeat(8_000_000) })).status).toBe(413);
  });

  it('survives names that mean something to JavaScript, SQL or a spreadsheet', async () => {
    const admin = await api.factory.administrator();
    const { lines } = await draftOf(
      admin,
      '__proto__,R',
      "'; drop table edition; --,R",
      '=HYPERLINK("x"),R'.replaceAll('"', "'"),
      'ｔ,R',
    );
    expect(lines.map(({ caseName }) => caseName)).toEqual([
      '__proto__',
      "'; drop table edition; --",
      "=HYPERLINK('x')",
      'ｔ',
    ]);
    expect(lines.some(({ standing }) => standing === 'fine')).toBe(false);
  });

  it('keeps at most twenty names of a header of two hundred columns', async () => {
    const admin = await api.factory.administrator();
    const columns = Array.from({ length: 200 }, (_, n) => `column ${n} ${'x'.repeat(100)}`);
    const res = await upload(admin, `case,algorithm,${columns.join(',')}\nT,${KNOWN.T}\n`);
    const view = await read(admin, (res.body as { draftId: string }).draftId);
    expect(view.unknownColumns).toHaveLength(20);
    expect(Math.max(...view.unknownColumns.map((name) => name.length))).toBe(60);
  });
});

it('writes nothing of a file when writing its lines fails', async () => {
  const admin = await api.factory.administrator();
  await api.factory.sql(`create function refuse_line() returns trigger language plpgsql as
    $$ begin if new.line = 3 then raise exception 'disk full'; end if; return new; end $$`);
  await api.factory.sql(
    'create trigger fault before insert on intake_line for each row execute function refuse_line()',
  );
  const before = await drafts();
  const res = await upload(admin, `${HEADER}T,${KNOWN.T}\nF,${KNOWN.F}\n`);
  expect(res.status).toBe(500);
  expect(await drafts()).toBe(before);
  await api.factory.sql('drop trigger fault on intake_line');
  expect((await upload(admin, `${HEADER}T,${KNOWN.T}\nF,${KNOWN.F}\n`)).status).toBe(200);
});

describe('who may', () => {
  const id = randomUUID();
  const requests: ['get' | 'post' | 'patch', string, object?][] = [
    ['get', '/api/admin/intake'],
    ['post', '/api/admin/intake', { setKey: 'pll', fileName: 'a.csv', content: '' }],
    ['get', `/api/admin/intake/${id}`],
    ['patch', `/api/admin/intake/${id}/lines/2`, { version: 1, decision: 'drop' }],
    ['post', `/api/admin/intake/${id}/publish`, { version: 1, note: '' }],
    ['post', `/api/admin/intake/${id}/discard`, { version: 1 }],
  ];

  it.each(requests)('%s %s: administrators only', async (method, path, body) => {
    const member = await api.factory.person();
    const captain = await api.factory.person({ role: 'captain' });
    expect((await api.as(null)[method](path, body)).status).toBe(401);
    expect((await api.as(member.claims)[method](path, body)).status).toBe(403);
    expect((await api.as(captain.claims)[method](path, body)).status).toBe(403);
    // A token that claims more than its account has.
    const forged = { ...member.claims, clubId: null, role: 'administrator' as const };
    expect((await api.as(forged)[method](path, body)).status).toBe(401);
  });

  it('shows drafts and editions to no session of a club, whatever the query', async () => {
    const admin = await api.factory.administrator();
    await draftOf(admin, `T,${KNOWN.T}`);
    const seen = await api.db.transaction(async (tx) => tx.execute('select 1 from intake_draft'));
    expect(seen.rows).toEqual([]);
  });

  it('knows no draft that is not there', async () => {
    const admin = await api.factory.administrator();
    const as = api.as(admin.claims);
    expect((await as.get(`/api/admin/intake/${id}`)).status).toBe(404);
    expect((await as.get('/api/admin/intake/not-an-id')).status).toBe(400);
    expect((await as.patch(`/api/admin/intake/${id}/lines/2`, { version: 1, decision: 'drop' })).status).toBe(
      404,
    );
    expect((await as.post(`/api/admin/intake/${id}/publish`, { version: 1, note: '' })).status).toBe(404);
    expect((await as.post(`/api/admin/intake/${id}/discard`, { version: 1 })).status).toBe(404);
  });
});
