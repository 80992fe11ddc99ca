import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** Nothing that keeps a person from using the page: axe's serious and critical findings, and no sideways scrolling. */
export async function looksRight(page: Page, name: string): Promise<void> {
  await page.waitForLoadState('load');
  // What sticks to the foot of the window must not lie over what is looked at.
  await page.evaluate(() => window.scrollTo(0, 0));
  await page.screenshot({ path: `test-results/screens/${name}.png`, fullPage: true });
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const serious = violations.filter(({ impact }) => impact === 'serious' || impact === 'critical');
  expect(
    serious.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 160) ?? ''}`),
    `${name}: what axe finds serious`,
  ).toEqual([]);
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(overflow, `${name}: the page scrolls sideways by so many pixels`).toBeLessThanOrEqual(1);
}
