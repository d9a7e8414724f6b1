import { EXAMPLES, exampleText } from './expected';
import { expect, openApp, test } from './page';
import { file, pick, titles, welcome } from './shelf';

test.use({ viewport: { width: 390, height: 844 } });

test('with the keyboard alone: past the header, rename, copy, delete and take back', async ({ page }) => {
  await openApp(page);
  await pick(page, ...EXAMPLES.slice(0, 2).map((example) => file(example.file, exampleText(example.file))));
  const [first, second] = [EXAMPLES[1].title, EXAMPLES[0].title];
  await expect(titles(page)).toHaveText([first, second]);
  await page.reload();
  await expect(page.locator('html')).toHaveAttribute('data-live', '');
  await expect(titles(page)).toHaveText([first, second]);

  const focused = page.locator(':focus');
  const press = (...keys: string[]) =>
    keys.reduce((done, key) => done.then(() => page.keyboard.press(key)), Promise.resolve());
  const ring = () => focused.evaluate((el) => getComputedStyle(el).outlineStyle);

  await press('Tab');
  await expect(focused).toHaveText('Skip to the plans');
  await expect(focused).toBeInViewport();
  await press('Enter');
  await expect(page.locator('#main')).toBeFocused();
  await press('Tab');
  await expect(focused).toHaveRole('searchbox');
  await press('Tab');
  await expect(focused).toHaveText('New plan');
  await press('Tab');
  await expect(focused).toHaveText('Import files');
  await press('Tab', 'Tab');
  await expect(focused).toHaveText(first);
  expect(await ring()).toBe('solid');

  await press('Tab');
  await expect(focused).toHaveAccessibleName(`More for ${first}`);
  await press('Enter', 'Tab', 'Enter');
  await expect(focused).toHaveAccessibleName(`Title of ${first}`);
  await page.keyboard.type('Snug');
  await press('Enter');
  await expect(focused).toHaveText('Snug');
  await expect(titles(page)).toHaveText(['Snug', second]);

  await press('Tab', 'Enter', 'Tab', 'Tab', 'Enter');
  await expect(focused).toHaveText('Snug (copy)');
  await expect(titles(page)).toHaveText(['Snug (copy)', 'Snug', second]);

  await press('Tab', 'Enter', 'Tab', 'Tab', 'Tab', 'Tab', 'Enter');
  await expect(focused).toHaveText('Undo');
  expect(await ring()).toBe('solid');
  await expect(titles(page)).toHaveText(['Snug', second]);
  await press('Enter');
  await expect(focused).toHaveText('Snug (copy)');
  await expect(titles(page)).toHaveCount(3);
});

test('the menu holds the focus, closes on Escape and gives it back', async ({ page }) => {
  await openApp(page);
  await expect(welcome(page)).toBeVisible();
  const menu = page.getByRole('button', { name: 'Menu' });
  const focused = page.locator(':focus');
  await menu.focus();
  await page.keyboard.press('Enter');
  const dialog = page.getByRole('dialog', { name: 'Menu' });
  await expect(dialog).toBeVisible();
  for (let i = 0; i < 6; i++) {
    await page.keyboard.press('Tab');
    // Beyond the last control the focus goes to the browser's own bar, never to the page behind.
    expect(await page.evaluate(() => document.activeElement?.closest('dialog, body')?.tagName)).toBe(
      (await focused.count()) > 0 ? 'DIALOG' : 'BODY'
    );
  }
  await page.keyboard.press('Escape');
  await expect(dialog).toBeHidden();
  await expect(menu).toBeFocused();
});
