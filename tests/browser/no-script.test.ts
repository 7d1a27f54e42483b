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

it('counts any step of the last layer, without a script', async () => {
  const page = await (await site.visitor({ ...PHONE, javaScriptEnabled: false })).newPage();
  await page.goto('/');
  await page.getByRole('link', { name: 'Ledger' }).click();
  await page.waitForURL('**/ledger');
  // 22: PLL with its skip (common practice).
  expect(await page.getByRole('status').textContent()).toBe('22 cases, the skip among them');
  await page.locator('label', { hasText: 'edges oriented' }).first().click();
  await page.locator('label', { hasText: 'corner orientation' }).click();
  await page.getByRole('button', { name: 'Count' }).click();
  await page.waitForURL(/entry=eo/);
  // 494: ZBLL with its skip (common practice).
  expect(await page.getByRole('status').textContent()).toBe('494 cases, the skip among them');
  await page.getByLabel('Some solves arrive with').selectOption('all edges');
  await page.getByRole('button', { name: 'Mix' }).click();
  await page.getByText(/^40 of 100 solves arrive with: all edges/).waitFor();

  await page.getByRole('link', { name: 'All 480 cases with 4 angles' }).click();
  const table = page.getByRole('table', { name: 'Cases' });
  expect(await table.getByRole('row').count()).toBe(61);
  await page.getByRole('link', { name: 'Next' }).click();
  await page.getByText('Page 2 of 8').waitFor();
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
