import { copyFileSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { buildCommandLine, CORNER, lines, reference, STACK, type CommandLine } from './command-line';

let cli: CommandLine;
beforeAll(() => {
  cli = buildCommandLine();
});
afterAll(() => cli.remove());

const OVER = reference('public/gentle-lift.sealwright.json');
const BAD = reference('bad/zero-sd.sealwright.json');
const expected = (name: string) =>
  JSON.parse(readFileSync(reference(`public/${name}.expected.json`), 'utf8'));

describe('check, as text', () => {
  test('a plan that holds: verdict, blocks, ledger, cautions, status 0', () => {
    const { status, out, err } = cli.run(['check', CORNER]);
    expect({ status, err }).toEqual({ status: 0, err: '' });
    expect(out).toMatch(/^Corner twelve\nHolds/);
    for (const heading of [
      'Driver as wired',
      'Box',
      'Limits',
      'Level and amplifier',
      'Findings',
      'Ledger by one-third octaves'
    ])
      expect(out).toContain(heading);
    expect(out.match(/Hanging loads/g)).toHaveLength(1);
    expect(out).not.toMatch(/NaN|undefined|\[object/);
  });

  test('stays within 100 columns, with nothing trailing', () => {
    for (const plan of [
      'corner-twelve',
      'four-coils-side-by-side',
      'six-watts',
      'gentle-lift',
      'soft-source'
    ]) {
      const { out } = cli.run(['check', reference(`public/${plan}.sealwright.json`)]);
      for (const line of lines(out)) {
        expect([...line].length).toBeLessThanOrEqual(100);
        expect(line).toBe(line.trimEnd());
      }
    }
  });

  test('"amplifier to buy" leads the watt figures', () => {
    const { out } = cli.run(['check', CORNER]);
    const block = out.slice(out.indexOf('Level and amplifier'));
    expect(lines(block)[1]).toMatch(/amplifier to buy\s+96\.1 W into 4 ohm/);
  });

  test('a limit over: status 1, said in words, with ways out and their patches', () => {
    const { status, out } = cli.run(['check', OVER]);
    expect(status).toBe(1);
    expect(out).toMatch(/^.*\nDoes not hold\./);
    expect(out).toMatch(/Cone travel .* over /);
    expect(out).toMatch(/blocking {2}At /);
    expect(out).toMatch(/- Listen .* lower, at /);
    expect(out).toContain('/goal/level_dB: ');
  });

  test('no colour where it is not a terminal', () => {
    expect(cli.run(['check', CORNER]).out).not.toContain('\u001b');
    expect(cli.run(['check', CORNER], { env: { FORCE_COLOR: '1' } }).out).not.toContain('\u001b');
  });

  test('a title cannot steer the terminal', () => {
    const plan = JSON.parse(readFileSync(CORNER, 'utf8'));
    const path = join(cli.folder, 'title.sealwright.json');
    writeFileSync(path, JSON.stringify({ ...plan, title: 'Loft\u001b[31m\u0007\ncorner' }));
    const { out } = cli.run(['check', path]);
    expect(out.split('\n')[0]).toBe('Loft [31m corner');
  });
});

describe('check --json', () => {
  test('one PLAN: one object with its file, and the reference numbers', () => {
    const { status, out } = cli.run(['check', CORNER, '--json']);
    const report = JSON.parse(out);
    const wanted = expected('corner-twelve');
    expect(status).toBe(0);
    expect(report).toMatchObject({ file: CORNER, title: 'Corner twelve', holds: true });
    // Tolerances of the reference: 0.05 dB on levels and margins, 0.3 % on scalars.
    expect(Math.abs(report.max_level_dB - wanted.max_level_dB)).toBeLessThan(0.05);
    expect(Math.abs(report.alignment.fc_Hz / wanted.alignment.fc_Hz - 1)).toBeLessThan(0.003);
    expect(report.ledger).toHaveLength(wanted.ledger.length);
    expect(out).not.toContain('NaN');
  });

  test('delivered is the sum the page promises, as printed', () => {
    const { ledger, master_drive_V } = JSON.parse(cli.run(['check', CORNER, '--json']).out);
    for (const row of ledger) {
      const sum =
        row.driver_box_dB + row.shaping_dB + row.room_dB + row.copies_dB + 20 * Math.log10(master_drive_V);
      expect(Math.abs(row.delivered_dB - sum)).toBeLessThan(1e-9);
    }
  });

  test('several: an array, the unreadable left out, the worst status', () => {
    const { status, out, err } = cli.run(['check', CORNER, BAD, OVER, '--json']);
    expect(status).toBe(2);
    expect(JSON.parse(out).map((r: { file: string }) => r.file)).toEqual([CORNER, OVER]);
    expect(err).toContain(`${BAD}: `);
  });

  test('one unreadable PLAN: nothing on standard output', () => {
    expect(cli.run(['check', BAD, '--json'])).toMatchObject({ status: 2, out: '' });
  });

  test('several, all unreadable: an empty array', () => {
    const { status, out } = cli.run(['check', BAD, BAD, '--json']);
    expect(status).toBe(2);
    expect(JSON.parse(out)).toEqual([]);
  });
});

describe('several plans', () => {
  test('each readable one is reported, the worst status wins, cautions stand once at the end', () => {
    const two = cli.run(['check', CORNER, OVER]);
    expect(two.status).toBe(1);
    expect(two.out.match(/^Ledger by/gm)).toHaveLength(2);
    expect(two.out.match(/Hanging loads/g)).toHaveLength(1);
    expect(two.out.indexOf('Hanging loads')).toBeGreaterThan(two.out.lastIndexOf('Ledger by'));

    const withBad = cli.run(['check', BAD, CORNER]);
    expect(withBad.status).toBe(2);
    expect(withBad.out).toMatch(/^Corner twelve\n/);
    expect(withBad.err).toContain('/driver/sd_cm2');
  });

  test('a name with spaces and other letters', () => {
    const path = join(cli.folder, 'Küche links.sealwright.json');
    copyFileSync(CORNER, path);
    expect(JSON.parse(cli.run(['check', path, '--json']).out).file).toBe(path);
  });
});

describe('standard input', () => {
  test('- reads a plan', () => {
    const { status, out } = cli.run(['check', '-', '--json'], { input: readFileSync(CORNER) });
    expect(status).toBe(0);
    expect(JSON.parse(out)).toMatchObject({ file: '-', title: 'Corner twelve' });
  });

  test('nothing there: one line, status 2', () => {
    const { status, out, err } = cli.run(['check', '-']);
    expect({ status, out }).toEqual({ status: 2, out: '' });
    expect(err).toMatch(/^standard input: /);
    expect(err).not.toMatch(STACK);
  });

  test('too much there: refused', () => {
    const { status, err } = cli.run(['check', '-'], { input: new Uint8Array(3 * 1024 * 1024).fill(32) });
    expect(status).toBe(2);
    expect(lines(err)).toEqual(['standard input: larger than the 1 MiB a plan may have']);
  });

  test('only once', () => {
    expect(cli.run(['check', '-', '-'])).toMatchObject({ status: 2, out: '' });
  });
});
