import { expect, it } from 'vitest';
import { answerInTime } from './support/answers.ts';
import { expectSound } from './support/looks.ts';
import { longLimits, memberOf } from './support/members.ts';
import { openPage } from './support/open-page.ts';
import { LAPTOP, useSite } from './support/site.ts';
import { Trainee } from './support/trainee.ts';

const site = useSite();

it('is sound in every phase of a sitting, light and dark, wide and narrow', async () => {
  const pia = await memberOf(site, 'Pia');
  await longLimits(site, pia);
  const page = await (await site.visitorAs('pia', LAPTOP)).newPage();
  const trainee = new Trainee(site, page, 'pointer');
  await openPage(page, '/today');
  await page.getByRole('button', { name: /^Begin / }).waitFor();
  await expectSound(page);

  await trainee.begin();
  await expectSound(page);
  const names = await trainee.recognise();
  await expectSound(page);
  await names
    .getByRole('button', { name: /^(?!solved|lost it)/ })
    .first()
    .click();
  await page.getByRole('toolbar', { name: 'AUF before' }).waitFor();
  await expectSound(page);
  // Whatever that would have been: it is left, and the next one named wrongly.
  await openPage(page, '/form');
  await expect.poll(() => pia.answersToday()).toBe(1);
  await trainee.begin();
  await trainee.answer('wrong name');
  await trainee.goOn.waitFor();
  expect(await page.getByRole('figure').count()).toBe(2);
  await expectSound(page);
  await page.getByRole('button', { name: 'mis-tap' }).click();
  await page.getByText(/^Mis-tap noted/).waitFor();
  await expectSound(page);
});

it('is sound at the end of the day, and where nothing is on the programme', async () => {
  const context = await site.visitorAs('marlo', LAPTOP);
  await answerInTime(site, context, null);
  const page = await context.newPage();
  await openPage(page, '/today');
  await page.getByRole('heading', { name: 'Done for today' }).waitFor();
  await expectSound(page);

  const { clubId } = await memberOf(site, 'Marlo', 'North Quay Cube Club');
  await site.sql('delete from programme where club_id = $1', [clubId]);
  await page.reload();
  await page
    .getByRole('heading', { name: 'Done for today' })
    .or(page.getByText('Nothing is on your programme yet'))
    .first()
    .waitFor();
  await expectSound(page);
});
