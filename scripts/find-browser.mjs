import { accessSync, constants, existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import process from 'node:process';
import { chromium } from '@playwright/test';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome', 'microsoft-edge'];

const USUAL_PLACES = {
  darwin: [
    '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
    '/Applications/Chromium.app/Contents/MacOS/Chromium',
    '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge'
  ],
  win32: [
    'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
    'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
    'C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe'
  ]
};

/**
 * A Chromium or Chrome that exists on this machine, or null. In order: CHROMIUM_PATH (an error when it cannot be
 * run), Playwright's own download, the names on PATH, the usual places of the system.
 *
 * @returns {{ path: string, origin: 'CHROMIUM_PATH' | 'playwright' | 'machine' } | null}
 */
export function findBrowser() {
  const wished = process.env.CHROMIUM_PATH;
  if (wished) {
    if (!runs(wished)) throw new Error(`CHROMIUM_PATH is ${wished}, which is not a program that can be run`);
    return { path: wished, origin: 'CHROMIUM_PATH' };
  }
  const own = chromium.executablePath();
  if (own && existsSync(own)) return { path: own, origin: 'playwright' };

  const suffix = process.platform === 'win32' ? '.exe' : '';
  const onPath = (process.env.PATH ?? '')
    .split(delimiter)
    .filter(Boolean)
    .flatMap((dir) => NAMES.map((name) => join(dir, name + suffix)));
  const path = [...onPath, ...(USUAL_PLACES[process.platform] ?? [])].find(runs);
  return path ? { path, origin: 'machine' } : null;
}

/** @param {string} path */
function runs(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}
