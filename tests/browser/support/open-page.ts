import type { Page, Response } from 'playwright-core';

/** Goes to a page and waits until its scripts have taken it over. */
export async function openPage(page: Page, path: string): Promise<Response> {
  const response = await page.goto(path);
  if (!response) throw new Error(`${path} sent no document.`);
  await takenOver(page);
  return response;
}

/**
 * Waits until the scripts of a page have taken over what the server sent: a press on a key before that does nothing.
 * React leaves a mark of its own on every element it has taken over.
 */
export async function takenOver(page: Page): Promise<void> {
  await page.waitForFunction(() => {
    const content = document.querySelector('main');
    return content !== null && Object.keys(content).some((key) => key.startsWith('__reactFiber$'));
  });
}
