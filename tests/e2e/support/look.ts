import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/**
 * Batches far from today lie as thin slips over each other on the tideline. The list of the same batches stands beside
 * it with rows of full height: the equivalent that WCAG 2.5.8 asks for where a target is smaller than 24 px.
 */
const isSlip = (rule: string, html: string): boolean => rule === 'target-size' && html.includes('lw-slip');

/** Nothing that keeps a person from using the page: axe's serious and critical findings, and no sideways scrolling. */
export async function looksRight(page: Page, name: string): Promise<void> {
  await fitsTheWindow(page, name);
  const { violations } = await new AxeBuilder({ page })
    // Findings alone: describing what is right takes most of the time.
    .options({ resultTypes: ['violations'] })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const serious = violations
    .map((violation) => ({
      ...violation,
      nodes: violation.nodes.filter((node) => !isSlip(violation.id, node.html)),
    }))
    .filter(({ impact, nodes }) => nodes.length > 0 && (impact === 'serious' || impact === 'critical'));
  // One bad page must not hide the next.
  expect
    .soft(
      serious.map(({ id, nodes }) => `${id}: ${nodes[0]?.html.slice(0, 160) ?? ''}`),
      `${name}: what axe finds serious`,
    )
    .toEqual([]);
}

/** Keeps a picture of the page and sees that it does not scroll sideways. */
export async function fitsTheWindow(page: Page, name: string): Promise<void> {
  await page.waitForLoadState('load');
  // What sticks to the foot of the window must not lie over what is looked at.
  await page.evaluate(() => window.scrollTo(0, 0));
  await page.screenshot({ path: `test-results/screens/${name}.png`, fullPage: true });
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect.soft(overflow, `${name}: the page scrolls sideways by so many pixels`).toBeLessThanOrEqual(1);
}
