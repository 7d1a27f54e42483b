import { parse } from 'csv-parse/sync';
import { describe, expect, it } from 'vitest';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';

const api = useApi();
const ledger = (query: string) => api.as(null).get(`/api/ledger?${query}`);
const fraction = (numerator: number, denominator: number) => ({ numerator, denominator });

describe('the Ledger', () => {
  it('counts a step for one who is not signed in, and for everyone else', async () => {
    const { status, body } = await ledger('entry=co%2Beo&aspects=cp,ep');
    expect(status).toBe(200);
    // PLL: 576 assemblies, 288 solvable, 72 without the AUF after, 22 with the skip (common practice).
    expect(body).toMatchObject({
      trade: { key: 'pll', name: 'PLL' },
      entryStates: 288,
      assemblies: { value: 576 },
      solvable: { value: 288 },
      withoutAufAfter: { value: 72 },
      cases: 22,
      of: 72,
      mix: null,
      // The trade's sets for this entry (common practice).
      tradeSets: [
        { name: 'PLL', aspects: ['cp', 'ep'] },
        { name: 'CPLL', aspects: ['cp'] },
      ],
    });
    // Sixteen of 1/18, two of 1/36, four of 1/72, the skip among these (common practice).
    expect(body.classes).toMatchObject([
      { angles: 4, cases: 16, prior: fraction(1, 18), dealtOnceIn: fraction(18, 1) },
      { angles: 2, cases: 2, prior: fraction(1, 36), dealtOnceIn: fraction(36, 1) },
      { angles: 1, cases: 4, prior: fraction(1, 72), dealtOnceIn: fraction(72, 1) },
    ]);
    expect(body.classes.map((one: { shown: { name: string }[] }) => one.shown.length)).toEqual([6, 2, 4]);
    expect(body.classes[1].shown.map((one: { name: string }) => one.name).sort()).toEqual(['E', 'Z']);
    expect(body.classes[2].shown[0]).toMatchObject({ number: 0, name: 'skip' });
    // The lemma: the mean of what the sixteen pairs of turns leave as it is.
    expect(body.burnside.reduce((sum: number, n: number) => sum + n, 0) / 16).toBe(22);

    const member = await api.factory.person();
    for (const claims of [member.claims, (await api.factory.administrator()).claims]) {
      const other = await api.as(claims).get('/api/ledger?entry=co%2Beo&aspects=cp,ep');
      expect(other.body).toEqual(body);
    }
  });

  it('takes aspects as a list, one by one, in any order, twice, and none at all', async () => {
    const { body } = await ledger('entry=any&aspects=co,eo');
    for (const aspects of ['aspects=eo,co', 'aspects=co&aspects=eo', 'aspects=eo&aspects=co,eo,']) {
      expect((await ledger(`entry=any&${aspects}`)).body).toEqual(body);
    }
    for (const none of ['entry=eo&aspects=', 'entry=eo']) {
      const alone = (await ledger(none)).body;
      expect(alone).toMatchObject({ cases: 1, aspects: [], seen: ['eo'], trade: null, of: 1 });
      expect(alone.classes).toMatchObject([{ cases: 1, prior: fraction(1, 1) }]);
    }
  });

  it('hatches what is not seen, and says where inverse is not defined', async () => {
    const { body } = await ledger('entry=any&aspects=co,eo');
    const [{ shown }] = body.classes;
    expect(Object.values(shown[0].picture.stickers).join('')).toMatch(/^[U?]+$/);
    expect(body).toMatchObject({ upToInverse: null, upToMirrorAndInverse: null });
    // 1LLL: 1,212 up to mirror and inverse (common practice).
    expect((await ledger('entry=any&aspects=co,eo,cp,ep')).body.upToMirrorAndInverse).toBe(1212);
  });

  it('mixes the priors of two ways to arrive exactly', async () => {
    const { body } = await ledger('entry=any&aspects=co,eo&with=eo&share=40');
    expect(body.mix).toMatchObject({ with: 'eo', share: 40, cases: 58 });
    // By hand: of 100 solves 60 deal OLL (1/54 a case of four angles), 40 OCLL (4/27): 0.6/54 + 0.4·4/27 = 19/270.
    expect(body.mix.classes[0]).toMatchObject({
      cases: 6,
      first: fraction(1, 54),
      second: fraction(4, 27),
      mixed: fraction(19, 270),
      dealtOnceIn: fraction(270, 19),
    });
    const sum = body.mix.classes.reduce(
      (all: number, one: { cases: number; mixed: { numerator: number; denominator: number } }) =>
        all + (one.cases * one.mixed.numerator) / one.mixed.denominator,
      0,
    );
    expect(sum).toBeCloseTo(1, 12);
    // Cases that only one of the two can deal have no prior under the other.
    expect(body.mix.classes.at(-1)).toMatchObject({ second: fraction(0, 1) });
  });

  it('names the field that is wrong', async () => {
    const pointers = async (query: string) => {
      const res = await ledger(query);
      expect(res.status).toBe(400);
      expect(res.type).toBe('application/problem+json');
      expect(res.headers['cache-control']).toBe('no-store');
      return res.body.errors.map((one: { pointer: string }) => one.pointer);
    };
    expect(await pointers('entry=f2l&aspects=cp')).toEqual(['/entry']);
    expect(await pointers('aspects=cp')).toEqual(['/entry']);
    expect(await pointers('entry=any&aspects=cp,centres')).toEqual(['/aspects/1']);
    expect(await pointers('entry=any&aspects=cp&with=eo')).toEqual(['/share']);
    expect(await pointers('entry=any&aspects=cp&with=any&share=40')).toEqual(['/with']);
    for (const share of ['0', '100', '4.5', 'x', '']) {
      expect(await pointers(`entry=any&aspects=cp&with=eo&share=${share}`)).toEqual(['/share']);
    }
    const odd = await ledger('entry=any&aspects=cp&clubId=1');
    expect(odd.status).toBe(400);
    expect(odd.body.errors[0].detail).toContain('clubId');
  });

  it('may be kept by anyone for a while, and is not sent again unchanged', async () => {
    const first = await ledger('entry=eo&aspects=co');
    expect(first.headers['cache-control']).toBe('public, max-age=300');
    expect(first.headers['set-cookie']).toBeUndefined();
    const again = await ledger('entry=eo&aspects=co');
    expect(again.headers.etag).toBe(first.headers.etag);
  });
});

