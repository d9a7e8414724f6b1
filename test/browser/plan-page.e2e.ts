import { readFileSync } from 'node:fs';
import type { Locator, Page } from '@playwright/test';
import { SIZES, sideways, violations } from './accessible';
import { checked, EXAMPLES, exampleText } from './expected';
import { expect, openApp, plain, test } from './page';

const example = (name: string, view = '') =>
  `plan/?example=${name}.sealwright.json${view && `&view=${view}`}`;
const sentence = (page: Page): Locator => page.locator('.verdict [role=status]');
const undo = (page: Page) => page.getByRole('button', { name: /^Undo/ });
const redo = (page: Page) => page.getByRole('button', { name: /^Redo/ });
const saved = (page: Page) => page.locator('header [role=status]');
const cursor = (page: Page) => page.getByRole('slider', { name: 'Cursor frequency' }).first();
const station = (page: Page, name: string) => page.getByRole('button', { name: new RegExp(`^${name}`) });
const fresh = (page: Page) => page.locator('.findings[aria-busy=false]');

async function openExample(page: Page, name: string, view = ''): Promise<void> {
  await openApp(page, example(name, view));
  await expect(sentence(page)).toBeVisible();
}

for (const { file } of EXAMPLES) {
  test(`${file}: the page says what the command line says`, async ({ page }) => {
    const told = checked(exampleText(file));
    await openApp(page, `plan/?example=${file}`);
    await expect(sentence(page)).toContainText(told.sentence.slice(0, 40));
    expect(plain((await sentence(page).textContent()) ?? '')).toBe(told.sentence);
    const rows = page.locator('section[aria-labelledby=ledger-title] tbody tr');
    await expect(rows).toHaveCount(told.ledger.length);
    for (const [i, { delivered_dB }] of told.ledger.entries())
      await expect(rows.nth(i)).toContainText(delivered_dB.toFixed(1).replace('-', '−'));
    const spoken = plain((await page.locator('main').textContent()) ?? '');
    for (const { text } of told.findings) expect(spoken).toContain(plain(text));
    if (told.findings.some((f) => f.ways_out.length > 0)) {
      await expect(fresh(page)).toBeVisible();
      const after = plain((await page.locator('main').textContent()) ?? '');
      for (const { act } of told.findings.flatMap((f) => f.ways_out as unknown as { act: string }[]))
        expect(after).toContain(plain(act));
    }
  });
}

test('change the driver, take a way out, undo, reload: all there', async ({ page }) => {
  await openExample(page, 'film-den');
  await expect(saved(page)).toHaveText(/Example/);
  await station(page, 'Driver').click();
  const xmax = page.getByRole('textbox', { name: /Xmax/ });
  await xmax.fill('15');
  await xmax.press('Enter');
  await expect(sentence(page)).toContainText('of its 15 mm');
  await expect(page).toHaveURL(/\?id=/);
  await expect(saved(page)).toHaveText(/^Saved/);

  await expect(fresh(page)).toBeVisible();
  await page.locator('.ways button').first().click();
  await expect(sentence(page)).toContainText('Holds');
  await undo(page).click();
  await expect(sentence(page)).toContainText('Does not hold');
  await redo(page).click();
  await expect(sentence(page)).toContainText('Holds');
  const before = await sentence(page).textContent();
  await expect(saved(page)).toHaveText(/^Saved/);

  await page.reload();
  await expect(sentence(page)).toHaveText(plain(before ?? ''));
  await undo(page).click();
  await expect(sentence(page)).toContainText('of its 15 mm');
  await undo(page).click();
  await expect(sentence(page)).toContainText('of its 16 mm');
  await expect(undo(page)).toBeDisabled();
  // The keys do the same.
  await page.locator('main').focus();
  await page.keyboard.press('Control+Shift+z');
  await expect(sentence(page)).toContainText('of its 15 mm');
  await page.keyboard.press('Control+z');
  await expect(sentence(page)).toContainText('of its 16 mm');
});

test('what is exported is the plan, and the command line says of it what the page says', async ({ page }) => {
  await openExample(page, 'loft-corner');
  await station(page, 'Programme').click();
  const level = page.getByLabel('Level', { exact: true });
  await level.fill('111');
  await level.press('Enter');
  await expect(sentence(page)).toContainText('Does not hold');
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export' }).first().click();
  const path = await (await download).path();
  const told = checked(readFileSync(path, 'utf8'));
  expect(plain((await sentence(page).textContent()) ?? '')).toBe(told.sentence);
});

test('the cursor by keys: account, plots and ledger follow', async ({ page }) => {
  await openExample(page, 'film-den');
  await cursor(page).focus();
  const before = await cursor(page).getAttribute('aria-valuetext');
  await page.keyboard.press('Home');
  await expect(page.locator('.account output')).toHaveText('10 Hz');
  await page.keyboard.press('Shift+ArrowRight');
  await expect(page.locator('.account output')).toHaveText('12.6 Hz');
  await expect(page.locator('tr[aria-current=true] th')).toContainText('12.5');
  expect(await cursor(page).getAttribute('aria-valuetext')).not.toBe(before);
  await expect(undo(page)).toBeDisabled();
});

