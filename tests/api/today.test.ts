import { v7 } from 'uuid';
import { beforeAll, describe, expect, it } from 'vitest';
import type { AnswersResult } from '#shared/contracts/today.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { useApi } from '../support/api.ts';
import type { Person } from '../support/factories.ts';
import { anyId, Phone } from '../support/training.ts';

const api = useApi();

/** A member of a club of their own that trains PLL. */
async function newMember(setKey = 'pll'): Promise<{ person: Person; phone: Phone }> {
  const club = await api.factory.club();
  const person = await api.factory.person({ club, minutesPerDay: 20 });
  await api.factory.assign(club, setKey);
  return { person, phone: new Phone(api, person) };
}

/** Everything that is derived from the log for one member, as text. */
async function derived(person: Person): Promise<string> {
  const rows = await Promise.all(
    ['review', 'case_state', 'first_answer', 'rollup'].map((table) =>
      api.factory.sql(
        `select * from ${table} where club_id = $1 and member_id = $2 order by ${table}::text`,
        [person.clubId, person.memberId],
      ),
    ),
  );
  return JSON.stringify(rows);
}

describe('Today', () => {
  it('begins with the likeliest cases of a set that is new to the member', async () => {
    const { phone } = await newMember();
    const today = await phone.today();
    expect(today.empty).toBeNull();
    expect(today.answered).toBe(0);
    const shown = await Promise.all(today.showings.map((s) => phone.look(s.id)));
    const angles = shown.map(({ caseKey }) => caseSet('pll').byKey(caseKey)?.angles);
    // common practice: sixteen of the 21 PLL cases have four angles, prior 1/18
    expect(angles.every((m) => m === 4)).toBe(true);
    expect(new Set(shown.map((s) => s.caseKey)).size).toBe(shown.length);
  });

  it('offers every PLL name and "solved", and says nothing of the case with the picture', async () => {
    const { phone } = await newMember();
    const today = await phone.today();
    // common practice: 21 PLL cases, and the skip
    expect(today.sets[0]?.grids.all).toHaveLength(22);
    expect(today.sets[0]?.grids.all?.at(-1)?.key).toBe('solved');
    const allowed = ['asksAuf', 'grid', 'id', 'issuedAt', 'limitMs', 'picture', 'setKey'];
    for (const showing of today.showings) expect(Object.keys(showing).sort()).toEqual(allowed);
  });

  it('offers exactly the fixed cluster of the case in a set of more than 24', async () => {
    const { phone } = await newMember('oll');
    const today = await phone.today();
    for (const showing of today.showings) {
      const { caseKey } = await phone.look(showing.id);
      const keys = (today.sets[0]?.grids[showing.grid] ?? []).map(({ key }) => key);
      const cluster = caseSet('oll').byKey(caseKey)?.cluster;
      expect(keys).toContain(caseKey);
      expect(keys.every((key) => caseSet('oll').byKey(key)?.cluster === cluster)).toBe(true);
      expect(keys.length).toBeGreaterThanOrEqual(6);
      expect(keys.length).toBeLessThanOrEqual(12);
    }
  });

  it('is the same queue on another device, and issues nothing twice', async () => {
    const { phone } = await newMember();
    const first = await phone.today();
    const second = await phone.today();
    expect(second.showings).toEqual(first.showings);
  });

  it('refuses the signed-out and the administrator', async () => {
    expect((await api.as(null).get('/api/today')).status).toBe(401);
    const administrator = await api.factory.administrator();
    expect((await api.as(administrator.claims).get('/api/today')).status).toBe(403);
  });

  it('says so when the club trains nothing', async () => {
    const person = await api.factory.person();
    const today = await new Phone(api, person).today();
    expect(today.empty).toBe('no-programme');
  });
});

