import { checked, EXAMPLES, exampleText } from './expected';
import { expect, test } from './page';

test('every example is in the page before any script runs, with its line and its verdict', async ({
  browser,
  baseURL
}) => {
  const page = await browser.newPage({ javaScriptEnabled: false });
  await page.goto(baseURL!);
  const cards = page.getByRole('region', { name: 'Examples' }).getByRole('listitem');
  await expect(cards).toHaveCount(EXAMPLES.length);
  for (const [i, { file, title, about }] of EXAMPLES.entries()) {
    const { holds } = checked(exampleText(file));
    await expect(cards.nth(i).getByRole('link')).toHaveText(title);
    await expect(cards.nth(i).locator('p')).toHaveText(`${about} ${holds ? 'Holds.' : 'Does not hold.'}`);
    const href = await cards.nth(i).getByRole('link').getAttribute('href');
    expect(new URL(href!, page.url()).href).toBe(`${baseURL}plan/?example=${file}`);
  }
  await expect(page.locator('noscript p')).toHaveText(/needs JavaScript switched on/);
  await page.close();
});

test('the examples show both verdicts', () => {
  const holds = EXAMPLES.map(({ file }) => checked(exampleText(file)).holds);
  expect(new Set(holds)).toEqual(new Set([true, false]));
});
