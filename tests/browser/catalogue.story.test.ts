import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { expect, it } from 'vitest';
import { openPage } from './support/open-page.ts';
import { LAPTOP, PHONE, useSite } from './support/site.ts';

const site = useSite();

/** Names in the table of a set's cases, top to bottom. */
const names = (page: Page) =>
  page.getByRole('table', { name: 'Cases of the set' }).getByRole('rowheader').allTextContents();

it('a captain finds a case by its moves and follows it to its mirror', async () => {
  const page = await (await site.visitorAs('ines', LAPTOP)).newPage();
  await openPage(page, '/desk/squad');
  await page.getByRole('link', { name: 'Catalogue' }).click();
  await page
    .getByRole('table', { name: 'Case sets' })
    .getByRole('link', { name: 'PLL', exact: true })
    .click();
  await page.getByRole('heading', { level: 1, name: 'PLL' }).waitFor();
  // 21 cases of PLL: common practice.
  await page.getByText('21 cases', { exact: true }).waitFor();

  await page.getByLabel('Find').fill("R U' R' U' R U R D");
  await page.getByText('1 found among 21 cases').waitFor();
  expect(await names(page)).toEqual(['Ra']);
  await page.getByRole('link', { name: 'Ra', exact: true }).click();

  await page.getByRole('heading', { level: 1, name: 'PLL Ra' }).waitFor();
  expect(await page.title()).toContain('PLL Ra');
  await page.getByText('1/18', { exact: true }).waitFor();
  await page.getByText('18 solves', { exact: true }).waitFor();
  const angles = page.getByRole('region', { name: 'Angles' });
  expect(await angles.getByRole('listitem').count()).toBe(4);
  const algorithms = page.getByRole('table', { name: /^Algorithms of the case/ });
  await algorithms.getByRole('columnheader', { name: 'AUF, view 4' }).waitFor();

  const relations = page.getByRole('region', { name: 'Related cases' });
  await relations.getByRole('link', { name: /Rb/ }).first().click();
  await page.getByRole('heading', { level: 1, name: 'PLL Rb' }).waitFor();
  await page.getByRole('link', { name: 'Next: T' }).click();
  await page.getByRole('heading', { level: 1, name: 'PLL T' }).waitFor();
  await page.goBack();
  await page.getByRole('heading', { level: 1, name: 'PLL Rb' }).waitFor();
});

it('a member goes through a set of thousands on the phone, page by page, and can send the view on', async () => {
  const page = await (await site.visitorAs('tobi', PHONE)).newPage();
  await openPage(page, '/catalogue/1lll');
  await page.getByText('1 to 100 of 3,915 cases').waitFor();
  await page.getByRole('link', { name: 'Next page' }).tap();
  await page.getByText('101 to 200 of 3,915 cases').waitFor();
  await page.getByLabel('Angles').selectOption('1');
  // Seven cases beside the skip look the same from all sides (derived: orbits of four states).
  await page.getByText('7 found among 3,915 cases').waitFor();
  const seen = await names(page);
  expect(seen).toHaveLength(7);

  const other = await (await site.visitorAs('tobi', PHONE)).newPage();
  await openPage(other, page.url());
  expect(await names(other)).toEqual(seen);
  await other.getByRole('rowheader').first().getByRole('link').tap();
  // Oriented by OLL and permuted by PLL: the whole last layer has both.
  await other
    .getByRole('region', { name: 'Related cases' })
    .getByText('permutation', { exact: true })
    .waitFor();
});

it('filters and sorts without a script, by the plain form and plain links', async () => {
  const page = await (await site.visitorAs('ines', { ...LAPTOP, javaScriptEnabled: false })).newPage();
  await page.goto('/catalogue/oll');
  await page.getByLabel('Group').selectOption('dot');
  await page.getByRole('button', { name: 'Show', exact: true }).click();
  // Eight dot cases: common practice.
  await page.getByText('8 found among 57 cases').waitFor();
  await page.getByRole('table', { name: 'Cases of the set' }).getByRole('link', { name: 'prior' }).click();
  await page.getByText('8 found among 57 cases').waitFor();
  // The one that looks the same from all sides is dealt least: OLL 20 (common practice).
  expect((await names(page)).at(-1)?.trim()).toBe('20');
  await page.getByRole('link', { name: '20', exact: true }).click();
  await page.getByText('1/216', { exact: true }).waitFor();
});

it('takes all that a filter finds away as a file, and a sheet to the printer', async () => {
  const page = await (await site.visitorAs('desk', LAPTOP)).newPage();
  await openPage(page, '/catalogue/1lll?angles=2');
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Cases, CSV' }).click(),
  ]);
  expect(download.suggestedFilename()).toBe('1lll-cases.csv');
  const lines = (await readFile(await download.path(), 'utf8')).trim().split('\r\n');
  // 44 orbits of eight states (derived: Burnside's lemma), and the head.
  expect(lines).toHaveLength(45);
  expect(lines[1]).toMatch(/,2,8,62208,$/);

  await openPage(page, '/catalogue/pll');
  await page.getByRole('link', { name: 'Algorithm sheet' }).click();
  await page.getByRole('heading', { level: 1, name: 'PLL, algorithm sheet' }).waitFor();
  await page.getByLabel('Algorithms').selectOption('first');
  await page.waitForURL('**/sheet?algorithms=first');
  // One algorithm for each of the 21.
  await expect.poll(() => page.getByRole('main').locator('ol > li').count()).toBe(21);
  const running = page.getByText(/^PLL, edition \d+$/);
  expect(await running.isVisible()).toBe(false);
  await page.emulateMedia({ media: 'print' });
  expect(await running.isVisible()).toBe(true);
  expect(await page.getByRole('button', { name: 'Print' }).isVisible()).toBe(false);
  expect(await page.getByRole('navigation').first().isVisible()).toBe(false);
});

it('still answers at the address it had', async () => {
  const page = await (await site.visitorAs('desk', LAPTOP)).newPage();
  await openPage(page, '/admin/catalogue/oll/1');
  expect(new URL(page.url()).pathname).toBe('/catalogue/oll/editions/1');
  await page.getByRole('heading', { level: 1, name: 'OLL, edition 1' }).waitFor();
});
