import { readFileSync } from 'node:fs';
import { expect, openApp, test } from './page';

const html = readFileSync(new URL('../../build/index.html', import.meta.url), 'utf8');
const policy = /<meta http-equiv="content-security-policy" content="([^"]+)"/i.exec(html)?.[1] ?? '';
const directives = Object.fromEntries(
  policy.split(';').map((part) => {
    const [name, ...values] = part.trim().split(/\s+/);
    return [name, values.join(' ')];
  })
);

test('the built page states its policy: one script by its hash, no style of its own', () => {
  expect(directives).toMatchObject({
    'default-src': "'self'",
    'script-src': expect.stringMatching(/^'self' 'sha256-[A-Za-z0-9+/]+='$/),
    'style-src': "'self'",
    'style-src-attr': "'unsafe-inline'",
    'img-src': "'self' data: blob:",
    'connect-src': "'self'",
    'font-src': "'self'",
    'object-src': "'none'",
    'base-uri': "'self'"
  });
  expect(policy).not.toContain('unsafe-eval');
  const scripts = html.match(/<script[^>]*>/g) ?? [];
  expect(scripts.filter((tag) => !tag.includes(' src='))).toHaveLength(1);
  expect(scripts.filter((tag) => tag.includes(' src='))).toEqual(['<script src="./theme.js">']);
  expect(html).not.toMatch(/<style[\s>]/);
});

test('the policy is in force', async ({ page, quiet }) => {
  await openApp(page);
  const ran = await page.evaluate(() => {
    const script = document.createElement('script');
    script.textContent = 'document.documentElement.dataset.slipped = "in"';
    document.body.append(script);
    return document.documentElement.dataset.slipped ?? 'no';
  });
  expect(ran).toBe('no');
  // This once the noise is what is wanted: both reports of the one violation, and nothing besides.
  await expect.poll(() => quiet.filter((line) => line.startsWith('policy: script-src')).length).toBe(1);
  expect(
    quiet.filter((line) => !/^(policy: script-src|console: .*Content Security Policy)/.test(line))
  ).toEqual([]);
  quiet.length = 0;
});

test('the face of the page is its own font, in every weight that is used', async ({ page }) => {
  await openApp(page);
  const loaded = await page.evaluate(async () => {
    await document.fonts.ready;
    return [...document.fonts]
      .filter((f) => f.status === 'loaded')
      .map((f) => `${f.family.replace(/"/g, '')} ${f.weight}`);
  });
  expect(loaded).toContain('Fira Sans 400');
  expect(loaded).toContain('Fira Sans 500');
});
