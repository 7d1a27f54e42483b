import { expect, it } from 'vitest';
import { openPage } from './support/open-page.ts';
import { LAPTOP, useSite } from './support/site.ts';

const site = useSite();

it('counts step after step by keyboard, and goes back through them', async () => {
  const page = await (await site.visitor(LAPTOP)).newPage();
  await openPage(page, '/ledger');
  const counted = page.getByRole('status');
  const shows = (cases: string) => expect.poll(() => counted.textContent()).toBe(cases);
  const chosen = () => page.evaluate(() => (document.activeElement as HTMLInputElement).value);
  // The numbers of cases, the skip among them, are common practice: 22 of PLL, 8 of OCLL, 58 of OLL.
  await shows('22 cases, the skip among them');
  expect(await page.getByRole('button', { name: 'Count' }).count()).toBe(0);

  await page.keyboard.press('Tab');
  await page.keyboard.press('Enter');
  await page.keyboard.press('Tab');
  expect(await chosen()).toBe('co+eo');
  for (const next of ['co', 'eo', 'any']) {
    await page.keyboard.press('ArrowUp');
    await expect.poll(() => new URL(page.url()).searchParams.get('entry')).toBe(next);
    expect(await chosen()).toBe(next);
  }
  await page.keyboard.press('Tab');
  for (const aspect of ['co', 'eo', 'cp', 'ep']) {
    await page.keyboard.press('Tab');
    expect(await chosen()).toBe(aspect);
    await page.keyboard.press('Space');
  }
  await shows('58 cases, the skip among them');
  await page.getByText('Trade name: OLL').waitFor();
  await page.goBack();
  await expect.poll(() => new URL(page.url()).searchParams.get('aspects')).toBe('co,eo,ep');
  await page.goForward();
  await shows('58 cases, the skip among them');

  await page.getByLabel('Some solves arrive with').selectOption('eo');
  await page.getByLabel('In per cent of solves').focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('25');
  await page.getByText(/^25 of 100 solves arrive with: edges oriented/).waitFor();
  // The address is the view: a fresh visit shows the same.
  const mixed = page.getByRole('table', { name: 'Cases by prior, mixed' });
  const text = await mixed.textContent();
  const other = await (await site.visitor(LAPTOP)).newPage();
  await openPage(other, page.url());
  expect(await other.getByRole('table', { name: 'Cases by prior, mixed' }).textContent()).toBe(text);
});

it('lists the cases of a class, each with its page in the Catalogue for whoever is signed in', async () => {
  const page = await (await site.visitorAs('tobi', LAPTOP)).newPage();
  await openPage(page, '/ledger');
  await page.getByRole('link', { name: 'All 16 cases with 4 angles' }).press('Enter');
  await page.getByRole('heading', { level: 1, name: 'All cases of PLL' }).waitFor();
  const table = page.getByRole('table', { name: 'Cases' });
  expect(await table.getByRole('row').count()).toBe(17);
  await table.getByRole('link', { name: 'name' }).press('Enter');
  await expect
    .poll(async () => (await table.getByRole('rowheader').allTextContents()).slice(0, 3))
    .toEqual(['Aa', 'Ab', 'F']);
  await table.getByRole('link', { name: 'Aa', exact: true }).press('Enter');
  await page.getByRole('heading', { level: 1, name: /Aa/ }).waitFor();
  expect(new URL(page.url()).pathname).toMatch(/^\/catalogue\/pll\/cases\//);
});

it('can be taken along as a file', async () => {
  const page = await (await site.visitor(LAPTOP)).newPage();
  await openPage(page, '/ledger?entry=any&aspects=co,eo');
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: 'Download CSV' }).click(),
  ]);
  expect(download.suggestedFilename()).toBe('ledger-any-co-eo.csv');
});
