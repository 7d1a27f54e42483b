import type { Browser, BrowserContext, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import accounts from '#database/seed/demo-accounts.json' with { type: 'json' };
import { launchBrowser } from '#tests/support/browser.ts';
import { useDemoDatabase } from '#tests/support/database.ts';
import { Factory } from '#tests/support/factories.ts';
import { type RunningServer, startServer } from '#tests/support/server.ts';
import { openPage } from './open-page.ts';
import { Watch } from './watch.ts';

/** A phone in the hand, as look.md's mocks are drawn. */
export const PHONE: BrowserContextOptions = {
  viewport: { width: 390, height: 844 },
  hasTouch: true,
  isMobile: true,
};
/** A small laptop. */
export const LAPTOP: BrowserContextOptions = { viewport: { width: 1280, height: 860 } };

export type DemoName = 'ines' | 'tobi' | 'pia' | 'desk' | 'marlo';

/** Sign-in and password of one of the demonstration's accounts. */
export function accountOf(name: DemoName): { signIn: string; password: string } {
  const account = accounts.find(({ signIn }) => signIn.startsWith(name));
  if (!account) throw new Error(`The demonstration has no account of ${name}.`);
  return { signIn: account.signIn, password: account.password };
}

export interface Site {
  readonly url: string;
  readonly watch: Watch;
  /** Runs SQL as the owner, behind the walls. */
  readonly sql: Factory['sql'];
  /** An empty browser profile; it is closed when the test is over. */
  visitor(options?: BrowserContextOptions): Promise<BrowserContext>;
  /** The same with somebody signed in. Each call is a device of its own. */
  visitorAs(name: DemoName, options?: BrowserContextOptions): Promise<BrowserContext>;
  /** Signs in on the sign-in page, by hand. */
  signIn(page: Page, name: DemoName): Promise<void>;
}

/**
 * The whole product for one test file: its own copy of the demonstration, its own server and browser. Call it
 * at the top. After each test all that its pages did wrong fails it.
 */
export function useSite(): Site {
  const urls = useDemoDatabase();
  let state: { server: RunningServer; browser: Browser; factory: Factory; watch: Watch } | undefined;
  const open: BrowserContext[] = [];
  const here = () => {
    if (!state) throw new Error('useSite is ready in hooks and tests, not before.');
    return state;
  };

  beforeAll(async () => {
    const server = await startServer(urls);
    const factory = new Factory(urls.ownerUrl);
    state = { server, browser: await launchBrowser(), factory, watch: new Watch(server.url) };
  });
  afterEach(async ({ task }) => {
    if (task.result?.state === 'fail') await describe(open);
    await Promise.all(open.splice(0).map((context) => context.close()));
    expect(here().watch.take()).toEqual([]);
  });
  afterAll(async () => {
    await state?.browser.close();
    await state?.server.stop();
    await state?.factory.end();
  });

  const visitor: Site['visitor'] = async (options = LAPTOP) => {
    const { browser, server, watch } = here();
    const context = await browser.newContext({
      baseURL: server.url,
      locale: 'en-GB',
      timezoneId: 'Europe/Amsterdam',
      ...options,
    });
    context.setDefaultTimeout(20_000);
    watch.follow(context);
    open.push(context);
    return context;
  };
  return {
    get url() {
      return here().server.url;
    },
    get watch() {
      return here().watch;
    },
    sql: (text, values) => here().factory.sql(text, values),
    visitor,
    async visitorAs(name, options) {
      const context = await visitor(options);
      const answer = await context.request.post('/api/session', {
        data: accountOf(name),
        headers: { Origin: here().server.url },
      });
      expect(answer.status()).toBe(200);
      return context;
    },
    async signIn(page, name) {
      const { signIn, password } = accountOf(name);
      await openPage(page, '/sign-in');
      await page.getByLabel('E-mail or sign-in name').fill(signIn);
      await page.getByLabel('Password').fill(password);
      await page.getByRole('button', { name: 'Sign in', exact: true }).click();
      await page.waitForURL((url) => url.pathname !== '/sign-in');
    },
  };
}

/** What a failed test's pages show, in words: more telling than the line it failed on. */
async function describe(contexts: readonly BrowserContext[]): Promise<void> {
  for (const page of contexts.flatMap((context) => context.pages())) {
    const words = await page
      .locator('body')
      .ariaSnapshot({ timeout: 5_000 })
      .catch(() => '(nothing)');
    process.stderr.write(`\n${page.url()}\n${words.slice(0, 6_000)}\n`);
  }
}
