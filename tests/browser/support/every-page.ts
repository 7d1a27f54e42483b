import type { BrowserContext } from 'playwright-core';
import { expect, it } from 'vitest';
import { nonceOf } from './documents.ts';
import { expectSound } from './looks.ts';
import { openPage } from './open-page.ts';
import { type DemoName, LAPTOP, type Site } from './site.ts';

export interface PageOfOurs {
  readonly name: string;
  readonly who: DemoName | null;
  readonly path: string | ((site: Site, context: BrowserContext) => Promise<string>);
  readonly heading: string | RegExp;
  readonly status?: number;
}

/** A test for each page: its status, its heading, its looks in both themes and all sizes, and a nonce of its own. */
export function lookAt(site: Site, pages: readonly PageOfOurs[]): void {
  it.each(pages)('$name', async (ours) => {
    if (ours.status) site.watch.expect(new RegExp(`status of ${ours.status}`));
    const context = await (ours.who ? site.visitorAs(ours.who, LAPTOP) : site.visitor(LAPTOP));
    const path = typeof ours.path === 'string' ? ours.path : await ours.path(site, context);
    const page = await context.newPage();
    const response = await openPage(page, path);
    expect(response.status()).toBe(ours.status ?? 200);
    await page.getByRole('heading', { level: 1, name: ours.heading }).waitFor();
    await expectSound(page);
    // The nonce is made anew for each document.
    expect(await nonceOf(await context.request.get(path))).not.toBe(await nonceOf(response));
  });
}
