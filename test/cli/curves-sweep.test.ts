import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { csvParseRows } from 'd3';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { buildCommandLine, CORNER, lines, reference, type CommandLine } from './command-line';

let cli: CommandLine;
beforeAll(() => {
  cli = buildCommandLine();
});
afterAll(() => cli.remove());

const CURVES =
  'f_Hz,delivered_dB,wanted_dB,phase_deg,group_delay_ms,shaping_dB,driver_box_dB,room_dB,drive_V,current_A,real_W,apparent_VA,impedance_ohm,impedance_deg,travel_mm,ceiling_voltage_dB,ceiling_current_dB,ceiling_travel_dB,ceiling_heat_dB,ceiling_stop_dB';
const SWEEP =
  'qtc,fc_Hz,alignment_f3_Hz,system_f3_Hz,shaping_boost_dB,rated_W_nominal,peak_V,peak_A,cone_travel_mm,margin_voltage_dB,margin_current_dB,margin_travel_dB,margin_stop_dB,margin_heat_dB,limit,worst_Hz,holds';

/** A plan made from the corner-twelve by changing it. */
function variant(name: string, change: (plan: Record<string, never>) => void): string {
  const plan = JSON.parse(readFileSync(CORNER, 'utf8'));
  change(plan);
  const path = join(cli.folder, `${name}.sealwright.json`);
  writeFileSync(path, JSON.stringify(plan));
  return path;
}

const records = (out: string): Record<string, string>[] => {
  const [head, ...rows] = csvParseRows(out);
  return rows.map((row) => Object.fromEntries(head.map((name, i) => [name, row[i]])));
};

describe('curves', () => {
  test('--csv: the fixed columns, 400 rows from 5 to 500 Hz, enough digits, and empty outside the goal', () => {
    const { status, out, err } = cli.run(['curves', CORNER, '--csv']);
    expect({ status, err }).toEqual({ status: 0, err: '' });
    expect(out.split('\n')[0]).toBe(CURVES);
    const rows = records(out);
    expect(rows).toHaveLength(400);
    expect([rows[0].f_Hz, rows[399].f_Hz]).toEqual(['5', '500']);
    expect(rows[0].wanted_dB).toBe('');
    expect(rows[1].delivered_dB.replace(/\D/g, '').length).toBeGreaterThanOrEqual(6);
    expect(out).not.toMatch(/NaN|null|undefined/);
  });

  test('--csv agrees with the reference curve', () => {
    // Reference: a circuit simulator and checked filters, tolerance 0.05 dB on levels.
    const ours = records(cli.run(['curves', CORNER, '--csv']).out);
    const theirs = records(readFileSync(reference('public/corner-twelve.curves.csv'), 'utf8'));
    expect(theirs.length).toBe(ours.length);
    theirs.forEach((row, i) => {
      for (const column of ['delivered_dB', 'ceiling_travel_dB', 'ceiling_stop_dB'])
        expect(Math.abs(Number(ours[i][column]) - Number(row[column]))).toBeLessThan(0.05);
    });
  });

  test('--json: the same rows under { rows }, null where nothing is', () => {
    const { rows } = JSON.parse(
      cli.run(['curves', CORNER, '--json', '--points', '3', '--from', '10', '--to', '40']).out
    );
    expect(rows.map((row: { f_Hz: number }) => row.f_Hz)).toEqual([10, expect.closeTo(20, 9), 40]);
    expect(Object.keys(rows[0]).join(',')).toBe(CURVES);
    expect(rows[0].wanted_dB).toBeNull();
    expect(rows[1].wanted_dB).toBe(103);
  });

  test('a missing rating leaves its ceiling empty', () => {
    const path = variant('no-stop', ({ driver }) => delete (driver as Record<string, unknown>).xmech_mm);
    const [row] = records(cli.run(['curves', path, '--csv', '--points', '2']).out);
    expect(row.ceiling_stop_dB).toBe('');
    expect(row.ceiling_travel_dB).not.toBe('');
  });

  test.for([1, 3])('delivered is the sum the page promises, as printed, with %i copies', (copies) => {
    const path = variant(`copies-${copies}`, (plan) => Object.assign(plan, { copies }));
    const { master_drive_V } = JSON.parse(cli.run(['check', path, '--json']).out);
    const rows = records(cli.run(['curves', path, '--csv']).out);
    expect('copies_dB' in rows[0]).toBe(copies > 1);
    for (const row of rows) {
      const parts = ['driver_box_dB', 'shaping_dB', 'room_dB', ...(copies > 1 ? ['copies_dB'] : [])];
      const sum = parts.reduce((total, name) => total + Number(row[name]), 20 * Math.log10(master_drive_V));
      expect(Math.abs(Number(row.delivered_dB) - sum)).toBeLessThan(1e-9);
    }
  });

  test('by default an aligned table that stays numbers when piped', () => {
    const { out } = cli.run(['curves', CORNER, '--points', '5']);
    const all = lines(out);
    expect(all).toHaveLength(6);
    expect(new Set(all.map((line) => line.length)).size).toBe(1);
    expect(all[1].trim().split(/\s+/)).toHaveLength(20);
    expect(out).not.toContain('−');
  });
});

