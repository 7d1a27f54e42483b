import { expect, it } from 'vitest';
import { PALETTES } from '#shared/lastlayer/pictures/index.ts';
import { expectSound } from './support/looks.ts';
import { openPage } from './support/open-page.ts';
import { LAPTOP, PHONE, useSite } from './support/site.ts';

const site = useSite();
const { standard, safe } = PALETTES;

it('draws every picture as a member chose, on all devices, from the first byte', async () => {
  const phone = await (await site.visitorAs('tobi', PHONE)).newPage();
  await openPage(phone, '/club');
  const preview = phone.getByRole('region', { name: 'Preview' });
  await phone.locator('label', { hasText: 'Safe for colour-vision deficiency' }).tap();
  await expect.poll(() => preview.innerHTML()).toContain(safe.colours.yellow);
  await phone.locator('label', { hasText: 'Lay each colour’s letter' }).tap();
  await phone.getByRole('button', { name: 'Save pictures' }).tap();
  await phone.getByText('Saved. All pictures look so from now on.').waitFor();
  // The page it was saved on has it at once, without being loaded again.
  await phone.getByRole('link', { name: 'My cases' }).tap();
  const first = phone.locator('.flat-view').first();
  await first.waitFor();
  expect(await first.innerHTML()).toContain(safe.colours.yellow);

  const laptop = await site.visitorAs('tobi', LAPTOP);
  for (const path of ['/cases', '/ledger', '/catalogue/pll']) {
    const sent = await (await laptop.request.get(path)).text();
    expect(sent).toContain(`fill="${safe.colours.yellow}"`);
    expect(sent).not.toContain(`fill="${standard.colours.yellow}"`);
  }
  const another = await site.visitorAs('pia', LAPTOP);
  expect(await (await another.request.get('/ledger')).text()).toContain(`fill="${standard.colours.yellow}"`);
});

it('warns an administrator of shades that cannot be told apart, and saves them', async () => {
  const page = await (await site.visitorAs('desk', LAPTOP)).newPage();
  await openPage(page, '/admin/pictures');
  await expectSound(page);
  await page.locator('label', { hasText: 'Own shades' }).click();
  await page.locator('input[name="red"]').fill('#e07030');
  await page.getByText(/^orange and red: \d/).waitFor();
  await expectSound(page);
  await page.getByRole('button', { name: 'Save pictures' }).click();
  await page.getByText('Saved. All pictures look so from now on.').waitFor();
  await openPage(page, '/admin/pictures');
  expect(await page.locator('input[name="red"]').inputValue()).toBe('#e07030');
});
