/**
 * Sees to it that the browser tests have a browser: one that exists is taken; else Playwright's own is fetched; else,
 * on Debian or Ubuntu as root, the system's package is installed. Ends with 1 and a word of advice when none can be had.
 */
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import process from 'node:process';
import { findBrowser } from './find-browser.mjs';

const DOWNLOAD_LIMIT_MS = 5 * 60_000;
const ADVICE = `No Chromium or Chrome was found, and none could be installed.
Do one of these, then run the tests again:
  - install Chromium or Chrome the way your system installs programs (Debian, Ubuntu: apt-get install chromium)
  - run: npx playwright install chromium
  - set CHROMIUM_PATH to the browser you have`;

function run(command, args, options = {}) {
  console.log(`> ${[command, ...args].join(' ')}`);
  return spawnSync(command, args, { stdio: 'inherit', ...options }).status === 0;
}

function downloadOne() {
  const cli = join(
    dirname(createRequire(import.meta.url).resolve('@playwright/test/package.json')),
    'cli.js'
  );
  console.log('No Chromium or Chrome on this machine: fetching the one that Playwright keeps.');
  return run(process.execPath, [cli, 'install', 'chromium'], { timeout: DOWNLOAD_LIMIT_MS });
}

function installOne() {
  if (process.getuid?.() !== 0 || !existsSync('/etc/debian_version')) return false;
  console.log("That did not work: installing the system's own Chromium.");
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  return (
    run('apt-get', ['update', '-qq'], { env }) &&
    run('apt-get', ['install', '-y', '-qq', 'chromium'], { env })
  );
}

try {
  const browser = findBrowser() ?? (downloadOne() && findBrowser()) ?? null;
  const found = browser || (installOne() && findBrowser());
  if (!found) throw new Error(ADVICE);
  console.log(`Browser for the tests: ${found.path}`);
} catch (trouble) {
  console.error(trouble instanceof Error ? trouble.message : String(trouble));
  process.exitCode = 1;
}
