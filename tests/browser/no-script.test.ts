import { expect, it } from 'vitest';
import { accountOf, LAPTOP, PHONE, useSite } from './support/site.ts';

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

it('takes what was typed before the scripts had come', async () => {
  const page = await (await site.visitor(PHONE)).newPage();
  let letScriptsIn = () => {};
  const held = new Promise<void>((resolve) => {
    letScriptsIn = resolve;
  });
  await page.route('**/assets/**/*.js', async (route) => {
    await held;
    await route.continue();
  });
  const { signIn, password } = accountOf('tobi');
  await page.goto('/sign-in', { waitUntil: 'commit' });
  await page.getByLabel('E-mail or sign-in name').fill(signIn);
  await page.getByLabel('Password').fill(password);
  letScriptsIn();
  await page.waitForLoadState('networkidle');
  expect(await page.getByLabel('E-mail or sign-in name').inputValue()).toBe(signIn);
  await page.getByRole('button', { name: 'Sign in', exact: true }).tap();
  await page.waitForURL('**/today');
});
