import axe, { type AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';

/** Conformance to level AA of WCAG 2.0 to 2.2, and what the rules' authors call good practice. */
const ALL = {
  type: 'tag',
  values: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'],
} as const;
/** The rules that another theme can break: a theme changes colours and nothing else. */
const COLOURS = { type: 'rule', values: ['color-contrast', 'link-in-text-block'] } as const;

declare global {
  interface Window {
    axe: typeof axe;
  }
}

/** What is wrong with a page as it stands: a line for each rule that is broken, with where and why. */
export async function accessibilityFaults(page: Page, rules: 'all' | 'colours'): Promise<string[]> {
  if (!(await page.evaluate(() => 'axe' in window))) await page.evaluate(axe.source);
  const { violations }: Pick<AxeResults, 'violations'> = await page.evaluate(
    ({ type, values }) =>
      window.axe.run({ runOnly: { type, values: [...values] }, resultTypes: ['violations'] }),
    rules === 'all' ? ALL : COLOURS,
  );
  return violations.map(
    ({ id, nodes }) =>
      `${id}: ${nodes.map(({ target, failureSummary }) => `${target.join(' ')} (${failureSummary})`).join('; ')}`,
  );
}
