import type { Page } from '@playwright/test';
import { SIZES, sideways, violations } from './accessible';
import { EXAMPLES, exampleText } from './expected';
import { expect, openApp, test } from './page';
import { choose, file, pick, titles, welcome } from './shelf';

async function inOrder(page: Page): Promise<void> {
  expect(await violations(page)).toEqual([]);
  expect(await sideways(page)).toBeLessThanOrEqual(0);
}

for (const colorScheme of ['light', 'dark'] as const) {
  for (const viewport of SIZES) {
    test.describe(`${colorScheme}, ${viewport.width} wide`, () => {
      test.use({ colorScheme, viewport });

      test('the shelf, empty and full, passes every rule, and nothing is wider than the page', async ({
        page
      }) => {
        await openApp(page);
        await expect(welcome(page)).toBeVisible();
        await inOrder(page);

        const long = JSON.stringify({
          ...JSON.parse(exampleText(EXAMPLES[0].file)),
          title: 'Averylongword'.repeat(9)
        });
        await pick(
          page,
          ...EXAMPLES.map((example) => file(example.file, exampleText(example.file))),
          file('long.json', long),
          file(`${'a-very-long-name-'.repeat(8)}.json`, '{"format":"sealwright-plan","version":1}')
        );
        await expect(titles(page)).toHaveCount(EXAMPLES.length + 1);
        await expect(page.getByRole('alert')).toBeVisible();
        await choose(page, EXAMPLES[1].title, 'Delete');
        await page.getByText('Deleted plans (1)').click();
        await page.getByRole('button', { name: `More for ${EXAMPLES[0].title}`, exact: true }).click();
        await inOrder(page);

        if (viewport.width < 720) {
          await page.keyboard.press('Escape');
          await page.getByRole('button', { name: 'Menu' }).click();
          await expect(page.getByRole('dialog')).toBeVisible();
          await inOrder(page);
        }
      });
    });
  }
}

test('the page follows the system into the dark, and a theme chosen overrides it, on the next visit too', async ({
  page
}) => {
  const paper = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
  const theme = page.getByRole('button', { name: /^Theme/ });
  await page.emulateMedia({ colorScheme: 'light' });
  await openApp(page);
  const light = await paper();
  await page.emulateMedia({ colorScheme: 'dark' });
  const dark = await paper();
  expect(dark).not.toBe(light);
  await theme.click();
  await expect(theme).toHaveAccessibleName('Theme: Light');
  expect(await paper()).toBe(light);
  await page.reload();
  expect(await paper()).toBe(light);
  await expect(theme).toHaveAccessibleName('Theme: Light');
  await page.emulateMedia({ colorScheme: 'light' });
  await theme.click();
  expect(await paper()).toBe(dark);
  await theme.click();
  expect(await paper()).toBe(light);
  await expect(page.locator('html')).not.toHaveAttribute('data-theme');
});
