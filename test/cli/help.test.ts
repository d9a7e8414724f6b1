import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { inkFor } from '../../src/cli/colour';
import { buildCommandLine, CORNER, ROOT, STACK, type CommandLine } from './command-line';

let cli: CommandLine;
beforeAll(() => {
  cli = buildCommandLine();
});
afterAll(() => cli.remove());

describe('help', () => {
  test.for([['--help'], ['-h'], ['help']])('%s: what there is', ([option]) => {
    const { status, out, err } = cli.run([option]);
    expect({ status, err }).toEqual({ status: 0, err: '' });
    for (const name of ['check', 'curves', 'sweep', 'schema', '--version', 'Exit status'])
      expect(out).toContain(name);
  });

  test.for(['check', 'curves', 'sweep', 'schema'])('%s --help, wherever it stands', (command) => {
    const { status, out } = cli.run([command, '--help']);
    expect(status).toBe(0);
    expect(out).toMatch(new RegExp(`^sealwright ${command}\\b`));
    expect(cli.run([command, CORNER, '--help']).out).toBe(out);
    expect(cli.run(['help', command]).out).toBe(out);
    for (const line of out.split('\n')) expect(line.length).toBeLessThanOrEqual(110);
  });

  test('every option of a command stands in its help', () => {
    const options = {
      check: ['--json'],
      curves: ['--from', '--to', '--points', '--csv', '--json'],
      sweep: ['--over', '--from', '--to', '--points', '--csv', '--json']
    };
    for (const [command, names] of Object.entries(options))
      for (const name of names) expect(cli.run([command, '--help']).out).toContain(name);
  });
});

test('--version is the package’s', () => {
  const { version } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8'));
  expect(cli.run(['--version'])).toEqual({ status: 0, out: `${version}\n`, err: '' });
});

test('schema prints a JSON Schema', () => {
  const { status, out } = cli.run(['schema']);
  expect(status).toBe(0);
  const schema = JSON.parse(out);
  expect(schema.$schema).toMatch(/json-schema\.org/);
  expect(Object.keys(schema.properties)).toContain('driver');
});

describe('colour', () => {
  const coloured = (terminal: boolean, env: Record<string, string>) => inkFor(terminal, env).red('x') !== 'x';

  test.for([
    { terminal: true, env: {}, colour: true },
    { terminal: true, env: { NO_COLOR: '' }, colour: true },
    { terminal: true, env: { NO_COLOR: '1' }, colour: false },
    { terminal: true, env: { TERM: 'dumb' }, colour: false },
    { terminal: true, env: { TERM: 'xterm' }, colour: true },
    { terminal: false, env: { TERM: 'xterm' }, colour: false }
  ])('terminal $terminal, $env: $colour', ({ terminal, env, colour }) => {
    expect(coloured(terminal, env as Record<string, string>)).toBe(colour);
  });
});

describe('an error of the program itself', () => {
  test('is one line, and a stack only when asked for', () => {
    const broken = (env: Record<string, string>) =>
      cli.run(['check', CORNER, '--json'], { env: { NODE_OPTIONS: `--import=${breaking()}`, ...env } });
    const { status, out, err } = broken({});
    expect({ status, out }).toEqual({ status: 2, out: '' });
    expect(err).toBe('internal error: made to fail; please report it\n');
    expect(broken({ SEALWRIGHT_DEBUG: '1' }).err).toMatch(STACK);
  });

  /** A module that breaks what the report is printed with. */
  const breaking = (): string =>
    `data:text/javascript,${encodeURIComponent('JSON.stringify = () => { throw new Error("made to fail"); };')}`;
});
