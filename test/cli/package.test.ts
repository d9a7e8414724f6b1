import { execFileSync, spawnSync } from 'node:child_process';
import {
  chmodSync,
  cpSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  rmSync,
  symlinkSync
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { CORNER, ROOT } from './command-line';

/** What packing needs; packed from a copy, so that nothing else that builds here is disturbed. */
const NEEDED = [
  'package.json',
  'vite.cli.config.ts',
  'src',
  'static',
  'LICENSE',
  'README.md',
  'DEVELOPERS.md'
];

let folder: string;
let installed: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'sealwright-package-'));
  const copy = join(folder, 'copy');
  mkdirSync(copy);
  for (const name of NEEDED)
    if (existsSync(join(ROOT, name))) cpSync(join(ROOT, name), join(copy, name), { recursive: true });
  symlinkSync(join(ROOT, 'node_modules'), join(copy, 'node_modules'));
  // `npm pack` runs `prepare`, which builds the command line.
  execFileSync('npm', ['pack', '--offline', '--pack-destination', folder], { cwd: copy, stdio: 'pipe' });
  const tarball = readdirSync(folder).find((name) => name.endsWith('.tgz')) as string;
  // As an install would lay it out, dependencies left out: everything the command line needs is in its one file.
  const modules = join(folder, 'home/node_modules');
  mkdirSync(join(modules, '.bin'), { recursive: true });
  execFileSync('tar', ['-xzf', join(folder, tarball), '-C', modules]);
  installed = join(modules, 'sealwright');
  cpSync(join(modules, 'package'), installed, { recursive: true });
  rmSync(join(modules, 'package'), { recursive: true });
  // An installer makes what `bin` names runnable and links it.
  chmodSync(join(installed, 'dist/cli.js'), 0o755);
  symlinkSync('../sealwright/dist/cli.js', join(modules, '.bin/sealwright'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

test('the tarball holds one runnable file and nothing of the workshop', () => {
  expect(readdirSync(join(installed, 'dist'))).toEqual(['cli.js']);
  for (const name of ['src', 'test', 'node_modules']) expect(existsSync(join(installed, name))).toBe(false);
});

test('it runs by its link, by npx and by node, with no dependency installed', () => {
  const home = join(folder, 'home');
  const ways: [string, string[]][] = [
    [join(home, 'node_modules/.bin/sealwright'), []],
    ['npx', ['--offline', '--no-install', 'sealwright']],
    [process.execPath, [join(installed, 'dist/cli.js')]]
  ];
  for (const [command, first] of ways) {
    const ran = spawnSync(command, [...first, 'check', CORNER, '--json'], { cwd: home });
    expect({ command, status: ran.status, err: ran.stderr.toString() }).toEqual({
      command,
      status: 0,
      err: ''
    });
    expect(JSON.parse(ran.stdout.toString())).toMatchObject({ title: 'Corner twelve', holds: true });
  }
});
