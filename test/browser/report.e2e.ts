import type { Page } from '@playwright/test';
import { checked, EXAMPLES, exampleText, type Checked } from './expected';
import { expect, openApp, plain, test, verdict } from './page';

/** The page against the command line's report of the same plan. */
async function expectReport(page: Page, report: Checked): Promise<void> {
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(report.title);
  await expect(page).toHaveTitle(`${report.title} – Sealwright`);
  await expect(verdict(page)).toHaveText(report.sentence);
  await expect(verdict(page).locator('strong')).toHaveText(report.holds ? /^Holds/ : /^Does not hold/);

  const findings = page.locator('.findings > li');
  await expect(findings).toHaveCount(report.findings.length);
  for (const { text, ways_out } of report.findings) {
    const item = findings.filter({ hasText: plain(text) });
    await expect(item.locator('.text')).toHaveText(text);
    await expect(item.locator('.ways li')).toHaveText(ways_out.map((way) => way.text));
  }

  await expect(page.locator('dt', { hasText: 'Qtc' }).locator('xpath=following-sibling::dd')).toHaveText(
    report.alignment.qtc.toFixed(2)
  );
  const rows = page.getByRole('region', { name: /ledger/i }).locator('tbody tr');
  await expect(rows).toHaveCount(report.ledger.length);
  const shown = await rows.evaluateAll((lines) =>
    lines.map((line) => [
      line.querySelector('th')?.textContent ?? '',
      line.querySelector('.strong')?.textContent ?? ''
    ])
  );
  expect(shown.map(([band, seat]) => [Number(band), Number(seat)])).toEqual(
    report.ledger.map((row) => [row.nominal_Hz, Number(row.delivered_dB.toFixed(1))])
  );
  await expect(page.locator('section[aria-labelledby="cautions-title"] li')).toHaveCount(
    report.cautions.length
  );
}

test('the page shows what the engine finds for the first example', async ({ page }) => {
  await openApp(page);
  await expectReport(page, checked(exampleText(EXAMPLES[0].file)));
});

test('the verdict is in the page before any script runs', async ({ browser, baseURL }) => {
  const page = await browser.newPage({ javaScriptEnabled: false });
  await page.goto(baseURL!);
  await expect(verdict(page)).toHaveText(checked(exampleText(EXAMPLES[0].file)).sentence);
  await page.close();
});

test('every other example can be chosen, and the first one again', async ({ page }) => {
  await openApp(page);
  const select = page.getByRole('combobox', { name: 'Example plan' });
  await expect(select.locator('option')).toHaveText(EXAMPLES.map((example) => example.title));
  expect(EXAMPLES.length).toBeGreaterThan(1);
  for (const { file, about } of [...EXAMPLES.slice(1), EXAMPLES[0]]) {
    await select.selectOption(file);
    await expectReport(page, checked(exampleText(file)));
    await expect(page.getByText(about)).toBeVisible();
  }
});

test('the examples show both verdicts', () => {
  const holds = EXAMPLES.map(({ file }) => checked(exampleText(file)).holds);
  expect(new Set(holds)).toEqual(new Set([true, false]));
});
