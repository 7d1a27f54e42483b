import type { Page } from 'playwright-core';
import { expect, it } from 'vitest';
import { longLimits, memberOf } from './support/members.ts';
import { openPage, takenOver } from './support/open-page.ts';
import { accountOf, LAPTOP, useSite } from './support/site.ts';
import { Trainee } from './support/trainee.ts';

const site = useSite();

/** The accessible name of what has the focus, without what is a hint of it. */
const focused = (page: Page) =>
  page.evaluate(() => {
    const element = document.activeElement;
    return (
      element?.getAttribute('aria-label') ??
      element?.querySelector('span')?.textContent ??
      element?.textContent
    );
  });

it('signs in, trains five showings and takes a mis-tap back without a pointer', async () => {
  const marlo = await memberOf(site, 'Marlo', 'North Quay Cube Club');
  await longLimits(site, marlo);
  const page = await (await site.visitor(LAPTOP)).newPage();
  const { signIn, password } = accountOf('marlo');

  await openPage(page, '/sign-in');
  await page.keyboard.press('Tab');
  expect(await focused(page)).toBe('Skip to content');
  await page.keyboard.press('Enter');
  await page.keyboard.press('Tab');
  await page.keyboard.type(signIn);
  await page.keyboard.press('Tab');
  await page.keyboard.type(password);
  await page.keyboard.press('Enter');
  await page.waitForURL('**/desk/squad');

  await page.getByRole('link', { name: 'My training' }).focus();
  await page.keyboard.press('Enter');
  const begin = page.getByRole('button', { name: /^Begin / });
  await begin.waitFor();
  // The way from the desk is a new document: what the server sent is there before its scripts are.
  await takenOver(page);
  const trainee = new Trainee(site, page, 'keyboard');
  await trainee.readQueue();
  await page.keyboard.press('Space');
  await trainee.gotIt.waitFor();

  for (let k = 0; k < 4; k++) {
    const { verdict } = await trainee.answer('right');
    expect(verdict.outcome).toBe('held');
    await trainee.gotIt.waitFor();
  }
  const { verdict, real } = await trainee.answer('wrong name');
  expect(verdict.outcome).toBe('missed');
  await trainee.goOn.waitFor();
  expect(await focused(page)).toBe('Go on');
  await page.keyboard.press('Shift+Tab');
  expect(await focused(page)).toBe('mis-tap');
  await page.keyboard.press('Enter');
  await page.getByText(/^Mis-tap noted/).waitFor();
  await expect
    .poll(() => site.sql('select case_key from mis_tap where review_id = $1', [verdict.id]))
    .toEqual([{ case_key: real.caseKey }]);
  await page.keyboard.press('Tab');
  expect(await focused(page)).toBe('Go on');
  await page.keyboard.press('Enter');
  await trainee.gotIt.waitFor();
  expect(await marlo.answersToday()).toBe(5);
});
