import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { checkPlan, readPlan, type PlanResult } from '$lib/plan/read-plan';
import { serialisePlan } from '$lib/plan/serialise-plan';
import { validPlan } from '../laws/valid-plan';

const SLOWEST_MS = 1000;

/** Reads, and asserts what must be true of any input: it is quick, and says either a chain of numbers or at least one problem in one line each. */
function reads(read: () => PlanResult): PlanResult {
  // Time of this process alone, so that a busy machine does not count.
  const start = process.cpuUsage();
  const result = read();
  expect(process.cpuUsage(start).user / 1000).toBeLessThan(SLOWEST_MS);
  if (result.ok) expect(JSON.stringify(result.chain)).not.toMatch(/undefined|NaN/);
  else {
    expect(result.problems.length).toBeGreaterThan(0);
    for (const p of result.problems) expect(formatProblem(p)).toMatch(/^\P{Cc}{5,1500}$/u);
  }
  return result;
}

/** Every place of a value, as keys that lead there. */
function* places(value: unknown, path: string[] = []): Generator<string[]> {
  if (path.length > 0) yield path;
  if (typeof value === 'object' && value !== null)
    for (const key of Object.keys(value))
      yield* places((value as Record<string, unknown>)[key], [...path, key]);
}

const strange = fc.oneof(
  fc.constantFrom<unknown>(
    null,
    true,
    '',
    '21',
    'box',
    '1e400',
    [],
    {},
    [[]],
    -0,
    0,
    -1,
    1.5,
    1e308,
    -1e308,
    5e-324,
    Number.MAX_SAFE_INTEGER,
    2 ** 53,
    'x'.repeat(5000)
  ),
  fc.double(),
  fc.jsonValue({ maxDepth: 3 })
);

describe('whatever the file holds', () => {
  test('bytes changed, put in or cut off', () => {
    const edit = fc.record({
      at: fc.nat(),
      byte: fc.nat(255),
      how: fc.constantFrom('flip', 'insert', 'delete', 'cut')
    });
    fc.assert(
      fc.property(validPlan, fc.array(edit, { minLength: 1, maxLength: 4 }), (plan, edits) => {
        let bytes = [...new TextEncoder().encode(serialisePlan(plan))];
        for (const { at, byte, how } of edits) {
          const i = at % Math.max(1, bytes.length);
          if (how === 'flip') bytes[i] = byte;
          else if (how === 'insert') bytes.splice(i, 0, byte);
          else if (how === 'delete') bytes.splice(i, 1);
          else if (byte < 30) bytes = bytes.slice(0, i);
        }
        reads(() => readPlan(Uint8Array.from(bytes)));
      }),
      { numRuns: 500, seed: 1 }
    );
  });

  test('keys taken out, values of another type, numbers out of all measure', () => {
    const edit = fc.record({
      at: fc.nat(),
      value: strange,
      how: fc.constantFrom('set', 'set', 'delete', 'rename')
    });
    fc.assert(
      fc.property(validPlan, fc.array(edit, { minLength: 1, maxLength: 3 }), (plan, edits) => {
        const copy = structuredClone(plan) as unknown as Record<string, unknown>;
        for (const { at, value, how } of edits) {
          const all = [...places(copy)];
          const path = all[at % all.length];
          let holder: Record<string, unknown> = copy;
          for (const key of path.slice(0, -1)) holder = holder[key] as Record<string, unknown>;
          const key = path[path.length - 1];
          if (how === 'set') holder[key] = value;
          else if (how === 'rename' && !Array.isArray(holder)) holder[`${key}x`] = holder[key];
          else delete holder[key];
          if (all.length < 4) break;
        }
        const checked = reads(() => checkPlan(copy));
        // The text of the same value says the same, where JSON can hold it.
        const text = JSON.stringify(copy);
        const read = reads(() => readPlan(text));
        if (JSON.stringify(JSON.parse(text)) === text && !/null/.test(text)) expect(read.ok).toBe(checked.ok);
      }),
      { numRuns: 700, seed: 2 }
    );
  });

  test('any bytes and any JSON at all', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), (bytes) => {
        reads(() => readPlan(bytes));
      }),
      { numRuns: 300, seed: 3 }
    );
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        reads(() => checkPlan(value));
      }),
      { numRuns: 300, seed: 4 }
    );
  });

  test.each([
    [
      'unknown keys',
      (n: number) =>
        `{"format":"sealwright-plan","version":1,${Array.from({ length: n }, (_, i) => `"k${i}":0`)}}`,
      60_000
    ],
    [
      'one key of great length',
      (n: number) => `{"format":"sealwright-plan","version":1,"${'k'.repeat(n)}":0}`,
      1_000_000
    ],
    [
      'blocks of no kind',
      (n: number) =>
        `{"format":"sealwright-plan","version":1,"shaping":[${Array.from({ length: n }, () => '{}')}]}`,
      300_000
    ],
    ['one key again and again', (n: number) => `{${Array.from({ length: n }, () => '"a":0')}}`, 150_000],
    ['pairs of keys', (n: number) => `{${Array.from({ length: n }, (_, i) => `"${i}":0,"${i}":0`)}}`, 30_000],
    ['numbers too large', (n: number) => `[${Array.from({ length: n }, () => '1e999')}]`, 150_000],
    ['digits', (n: number) => `[${'9'.repeat(n)}]`, 1_000_000],
    ['spaces', (n: number) => `${' '.repeat(n)}x`, 1_000_000],
    ['a text of backslashes', (n: number) => `"${'\\\\'.repeat(n)}"`, 500_000],
    ['lines', (n: number) => `${'\n'.repeat(n)}{,`, 1_000_000]
  ])('a file of nothing but %s is read in under a second', (_, make, n) => {
    const result = reads(() => readPlan(make(n)));
    expect(result.ok).toBe(false);
    expect(!result.ok && result.problems.length).toBeLessThanOrEqual(51);
  });
});
