import { expect, it } from 'vitest';
import { openPage } from './support/open-page.ts';
import { LAPTOP, PHONE, useSite } from './support/site.ts';

const site = useSite();

it('a pasted algorithm leads to its case, and is stepped through by keyboard', async () => {
  const page = await (await site.visitorAs('ines', LAPTOP)).newPage();
  await openPage(page, '/catalogue');
  // T, turned half round in front: common practice.
  await page.getByLabel('Find a case').fill("U2 R U R' U' R' F R2 U' R' U' R U R' F'");
  await page.keyboard.press('Enter');
  const table = page.getByRole('table', { name: 'What the moves solve and lead to, by set' });
  const row = table.getByRole('row', { name: /^PLL/ });
  await row.getByText('AUF U2, then', { exact: false }).first().waitFor();
  await row.getByRole('link', { name: /^T / }).first().press('Enter');
  await page.getByRole('heading', { level: 1, name: 'PLL T' }).waitFor();

  const steps = page.getByRole('group', { name: 'Step by step' });
  const says = () => steps.getByRole('status').textContent();
  const seen = () => steps.getByRole('img').getAttribute('aria-label');
  const begins = await seen();
  await steps.getByRole('button', { name: 'start', exact: true }).focus();
  await page.keyboard.press('ArrowRight');
  expect(await says()).toMatch(/^After move 1 of \d+: R\.$/);
  expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-current'))).toBe('step');
  await page.keyboard.press('End');
  // A PLL algorithm ends in a solved cube: each face in view of one colour.
  expect(await seen()).toMatch(
    /^Top, row by row: (Y Y Y[,.] ){3}Front, row by row: (\w) \2 \2, \2 \2 \2, \2 \2 \2\./,
  );
  await page.keyboard.press('Home');
  expect(await seen()).toBe(begins);
  // With the focus on nothing the arrows step all the same; in a field they are the field's own.
  await page.evaluate(() => (document.activeElement as HTMLElement | null)?.blur());
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('ArrowRight');
  expect(await says()).toMatch(/^After move 2 of /);
  await page.getByLabel('Side in view').focus();
  await page.keyboard.press('ArrowLeft');
  expect(await says()).toMatch(/^After move 2 of /);
  await steps.getByRole('button', { name: 'Next', exact: true }).click();
  expect(await says()).toMatch(/^After move 3 of /);

  const mistaken = page.getByRole('region', { name: 'Mistaken for' });
  expect(await mistaken.getByRole('listitem').count()).toBe(6);
});

it('what is wrong with moves is said, character and pieces', async () => {
  const page = await (await site.visitorAs('tobi', PHONE)).newPage();
  await openPage(page, '/catalogue');
  const box = page.getByLabel('Find a case');
  await box.fill('R U Q');
  await page.getByRole('button', { name: 'Find', exact: true }).click();
  await page.getByText('It cannot be read as moves: “Q” at character 5 is not a move.').waitFor();
  await box.fill("R U R'");
  await page.keyboard.press('Enter');
  await page.getByText('It breaks the first two layers: DFR and FR are out of place.').waitFor();
});

it('a case is drawn by keyboard alone, and the address shows the same to another', async () => {
  const page = await (await site.visitorAs('tobi', LAPTOP)).newPage();
  await openPage(page, '/catalogue/draw');
  const layer = page.getByRole('toolbar', { name: 'The last layer from above, front below' });
  await layer.getByRole('button', { name: /^Front left corner, top/ }).focus();
  await page.keyboard.press('ArrowDown');
  for (const key of ['r', 'ArrowRight', 'r', 'ArrowRight', 'r']) await page.keyboard.press(key);
  await layer.getByRole('button', { name: 'Front right corner, front: red' }).waitFor();
  const found = page.getByRole('region', { name: 'PLL' });
  await found.getByText('6 of 22 cases').waitFor();
  // A side of three alike: the U, the J, F and the skip (common practice).
  const names = await found.getByRole('link').allTextContents();
  expect(names.map((text) => text.match(/^(skip|Ua|Ub|Ja|Jb|F)/)?.[0]).sort()).toEqual([
    'F',
    'Ja',
    'Jb',
    'Ua',
    'Ub',
    'skip',
  ]);

  // White is opposite yellow, which is on top while nothing else is painted there.
  await page.keyboard.press('w');
  await page.getByText('There is no such cube').waitFor();
  await page.keyboard.press('0');
  await expect.poll(() => new URL(page.url()).searchParams.get('d')).toBe('---------rr----------');

  const other = await (await site.visitorAs('ines', LAPTOP)).newPage();
  await openPage(other, page.url());
  await other.getByRole('button', { name: 'Front edge, front: red' }).waitFor();
  await other.getByText('ZBLL', { exact: true }).click();
  await other.getByRole('region', { name: 'ZBLL' }).waitFor();
});

it('a sticker is painted by hand with the colour that is chosen', async () => {
  const page = await (await site.visitorAs('pia', PHONE)).newPage();
  await openPage(page, '/catalogue/draw');
  await page.getByRole('radio', { name: 'blue' }).check();
  await page.getByRole('button', { name: /^Back edge, back/ }).click();
  await page.getByRole('button', { name: 'Back edge, back: blue' }).waitFor();
  await page.getByRole('button', { name: 'Start again' }).click();
  await page.getByRole('button', { name: 'Back edge, back: not known' }).waitFor();
});
