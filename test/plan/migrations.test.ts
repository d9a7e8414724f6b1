import { describe, expect, test } from 'vitest';
import { migrate, MIGRATIONS, type Migration } from '$lib/plan/migrations';
import { formatProblem } from '$lib/plan/problem';
import { checkPlan, readPlan } from '$lib/plan/read-plan';
import { fullPlan } from './full-plan';

// An invented version 0, which lives in this file alone: the seat was a bare number, and before that, in version −1, it was in centimetres.
const STEPS: readonly Migration[] = [
  { from: -1, to: 0, apply: (v) => ({ ...v, seat: Number(v.seat) / 100 }) },
  { from: 0, to: 1, apply: (v) => ({ ...v, seat: { distance_m: v.seat } }) }
];

const lines = (value: unknown, migrations?: readonly Migration[]): string[] => {
  const result = checkPlan(value, { migrations });
  return result.ok ? [] : result.problems.map(formatProblem);
};

describe('format and version', () => {
  test('an older file is brought up step by step, and is not itself changed', () => {
    const old = { ...fullPlan(), version: 0, seat: 3 };
    const result = checkPlan(old, { migrations: STEPS });
    expect(result.ok && result.plan).toEqual(fullPlan());
    expect(old).toEqual({ ...fullPlan(), version: 0, seat: 3 });
    const older = readPlan(JSON.stringify({ ...fullPlan(), version: -1, seat: 300 }), { migrations: STEPS });
    expect(older.ok && older.plan).toEqual(fullPlan());
  });

  test('what a step makes is checked like any plan', () => {
    expect(lines({ ...fullPlan(), version: 0, seat: 'far' }, STEPS)[0]).toMatch(
      /^\/seat\/distance_m: text "far"/
    );
  });

  test('version 1 is the first: no step of the program is older, and an unknown old version is named', () => {
    expect(MIGRATIONS).toEqual([]);
    expect(lines({ ...fullPlan(), version: 0, seat: 3 })).toEqual([
      '/version: version 0 is not known: this Sealwright reads version 1.'
    ]);
  });

  test('a step that leads nowhere cannot go round for ever', () => {
    const round: Migration[] = [{ from: 0, to: 0, apply: (v) => v }];
    expect(lines({ ...fullPlan(), version: 0 }, round)[0]).toMatch(/^\/version: version 0 is not known/);
  });

  test('a newer version names both', () => {
    expect(lines({ ...fullPlan(), version: 99, rooms: [] })).toEqual([
      '/version: the file has version 99, this Sealwright reads version 1: it needs a newer Sealwright.'
    ]);
  });

  test.each([undefined, null, '1', 1.5, NaN, true, {}])('version %j is no version', (version) => {
    const found = lines({ ...fullPlan(), version, driver: {} });
    expect(found).toHaveLength(1);
    expect(found[0]).toMatch(/^\/version: /);
  });

  test.each([undefined, null, 'other', 1])('format %j is reported alone', (format) => {
    const found = lines({ ...fullPlan(), format, version: 99 });
    expect(found).toHaveLength(1);
    expect(found[0]).toMatch(/^\/format: /);
  });

  test.each([[[]], [null], ['plan'], [1], [undefined]])('%j is no plan', (value) => {
    expect(lines(value)[0]).toContain('a plan is an object');
    expect(migrate(value).ok).toBe(false);
  });

  test('format and version inherited from elsewhere are none', () => {
    expect(lines(Object.create(fullPlan()) as unknown)[0]).toMatch(/^\/format: missing/);
  });
});
