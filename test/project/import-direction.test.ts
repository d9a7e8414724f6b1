import { ESLint } from 'eslint';
import { describe, expect, test } from 'vitest';

const lint = new ESLint();

async function complaints(file: string, code: string): Promise<string[]> {
  const [result] = await lint.lintText(code, { filePath: file });
  return result.messages
    .filter((message) => message.severity === 2)
    .map((message) => message.ruleId ?? 'parse');
}

const IMPORTS = '@typescript-eslint/no-restricted-imports';
const SYNTAX = 'no-restricted-syntax';
const GLOBALS = 'no-restricted-globals';
const PROPERTIES = 'no-restricted-properties';

/** Each snippet uses what it imports, so that no other rule speaks. */
const name = (from: string) => `import { a } from '${from}';\nexport const b = a;\n`;
const type = (from: string) => `import type { A } from '${from}';\nexport type B = A;\n`;
const whole = (from: string) => `import * as a from '${from}';\nexport const b = a;\n`;
const late = (from: string) => `export const b = () => import('${from}');\n`;
const lateType = (from: string) => `export type B = typeof import('${from}');\n`;
const again = (from: string) => `export { a } from '${from}';\n`;
const all = (from: string) => `export * from '${from}';\n`;

const ENGINE = 'src/lib/engine/budget/snippet.ts';
const PLAN = 'src/lib/plan/snippet.ts';
const WORDS = 'src/lib/words/snippet.ts';
const CHARTS = 'src/lib/charts/snippet.ts';
const SHELF = 'src/lib/shelf/snippet.ts';
const WORKSPACE = 'src/lib/workspace/snippet.ts';
const CLI = 'src/cli/snippet.ts';
const ROUTES = 'src/routes/snippet.ts';

