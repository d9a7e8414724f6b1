/** The command line as people get it: built as for release, into a folder of its own, and run as a process. */
import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';

export const ROOT = resolve(import.meta.dirname, '../..');
export const reference = (name: string): string => join(ROOT, 'test/reference', name);
export const CORNER = reference('public/corner-twelve.sealwright.json');

export interface Ran {
  readonly status: number | null;
  readonly out: string;
  readonly err: string;
}

export interface CommandLine {
  readonly path: string;
  /** A folder to write in. */
  readonly folder: string;
  readonly run: (args: readonly string[], options?: RunOptions) => Ran;
  readonly remove: () => void;
}

interface RunOptions {
  readonly input?: string | Uint8Array;
  readonly env?: { readonly [name: string]: string };
  readonly cwd?: string;
}

export function buildCommandLine(): CommandLine {
  const folder = mkdtempSync(join(tmpdir(), 'sealwright-cli-'));
  const outDir = join(folder, 'dist');
  execFileSync(
    process.execPath,
    [
      join(ROOT, 'node_modules/vite/bin/vite.js'),
      'build',
      '-c',
      'vite.cli.config.ts',
      '--logLevel',
      'warn',
      '--outDir',
      outDir
    ],
    { cwd: ROOT, stdio: 'pipe' }
  );
  const path = join(outDir, 'cli.js');
  return {
    path,
    folder,
    run: (args, { input = '', env = {}, cwd = ROOT } = {}) => {
      const ran = spawnSync(process.execPath, [path, ...args], {
        input,
        cwd,
        env: { ...process.env, ...env },
        maxBuffer: 64 * 1024 * 1024
      });
      return { status: ran.status, out: ran.stdout.toString(), err: ran.stderr.toString() };
    },
    remove: () => rmSync(folder, { recursive: true, force: true })
  };
}

/** What a stack trace looks like. */
export const STACK = /^\s+at .*(:\d+:\d+|<anonymous>)/m;

export const lines = (text: string): string[] => text.split('\n').filter((line) => line !== '');
