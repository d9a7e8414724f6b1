import { readFileSync } from 'node:fs';
import { unzipSync } from 'fflate';
import { checked, EXAMPLES, exampleText } from './expected';
import { expect, openApp, test } from './page';
import { choose, file, pick, plans, refusal, titles, welcome } from './shelf';

const FIRST = exampleText(EXAMPLES[0].file);
const changed = (
  change: (plan: { title: string; goal: { level_dB: unknown }; [key: string]: unknown }) => void
) => {
  const plan = JSON.parse(FIRST);
  change(plan);
  return JSON.stringify(plan);
};
const called = (title: string) => changed((plan) => (plan.title = title));
const BROKEN = changed((plan) => {
  plan.goal.level_dB = 'loud';
  plan.seatt = {};
});

test('imported plans show the verdict of the command line and are there on the next visit', async ({
  page
}) => {
  await openApp(page);
  await expect(welcome(page)).toBeVisible();
  const holds = EXAMPLES.find(({ file: name }) => checked(exampleText(name)).holds)!;
  const over = EXAMPLES.find(({ file: name }) => !checked(exampleText(name)).holds)!;
  for (const { file: name } of [holds, over]) await pick(page, file(name, exampleText(name)));
  await expect(titles(page)).toHaveText([over.title, holds.title]);

  await page.reload();
  await expect(titles(page)).toHaveText([over.title, holds.title]);
  for (const { file: name, title } of [holds, over]) {
    const { sentence } = checked(exampleText(name));
    const row = plans(page).getByRole('listitem').filter({ hasText: title });
    const said = (await row.locator('p').first().innerText()).trim();
    expect(said.length).toBeGreaterThan(20);
    expect(sentence.startsWith(said)).toBe(true);
    await expect(row.locator('time')).toHaveText(/^(today|yesterday) \d\d:\d\d$/);
    await expect(row.getByRole('link')).toHaveAttribute('href', /\/plan\/\?id=[0-9a-f]{32}$/);
  }
});

test('of several files dropped at once the plans are stored, the others explained as on the command line', async ({
  page
}) => {
  await openApp(page);
  const transfer = await page.evaluateHandle(
    (files) => {
      const data = new DataTransfer();
      for (const [name, text] of files) data.items.add(new File([text], name, { type: 'application/json' }));
      return data;
    },
    [
      ['den.json', called('Den')],
      ['broken.json', BROKEN],
      ['shopping.json', 'two sheets of birch'],
      ['shed.json', called('Shed')]
    ] as const
  );
  await page.dispatchEvent('body', 'dragover', { dataTransfer: transfer });
  await expect(page.getByText('Drop plan files to put them on the shelf')).toBeVisible();
  await page.dispatchEvent('main', 'drop', { dataTransfer: transfer });
  await expect(page.getByText('Drop plan files to put them on the shelf')).toHaveCount(0);
  await expect(titles(page)).toHaveText(['Shed', 'Den']);

  const alert = page.getByRole('alert');
  await expect(alert.getByRole('heading', { level: 3 })).toHaveText(['broken.json', 'shopping.json']);
  await expect(alert.getByRole('listitem')).toHaveText([
    ...refusal(BROKEN),
    ...refusal('two sheets of birch')
  ]);
  await expect(alert).not.toContainText(/error|exception|undefined/i);

  // Mended under the same name, the file is taken and the problems are gone.
  await pick(page, file('broken.json', called('Mended')));
  await expect(titles(page)).toHaveText(['Mended', 'Shed', 'Den']);
  await expect(alert).toHaveCount(0);
  await page.reload();
  await expect(titles(page)).toHaveText(['Mended', 'Shed', 'Den']);
});

