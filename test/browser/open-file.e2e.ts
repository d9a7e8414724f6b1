import type { Page } from '@playwright/test';
import { checked, EXAMPLES, exampleText } from './expected';
import { expect, openApp, test, verdict } from './page';

const FIRST = exampleText(EXAMPLES[0].file);
const changed = (
  change: (plan: { title: string; goal: { level_dB: unknown }; [key: string]: unknown }) => void
): string => {
  const plan = JSON.parse(FIRST);
  change(plan);
  return JSON.stringify(plan);
};

const QUIETER = changed((plan) => {
  plan.title = 'Quieter';
  plan.goal.level_dB = 88;
});
const BROKEN = changed((plan) => {
  plan.goal.level_dB = 'loud';
  plan.seatt = {};
});

const file = (name: string, text: string) => ({
  name,
  mimeType: 'application/json',
  buffer: Buffer.from(text)
});
const pick = (page: Page, name: string, text: string) =>
  page.getByLabel('Open a plan file').setInputFiles(file(name, text));

test('a good file is shown in place of the example', async ({ page }) => {
  await openApp(page);
  await pick(page, 'quieter.sealwright.json', QUIETER);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Quieter');
  await expect(verdict(page)).toHaveText(checked(QUIETER).sentence);
  await expect(page.getByRole('combobox')).toHaveValue('');
  await page.getByRole('combobox').selectOption(EXAMPLES[0].file);
  await expect(verdict(page)).toHaveText(checked(FIRST).sentence);
});

test('a file that is no plan lists its problems with their places and leaves the plan alone', async ({
  page
}) => {
  await openApp(page);
  const before = await verdict(page).innerText();
  await pick(page, 'broken.json', BROKEN);
  const alert = page.getByRole('alert');
  await expect(alert).toContainText('broken.json cannot be opened');
  await expect(alert.locator('li', { hasText: '/goal/level_dB:' })).toHaveCount(1);
  await expect(alert.locator('li', { hasText: 'seatt' })).toHaveCount(1);
  expect(await verdict(page).innerText()).toBe(before);

  // Mended under the same name, the file opens and the problems are gone.
  await pick(page, 'broken.json', QUIETER);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Quieter');
  await expect(alert).toHaveCount(0);
});

test('what is not even JSON is refused in words', async ({ page }) => {
  await openApp(page);
  await pick(page, 'shopping.json', 'two sheets of birch');
  await expect(page.getByRole('alert').locator('li')).toHaveCount(1);
  await expect(page.getByRole('alert')).not.toContainText(/error|exception|undefined/i);
});

test('a file is opened when it is dropped on the page', async ({ page }) => {
  await openApp(page);
  const transfer = await page.evaluateHandle((text) => {
    const data = new DataTransfer();
    data.items.add(new File([text], 'dropped.json', { type: 'application/json' }));
    return data;
  }, QUIETER);
  await page.dispatchEvent('main', 'drop', { dataTransfer: transfer });
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Quieter');
});

test('nothing is stored', async ({ page, context }) => {
  await openApp(page);
  await pick(page, 'quieter.sealwright.json', QUIETER);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Quieter');
  expect(
    await page.evaluate(async () => [localStorage.length, (await indexedDB.databases()).length])
  ).toEqual([0, 0]);
  expect(await context.cookies()).toEqual([]);
});
