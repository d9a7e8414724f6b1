import { checked, EXAMPLES, exampleText } from './expected';
import { expect, openApp, test, verdict } from './page';

test('the page is walked, a plan chosen and the ledger scrolled with the keyboard alone', async ({
  page
}) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await openApp(page);
  const focused = page.locator(':focus');
  const ring = () => focused.evaluate((el) => getComputedStyle(el).outlineStyle);

  await page.keyboard.press('Tab');
  await expect(focused).toHaveText('Skip to the verdict');
  await expect(focused).toBeInViewport();

  await page.keyboard.press('Tab');
  await expect(focused).toHaveAttribute('id', 'example');
  expect(await ring()).toBe('solid');
  await page.keyboard.press('ArrowDown');
  await expect(verdict(page)).toHaveText(checked(exampleText(EXAMPLES[1].file)).sentence);

  await page.keyboard.press('Tab');
  await expect(focused).toHaveAttribute('id', 'file');
  expect(await ring()).toBe('solid');

  await page.keyboard.press('Tab');
  await expect(focused).toHaveText('Peaks and other watts');
  const detail = page.getByText('Apparent power');
  await expect(detail).toBeHidden();
  await page.keyboard.press('Enter');
  await expect(detail).toBeVisible();
  expect(await ring()).toBe('solid');

  await page.keyboard.press('Tab');
  await expect(focused).toHaveAttribute('role', 'region');
  expect(await ring()).toBe('solid');
  expect(await focused.evaluate((el) => el.scrollLeft)).toBe(0);
  await page.keyboard.press('ArrowRight');
  await expect.poll(() => focused.evaluate((el) => el.scrollLeft)).toBeGreaterThan(0);
});

test('the skip link leads past the chooser', async ({ page }) => {
  await openApp(page);
  await page.keyboard.press('Tab');
  await page.keyboard.press('Enter');
  await expect(page.locator('#verdict')).toBeFocused();
  await page.keyboard.press('Tab');
  await expect(page.locator(':focus')).toHaveText('Peaks and other watts');
});
