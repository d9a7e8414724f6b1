/**
 * The engine against values from published sources and common practice, numbered as in `test/reference/published-checks.md`.
 * Each row names its source; the rows stand by subject in `published/`.
 */
import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { used } from '../tolerance';
import { air } from './published/air';
import { bands } from './published/bands';
import { closedBox } from './published/closed-box';
import { coils } from './published/coils';
import { decibels } from './published/decibels';
import { filterPoles } from './published/filter-poles';
import { filters } from './published/filters';
import { room } from './published/room';
import { workedExample } from './published/worked-example';

const SUBJECTS = { air, closedBox, workedExample, coils, filterPoles, filters, decibels, room, bands };

/** Values the engine does not compute, and why. */
const NOT_COMPUTED: { readonly [number: number]: string } = {
  44: 'cubic feet: the plan file is metric',
  82: 'oblique modes: of a later room',
  85: 'E12: no parts are chosen',
  86: 'E24: no parts are chosen',
  87: 'E96: no parts are chosen',
  90: 'band edges: the ledger calculates at the centres'
};

describe.for(Object.entries(SUBJECTS))('%s', ([, rows]) => {
  test.for(rows)('$number: $what ($source)', (row) => {
    const actual = row.actual();
    expect(
      used(actual, row.value, row.tolerance),
      `${actual} where ${row.value} is due: ${row.source}`
    ).toBeLessThanOrEqual(1);
  });
});

test('every value of the page is checked here or named as not computed', () => {
  const page = readFileSync(new URL('../reference/published-checks.md', import.meta.url), 'utf8');
  const listed = [...page.matchAll(/^\| (\d+) \|/gm)].map((match) => Number(match[1]));
  expect(listed).toHaveLength(90);
  const checked = new Set(
    Object.values(SUBJECTS)
      .flat()
      .map((row) => row.number)
  );
  expect(checked.size).toBe(84);
  for (const number of listed)
    expect(checked.has(number) || NOT_COMPUTED[number] !== undefined, `number ${number}`).toBe(true);
});

test('every row names its source', () => {
  for (const row of Object.values(SUBJECTS).flat()) expect(row.source.length).toBeGreaterThan(5);
});