test('the level handle: keys, mouse and touch write the plan, one entry a drag', async ({ page }) => {
  await openExample(page, 'film-den', 'level');
  const handle = page.getByRole('slider').first();
  await expect(handle).toBeVisible();
  await handle.focus();
  await page.keyboard.press('ArrowLeft');
  await expect(undo(page)).toBeEnabled();
  await undo(page).click();
  await expect(undo(page)).toBeDisabled();

  const box = await handle.boundingBox();
  if (box === null) throw new Error('the handle has no place');
  const y = box.y + box.height / 3;
  await page.mouse.move(box.x + box.width / 2, y);
  await page.mouse.down();
  for (let i = 1; i <= 6; i++) await page.mouse.move(box.x + box.width / 2 - 20 * i, y);
  await page.mouse.up();
  await expect(undo(page)).toBeEnabled();
  await undo(page).click();
  await expect(undo(page)).toBeDisabled();
  await expect(sentence(page)).toContainText('110 dB is wanted');
});

test('a new plan: the chain with dashes, the data sheet, a verdict', async ({ page }) => {
  await openApp(page, 'plan/?new');
  await page.getByRole('button', { name: 'Give the driver' }).click();
  const sheet = { fs: '24', Qms: '5', Qes: '0.45', Vas: '90', Re: '5.8', Sd: '500', 'Xmax, one way': '12' };
  for (const [label, value] of Object.entries(sheet)) {
    const field = page.getByLabel(label, { exact: true });
    await field.fill(value);
    await field.press('Enter');
  }
  await page.getByRole('button', { name: 'Work it through' }).click();
  await expect(sentence(page)).toContainText(/Holds|Does not hold/);
  await expect(page).toHaveURL(/\?id=/);
  await page.reload();
  await expect(sentence(page)).toContainText(/Holds|Does not hold/);
});

test('markup in names stays text: nothing runs, nothing is asked of another origin', async ({ page }) => {
  const asked: string[] = [];
  page.on('request', (request) => asked.push(new URL(request.url()).origin));
  const evil = '<img src=x onerror=document.title="ran"><script>document.title="ran"</script>';
  const plan = JSON.parse(exampleText('loft-corner.sealwright.json'));
  plan.title = evil;
  plan.notes = evil;
  plan.driver.label = evil;
  plan.shaping[0].label = evil;
  await openApp(page);
  await page
    .locator('input[type=file]')
    .first()
    .setInputFiles({
      name: 'evil.json',
      mimeType: 'application/json',
      buffer: Buffer.from(JSON.stringify(plan))
    });
  await page.getByRole('link', { name: evil }).first().click();
  await expect(sentence(page)).toBeVisible();
  for (const name of ['Filters and EQ', 'Driver']) await station(page, name).click();
  await expect(page).toHaveTitle(`${evil} – Sealwright`);
  expect(await page.locator('main img, main script').count()).toBe(0);
  expect([...new Set(asked)]).toEqual([new URL(page.url()).origin]);
});

test('an unknown address says so; nothing is lost', async ({ page }) => {
  await openApp(page, 'plan/?id=nobody');
  await expect(page.getByRole('heading', { name: 'There is no such plan on this device' })).toBeVisible();
});

test('printed, it is the plan with its cautions, without the tools', async ({ page }) => {
  await openExample(page, 'film-den');
  await page.emulateMedia({ media: 'print' });
  await expect(page.getByRole('heading', { name: 'Before you build' })).toBeVisible();
  await expect(page.locator('header')).toBeHidden();
  const pdf = await page.pdf({ format: 'A4' });
  expect(pdf.subarray(0, 4).toString()).toBe('%PDF');
  expect(pdf.length).toBeGreaterThan(20_000);
});

for (const colorScheme of ['light', 'dark'] as const) {
  for (const viewport of SIZES) {
    test.describe(`${colorScheme}, ${viewport.width} wide`, () => {
      test.use({ colorScheme, viewport });

      test('the plan page passes every rule in its main states, and nothing is wider than the page', async ({
        page
      }) => {
        for (const view of ['', 'volume', 'amplifier', 'level']) {
          await openExample(page, 'film-den', view);
          if (view === '') {
            await expect(fresh(page)).toBeVisible();
            await station(page, 'Driver').click();
            await expect(page.getByRole('textbox', { name: /Xmax/ })).toBeVisible();
          } else await expect(page.getByRole('slider').first()).toBeVisible();
          expect(await violations(page)).toEqual([]);
          expect(await sideways(page)).toBeLessThanOrEqual(0);
        }
      });
    });
  }
}
