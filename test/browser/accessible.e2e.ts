import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { checked, EXAMPLES, exampleText } from './expected';
import { expect, openApp, test } from './page';

const TAGS = ['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'];
const SIZES = [
  { width: 1440, height: 900 },
  { width: 1024, height: 768 },
  { width: 390, height: 844 }
];

const titleOf = (file: string): string => (JSON.parse(exampleText(file)) as { title: string }).title;

/** The example with the most to say: every kind of mark is on the page. */
const WORST = EXAMPLES.map(({ file }) => ({ file, count: checked(exampleText(file)).findings.length })).sort(
  (a, b) => b.count - a.count
)[0].file;

async function violations(page: Page): Promise<string[]> {
  const { violations: found, passes } = await new AxeBuilder({ page }).withTags(TAGS).analyze();
  expect(passes.length).toBeGreaterThan(10);
  return found.map((violation) => `${violation.id}: ${violation.nodes.map((node) => node.html).join(' ')}`);
}

/** The page may scroll down, never sideways. */
const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);

for (const colorScheme of ['light', 'dark'] as const) {
  for (const viewport of SIZES) {
    test.describe(`${colorScheme}, ${viewport.width} wide`, () => {
      test.use({ colorScheme, viewport });

      test('both verdicts and a refused file pass every rule, and nothing is wider than the page', async ({
        page
      }) => {
        await openApp(page);
        await page.getByText('Peaks and other watts').click();
        const rules = new Set([EXAMPLES[0].file, WORST]);
        for (const { file } of EXAMPLES) {
          await page.getByRole('combobox').selectOption(file);
          await expect(page.getByRole('heading', { level: 1 })).toHaveText(titleOf(file));
          expect(await sideways(page)).toBeLessThanOrEqual(0);
          if (rules.has(file)) expect(await violations(page)).toEqual([]);
        }
        await page.getByLabel('Open a plan file').setInputFiles({
          name: `${'a-very-long-name-'.repeat(8)}.json`,
          mimeType: 'application/json',
          buffer: Buffer.from('{"format":"sealwright-plan","version":1}')
        });
        await expect(page.getByRole('alert')).toBeVisible();
        expect(await violations(page)).toEqual([]);
        expect(await sideways(page)).toBeLessThanOrEqual(0);
      });
    });
  }
}

test('the page follows the system into the dark, and data-theme overrides it', async ({ page }) => {
  const paper = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
  await page.emulateMedia({ colorScheme: 'light' });
  await openApp(page);
  const light = await paper();
  await page.emulateMedia({ colorScheme: 'dark' });
  const dark = await paper();
  expect(dark).not.toBe(light);
  await page.evaluate(() => (document.documentElement.dataset.theme = 'light'));
  expect(await paper()).toBe(light);
  await page.emulateMedia({ colorScheme: 'light' });
  await page.evaluate(() => (document.documentElement.dataset.theme = 'dark'));
  expect(await paper()).toBe(dark);
});
