import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { launchBrowser } from '#tests/support/browser.ts';
import { Watch } from './support/watch.ts';

// The other files rest on what the watch sees: here are pages that do what none of ours may.

const ORIGIN = 'http://site.test';
let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** A page of a site that answers every address itself: the document with this body, all else by a status. */
async function pageWith(body: string): Promise<{ page: Page; watch: Watch }> {
  const context = await browser.newContext();
  const watch = new Watch(ORIGIN);
  watch.follow(context);
  await context.route('**/*', (route) => {
    const { pathname } = new URL(route.request().url());
    if (pathname === '/') {
      return route.fulfill({
        contentType: 'text/html',
        headers: { 'Content-Security-Policy': "default-src 'none'; script-src 'nonce-a'; img-src * data:" },
        body: `<!DOCTYPE html><link rel="icon" href="data:,"><p>${body}`,
      });
    }
    return route.fulfill({ status: pathname === '/broken' ? 503 : 404, body: '' });
  });
  const page = await context.newPage();
  await page.goto(`${ORIGIN}/`, { waitUntil: 'networkidle' });
  return { page, watch };
}

const script = (code: string) => `<script nonce="a">${code}</script>`;

it.each([
  ['an error in the console', script('console.error("so")'), /^error: so/],
  ['a warning in the console', script('console.warn("so")'), /^warning: so/],
  ['something thrown', script('throw new Error("so")'), /^thrown: Error: so/],
  ['a promise nobody catches', script('Promise.reject(new Error("so"))'), /^thrown: Error: so/],
  ['a style that the policy forbids', '<b style="color: red">so</b>', /Content Security Policy/],
  ['a script that the policy forbids', '<script>so()</script>', /Content Security Policy/],
  ['a picture of another site', '<img alt="" src="http://other.test/a.png">', /^request to another site/],
  ['an answer that we erred', '<img alt="" src="/broken">', /^503 from/],
  ['an answer that there is nothing', '<img alt="" src="/gone.png">', /status of 404/],
])('notices %s', async (_name, body, fault) => {
  const { watch } = await pageWith(body);
  expect(watch.take()).toContainEqual(expect.stringMatching(fault));
  expect(watch.take()).toEqual([]);
});

it('says nothing of a page that does none of it, nor of what a test brings about', async () => {
  expect((await pageWith(script('console.log("so")'))).watch.take()).toEqual([]);
  const { page, watch } = await pageWith('');
  watch.expect(/status of 404/);
  await page.evaluate(() => {
    document.body.append(Object.assign(new Image(), { src: '/gone.png' }));
  });
  await page.waitForLoadState('networkidle');
  expect(watch.take()).toEqual([]);
});
