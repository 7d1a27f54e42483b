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

  const share = page.getByLabel('In per cent of solves');
  expect(await share.isDisabled()).toBe(true);
  await page.getByLabel('Some solves arrive with').selectOption('eo');
  await expect.poll(() => share.isEnabled()).toBe(true);
  await share.focus();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('25');
  await page.getByText(/^25 of 100 solves arrive with: edges oriented/).waitFor();
  // The address is the view: a fresh visit shows the same.
  const mixed = page.getByRole('table', { name: 'Cases by prior, mixed' });
  const text = await mixed.textContent();
  // What is no share is left as typed and told, and no figures stand under it.
  for (const wrong of ['100', '33.3', 'ab']) {
    await share.fill(wrong);
    await page.getByText('The share is a whole number of per cent from 1 to 99.').waitFor();
    expect(await share.inputValue()).toBe(wrong);
    expect(await mixed.count()).toBe(0);
  }
  await share.fill('25');
  await mixed.waitFor();
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

it('leads on to the trade’s sets of the entry that is chosen, and to a list on one page', async () => {
  const page = await (await site.visitor(LAPTOP)).newPage();
  await openPage(page, '/ledger?entry=any&aspects=cp,ep');
  await page.getByText('No trade name').waitFor();
  await page.getByRole('link', { name: '1LLL' }).press('Enter');
  await page.getByText('Trade name: 1LLL').waitFor();

  await openPage(page, '/ledger/cases?entry=cp%2Beo&aspects=co,ep');
  // 84 and the skip (common practice).
  await page.getByText('1 to 60 of 85 on this page').waitFor();
  await page.getByRole('link', { name: 'All 85 on one page' }).press('Enter');
  const rows = page.getByRole('table', { name: 'Cases' }).getByRole('row');
  await expect.poll(() => rows.count()).toBe(86);
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
