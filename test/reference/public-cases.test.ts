/**
 * The public reference cases: plans with what the report and the curves must say, computed apart from the engine
 * (a general circuit simulator for driver, box and load; filters checked on their own). Source: the files in `public/`.
 *
 * Tolerances as agreed for them: 0.05 dB on levels, ceilings and margins; 0.3 % on scalar parameters; 0.5 % on travel, impedance,
 * volts and amps; 1 % on watts; 0.3° on impedance phase; 0.5° on acoustic phase. Group delay has none agreed: 0.5 % or 0.01 ms here.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { toChain } from '$lib/plan/to-chain';
import type { Plan } from '$lib/plan/schema';
import { curveTable } from '$lib/words/curve-columns';
import { report } from '$lib/words/report';
import { check } from '../../src/cli/check';
import { inkFor } from '../../src/cli/colour';
import {
  absolute,
  angle,
  Comparison,
  EXACT,
  percent,
  range,
  shareOrAbsolute,
  type Tolerance,
  type Value
} from '../tolerance';

type Json = Value | { readonly [key: string]: Json } | readonly Json[];
type JsonObject = { readonly [key: string]: Json };

const FOLDER = new URL('./public/', import.meta.url);
const read = (file: string): string => readFileSync(new URL(file, FOLDER), 'utf8');
const NAMES = readdirSync(FOLDER)
  .filter((file) => file.endsWith('.sealwright.json'))
  .map((file) => file.replace('.sealwright.json', ''));

const LEVEL = absolute(0.05);
const SCALAR = percent(0.3);

const CURVE_TOLERANCES: { readonly [column: string]: Tolerance } = {
  f_Hz: EXACT,
  wanted_dB: EXACT,
  phase_deg: angle(0.5),
  impedance_deg: angle(0.3),
  group_delay_ms: shareOrAbsolute(0.005, 0.01)
};

/** By the unit at the end of the name; a driver's and a box's own figures are scalar parameters whatever their unit. */
function toleranceOf(path: string): Tolerance {
  const key = path.split('.').at(-1) as string;
  if (key === 'nominal_Hz' || key === 'title' || key === 'holds' || key.endsWith('limit')) return EXACT;
  if (/_dBA?$/.test(key)) return LEVEL;
  if (/^(driver|alignment|system)\./.test(path)) return SCALAR;
  if (/_(W|VA|W_nominal)$/.test(key)) return percent(1);
  if (/_(mm|ohm|V|A)$/.test(key)) return percent(0.5);
  return SCALAR;
}

const isObject = (value: Json | undefined): value is JsonObject =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** Walks the expected object; every key in it that is no acceptance rule must be in the report and agree. */
function compareReport(
  all: Comparison,
  actual: Json | undefined,
  expected: Json,
  path: string,
  accept: JsonObject
) {
  if (Array.isArray(expected)) {
    const list = (Array.isArray(actual) ? actual : []) as readonly Json[];
    all.check(`${path} (length)`, list.length, expected.length, EXACT);
    expected.forEach((item: JsonObject, i) => {
      const name = String(item.limit !== undefined && path === 'limits' ? item.limit : item.nominal_Hz);
      compareReport(all, list[i], item, `${path}.${name}`, accept);
    });
    return;
  }
  if (!isObject(expected)) {
    const accepted = accept[path] as readonly [number, number] | undefined;
    const tolerance = accepted === undefined ? toleranceOf(path) : range(...accepted);
    all.check(path, actual as Value | undefined, expected as Value, tolerance);
    return;
  }
  for (const [key, value] of Object.entries(expected)) {
    if (key.startsWith('_')) continue;
    const here = path === '' ? key : `${path}.${key}`;
    const found = isObject(actual) ? actual[key] : undefined;
    const allowed = expected[`_${key}_ok`] as readonly string[] | undefined;
    // Where two limits lie as good as level, either name will do.
    if (allowed !== undefined) all.check(here, allowed.includes(String(found)), true, EXACT);
    else compareReport(all, found, value, here, accept);
  }
}

function parseCsv(text: string): { columns: string[]; rows: (number | null)[][] } {
  const [head, ...lines] = text.trim().split(/\r?\n/);
  return {
    columns: head.split(','),
    rows: lines.map((line) => line.split(',').map((cell) => (cell === '' ? null : Number(cell))))
  };
}

test('there are the eight public cases', () => {
  expect(NAMES).toHaveLength(8);
});

describe.for(NAMES)('%s', (name) => {
  const plan = JSON.parse(read(`${name}.sealwright.json`)) as Plan;
  const expected = JSON.parse(read(`${name}.expected.json`)) as JsonObject;
  const chain = toChain(plan);
  const budget = evaluate(chain);

  test('the report', () => {
    const { _accept_Hz: accept, contradictions, exit, ...due } = expected;
    const actual = JSON.parse(JSON.stringify(report(plan, chain, budget))) as JsonObject;
    const all = new Comparison();
    compareReport(all, actual, due, '', accept as JsonObject);
    expect(all.misses, all.nearest).toEqual([]);
    expect(all.count).toBe(200);
    const found = budget.findings.flatMap((f) => (f.code === 'driver-contradiction' ? [f.facts.key] : []));
    expect(found).toEqual(contradictions);
    expect(budget.verdict.holds ? 0 : 1).toBe(exit);
  });

  test('the exit status of the command line', async () => {
    const lines: string[] = [];
    const io = {
      out: () => undefined,
      err: (line: string) => lines.push(line),
      ink: inkFor(false, {}),
      width: 80
    };
    const path = fileURLToPath(new URL(`${name}.sealwright.json`, FOLDER));
    expect(await check([path, '--json'], io)).toBe(expected.exit);
    expect(lines).toEqual([]);
  });

  test('the curves', () => {
    const { columns, rows } = parseCsv(read(`${name}.curves.csv`));
    const frequency = columns.indexOf('f_Hz');
    const table = curveTable(
      curves(
        chain,
        Float64Array.from(rows, (row) => row[frequency] as number)
      )
    );
    const all = new Comparison();
    expect(table.rows).toHaveLength(rows.length);
    for (const [c, column] of columns.entries()) {
      const mine = table.columns.indexOf(column);
      expect(mine, column).toBeGreaterThanOrEqual(0);
      const tolerance = CURVE_TOLERANCES[column] ?? toleranceOf(column);
      rows.forEach((row, i) =>
        all.check(`${column} at ${row[frequency]} Hz`, table.rows[i][mine], row[c], tolerance)
      );
    }
    expect(all.misses, all.nearest).toEqual([]);
    expect(all.count).toBe(400 * columns.length);
  });
});
