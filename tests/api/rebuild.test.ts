import { expect, it } from 'vitest';
import { useApi } from '../support/api.ts';
import { derivedOf, rebuild } from '../support/derived.ts';
import { Phone } from '../support/training.ts';

const api = useApi();
const DAY = 86_400_000;

it('memory, first answers and rollups made again from the log differ by nothing', async () => {
  const club = await api.factory.club();
  const person = await api.factory.person({ club, minutesPerDay: 10 });
  await api.factory.assign(club, 'pll');
  await api.factory.assign(club, 'oll');
  const phone = new Phone(api, person);

  // Eight days of training with every kind of answer; a day is left out.
  for (const day of [0, 1, 2, 4, 5, 6, 7, 8]) {
    for (let n = 0; n < 7; n++) {
      const today = await phone.today();
      const showing = today.showings[0];
      if (!showing) break;
      const change =
        n % 4 === 3
          ? { named: 'lost', aufBefore: null }
          : n % 5 === 4
            ? { recognitionMs: 4000 }
            : n % 6 === 5
              ? { namingMs: 6000 }
              : {};
      const res = await phone.send(await phone.answerTo(showing.id, change));
      expect(res.status).toBe(200);
      if (n === 3) {
        const reviewId = res.body.verdicts[0].id;
        const [row] = await api.factory.sql<{ at: Date }>(
          'select answered_at as at from review where review_id = $1',
          [reviewId],
        );
        const tap = await api
          .as(person.claims)
          .post('/api/today/mis-taps', { reviewId, at: (row?.at.getTime() ?? 0) + 1000 });
        expect(tap.status).toBe(200);
      }
    }
    api.clock.advance((day === 2 ? 2 : 1) * DAY);
  }
  const before = await derivedOf(api, person);
  expect(before.states?.length).toBeGreaterThan(5);
  expect(before.rollups?.length).toBeGreaterThan(20);
  await rebuild(api, person);
  expect(await derivedOf(api, person)).toEqual(before);
}, 60_000);

it('an answer that comes late is folded in where it belongs, and its days are written again', async () => {
  const club = await api.factory.club();
  const person = await api.factory.person({ club, minutesPerDay: 10 });
  await api.factory.assign(club, 'pll');
  const phone = new Phone(api, person);
  const [held, kept] = (await phone.today()).showings;
  if (!held || !kept) throw new Error('Two showings are wanted.');
  await phone.send(await phone.answerTo(held.id));
  // Answered without a connection today, sent two days later, after more answers.
  const late = await phone.answerTo(kept.id, { named: 'lost', aufBefore: null });
  api.clock.advance(DAY);
  await phone.answerNext();
  api.clock.advance(DAY);
  const res = await phone.send(late);
  expect(res.status).toBe(200);
  const rows = await api.factory.sql<{ local_day: number }>(
    'select local_day from review where member_id = $1 order by answered_at',
    [person.memberId],
  );
  expect(new Set(rows.map((row) => row.local_day)).size).toBe(2);
  const missed = await api.factory.sql<{ day: number; missed: number }>(
    'select day, sum(missed)::int as missed from rollup where member_id = $1 group by day order by day',
    [person.memberId],
  );
  expect(missed[0]?.missed).toBe(1);
  const before = await derivedOf(api, person);
  await rebuild(api, person);
  expect(await derivedOf(api, person)).toEqual(before);
}, 60_000);
