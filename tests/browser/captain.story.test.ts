import type { Page } from 'playwright-core';
import { expect, it } from 'vitest';
import { answerInTime } from './support/answers.ts';
import { manyMinutes, memberOf } from './support/members.ts';
import { openPage } from './support/open-page.ts';
import { LAPTOP, PHONE, useSite } from './support/site.ts';

const site = useSite();

/** What the desk says of a member in words: each set's figure, interval and answers. */
async function figuresOf(page: Page, nickname: string): Promise<{ words: string[]; answers: number }> {
  await openPage(page, '/desk/squad');
  const row = page
    .getByRole('table', { name: 'Squad' })
    .getByRole('row', { name: new RegExp(`^${nickname}`) });
  const text = (await row.textContent()) ?? '';
  const words = [...text.matchAll(/\d+%, between \d+% and \d+%, (\d+) answers?/g)];
  return { words: words.map(([all]) => all), answers: words.reduce((sum, [, n]) => sum + Number(n), 0) };
}

it('sees a member’s figures move with twenty answers', async () => {
  const page = await (await site.visitor(LAPTOP)).newPage();
  await site.signIn(page, 'ines');
  expect(new URL(page.url()).pathname).toBe('/desk/squad');
  const before = await figuresOf(page, 'Tobi');
  expect(before.words).toHaveLength(2);

  await manyMinutes(site, await memberOf(site, 'Tobi'));
  const answered = await answerInTime(site, await site.visitorAs('tobi', PHONE), 20);
  const after = await figuresOf(page, 'Tobi');
  expect(after.words).not.toEqual(before.words);
  expect(after.answers).toBe(before.answers + 20);

  await page.getByRole('link', { name: 'Tobi', exact: true }).click();
  await page.getByRole('heading', { level: 1, name: 'Tobi' }).waitFor();
  await page.getByText('Last trained today.').waitFor();
  const latest = page.getByRole('table', { name: /^The newest 30/ });
  const names = await latest.getByRole('rowheader').allTextContents();
  expect(names.slice(0, 20)).toEqual(answered.map(({ setName, name }) => `${setName}${name}`).reverse());

  await page.getByRole('link', { name: 'Standings' }).click();
  await page.getByRole('heading', { level: 1, name: /^Standings, / }).waitFor();
  const board = page.getByRole('table', { name: /^Standings, / });
  await board.getByRole('rowheader', { name: 'Tobi' }).waitFor();
  // Joss has not opted in: on no board, though the captain sees the figures at the desk.
  expect(await board.getByText('Joss').count()).toBe(0);
  await page.getByText(/One other member answers for this set and has not opted in/).waitFor();
  await page.getByText('Quayside board, PLL').waitFor();
});

it('hands a set to chosen members: only they find it in Today', async () => {
  const page = await (await site.visitorAs('ines', LAPTOP)).newPage();
  const pia = await (await site.visitorAs('pia', PHONE)).newPage();
  await openPage(pia, '/today');
  await pia.getByText(/^(PLL, OLL|OLL, PLL) · /).waitFor();

  await openPage(page, '/desk/programme');
  const table = page.getByRole('table', { name: 'Sets on the programme' });
  const oll = table.getByRole('row', { name: /^OLL/ });
  expect(await oll.textContent()).toContain('everyone');
  await oll.getByRole('button', { name: 'Edit OLL' }).click();
  await page.getByRole('group', { name: 'Who answers' }).getByText('Chosen members').click();
  // All are ticked, so that one can be taken out. Nobody at all: said, and not saved.
  const members = page.getByRole('group', { name: 'Members' });
  expect(await members.getByRole('checkbox', { checked: false }).count()).toBe(0);
  await page.getByRole('button', { name: 'Tick none' }).click();
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByText('Choose at least one member.').first().waitFor();
  for (const name of ['Tobi', 'Ines']) await members.getByText(name, { exact: true }).click();
  expect(await members.getByRole('checkbox', { checked: true }).count()).toBe(2);
  await page.getByRole('button', { name: 'Save' }).click();
  await page.getByText('OLL is changed.').waitFor();
  await oll.getByText('Ines, Tobi').waitFor();

  await pia.reload();
  await pia.getByText(/^PLL · /).waitFor();
  const tobi = await (await site.visitorAs('tobi', PHONE)).newPage();
  await openPage(tobi, '/today');
  await tobi.getByText(/^(PLL, OLL|OLL, PLL) · /).waitFor();
  // At the desk whoever does not answer for a set has no figure in it.
  await openPage(page, '/desk/squad');
  const squad = page.getByRole('table', { name: 'Squad' });
  expect(await squad.getByRole('row', { name: /^Pia/ }).textContent()).toContain('not assigned');
});

it('keeps a captain to the own club, and members from the desk', async () => {
  const marit = await memberOf(site, 'Marit');
  const page = await (await site.visitorAs('marlo', LAPTOP)).newPage();
  site.watch.expect(/status of 404/);
  const answer = await openPage(page, `/desk/squad/${marit.memberId}`);
  expect(answer.status()).toBe(404);
  await page.getByRole('heading', { level: 1, name: 'Not here' }).waitFor();

  // Tobi is in both clubs; of all others of Harbour Lane no page says a word.
  const theirs = await site.sql<{ nickname: string }>(
    "select nickname from membership join club using (club_id) where name = 'Harbour Lane Cubers' and nickname <> 'Tobi'",
  );
  const names = new RegExp(`\\b(${theirs.map(({ nickname }) => nickname).join('|')})\\b`);
  for (const path of [
    '/desk/squad',
    '/desk/squad?setKey=pll',
    '/desk/standings',
    '/desk/programme',
    '/club',
  ]) {
    await openPage(page, path);
    expect(await page.getByRole('main').textContent()).not.toMatch(names);
    // Nor the document that was sent, with the data for its scripts.
    expect(await (await page.request.get(path)).text()).not.toMatch(names);
  }

  const member = await (await site.visitorAs('tobi', PHONE)).newPage();
  site.watch.expect(/status of 403/);
  const refused = await openPage(member, '/desk/squad');
  expect(refused.status()).toBe(403);
  await member.getByRole('heading', { level: 1, name: 'Not yours to see' }).waitFor();
});
