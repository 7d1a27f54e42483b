import axe, { type AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';

/** Conformance to level AA of WCAG 2.0 to 2.2, and what the rules' authors call good practice. */
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

declare global {
  interface Window {
    axe: typeof axe;
  }
}

/** What is wrong with a page as it stands: a line for each rule that is broken, with where and why. */
export async function accessibilityFaults(page: Page): Promise<string[]> {
  if (!(await page.evaluate(() => 'axe' in window))) await page.evaluate(axe.source);
  const { violations }: Pick<AxeResults, 'violations'> = await page.evaluate(
    (values) => window.axe.run({ runOnly: { type: 'tag', values }, resultTypes: ['violations'] }),
    RULES,
  );
  return violations.map(
    ({ id, nodes }) =>
      `${id}: ${nodes.map(({ target, failureSummary }) => `${target.join(' ')} (${failureSummary})`).join('; ')}`,
  );
}