describe('the list of a step’s cases', () => {
  const list = (query: string) => api.as(null).get(`/api/ledger/cases?${query}`);
  const names = (body: { cases: { name: string }[] }) => body.cases.map(({ name }) => name);

  it('names each case with its key, group, angles and prior', async () => {
    const { status, body } = await list('entry=co%2Beo&aspects=cp,ep');
    expect(status).toBe(200);
    expect(body).toMatchObject({ all: 22, found: 22, page: 1, pages: 1, angles: [4, 2, 1] });
    expect(body.cases[0]).toMatchObject({ number: 0, name: 'skip', skip: true, prior: fraction(1, 72) });
    const t = body.cases.find((one: { name: string }) => one.name === 'T');
    expect(t).toMatchObject({
      key: caseSet('pll').byName('T')?.key,
      group: 'adjacent corners',
      angles: 4,
      prior: fraction(1, 18),
      dealtOnceIn: fraction(18, 1),
    });
  });

  it('filters, sorts and goes page by page', async () => {
    expect(names((await list('entry=co%2Beo&aspects=cp,ep&angles=2&sort=name')).body)).toEqual(['E', 'Z']);
    const { body: down } = await list('entry=co%2Beo&aspects=cp,ep&angles=1&sort=name&order=descending');
    expect(names(down)).toEqual(['skip', 'Nb', 'Na', 'H']);
    const { body: diagonal } = await list('entry=co%2Beo&aspects=cp,ep&group=diagonal%20corners&sort=name');
    // Common practice: E, Na, Nb, V and Y swap corners across.
    expect(names(diagonal)).toEqual(['E', 'Na', 'Nb', 'V', 'Y']);
    expect((await list('entry=any&aspects=co,eo&sort=prior')).body.cases[0].prior).toEqual(fraction(1, 216));

    const seen = new Set<number>();
    const { body: first } = await list('entry=eo&aspects=co,cp,ep');
    for (let page = 1; page <= first.pages; page++) {
      const { body } = await list(`entry=eo&aspects=co,cp,ep&page=${page}`);
      for (const { number } of body.cases) seen.add(number);
    }
    // ZBLL: 493 and the skip (common practice).
    expect(seen.size).toBe(494);
    const { body: beyond } = await list('entry=eo&aspects=co,cp,ep&page=999');
    expect(beyond.page).toBe(first.pages);
  });

  it('says which of the cases a page has, and gives a list for print on one', async () => {
    // ZBLL: 493 and the skip (common practice).
    const { body: second } = await list('entry=eo&aspects=co,cp,ep&page=2');
    expect(second).toMatchObject({ found: 494, from: 61, page: 2, pages: 9 });
    const { body: whole } = await list('entry=eo&aspects=co,cp,ep&size=most');
    expect(whole).toMatchObject({ found: 494, from: 1, page: 1, pages: 1 });
    expect(whole.cases).toHaveLength(494);
    // Only a list of thousands is still given in pages.
    const { body: most } = await list('entry=any&aspects=co,eo,cp,ep&size=most&page=2');
    expect(most).toMatchObject({ from: 501, pages: 8 });
    expect((await list('entry=any&aspects=co,eo&group=none')).body).toMatchObject({ found: 0, from: 0 });
  });

  it('numbers the cases of a step that the trade has no name for', async () => {
    const { body } = await list('entry=cp%2Beo&aspects=co,ep');
    // Corners permuted, edges oriented: 84 and the skip (common practice).
    expect(body).toMatchObject({ all: 85, trade: null });
    expect(names(body).slice(0, 3)).toEqual(['skip', '#1', '#2']);
    expect((await list('entry=eo')).body).toMatchObject({ all: 1, groups: [], cases: [{ name: 'skip' }] });
  });

  it('names the field that is wrong', async () => {
    for (const [query, pointer] of [
      ['entry=no', '/entry'],
      ['entry=any&angles=3', '/angles'],
      ['entry=any&sort=colour', '/sort'],
      ['entry=any&page=0', '/page'],
    ]) {
      const { status, body } = await list(query ?? '');
      expect({ status, pointer: body.errors[0].pointer }).toEqual({ status: 400, pointer });
    }
  });
});

