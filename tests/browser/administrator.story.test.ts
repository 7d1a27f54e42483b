import { readFileSync } from 'node:fs';
import type { Locator, Page } from 'playwright-core';
import { expect, it } from 'vitest';
import { openPage } from './support/open-page.ts';
import { LAPTOP, useSite } from './support/site.ts';

const site = useSite();
const PLL = readFileSync(new URL('../../database/seed/case-sets/pll.csv', import.meta.url), 'utf8');

/** The seed's own file with two faults: T's line says F, and V's first algorithm has lost its last move. */
function faultyFile(): { csv: string; mislabelled: number; broken: number } {
  const lines = PLL.trimEnd().split('\n');
  const mislabelled = lines.findIndex((line) => line.startsWith('T,'));
  const broken = lines.findIndex((line) => line.startsWith('V,'));
  lines[mislabelled] = (lines[mislabelled] ?? '').replace(/^T,/, 'F,');
  lines[broken] = (lines[broken] ?? '').replace(/ F,/, ',');
  return { csv: `${lines.join('\n')}\n`, mislabelled: mislabelled + 1, broken: broken + 1 };
}

async function upload(page: Page, csv: string): Promise<void> {
  await openPage(page, '/admin/intake');
  await page.getByLabel('Set', { exact: true }).selectOption('pll');
  await page
    .getByLabel('File', { exact: true })
    .setInputFiles({ name: 'pll.csv', mimeType: 'text/csv', buffer: Buffer.from(csv) });
  await page.getByRole('button', { name: 'Read the file' }).click();
  await page.getByRole('heading', { level: 1, name: 'pll.csv' }).waitFor();
}

/** The row of a line of the file. */
const lineOf = (page: Page, line: number): Locator =>
  page
    .getByRole('table', { name: 'Lines of the file' })
    .getByRole('row', { name: new RegExp(`line ${line}\\b`) });

const editions = () =>
  site.sql<{ number: number; note: string; cases: string; algorithms: string }>(
    `select e.number, e.note,
       (select count(*) from edition_case c where c.set_key = e.set_key and c.edition_number = e.number) as cases,
       (select count(*) from edition_algorithm a where a.set_key = e.set_key and a.edition_number = e.number) as algorithms
     from edition e where e.set_key = 'pll' order by e.number`,
  );

const algorithms = (edition: number) =>
  site.sql<{ name: string; rank: number; algorithm: string }>(
    `select c.name, a.rank, a.algorithm from edition_algorithm a
     join edition_case c using (set_key, edition_number, case_key)
     where a.set_key = 'pll' and a.edition_number = $1 order by c.name, a.rank`,
    [edition],
  );

it('brings in a file with two wrong lines, settles them, and publishes an edition', async () => {
  const page = await (await site.visitor(LAPTOP)).newPage();
  await site.signIn(page, 'desk');
  expect(new URL(page.url()).pathname).toBe('/admin/intake');
  const { csv, mislabelled, broken } = faultyFile();
  await upload(page, csv);

  // Both are found, on their lines, and nothing else is.
  const wrongName = lineOf(page, mislabelled);
  const wrongMoves = lineOf(page, broken);
  expect(await wrongName.textContent()).toContain('Solves T, the file says F');
  expect(await wrongMoves.textContent()).toContain('Breaks the first two layers');
  const shown = page.getByRole('navigation', { name: 'Lines shown' });
  await shown.getByRole('link', { name: 'To settle 2' }).waitFor();
  await shown.getByRole('link', { name: 'Cannot go in 1' }).waitFor();
  // T has no other line; V's second algorithm still stands for it.
  await page.getByText('20 of 21').waitFor();
  await page.getByText(/cases covered; T stays as in edition 1/).waitFor();
  const blocked = page.getByRole('button', { name: 'Publish: 2 lines to settle' });
  expect(await blocked.getAttribute('aria-disabled')).toBe('true');
  await blocked.click({ force: true });
  expect(await page.getByRole('dialog').count()).toBe(0);

  // One is taken for what it is, the other typed anew.
  await wrongName.getByRole('button', { name: `take as T, line ${mislabelled}` }).click();
  await wrongName.getByText('Taken as T').waitFor();
  await page.getByText('21 of 21').waitFor();
  await page.getByRole('button', { name: 'Publish: 1 line to settle' }).waitFor();
  await wrongMoves.getByRole('button', { name: `edit, line ${broken}` }).click();
  const moves = page.getByLabel(`Algorithm, line ${broken}`);
  await moves.fill(`${await moves.inputValue()} F`);
  await page.getByRole('button', { name: 'Save' }).click();
  await wrongMoves.getByText('Agrees').waitFor();
  await shown.getByRole('link', { name: 'To settle 0' }).waitFor();

  await page.getByRole('button', { name: 'Publish', exact: true }).click();
  const dialog = page.getByRole('dialog', { name: 'Publish PLL, edition 2?' });
  await dialog.getByLabel('Note').fill('Checked against the cube in spring.');
  await dialog.getByRole('button', { name: 'Publish' }).click();
  await page.getByText('PLL, edition 2 is published.').waitFor();

  // It stands in the catalogue, with what it holds.
  await page.getByRole('link', { name: 'Catalogue' }).click();
  const pll = page.getByRole('table', { name: 'Case sets' }).getByRole('row', { name: /^PLL/ });
  await pll.getByText('Checked against the cube in spring.').waitFor();
  await pll.getByText('21 cases, 37 algorithms').waitFor();
  await pll.getByRole('link', { name: 'edition 2' }).click();
  await page.getByRole('heading', { level: 1, name: 'PLL, edition 2' }).waitFor();
  const cases = page.getByRole('table', { name: 'Cases of the edition' });
  expect(await cases.getByRole('row').count()).toBe(22);
  expect(await cases.getByRole('row', { name: /\bT\b.*1\/18/ }).textContent()).toContain(
    'R U R′ U′ R′ F R2 U′ R′ U′ R U R′ F′',
  );

  expect(await editions()).toEqual([
    expect.objectContaining({ number: 1, cases: '21', algorithms: '37' }),
    { number: 2, note: 'Checked against the cube in spring.', cases: '21', algorithms: '37' },
  ]);
  // What was taken and what was typed came out as the seed has it: the two editions say the same.
  expect(await algorithms(2)).toEqual(await algorithms(1));
});

it('discards a file: nothing of it stays but the file', async () => {
  const page = await (await site.visitorAs('desk', LAPTOP)).newPage();
  const before = await editions();
  await upload(page, 'case,algorithm\nT,R U Q\nH,M2 U M2 U2 M2 U M2\n');
  expect(await lineOf(page, 2).textContent()).toMatch(/Q is not a move.*character 5/);

  await page.getByRole('button', { name: 'Discard' }).click();
  const dialog = page.getByRole('dialog', { name: 'Discard pll.csv?' });
  await dialog.getByRole('button', { name: 'Keep it' }).click();
  await dialog.waitFor({ state: 'hidden' });
  await page.getByRole('button', { name: 'Discard' }).click();
  await dialog.getByRole('button', { name: 'Discard' }).click();

  await page.getByText('No draft is open').waitFor();
  const earlier = page.getByRole('table', { name: 'Files published or discarded' });
  expect(await earlier.getByRole('row').nth(1).textContent()).toMatch(/pll\.csv.*discarded/);
  expect(await editions()).toEqual(before);
});
