import { test as base, expect, type Page } from '@playwright/test';

/** A page that fails its test when the console shows an error, a script throws, a request fails or the policy is violated. */
export const test = base.extend<{ quiet: string[] }>({
  quiet: [
    async ({ page }, use) => {
      const noise: string[] = [];
      page.on('console', (message) => {
        if (message.type() === 'error' || message.type() === 'warning')
          noise.push(`console: ${message.text()}`);
      });
      page.on('pageerror', (error) => noise.push(`thrown: ${error.message}`));
      page.on('requestfailed', (request) => noise.push(`failed: ${request.url()}`));
      page.on('response', (response) => {
        if (response.status() >= 400) noise.push(`${response.status()}: ${response.url()}`);
      });
      await page.exposeFunction('tellViolation', (text: string) => noise.push(`policy: ${text}`));
      await page.addInitScript(() => {
        const tell = (window as unknown as { tellViolation: (text: string) => void }).tellViolation;
        document.addEventListener('securitypolicyviolation', (e) =>
          tell(`${e.violatedDirective} ${e.blockedURI} ${e.sample}`)
        );
      });
      await use(noise);
      expect(noise).toEqual([]);
    },
    { auto: true }
  ]
});

export { expect };

/** Opens the app and waits until it answers: the page is readable before, but its controls are not live. */
export async function openApp(page: Page, address = '/'): Promise<void> {
  await page.goto(address);
  await expect(page.locator('html')).toHaveAttribute('data-live', '');
}

export const verdict = (page: Page) => page.getByRole('status');

/** Text as it reads, runs of white space as one. */
export const plain = (text: string): string => text.replace(/\s+/g, ' ').trim();