describe('An answer', () => {
  it.each([
    ['right in time is held', {}, 'held', null],
    ['at the limit is still held', { recognitionMs: 3000 }, 'held', null],
    ['right but over the limit is late', { recognitionMs: 3001 }, 'late', 'late'],
    [
      '"not recognised" is missed',
      { named: 'unrecognised', aufBefore: null, recognitionMs: null, namingMs: null },
      'missed',
      'not recognised',
    ],
    ['"lost it" is missed', { named: 'lost', aufBefore: null }, 'missed', 'not recognised'],
    ['"solved" is an answer, here a wrong one', { named: 'solved', aufBefore: null }, 'missed', null],
  ])('%s', async (_title, change, outcome, lostBy) => {
    const { phone } = await newMember();
    const result = await phone.answerNext(change);
    expect(result.verdicts[0]?.outcome).toBe(outcome);
    if (lostBy) expect(result.verdicts[0]?.lostBy).toBe(lostBy);
  });

  it('with the right name and a wrong AUF is not held, and every right AUF is', async () => {
    const { phone } = await newMember();
    const today = await phone.today();
    const [one, two] = today.showings;
    if (!one || !two) throw new Error('Two showings are wanted.');
    const real = await phone.look(one.id);
    const wrong = [0, 1, 2, 3].find((auf) => !real.rightAufs.includes(auf)) ?? 0;
    const res = await phone.send(await phone.answerTo(one.id, { aufBefore: wrong }));
    const [verdict] = (res.body as AnswersResult).verdicts;
    expect(verdict).toMatchObject({
      outcome: 'missed',
      caseRight: true,
      aufRight: false,
      lostBy: 'AUF before',
    });
    expect(verdict?.was.rightAufs).toEqual([...real.rightAufs]);
  });

  it('shows what was named beside what it was, with where the two differ', async () => {
    const { phone } = await newMember();
    const showing = (await phone.today()).showings[0];
    if (!showing) throw new Error('A showing is wanted.');
    const real = await phone.look(showing.id);
    const set = caseSet('pll');
    const other = set.cases.find((c) => c.key !== real.caseKey && c.name === 'H') ?? set.cases[0];
    const res = await phone.send(await phone.answerTo(showing.id, { named: other?.key ?? '' }));
    const [verdict] = (res.body as AnswersResult).verdicts;
    expect(verdict?.named?.name).toBe(other?.name);
    expect(verdict?.was.picture).toEqual(showing.picture);
    expect(verdict?.differsAt).toMatch(/\w+/);
    expect(verdict?.back.thisSitting).toBe(true);
  });

  it('named slower than five seconds is kept but not scored', async () => {
    const { person, phone } = await newMember();
    const result = await phone.answerNext({ namingMs: 5001 });
    expect(result.verdicts[0]).toMatchObject({ scored: false, unscoredReason: 'slow naming' });
    const states = await api.factory.sql('select 1 from case_state where member_id = $1', [person.memberId]);
    expect(states).toHaveLength(0);
  });

  it('that was left is recorded as such and moves no memory', async () => {
    const { person, phone } = await newMember();
    await phone.answerNext({ named: 'left', aufBefore: null, recognitionMs: null, namingMs: null });
    const rows = await api.factory.sql<{ outcome: string; scored: boolean }>(
      'select outcome, scored from review where member_id = $1',
      [person.memberId],
    );
    expect(rows).toEqual([{ outcome: 'left', scored: false }]);
    expect(
      await api.factory.sql('select 1 from case_state where member_id = $1', [person.memberId]),
    ).toHaveLength(0);
  });
});

describe('Stored once', () => {
  it('a resent answer changes nothing and is told the same', async () => {
    const { person, phone } = await newMember();
    const today = await phone.today();
    const answers = await Promise.all(today.showings.slice(0, 3).map((s) => phone.answerTo(s.id)));
    const first = (await phone.send(...answers)).body as AnswersResult;
    const before = await derived(person);
    const again = (await phone.send(...answers, answers[0] as (typeof answers)[number]))
      .body as AnswersResult;
    expect(again.verdicts.map((v) => v.status)).toEqual(
      ['already', 'already', 'already', 'already'].slice(0, again.verdicts.length),
    );
    expect(again.verdicts.map((v) => v.outcome).slice(0, 3)).toEqual(first.verdicts.map((v) => v.outcome));
    expect(await derived(person)).toBe(before);
  });

  it('ten devices sending one answer at once leave one row', async () => {
    const { person, phone } = await newMember();
    const showing = (await phone.today()).showings[0];
    const answer = await phone.answerTo(showing?.id ?? '');
    api.clock.advance(10_000);
    const replies = await Promise.all(
      Array.from({ length: 10 }, () =>
        api.as(person.claims).post('/api/today/answers', { answers: [answer] }),
      ),
    );
    expect(replies.map((r) => r.status)).toEqual(Array(10).fill(200));
    const statuses = replies.map((r) => (r.body as AnswersResult).verdicts[0]?.status);
    expect(statuses.filter((s) => s === 'stored')).toHaveLength(1);
    const rows = await api.factory.sql('select 1 from review where member_id = $1', [person.memberId]);
    expect(rows).toHaveLength(1);
  });

  it('the same id with another body is refused, and so is a second answer to one showing', async () => {
    const { phone } = await newMember();
    const showing = (await phone.today()).showings[0];
    const answer = await phone.answerTo(showing?.id ?? '');
    await phone.send(answer);
    const other = await phone.send({ ...answer, recognitionMs: 401 });
    expect(other.status).toBe(422);
    const second = await phone.send({ ...answer, id: v7({ msecs: api.clock.now() }) });
    expect(second.status).toBe(422);
    expect(second.body.detail).toContain('first answer stands');
  });

  it('one that cannot be taken does not hold up the others', async () => {
    const { phone } = await newMember();
    const [one, two] = (await phone.today()).showings;
    const good = await phone.answerTo(one?.id ?? '');
    const bad = await phone.answerTo(two?.id ?? '', { named: 'no such name' });
    const res = await phone.send(good, bad);
    expect(res.status).toBe(200);
    expect((res.body as AnswersResult).verdicts.map((v) => v.id)).toEqual([good.id]);
    expect((res.body as AnswersResult).refused.map((r) => r.id)).toEqual([bad.id]);
  });
});

