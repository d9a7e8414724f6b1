import type { LaunchOptions } from '@playwright/test';
import { findBrowser } from '../../scripts/find-browser.mjs';

const QUIET = [
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync'
];

/** How to start the machine's Chromium: Playwright's own needs no path, and as root no sandbox is to be had. */
export function chromiumLaunch(): LaunchOptions {
  const browser = findBrowser();
  if (!browser) throw new Error('no Chromium or Chrome found: run "node scripts/ensure-browser.mjs"');
  const args = [...(process.getuid?.() === 0 ? ['--no-sandbox'] : []), ...QUIET];
  return browser.origin === 'playwright' ? { args } : { args, executablePath: browser.path };
}
