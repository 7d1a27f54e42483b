import type { BrowserContext } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { lookAt, type PageOfOurs } from './support/every-page.ts';
import { expectSound } from './support/looks.ts';
import { memberOf } from './support/members.ts';
import { openPage } from './support/open-page.ts';
import { LAPTOP, type Site, useSite } from './support/site.ts';

const site = useSite();

const PAGES: readonly PageOfOurs[] = [
  { name: 'the first page', who: null, path: '/', heading: /last layer/ },
  { name: 'the sign-in page', who: null, path: '/sign-in', heading: 'Sign in' },
  { name: 'the Ledger', who: null, path: '/ledger', heading: 'What a solve can deal' },
  {
    name: 'the Ledger with a mix',
    who: 'ines',
    path: '/ledger?entry=any&aspects=co,eo&with=eo&share=40',
    heading: 'What a solve can deal',
  },
  {
    name: 'the Ledger asked wrongly',
    who: 'tobi',
    path: '/ledger?entry=nothing&aspects=cp,zz',
    heading: 'What a solve can deal',
  },
  {
    name: 'the Ledger’s list',
    who: 'desk',
    path: '/ledger/cases?entry=cp%2Beo&aspects=co,ep&angles=4',
    heading: 'All cases',
  },
  { name: 'an address without a page', who: null, path: '/nowhere', heading: 'Not here', status: 404 },
  { name: 'My cases', who: 'tobi', path: '/cases', heading: 'My cases' },
  { name: 'a case', who: 'tobi', path: aCase, heading: /^PLL/ },
  { name: 'Form', who: 'tobi', path: '/form', heading: 'Form' },
  { name: 'Club', who: 'tobi', path: '/club', heading: /Club|Harbour Lane Cubers/ },
  { name: 'a place of others', who: 'tobi', path: '/desk/squad', heading: 'Not yours to see', status: 403 },
  { name: 'Squad', who: 'ines', path: '/desk/squad', heading: 'Squad' },
  { name: 'Squad by groups', who: 'ines', path: '/desk/squad?setKey=oll', heading: 'Squad, OLL by group' },
  { name: 'a member’s page', who: 'ines', path: aMember, heading: 'Tobi' },
  { name: 'Standings', who: 'ines', path: '/desk/standings', heading: /^Standings, / },
  { name: 'Programme', who: 'ines', path: '/desk/programme', heading: 'Programme' },
  { name: 'Intake', who: 'desk', path: '/admin/intake', heading: 'Intake' },
  { name: 'a draft', who: 'desk', path: aDraft, heading: 'faults.csv' },
  { name: 'Pictures', who: 'desk', path: '/admin/pictures', heading: 'Pictures' },
];

async function aCase({ sql }: Site): Promise<string> {
  const [row] = await sql<{ case_key: string }>(
    "select case_key from edition_case where set_key = 'pll' and edition_number = 1 and name = 'T'",
  );
  return `/cases/${encodeURIComponent(row?.case_key ?? '')}`;
}

async function aMember(of: Site): Promise<string> {
  return `/desk/squad/${(await memberOf(of, 'Tobi')).memberId}`;
}

/** A draft with every kind of finding in it. */
async function aDraft({ url }: Site, context: BrowserContext): Promise<string> {
  const lines = [
    'case,algorithm,group,note,colour',
    "T,R U R' U' R' F R2 U' R' U' R U R' F',,,red",
    "F,R U R' U' R' F R2 U' R' U' R U R' F',,,",
    'H,M2 U M2 U2 M2 U M2,,,',
    'Z,M2 U M2 U2 M2 U M2,,,',
    "Y,R U R',,,",
    'Ua,R U Q2,,,',
    "Ub,R U2 R' U' R U' R',,,",
    ',M2 U M U2 M\' U M2,,"a note, with a comma"',
  ];
  const answer = await context.request.post('/api/admin/intake', {
    data: {
      setKey: 'pll',
      fileName: 'faults.csv',
      content: Buffer.from(`${lines.join('\n')}\n`).toString('base64'),
    },
    headers: { Origin: url },
  });
  expect(answer.status()).toBe(200);
  return `/admin/intake/${((await answer.json()) as { draftId: string }).draftId}`;
}

describe('every page, light and dark, wide and narrow', () => {
  lookAt(site, PAGES);

  it('the questions before what cannot be undone', async () => {
    const context = await site.visitorAs('desk', LAPTOP);
    const page = await context.newPage();
    await openPage(page, await aDraft(site, context));
    await page.getByRole('button', { name: 'Discard' }).click();
    await page.getByRole('dialog').waitFor();
    await expectSound(page);
  });

  it('a form that was filled in wrongly', async () => {
    const page = await (await site.visitor(LAPTOP)).newPage();
    await openPage(page, '/sign-in');
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page.getByRole('alert').waitFor();
    await expectSound(page);
    site.watch.expect(/status of 401/);
    await page.getByLabel('E-mail or sign-in name').fill('tobi@harbourlane.example');
    await page.getByLabel('Password').fill('not the password');
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page
      .getByRole('alert')
      .getByText(/password/i)
      .first()
      .waitFor();
    expect(new URL(page.url()).pathname).toBe('/sign-in');
  });
});