describe('sweep', () => {
  test.for([
    { over: 'volume', first: 'net_L' },
    { over: 'boost', first: 'boost_to_Hz' },
    { over: 'level', first: 'level_dB' }
  ])('over $over: the fixed columns, 101 rows', ({ over, first }) => {
    const { status, out, err } = cli.run(['sweep', CORNER, '--over', over, '--csv']);
    expect({ status, err }).toEqual({ status: 0, err: '' });
    expect(out.split('\n')[0]).toBe(`${first},${SWEEP}`);
    const rows = records(out);
    expect(rows).toHaveLength(101);
    for (const row of rows) expect(['true', 'false']).toContain(row.holds);
    const values = rows.map((row) => Number(row[first]));
    expect(values.every((value, i) => i === 0 || value > values[i - 1])).toBe(true);
  });

  test('volume runs from 0.35 to 3 times net; ends asked for are litres', () => {
    const volumes = (args: string[]) =>
      records(cli.run(['sweep', CORNER, '--over', 'volume', '--csv', ...args]).out).map((row) =>
        Number(row.net_L)
      );
    const own = volumes(['--points', '2']);
    expect(own[0]).toBeCloseTo(0.35 * 57, 6);
    expect(own[1]).toBeCloseTo(3 * 57, 6);
    expect(volumes(['--points', '2', '--from', '40', '--to', '90'])).toEqual([40, 90]);
  });

  test('--json: over, block, both answers with texts, rows', () => {
    const json = JSON.parse(cli.run(['sweep', CORNER, '--over', 'level', '--json', '--points', '9']).out);
    expect(Object.keys(json)).toEqual(['over', 'block', 'answer', 'amplifier_answer', 'rows']);
    expect(json).toMatchObject({ over: 'level', block: null });
    expect(json.rows).toHaveLength(9);
    // The reference's max level, rounded to the safe side.
    const { max_level_dB } = JSON.parse(
      readFileSync(reference('public/corner-twelve.expected.json'), 'utf8')
    );
    expect(json.answer.value).toBe(Math.floor(max_level_dB * 10) / 10);
    expect(json.answer.text).toBe(`highest level within limits: ${json.answer.value.toFixed(1)} dB`);
    expect(json.amplifier_answer.value).toBeGreaterThan(json.answer.value);
  });

  test('boost is the transform’s target, in its place in the plan', () => {
    expect(
      JSON.parse(cli.run(['sweep', CORNER, '--over', 'boost', '--json', '--points', '5']).out).block
    ).toBe(2);
    const shelf = variant('shelf', (plan) =>
      Object.assign(plan, { shaping: [{ kind: 'low-shelf', order: 1, corner_Hz: 40, gain_dB: 4 }] })
    );
    const swept = JSON.parse(cli.run(['sweep', shelf, '--over', 'boost', '--json', '--points', '5']).out);
    expect(swept.block).toBe(0);
    expect(swept.rows.map((row: { boost_gain_dB: number }) => row.boost_gain_dB)).toEqual([
      0, 4.5, 9, 13.5, 18
    ]);
    expect(
      cli.run(['sweep', shelf, '--over', 'boost', '--from', '-6', '--to', '0', '--csv', '--points', '2'])
        .status
    ).toBe(0);
    expect(cli.run(['sweep', shelf, '--over', 'boost', '--to', '41'])).toMatchObject({ status: 2, out: '' });
  });

  test('without a boost of its own a trial stands in, and is said', () => {
    const bare = variant('bare', (plan) => Object.assign(plan, { shaping: [] }));
    expect(cli.run(['sweep', bare, '--over', 'boost', '--points', '3']).out).toContain('trial transform');
  });

  test('nothing in range: null, and a text that says so', () => {
    const json = JSON.parse(
      cli.run(['sweep', CORNER, '--over', 'level', '--from', '120', '--to', '140', '--points', '3', '--json'])
        .out
    );
    expect(json.answer).toEqual({ value: null, text: 'no level from 120.0 dB to 140.0 dB holds' });
  });

  test('by default a table, then the answers in words', () => {
    const all = lines(cli.run(['sweep', CORNER, '--over', 'level', '--points', '4']).out);
    expect(all[0].split(/\s+/).slice(0, 2)).toEqual(['level_dB', 'qtc']);
    expect(all[5]).toMatch(/^Highest level within limits: /);
    expect(all[6]).toMatch(/^Highest level this amplifier carries: /);
  });
});
