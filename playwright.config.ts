import { defineConfig } from '@playwright/test';
import { chromiumLaunch } from './test/browser/chromium-path';
import { freePort } from './test/browser/free-port';

// The first process to read this file picks the port; its workers inherit it.
const port = (process.env.SEALWRIGHT_TEST_PORT ??= String(await freePort()));
const baseURL = `http://127.0.0.1:${port}/`;

export default defineConfig({
  testDir: 'test/browser',
  testMatch: '**/*.e2e.ts',
  outputDir: 'test-results/browser',
  reporter: [['list'], ['json', { outputFile: 'test-results/browser.json' }]],
  workers: 1,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  retries: 0,
  forbidOnly: true,
  use: { baseURL, launchOptions: chromiumLaunch() },
  webServer: {
    command: `node scripts/start.mjs --no-build --port ${port}`,
    url: baseURL,
    reuseExistingServer: false,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 5_000 }
  }
});