describe('What is refused', () => {
  let phone: Phone;
  let person: Person;
  let showingId: string;
  beforeAll(async () => {
    ({ phone, person } = await newMember());
    showingId = (await phone.today()).showings[0]?.id ?? '';
  });

  it.each([
    ['a name that was not offered', { named: 'T' }, 422],
    ['a missing AUF where it is asked', { aufBefore: null }, 422],
    ['a missing recognition time', { recognitionMs: null }, 422],
    ['a time longer than the showing was out', { recognitionMs: 3_000_000 }, 422],
    ['a showing that was never issued', { showingId: anyId() }, 422],
    ['an id that is no UUIDv7', { id: anyId() }, 422],
    ['an id from 401 days ago', { id: v7({ msecs: Date.now() - 401 * 86_400_000 }) }, 422],
    ['an AUF of five quarter turns', { aufBefore: 5 }, 400],
    ['an unknown field', { grade: 4 }, 400],
  ])('%s', async (_title, change, status) => {
    const answer = { ...(await phone.answerTo(showingId)), ...change };
    const res = await phone.send(answer as Parameters<Phone['send']>[0]);
    expect(res.status).toBe(status);
    expect(res.headers['content-type']).toContain('application/problem+json');
    expect(res.body.detail).toMatch(/\w/);
    expect(
      await api.factory.sql('select 1 from review where member_id = $1', [person.memberId]),
    ).toHaveLength(0);
  });

  it("somebody else's showing, in the same club and in another", async () => {
    const mate = await api.factory.person({ club: { clubId: person.clubId, name: '' } });
    const stranger = await api.factory.person();
    const answer = await phone.answerTo(showingId);
    for (const other of [mate, stranger]) {
      const res = await api.as(other.claims).post('/api/today/answers', { answers: [answer] });
      expect(res.status).toBe(422);
    }
    expect((await api.as(null).post('/api/today/answers', { answers: [answer] })).status).toBe(401);
  });
});

describe('A miss', () => {
  it('comes back within the sitting, from a newly issued showing', async () => {
    const { phone } = await newMember();
    const before = await phone.today();
    const missed = before.showings[0];
    const real = await phone.look(missed?.id ?? '');
    const result = await phone.answerNext({
      named: 'unrecognised',
      aufBefore: null,
      recognitionMs: null,
      namingMs: null,
    });
    const keys = await Promise.all(result.today.showings.map(async (s) => (await phone.look(s.id)).caseKey));
    expect(keys.filter((key) => key === real.caseKey)).toHaveLength(1);
    expect(keys.indexOf(real.caseKey)).toBeGreaterThanOrEqual(3);
    expect(result.today.showings.map((s) => s.id)).not.toContain(missed?.id);
  });

  it('called a mis-tap leaves memory, keeps its row, and counts once however often it is said', async () => {
    const { person, phone } = await newMember();
    const result = await phone.answerNext({ named: 'lost', aufBefore: null });
    const reviewId = result.verdicts[0]?.id ?? '';
    const say = () => api.as(person.claims).post('/api/today/mis-taps', { reviewId, at: api.clock.now() });
    // The clock of the tests has moved on with the answer; the tap came right after it.
    const answeredAt = (
      await api.factory.sql<{ at: Date }>('select answered_at as at from review where review_id = $1', [
        reviewId,
      ])
    )[0]?.at;
    const first = await api
      .as(person.claims)
      .post('/api/today/mis-taps', { reviewId, at: (answeredAt?.getTime() ?? 0) + 2_000 });
    expect(first.status).toBe(200);
    expect(
      await api.factory.sql('select 1 from case_state where member_id = $1', [person.memberId]),
    ).toHaveLength(0);
    expect(
      await api.factory.sql('select 1 from first_answer where member_id = $1', [person.memberId]),
    ).toHaveLength(1);
    await say();
    expect(
      await api.factory.sql('select 1 from mis_tap where member_id = $1', [person.memberId]),
    ).toHaveLength(1);
    const [day] = await api.factory.sql<{ taps: number }>(
      'select sum(mis_taps)::int as taps from rollup where member_id = $1',
      [person.memberId],
    );
    expect(day?.taps).toBe(1);
  });

  it('of somebody else cannot be called a mis-tap, nor after the window', async () => {
    const { person, phone } = await newMember();
    const result = await phone.answerNext({ named: 'lost', aufBefore: null });
    const body = { reviewId: result.verdicts[0]?.id ?? '', at: api.clock.now() };
    const mate = await api.factory.person({ club: { clubId: person.clubId, name: '' } });
    expect((await api.as(mate.claims).post('/api/today/mis-taps', body)).status).toBe(404);
    expect((await api.as(null).post('/api/today/mis-taps', body)).status).toBe(401);
    api.clock.advance(60_000);
    const late = await api.as(person.claims).post('/api/today/mis-taps', { ...body, at: api.clock.now() });
    expect(late.status).toBe(422);
  });
});
