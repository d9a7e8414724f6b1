import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

const TAGS = ['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'];

export const SIZES = [
  { width: 1440, height: 900 },
  { width: 1024, height: 768 },
  { width: 390, height: 844 }
];

/** Rules the page breaks, each with what breaks it. */
export async function violations(page: Page): Promise<string[]> {
  const { violations: found, passes } = await new AxeBuilder({ page }).withTags(TAGS).analyze();
  expect(passes.length).toBeGreaterThan(10);
  return found.map((violation) => `${violation.id}: ${violation.nodes.map((node) => node.html).join(' ')}`);
}

/** The page may scroll down, never sideways: px beyond its width. */
export const sideways = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
