import { checked, EXAMPLES, exampleText } from './expected';
import { expect, openApp, test, verdict } from './page';
import { serveUnder } from './serve-under';

test('the app works from a folder of any static server', async ({ page, context }) => {
  const server = await serveUnder('/some/where/');
  try {
    const requests: string[] = [];
    context.on('request', (request) => requests.push(request.url()));
    await openApp(page, server.address);
    const { file } = EXAMPLES[1];
    await page.getByRole('combobox').selectOption(file);
    await expect(verdict(page)).toHaveText(checked(exampleText(file)).sentence);
    expect(requests).toContain(`${server.address}examples/${file}`);
    expect(requests.filter((url) => !url.startsWith(server.address) && !url.startsWith('data:'))).toEqual([]);

    const manifest = await page
      .locator('link[rel="manifest"]')
      .evaluate((link: HTMLLinkElement) => link.href);
    const icons = await page.evaluate(async (address) => {
      const found = (await (await fetch(address)).json()) as { icons: { src: string }[] };
      return Promise.all(found.icons.map(async ({ src }) => (await fetch(new URL(src, address))).status));
    }, manifest);
    expect(icons.length).toBeGreaterThan(0);
    expect(icons.every((status) => status === 200)).toBe(true);
  } finally {
    await server.close();
  }
});