describe('the fence stops', () => {
  test.for<[string, string, string, string]>([
    ['engine importing zod', ENGINE, name('zod'), IMPORTS],
    ['engine importing svelte', ENGINE, name('svelte'), IMPORTS],
    ['engine importing a part of svelte', ENGINE, name('svelte/store'), IMPORTS],
    ['engine importing d3', ENGINE, name('d3'), IMPORTS],
    ['engine importing Node', ENGINE, name('node:fs'), IMPORTS],
    ['engine importing Node without its prefix', ENGINE, name('fs'), IMPORTS],
    ['engine importing the framework', ENGINE, name('$app/paths'), IMPORTS],
    ['engine importing plan by alias', ENGINE, name('$lib/plan/read-plan'), IMPORTS],
    ['engine importing plan by path', ENGINE, name('../../plan/read-plan'), IMPORTS],
    ['engine importing plan by a winding path', ENGINE, name('./../../plan/read-plan'), IMPORTS],
    ['engine importing plan from the root', ENGINE, name('src/lib/plan/read-plan'), IMPORTS],
    ['engine importing a type of plan', ENGINE, type('$lib/plan/schema'), IMPORTS],
    ['engine passing plan on', ENGINE, again('$lib/plan/read-plan'), IMPORTS],
    ['engine passing all of words on', ENGINE, all('$lib/words/report'), IMPORTS],
    ['engine loading zod late', ENGINE, late('zod'), SYNTAX],
    ['engine naming a type of plan in place', ENGINE, lateType('$lib/plan/schema'), SYNTAX],
    ['plan importing words', PLAN, name('$lib/words/report'), IMPORTS],
    ['plan importing words by path', PLAN, name('../words/report'), IMPORTS],
    ['plan importing svelte', PLAN, name('svelte'), IMPORTS],
    ['plan importing what merely begins like zod', PLAN, name('zodiac'), IMPORTS],
    ['plan loading words late', PLAN, late('$lib/words/report'), SYNTAX],
    ['words importing workspace', WORDS, name('$lib/workspace/VerdictLine.svelte'), IMPORTS],
    ['words importing shelf', WORDS, name('$lib/shelf/plans'), IMPORTS],
    ['words importing the command line', WORDS, name('../../cli/main'), IMPORTS],
    ['words importing zod', WORDS, name('zod'), IMPORTS],
    ['charts importing plan', CHARTS, name('$lib/plan/schema'), IMPORTS],
    ['charts importing the engine', CHARTS, name('$lib/engine/chain'), IMPORTS],
    ['charts importing words', CHARTS, name('../words/format-number'), IMPORTS],
    ['charts importing a part of d3', CHARTS, name('d3-scale'), IMPORTS],
    ['charts importing the whole of d3', CHARTS, whole('d3'), SYNTAX],
    ['charts loading the whole of d3 late', CHARTS, late('d3'), SYNTAX],
    ['workspace importing the whole of d3', WORKSPACE, whole('d3'), SYNTAX],
    ['routes importing the whole of d3', ROUTES, whole('d3'), SYNTAX],
    ['a test importing the whole of d3', 'test/engine/snippet.ts', whole('d3'), SYNTAX],
    ['shelf importing workspace', SHELF, name('$lib/workspace/open-plan.svelte'), IMPORTS],
    ['workspace importing the command line', WORKSPACE, name('../../cli/main'), IMPORTS],
    ['workspace importing routes', WORKSPACE, name('../../routes/+page.svelte'), IMPORTS],
    ['workspace loading routes late', WORKSPACE, late('../../routes/page'), SYNTAX],
    ['cli importing routes', CLI, name('../routes/+page.server'), IMPORTS],
    ['cli importing workspace', CLI, name('$lib/workspace/open-plan.svelte'), IMPORTS],
    ['cli importing charts', CLI, name('$lib/charts/Chart.svelte'), IMPORTS],
    ['cli loading shelf late', CLI, late('$lib/shelf/plans'), SYNTAX],
    ['cli importing svelte', CLI, name('svelte'), IMPORTS],
    ['routes importing the command line', ROUTES, name('../cli/main'), IMPORTS],
    ['engine using the document', ENGINE, 'export const b = () => document.title;\n', GLOBALS],
    ['engine using the window', ENGINE, 'export const b = () => window.innerWidth;\n', GLOBALS],
    ['engine telling the time', ENGINE, 'export const b = () => new Date();\n', GLOBALS],
    [
      'engine telling the time by the back door',
      ENGINE,
      'export const b = () => globalThis.Date.now();\n',
      GLOBALS
    ],
    ['engine measuring time', ENGINE, 'export const b = () => performance.now();\n', GLOBALS],
    ['engine logging', ENGINE, "export const b = () => console.log('a');\n", GLOBALS],
    ['engine reading the environment', ENGINE, 'export const b = () => process.env;\n', GLOBALS],
    ['engine rolling dice', ENGINE, 'export const b = () => Math.random();\n', PROPERTIES],
    ['engine rolling dice by name', ENGINE, "export const b = () => Math['random']();\n", PROPERTIES],
    ['engine picking up the dice', ENGINE, 'const { random } = Math;\nexport const b = random;\n', PROPERTIES]
  ])('%s', async ([, file, code, rule]) => {
    expect(await complaints(file, code)).toContain(rule);
  });
});

describe('the fence lets pass', () => {
  test.for<[string, string, string]>([
    ['engine importing itself by path', ENGINE, name('../chain')],
    ['engine importing itself by alias', ENGINE, name('$lib/engine/chain')],
    ['engine with plain numbers', ENGINE, 'export const b = (x: number) => Math.sqrt(x);\n'],
    ['plan importing zod', PLAN, name('zod')],
    ['plan importing the engine', PLAN, name('$lib/engine/chain')],
    ['plan importing a file of its own', PLAN, name('./words')],
    ['words importing plan and engine', WORDS, name('$lib/plan/schema') + type('$lib/engine/budget/budget')],
    ['charts importing names from d3', CHARTS, name('d3')],
    ['charts importing svelte', CHARTS, name('svelte')],
    ['shelf importing words', SHELF, name('$lib/words/report')],
    ['workspace importing words and charts', WORKSPACE, name('$lib/words/report')],
    ['workspace loading a part of its own late', WORKSPACE, late('./heavy')],
    ['cli importing words', CLI, name('$lib/words/report')],
    ['cli importing Node', CLI, name('node:fs')],
    ['cli importing a command of its own', CLI, name('./check')],
    ['routes importing workspace', ROUTES, name('$lib/workspace/open-plan.svelte')]
  ])('%s', async ([, file, code]) => {
    expect(await complaints(file, code)).toEqual([]);
  });
});
