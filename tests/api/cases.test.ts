import { describe, expect, it } from 'vitest';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '#tests/support/api.ts';
import { answerAll, member, uuid } from './member-support.ts';

const api = useApi();
const pll = caseSet('pll');
const t = pll.byName('T');
if (!t) throw new Error('PLL has a T.');

describe('my cases', () => {
  it('lists every case of the programme with picture, algorithm, prior and state', async () => {
    const me = await member(api, ['pll']);
    const res = await api.as(me.claims).get('/api/cases');
    expect(res.status).toBe(200);
    expect(res.body.sets).toMatchObject([{ setKey: 'pll', name: 'PLL', edition: 1 }]);
    // 21 PLL cases: trade knowledge, and the engine's own count.
    expect(res.body.cases).toHaveLength(21);
    const found = res.body.cases.find((c: { name: string }) => c.name === 'T');
    expect(found).toMatchObject({
      key: t.key,
      // T is dealt in 1 of 18 solves: weight 16 of 288 (derived: orbit of 16 states under the sixteen-fold action).
      prior: { weight: 16, total: 288 },
      angles: 4,
      state: 'unmet',
      recall: null,
      nextDate: null,
      answers: 0,
      lastOutcome: null,
    });
    expect(found.algorithm).not.toBe('');
    expect(found.picture.stickers.top).toBe('UUUUUUUUU');
  });

  it('hatches in pictures of OLL what the set does not tell apart', async () => {
    const me = await member(api, ['oll']);
    const { body } = await api.as(me.claims).get('/api/cases');
    expect(body.cases).toHaveLength(57);
    for (const { picture } of body.cases) expect(Object.values(picture.stickers).join('')).toMatch(/^[U?]+$/);
  });

  it('moves with the member’s own answers and nobody else’s', async () => {
    const me = await member(api, ['pll']);
    const other = await member(api, [], me.club);
    const answers = await answerAll(api, me.claims, { count: 2, named: 'unrecognised' });
    const mine = await api.as(me.claims).get('/api/cases');
    const met = mine.body.cases.filter((c: { state: string }) => c.state !== 'unmet');
    expect(met).toHaveLength(answers.length);
    for (const c of met) {
      expect(c).toMatchObject({ state: 'settling', answers: 1, lastOutcome: 'missed' });
      expect(c.recall).toBeGreaterThan(0);
      expect(c.nextDate > mine.body.date).toBe(true);
    }
    const theirs = await api.as(other.claims).get('/api/cases');
    expect(theirs.body.cases.every((c: { state: string }) => c.state === 'unmet')).toBe(true);
  });

  it('is empty without a programme, and leaves out sets handed to others', async () => {
    const alone = await member(api, []);
    expect((await api.as(alone.claims).get('/api/cases')).body).toMatchObject({ sets: [], cases: [] });
    const other = await member(api, [], alone.club);
    await api.factory.assign(alone.club, 'pll', { memberIds: [other.memberId] });
    expect((await api.as(alone.claims).get('/api/cases')).body.sets).toEqual([]);
    expect((await api.as(other.claims).get('/api/cases')).body.cases).toHaveLength(21);
  });

  it('is refused to the signed-out, to administrators, and with input it does not know', async () => {
    const me = await member(api, ['pll']);
    expect((await api.as(null).get('/api/cases')).status).toBe(401);
    expect((await api.as((await api.factory.administrator()).claims).get('/api/cases')).status).toBe(403);
    const odd = await api.as(me.claims).get('/api/cases?memberId=1');
    expect(odd.status).toBe(400);
    expect(odd.body.errors[0].detail).toContain('memberId');
  });
});

describe('a case', () => {
  const path = (key: string) => `/api/cases/${encodeURIComponent(key)}`;

  it('shows its really different angles, algorithms and mirror partner', async () => {
    const me = await member(api, ['pll']);
    const angles = async (name: string) => {
      const res = await api.as(me.claims).get(path(pll.byName(name)?.key ?? ''));
      expect(res.status).toBe(200);
      return res.body;
    };
    // H looks the same from all sides and Z from two (common knowledge of the set; derived: sixteen states over weight).
    for (const [name, count] of [
      ['T', 4],
      ['Z', 2],
      ['H', 1],
    ] as const) {
      const { angles: pictures } = await angles(name);
      expect(pictures).toHaveLength(count);
      expect(new Set(pictures.map((p: object) => JSON.stringify(p))).size).toBe(count);
    }
    // Ja and Jb are mirror images; so are Ua and Ub (common practice of naming).
    expect((await angles('Ja')).mirror.name).toBe('Jb');
    expect((await angles('Ua')).mirror.name).toBe('Ub');
    expect((await angles('H')).mirror).toBeNull();
    expect((await angles('T')).algorithms.length).toBeGreaterThan(0);
  });

  it('lists the latest answers, newest first, with what was named', async () => {
    const me = await member(api, ['pll']);
    const [first] = await answerAll(api, me.claims, { count: 1, named: 'unrecognised' });
    const { body: cases } = await api.as(me.claims).get('/api/cases');
    const met = cases.cases.find((c: { state: string }) => c.state === 'settling');
    const { body } = await api.as(me.claims).get(path(met.key));
    expect(body.answers).toMatchObject([
      {
        id: first,
        outcome: 'missed',
        named: 'unrecognised',
        lostBy: 'not recognised',
        scored: true,
        misTapped: false,
      },
    ]);
    await api.as(me.claims).post('/api/today/mis-taps', { reviewId: first, at: api.clock.now() });
    const after = await api.as(me.claims).get(path(met.key));
    expect(after.body.answers[0].misTapped).toBe(true);
    expect(after.body.case.state).toBe('unmet');
  });

  it('is not there when it is unknown, of another set, or the skip', async () => {
    const me = await member(api, ['pll']);
    const oll = caseSet('oll').cases[0]?.key ?? '';
    for (const key of ['nope', oll, pll.skip.key, uuid()]) {
      const res = await api.as(me.claims).get(path(key));
      expect(res.status).toBe(404);
      expect(res.type).toBe('application/problem+json');
    }
    expect((await api.as(me.claims).get(path('x'.repeat(121)))).status).toBe(400);
  });

  it('is refused to the signed-out', async () => {
    expect((await api.as(null).get(path(t.key))).status).toBe(401);
  });
});
