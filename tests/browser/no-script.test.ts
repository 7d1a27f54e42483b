import { expect, it } from 'vitest';
import { LAPTOP, useSite } from './support/site.ts';

const site = useSite();
const WITHOUT = { ...LAPTOP, javaScriptEnabled: false };

it('says what the product is and who may sign in, without a script', async () => {
  const page = await (await site.visitor(WITHOUT)).newPage();
  await page.goto('/');
  expect(await page.getByRole('heading', { level: 1 }).textContent()).toMatch(/last layer/);
  expect(await page.getByText('62,208').isVisible()).toBe(true);

  await page.getByRole('main').getByRole('link', { name: 'Sign in' }).click();
  await page.waitForURL('**/sign-in');
  expect(await page.getByLabel('Password').isVisible()).toBe(true);
  expect(await page.getByText('tobi@harbourlane.example').isVisible()).toBe(true);
});

it('shows the squad with all its figures, without a script', async () => {
  const page = await (await site.visitorAs('ines', WITHOUT)).newPage();
  await page.goto('/desk/squad');
  const table = page.getByRole('table', { name: 'Squad' });
  expect(await table.getByRole('row').count()).toBe(11);
  // A sort is a link: it works as one.
  await table.getByRole('link', { name: 'Member' }).click();
  const tobi = table.getByRole('row', { name: /^Tobi/ });
  expect(await tobi.textContent()).toMatch(/\d+%, between \d+% and \d+%, \d+ answers/);
});
