import { EXAMPLES, exampleText } from './expected';
import { expect, openApp, test } from './page';
import { serveUnder } from './serve-under';
import { choose, file, pick, titles } from './shelf';

test('the app works from a folder of any static server', async ({ page, context }) => {
  const server = await serveUnder('/some/where/');
  try {
    const requests: string[] = [];
    context.on('request', (request) => requests.push(request.url()));
    await openApp(page, server.address);
    const { file: name, title } = EXAMPLES[1];
    await pick(page, file(name, exampleText(name)));
    await expect(titles(page)).toHaveText([title]);
    const all = page.waitForEvent('download');
    await choose(page, title, 'Export');
    expect((await all).suggestedFilename()).toMatch(/\.sealwright\.json$/);
    const links = await page
      .getByRole('main')
      .getByRole('link')
      .evaluateAll((found) => found.map((link) => (link as HTMLAnchorElement).href));
    expect(links).toHaveLength(EXAMPLES.length + 2);
    expect(links.filter((href) => !href.startsWith(`${server.address}plan/?`))).toEqual([]);
    expect(requests).toContain(`${server.address}theme.js`);
    expect(requests.filter((url) => !url.startsWith(server.address) && !/^(data|blob):/.test(url))).toEqual(
      []
    );

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