describe('the Ledger as a file', () => {
  const file = (query: string) => api.as(null).get(`/ledger.csv?${query}`);

  it('has every case once, with its prior in whole numbers', async () => {
    const res = await file('entry=any&aspects=co&aspects=eo&aspects=cp&aspects=ep');
    expect(res.status).toBe(200);
    expect(res.headers).toMatchObject({
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': 'attachment; filename=ledger-any-co-eo-cp-ep.csv',
      'cache-control': 'public, max-age=300',
    });
    expect(res.headers['set-cookie']).toBeUndefined();
    const rows = parse(res.text, { bom: true, columns: true }) as Record<string, string>[];
    // 1LLL: 3,916 cases, the skip among them, of 62,208 states (common practice).
    expect(rows).toHaveLength(3916);
    expect(rows.reduce((sum, row) => sum + Number(row['full states']), 0)).toBe(62_208);
    expect(rows[0]).toMatchObject({
      'place in this list': '0',
      name: '1LLL skip',
      'prior numerator': '1',
      'prior denominator': '15552',
    });
    expect(res.text.split('\r\n')).toHaveLength(3918);
  });

  it('holds nothing that a spreadsheet would run', async () => {
    const { text } = await file('entry=cp%2Beo&aspects=co,ep');
    for (const row of parse(text, { bom: true }) as string[][]) {
      for (const field of row) expect(field).not.toMatch(/^[=+\-@\t\r]/);
    }
  });

  it('is not sent again to one who has it', async () => {
    const first = await file('entry=eo&aspects=co');
    expect(first.headers.etag).toBeDefined();
    expect((await file('entry=eo&aspects=co')).headers.etag).toBe(first.headers.etag);
  });

  it('names cases with their set, as the trade does', async () => {
    const rows = async (query: string) =>
      parse((await file(query)).text, { bom: true, columns: true }) as Record<string, string>[];
    const named = (await rows('entry=any&aspects=co,eo')).map(({ name }) => name);
    expect(named).toContain('OLL 28');
    // A step that the trade has no name for.
    expect((await rows('entry=cp%2Beo&aspects=co,ep'))[1]?.name).toMatch(/1$/);
  });

  it('says in plain sentences what is wrong with an address', async () => {
    const res = await file('entry=f2l&aspects=colour');
    expect(res.status).toBe(400);
    expect(res.type).toBe('text/plain');
    expect(res.headers['cache-control']).toBe('no-store');
    const [first, ...rest] = res.text.trim().split('\n');
    expect(first).toBe('There is no such file of the Ledger: the address is not right.');
    expect(rest).toEqual([
      expect.stringMatching(/^entry is one of any, eo, /),
      expect.stringMatching(/^aspects is a list of co, eo, cp, ep/),
    ]);
    expect((await file('entry=any&aspects=co&page=2')).text).toContain('Not known here: page.');
  });
});
