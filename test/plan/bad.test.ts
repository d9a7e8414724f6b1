/** Every bad file of the reference set: refused with its words, or accepted where it is to be accepted. */
import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';

interface Case {
  file: string;
  exit: number[];
  mentions: string[][];
  why: string;
  same_numbers_as?: string;
}

const here = (path: string) => new URL(`../reference/bad/${path}`, import.meta.url);
const cases = (JSON.parse(readFileSync(here('index.json'), 'utf8')) as { cases: Case[] }).cases.filter(
  // A file that does not exist is the command line's to report.
  (c) => c.file !== 'no-such-file.sealwright.json'
);

const holds = (text: string, mention: string): boolean =>
  mention.startsWith('re:')
    ? new RegExp(mention.slice(3)).test(text)
    : text.toLowerCase().includes(mention.toLowerCase());

describe('bad files', () => {
  test.each(cases)('$file: $why', ({ file, exit, mentions }) => {
    const result = readPlan(readFileSync(here(file)));
    if (result.ok) return expect(exit.some((status) => status !== 2)).toBe(true);
    expect(exit).toContain(2);
    const lines = result.problems.map(formatProblem);
    for (const line of lines) expect(line).not.toMatch(/\n|undefined|\[object/);
    for (const group of mentions)
      expect(
        group.some((mention) => holds(lines.join('\n'), mention)),
        `${group} in ${lines.join('\n')}`
      ).toBe(true);
  });

  test.each(cases.filter((c) => c.same_numbers_as?.endsWith('corner-twelve') && c.file.startsWith('byte')))(
    '$file reads as the plan it was made from',
    ({ file, same_numbers_as }) => {
      const one = readPlan(readFileSync(here(file)));
      const other = readPlan(readFileSync(here(`${same_numbers_as}.sealwright.json`)));
      expect(one.ok).toBe(true);
      expect(one).toEqual(other);
    }
  );
});