test('a deleted plan comes back with Undo, and on a later visit from the deleted ones', async ({ page }) => {
  await openApp(page);
  await pick(page, file('den.json', called('Den')), file('shed.json', called('Shed')));
  await choose(page, 'Den', 'Delete');
  await expect(page.getByRole('button', { name: 'Undo' })).toBeFocused();
  await expect(titles(page)).toHaveText(['Shed']);
  await page.keyboard.press('Enter');
  await expect(page.getByRole('link', { name: 'Den', exact: true })).toBeFocused();
  await expect(titles(page)).toHaveText(['Shed', 'Den']);

  await choose(page, 'Shed', 'Delete');
  await expect(titles(page)).toHaveText(['Den']);
  await page.reload();
  await expect(page.getByRole('button', { name: 'Undo' })).toHaveCount(0);
  await page.getByText('Deleted plans (1)').click();
  await page.getByRole('button', { name: 'Put back Shed' }).click();
  await expect(titles(page)).toHaveText(['Shed', 'Den']);
});

test('a plan, and all of them, leave as files that can be imported again', async ({ page }) => {
  await openApp(page);
  await pick(page, file('den.json', called('Den')), file('shed.json', called('Shed')));
  await expect(titles(page)).toHaveCount(2);
  const one = page.waitForEvent('download');
  await choose(page, 'Den', 'Export');
  expect((await one).suggestedFilename()).toBe('den.sealwright.json');
  const text = readFileSync(await (await one).path(), 'utf8');
  expect(JSON.parse(text)).toEqual(JSON.parse(called('Den')));

  const all = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export all' }).click();
  expect((await all).suggestedFilename()).toMatch(/^sealwright-plans-\d{4}-\d\d-\d\d\.zip$/);
  const zip = unzipSync(new Uint8Array(readFileSync(await (await all).path())));
  expect(Object.keys(zip).sort()).toEqual(['den.sealwright.json', 'shed.sealwright.json']);
  expect(Buffer.from(zip['den.sealwright.json']).toString()).toBe(text);
});

test('what one tab does, another shows', async ({ page, context }) => {
  await openApp(page);
  const other = await context.newPage();
  await openApp(other);
  await pick(page, file('den.json', called('Den')));
  await expect(titles(other)).toHaveText(['Den']);
  await choose(other, 'Den', 'Rename');
  await other.keyboard.type('Snug');
  await other.keyboard.press('Enter');
  await expect(titles(page)).toHaveText(['Snug']);
  await choose(page, 'Snug', 'Delete');
  await expect(welcome(other)).toBeVisible();
});

test('words of titles and notes find plans', async ({ page }) => {
  await openApp(page);
  const noted = changed((plan) => {
    plan.title = 'Shed';
    plan.notes = 'For the Saturday people';
  });
  await pick(page, file('den.json', called('Den')), file('shed.json', noted));
  await expect(titles(page)).toHaveCount(2);
  await page.getByRole('searchbox').fill('saturday');
  await expect(titles(page)).toHaveText(['Shed']);
  await expect(page.getByText('1 of 2')).toBeVisible();
  await page.getByRole('searchbox').fill('');
  await expect(titles(page)).toHaveCount(2);
});

test('where the browser stores nothing, the page says so and works all the same', async ({ page }) => {
  await page.addInitScript(() => {
    Object.defineProperty(window, 'indexedDB', { value: undefined });
    Object.defineProperty(window, 'localStorage', {
      get: () => {
        throw new DOMException('no', 'SecurityError');
      }
    });
  });
  await openApp(page);
  await expect(page.getByText(/Plans are kept until this page is closed/)).toBeVisible();
  await pick(page, file('den.json', called('Den')));
  await expect(titles(page)).toHaveText(['Den']);
  const all = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export all plans' }).click();
  expect((await all).suggestedFilename()).toMatch(/\.zip$/);
  await page.getByRole('button', { name: /^Theme/ }).click();
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'light');
});

test('nothing is stored before there is something to store, and nothing leaves this machine', async ({
  page,
  context,
  baseURL
}) => {
  const requests: string[] = [];
  context.on('request', (request) => requests.push(request.url()));
  await openApp(page);
  await expect(welcome(page)).toBeVisible();
  await pick(page, file('den.json', called('Den')));
  await expect(titles(page)).toHaveText(['Den']);
  expect(requests.filter((url) => !url.startsWith(baseURL!) && !url.startsWith('data:'))).toEqual([]);
  expect(await page.evaluate(() => localStorage.length)).toBe(0);
  expect(await context.cookies()).toEqual([]);
});
