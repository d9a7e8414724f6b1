/** The shelf page in a browser: what its tests look at and do. */
import { execFileSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import type { Page } from '@playwright/test';

export const plans = (page: Page) => page.getByRole('list', { name: 'Plans' });
export const titles = (page: Page) => plans(page).getByRole('heading');
export const welcome = (page: Page) => page.getByRole('heading', { name: /before you cut the wood/ });

export const file = (name: string, content: string | Buffer) => ({
  name,
  mimeType: 'application/json',
  buffer: Buffer.from(content)
});

export const pick = (page: Page, ...files: ReturnType<typeof file>[]) =>
  page.getByLabel('Plan files').setInputFiles(files);

/** Opens the menu of a plan and chooses. */
export async function choose(page: Page, title: string, word: string): Promise<void> {
  await page.getByRole('button', { name: `More for ${title}`, exact: true }).click();
  await page.getByRole('button', { name: `${word} ${title}`, exact: true }).click();
}

/** What the built command line says of a file that is no plan: a line a problem. */
export function refusal(text: string): string[] {
  const cli = fileURLToPath(new URL('../../dist/cli.js', import.meta.url));
  try {
    execFileSync(process.execPath, [cli, 'check', '-'], { input: text, stdio: ['pipe', 'pipe', 'pipe'] });
  } catch (trouble) {
    const { status, stderr } = trouble as { status: number; stderr: Buffer };
    if (status !== 2) throw trouble;
    return stderr
      .toString()
      .trimEnd()
      .split('\n')
      .map((line) => line.replace(/^standard input: /, ''));
  }
  throw new Error('the command line takes this file for a plan');
}
