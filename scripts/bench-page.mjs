/** The page under load, in one run of a real Chromium over the built site: edits and drags, first load, the heap. Needs `npm run build` first. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { chromium } from '@playwright/test';
import { preview } from 'vite';
import { findBrowser } from './find-browser.mjs';

const quantile = (times, q) =>
  times.sort((a, b) => a - b)[Math.min(times.length - 1, Math.floor(q * times.length))];
const ms = (value) => `${value.toFixed(1)} ms`;

const server = await preview({ preview: { host: '127.0.0.1', port: 4280 }, logLevel: 'error' });
const base = server.resolvedUrls.local[0];
const root = process.getuid?.() === 0 ? ['--no-sandbox'] : [];
const found = findBrowser();
const browser = await chromium.launch({
  ...(found ? { executablePath: found.path } : {}),
  args: [...root, '--disable-gpu', '--enable-precise-memory-info', '--js-flags=--expose-gc']
});
const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });

const scripts = new Set();
page.on('response', (response) => {
  if (response.url().endsWith('.js')) scripts.add(new URL(response.url()).pathname);
});
await page.goto(`${base}plan/?example=film-den.sealwright.json`);
await page.locator('.findings[aria-busy=false]').waitFor();
const bytes = [...scripts].reduce((sum, path) => sum + gzipSync(readFileSync(join('build', path))).length, 0);
console.log(
  `first load: ${(bytes / 1000).toFixed(0)} kB of compressed JavaScript in ${scripts.size} files, wanted under 130 kB`
);

/** Steps of a drag by keys on a slider: script, style and layout of each, and the wait for fresh ways out after the last. */
async function steps(name, address, count) {
  await page.goto(base + address);
  await page.getByRole('slider').first().waitFor();
  await page.locator('[aria-busy=false], .brief').first().waitFor();
  const times = await page.evaluate(async (count) => {
    const slider = document.querySelector('[role=slider]');
    slider.focus();
    const times = [];
    for (let i = 0; i < count; i++) {
      const key = i % 40 < 20 ? 'ArrowLeft' : 'ArrowRight';
      const start = performance.now();
      slider.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
      await Promise.resolve();
      // Reading a size makes style and layout part of the step.
      void document.body.getBoundingClientRect().height;
      times.push(performance.now() - start);
      await new Promise((done) => requestAnimationFrame(() => setTimeout(done)));
    }
    return times;
  }, count);
  console.log(
    `${name}: median ${ms(quantile(times, 0.5))} (wanted 16), 95th percentile ${ms(quantile(times, 0.95))} (wanted 50)`
  );
}
await steps('cursor step', 'plan/?example=film-den.sealwright.json', 200);
await steps('level step', 'plan/?example=film-den.sealwright.json&view=level', 200);
await steps('volume step', 'plan/?example=film-den.sealwright.json&view=volume', 200);

const cdp = await page.context().newCDPSession(page);
async function heap() {
  await cdp.send('HeapProfiler.collectGarbage');
  return (await page.evaluate(() => performance.memory.usedJSHeapSize)) / 1e6;
}
await page.goto(`${base}plan/?example=film-den.sealwright.json&view=level`);
await page.getByRole('slider').first().waitFor();
const edits = (count) =>
  page.evaluate(async (count) => {
    const slider = document.querySelector('[role=slider]');
    for (let i = 0; i < count; i++) {
      slider.dispatchEvent(
        new KeyboardEvent('keydown', {
          key: i % 40 < 20 ? 'ArrowLeft' : 'ArrowRight',
          bubbles: true,
          cancelable: true
        })
      );
      await new Promise((done) => setTimeout(done, 5));
    }
  }, count);
await edits(200);
await page.waitForTimeout(1500);
const early = await heap();
await edits(800);
await page.waitForTimeout(1500);
const late = await heap();
console.log(
  `heap after edit 200: ${early.toFixed(1)} MB, after edit 1000: ${late.toFixed(1)} MB, ${((late / early - 1) * 100).toFixed(0)} % more (wanted within 10)`
);

await browser.close();
await server.close();
process.exit(0);
