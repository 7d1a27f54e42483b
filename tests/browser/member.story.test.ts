import { expect, it } from 'vitest';
import { everythingOf, longLimits, manyMinutes, memberOf } from './support/members.ts';
import { openPage } from './support/open-page.ts';
import { PHONE, useSite } from './support/site.ts';
import { type Manner, Trainee } from './support/trainee.ts';

const site = useSite();

/** Twenty showings, most of them held, and every way to lose one among them. */
const PLAN: readonly Manner[] = [
  'right',
  'wrong name',
  'right',
  'wrong AUF',
  'right',
  'not recognised',
  'right',
  'lost',
  'right',
  ...Array.from({ length: 11 }, (): Manner => 'right'),
];

it('trains twenty showings on a phone; sending them again changes nothing', async () => {
  const tobi = await memberOf(site, 'Tobi');
  await manyMinutes(site, tobi);
  await longLimits(site, tobi);
  const page = await (await site.visitor(PHONE)).newPage();
  await site.signIn(page, 'tobi');
  expect(new URL(page.url()).pathname).toBe('/today');
  expect(await tobi.answersToday()).toBe(0);

  const trainee = new Trainee(site, page, 'thumb');
  await trainee.begin();
  const { planned } = await trainee.progress();
  expect(planned).toBeGreaterThanOrEqual(20);
  const left: Manner[] = [...PLAN];
  while (left.length > 0) {
    const { real } = await trainee.current();
    // A case that looks the same from all four sides takes any AUF: that one waits for another case.
    const at = left.findIndex((manner) => manner !== 'wrong AUF' || real.rightAufs.length < 4);
    const [manner = 'right'] = left.splice(Math.max(0, at), 1);
    const { verdict } = await trainee.answer(manner);
    expect(verdict.outcome).toBe(manner === 'right' ? 'held' : 'missed');
    if (manner !== 'right') {
      await trainee.goOn.waitFor();
      expect(await page.getByRole('figure').first().textContent()).toContain(real.name);
      const words = await page.getByRole('status').allTextContents();
      expect(words.join(' ')).toContain(`Missed. It was ${real.name}`);
      await trainee.next();
    } else {
      // The next picture comes by itself.
      await trainee.gotIt.waitFor();
      expect(
        await page
          .getByText(/^held in \d+\.\d s/)
          .first()
          .isVisible(),
      ).toBe(true);
    }
    expect((await trainee.progress()).answered).toBe(trainee.given.length);
  }

  const rows = await tobi.reviewsToday();
  expect(rows).toHaveLength(20);
  expect(new Set(rows.map(({ showing_id }) => showing_id))).toEqual(
    new Set(trainee.given.map(({ showingId }) => showingId)),
  );
  expect(rows.filter(({ outcome }) => outcome === 'held')).toHaveLength(16);

  // All that the page sent, sent once more by the page: as it was, and all at once, last first.
  const bodies = [...trainee.bodies];
  const before = await everythingOf(site, tobi);
  const together = { answers: bodies.flatMap(({ answers }) => answers).reverse() };
  expect(together.answers).toHaveLength(20);
  const statuses = await page.evaluate(
    async (all) => {
      const found: number[] = [];
      for (const body of all) {
        const answer = await fetch('/api/today/answers', {
          method: 'POST',
          headers: { 'Content-Type': 'application/json', Accept: 'application/json' },
          body: JSON.stringify(body),
        });
        found.push(answer.status);
      }
      return found;
    },
    [...bodies, together],
  );
  expect(statuses).toEqual(Array.from({ length: 21 }, () => 200));
  expect(await everythingOf(site, tobi)).toEqual(before);
  expect(await tobi.answersToday()).toBe(20);

  // The picture that is up has been seen: leaving now is an outcome too.
  await openPage(page, '/form');
  await expect.poll(() => tobi.answersToday()).toBe(21);
  expect((await tobi.reviewsToday()).at(-1)).toMatchObject({ outcome: 'left', named: 'left' });

  // Whoever comes back goes on where they were.
  await trainee.begin();
  expect((await trainee.progress()).answered).toBe(20);
  await trainee.answer('right');
  expect(await tobi.answersToday()).toBe(22);
});
