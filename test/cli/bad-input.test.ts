import { spawnSync } from 'node:child_process';
import { readFileSync, truncateSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { buildCommandLine, CORNER, lines, reference, STACK, type CommandLine } from './command-line';

interface BadCase {
  readonly file: string;
  readonly exit: readonly number[];
  /** One of each group must be said, letter case aside; "re:" marks a regular expression. */
  readonly mentions: readonly (readonly string[])[];
  readonly why: string;
}

let cli: CommandLine;
beforeAll(() => {
  cli = buildCommandLine();
});
afterAll(() => cli.remove());

const { cases } = JSON.parse(readFileSync(reference('bad/index.json'), 'utf8')) as { cases: BadCase[] };

const says = (text: string, mention: string): boolean =>
  mention.startsWith('re:')
    ? new RegExp(mention.slice(3)).test(text)
    : text.toLowerCase().includes(mention.toLowerCase());

describe('bad plans', () => {
  test('there are cases to go through', () => {
    expect(cases.length).toBeGreaterThan(40);
  });

  test.for(cases)('$file: $why', ({ file, exit, mentions }) => {
    const path = reference(`bad/${file}`);
    const { status, out, err } = cli.run(['check', path, '--json']);
    expect(exit).toContain(status);
    expect(err).not.toMatch(STACK);
    expect(err).not.toMatch(/internal error/);
    if (status === 2) {
      expect(out).toBe('');
      for (const line of lines(err)) expect(line.startsWith(`${path}: `)).toBe(true);
      expect(lines(err).length).toBeGreaterThan(0);
    }
    // The file's own name must not do the talking, unless it is what is missing.
    const said =
      status === 2
        ? err.replaceAll(path, exit.length === 1 && file.startsWith('no-such') ? file : '')
        : findingsOf(out);
    for (const group of mentions)
      expect(
        group.some((m) => says(said, m)),
        `${group} in: ${said}`
      ).toBe(true);
  });
});

const findingsOf = (out: string): string =>
  (JSON.parse(out).findings as { text: string }[]).map((finding) => finding.text).join('\n');

describe('what is no file', () => {
  test.for(['check', 'curves', 'sweep'])('%s: a missing file, a directory', (command) => {
    const more = command === 'sweep' ? ['--over', 'level'] : [];
    const missing = cli.run([command, join(cli.folder, 'nowhere.json'), ...more]);
    expect(missing).toMatchObject({ status: 2, out: '' });
    expect(lines(missing.err)).toEqual([`${join(cli.folder, 'nowhere.json')}: no such file`]);
    const directory = cli.run([command, cli.folder, ...more]);
    expect(directory).toMatchObject({ status: 2, out: '' });
    expect(lines(directory.err)).toEqual([`${cli.folder}: is a directory, not a plan`]);
  });

  test('unreadable bytes', () => {
    const path = join(cli.folder, 'noise.json');
    writeFileSync(
      path,
      Uint8Array.from({ length: 4096 }, (_, i) => (i * 37 + 128) % 256)
    );
    const { status, out, err } = cli.run(['check', path]);
    expect({ status, out, count: lines(err).length }).toEqual({ status: 2, out: '', count: 1 });
    expect(err).not.toMatch(STACK);
  });

  test('50 MB are refused at once, without being read', () => {
    const path = join(cli.folder, 'huge.json');
    writeFileSync(path, '{');
    truncateSync(path, 50 * 1024 * 1024);
    const started = performance.now();
    // With so small a heap, and outside it the buffer of 1 MiB, reading it all and parsing it would fail.
    const ran = spawnSync(process.execPath, ['--max-old-space-size=24', cli.path, 'check', path]);
    expect(performance.now() - started).toBeLessThan(5000);
    expect({ status: ran.status, out: ran.stdout.toString(), err: ran.stderr.toString() }).toEqual({
      status: 2,
      out: '',
      err: `${path}: larger than the 1 MiB a plan may have\n`
    });
  });

  test('a device without end is refused too', () => {
    const { status, err } = cli.run(['check', '/dev/zero']);
    expect(status).toBe(2);
    expect(err).toBe('/dev/zero: larger than the 1 MiB a plan may have\n');
  });
});

describe('bad usage: status 2, one line, a pointer to help', () => {
  test.for([
    [],
    ['frobnicate'],
    ['constructor'],
    ['--frobnicate'],
    ['check'],
    ['check', '--frob', CORNER],
    ['check', CORNER, '--json=yes'],
    ['curves'],
    ['curves', CORNER, CORNER],
    ['curves', CORNER, '--from', '100', '--to', '50'],
    ['curves', CORNER, '--from', '50', '--to', '50'],
    ['curves', CORNER, '--from', 'low'],
    ['curves', CORNER, '--from', ''],
    ['curves', CORNER, '--from', '-5'],
    ['curves', CORNER, '--from', '0'],
    ['curves', CORNER, '--from', 'NaN'],
    ['curves', CORNER, '--to', 'Infinity'],
    ['curves', CORNER, '--from', '600'],
    ['curves', CORNER, '--from'],
    ['curves', CORNER, '--points', '1'],
    ['curves', CORNER, '--points', '10001'],
    ['curves', CORNER, '--points', '2.5'],
    ['curves', CORNER, '--points', '1e9'],
    ['curves', CORNER, '--csv', '--json'],
    ['sweep', CORNER],
    ['sweep', CORNER, '--over'],
    ['sweep', CORNER, '--over', 'depth'],
    ['sweep', '--over', 'level'],
    ['sweep', CORNER, '--over', 'volume', '--from', '90', '--to', '30'],
    ['sweep', CORNER, '--over', 'volume', '--from', '4000'],
    ['sweep', CORNER, '--over', 'volume', '--from', '-4'],
    ['sweep', CORNER, '--over', 'level', '--from', '100', '--to', '1e9'],
    ['sweep', CORNER, '--over', 'boost', '--from', '0.5', '--to', '30'],
    ['sweep', CORNER, '--over', 'level', '--points', '1'],
    ['schema', 'please'],
    ['schema', '--csv']
  ])('%j', (args) => {
    const { status, out, err } = cli.run(args);
    expect({ status, out, count: lines(err).length }).toEqual({ status: 2, out: '', count: 1 });
    expect(err).toMatch(/^sealwright.*\(see sealwright.*--help\)\n$/);
    expect(err).not.toMatch(STACK);
  });
});

describe('a pipe that closes early', () => {
  test.for([['curves', '--points', '10000'], ['curves', '--points', '10000', '--json'], ['check']])(
    '%j | head -1',
    ([command, ...more]) => {
      const quoted = [process.execPath, cli.path, command, CORNER, ...more]
        .map((part) => `'${part}'`)
        .join(' ');
      const ran = spawnSync('bash', ['-c', `${quoted} | head -1; echo "status \${PIPESTATUS[0]}"`]);
      expect(ran.stderr.toString()).toBe('');
      expect(ran.stdout.toString().split('\n').at(-2)).toBe('status 0');
    }
  );
});

test('a full disk is one line, not a crash', () => {
  const ran = spawnSync('bash', ['-c', `'${process.execPath}' '${cli.path}' check '${CORNER}' > /dev/full`]);
  expect(ran.status).toBe(2);
  expect(ran.stderr.toString()).toBe('standard output: cannot be written (ENOSPC)\n');
});
