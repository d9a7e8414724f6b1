import type { Page } from '@playwright/test';
import type { Checked } from './expected';
import { expect, plain, verdict } from './page';

/** The page against the command line's report of the same plan. */
export async function expectReport(page: Page, report: Checked): Promise<void> {
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
