import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { accessibilityFaults } from './axe.ts';

const SIZES = [
  { width: 1280, height: 860 },
  { width: 390, height: 844 },
] as const;
/** The narrowest phone the product promises to work on. */
const NARROWEST = { width: 360, height: 740 };

/** Where a page is wider than its window, by how much and what sticks out; nothing where it fits. */
async function overflow(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement;
    if (scrollWidth <= clientWidth) return [];
    const out = [...document.querySelectorAll('body *')].filter(
      (element) => element.getBoundingClientRect().right > clientWidth + 1,
    );
    return [
      `${clientWidth} px hold ${scrollWidth}: ${out.slice(0, 5).map((e) => `${e.tagName}.${e.className}`)}`,
    ];
  });
}

/** The paper of the two themes (look.md), as the browser names colours. */
const PAPER = { light: 'rgb(244, 242, 236)', dark: 'rgb(20, 22, 27)' } as const;

/** Changes the device's theme and waits until no colour is on its way any more. */
async function inTheme(page: Page, colorScheme: keyof typeof PAPER): Promise<void> {
  await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
  await page.waitForFunction(
    (paper) => getComputedStyle(document.documentElement).backgroundColor === paper,
    PAPER[colorScheme],
  );
  await page.evaluate(async () => {
    const transitions = document.getAnimations().filter((one) => one instanceof CSSTransition);
    // One that is cancelled is over too.
    await Promise.allSettled(transitions.map((one) => one.finished));
  });
}

/**
 * Makes the window as high as the page: what lies under a bar at the window's foot can be scrolled from under it,
 * and whether anything lies there is chance.
 */
async function whole(page: Page, size: (typeof SIZES)[number]): Promise<void> {
  await page.setViewportSize(size);
  const height = await page.evaluate(() => document.documentElement.scrollHeight);
  await page.setViewportSize({ ...size, height: Math.max(size.height, height) });
}

/** Looks at a page as it stands in both themes and all sizes. */
export async function expectSound(page: Page): Promise<void> {
  for (const size of SIZES) {
    await whole(page, size);
    for (const colorScheme of ['light', 'dark'] as const) {
      await inTheme(page, colorScheme);
      const faults = await accessibilityFaults(page, colorScheme === 'light' ? 'all' : 'colours');
      expect(faults, `${page.url()}, ${colorScheme}, ${size.width} px wide`).toEqual([]);
    }
    expect(await overflow(page), page.url()).toEqual([]);
  }
  await page.setViewportSize(NARROWEST);
  expect(await overflow(page), page.url()).toEqual([]);
}
