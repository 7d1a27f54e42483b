import { describe, expect, it } from 'vitest';
import { useApi } from '#tests/support/api.ts';
import { answerAll, member } from './member-support.ts';

const api = useApi();

describe('form', () => {
  it('says nothing is known before the first answer', async () => {
    const me = await member(api, ['pll']);
    const { status, body } = await api.as(me.claims).get('/api/form');
    expect(status).toBe(200);
    expect(body.sets).toMatchObject([
      {
        setKey: 'pll',
        name: 'PLL',
        edition: 1,
        now: { value: 0, answers: 0, few: true },
        days: [],
        states: { unmet: 21, settling: 0, holding: 0, slipping: 0 },
      },
    ]);
    expect(body.outcomes).toEqual({ held: 0, late: 0, missed: 0, left: 0, misTaps: 0 });
    expect(body.minutesPerDay).toHaveLength(28);
  });

  it('counts outcomes, minutes and states of one’s own answers', async () => {
    const me = await member(api, ['pll']);
    const other = await member(api, [], me.club);
    const [first] = await answerAll(api, me.claims, {
      count: 3,
      named: 'unrecognised',
      recognitionMs: 2_000,
    });
    await answerAll(api, me.claims, { count: 1, named: 'left' });
    await api.as(me.claims).post('/api/today/mis-taps', { reviewId: first, at: api.clock.now() });
    const { body } = await api.as(me.claims).get('/api/form');
    expect(body.outcomes).toEqual({ held: 0, late: 0, missed: 3, left: 1, misTaps: 1 });
    const [set] = body.sets;
    // Three cases were missed; the one said to be a mis-tap counts for nothing.
    expect(set.states).toEqual({ unmet: 19, settling: 2, holding: 0, slipping: 0 });
    expect(set.now.value).toBeGreaterThan(0);
    expect(set.now.low).toBeLessThanOrEqual(set.now.value);
    expect(set.days).toHaveLength(1);
    const minutes = body.minutesPerDay.at(-1).minutes;
    // 3 × 2,000 ms, and 1,200 ms for the one that was left.
    expect(minutes * 60).toBeCloseTo(7.2, 6);
    const theirs = await api.as(other.claims).get('/api/form');
    expect(theirs.body.outcomes.missed).toBe(0);
    expect(theirs.body.sets[0].now.value).toBe(0);
  });

  it('shows the figure of today as the newest day does, and falls as days pass without training', async () => {
    const me = await member(api, ['pll']);
    await answerAll(api, me.claims, { count: 4, named: 'unrecognised' });
    const before = (await api.as(me.claims).get('/api/form')).body.sets[0];
    expect(before.now.value).toBeCloseTo(before.days.at(-1).value, 12);
    api.clock.advance(10 * 86_400_000);
    const after = (await api.as(me.claims).get('/api/form')).body.sets[0];
    expect(after.now.value).toBeLessThan(before.now.value);
  });

  it('is refused to the signed-out, to administrators, and with input it does not know', async () => {
    const me = await member(api, ['pll']);
    expect((await api.as(null).get('/api/form')).status).toBe(401);
    expect((await api.as((await api.factory.administrator()).claims).get('/api/form')).status).toBe(403);
    expect((await api.as(me.claims).get('/api/form?days=9')).status).toBe(400);
  });
});
