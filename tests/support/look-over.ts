import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect } from './market.ts';

const standards = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** What must hold of any page: a title, one heading of the first rank, no way to scroll sideways, nothing axe objects to. */
export async function lookOver(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await expect(page.getByRole('heading', { level: 1 }), address).toHaveCount(1);
  await page.waitForLoadState('networkidle');
  expect.soft(await page.title(), address).toMatch(/\S · Lydite$/);
  const overflowPx = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect.soft(overflowPx, `${address} scrolls sideways`).toBe(0);
  const { violations } = await new AxeBuilder({ page }).withTags(standards).analyze();
  const found = violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => ({ id, target: target.join(' '), failureSummary })),
  );
  expect.soft(found, address).toEqual([]);
}
