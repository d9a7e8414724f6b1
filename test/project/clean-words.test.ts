import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';

const read = (file: string) => readFileSync(new URL(`../../${file}`, import.meta.url), 'utf8');

interface Manifest {
  dependencies: Record<string, string>;
  devDependencies: Record<string, string>;
}
interface Lock {
  packages: Record<string, { version?: string; resolved?: string; integrity?: string }>;
}

const lock = JSON.parse(read('package-lock.json')) as Lock;
const manifest = JSON.parse(read('package.json')) as Manifest;
const wanted = Object.entries({ ...manifest.dependencies, ...manifest.devDependencies });

test('the lock file names no place to download from', () => {
  const entries = Object.entries(lock.packages).filter(([path]) => path !== '');
  expect(entries.length).toBeGreaterThan(100);
  expect(entries.filter(([, entry]) => entry.resolved !== undefined)).toEqual([]);
  expect(read('package-lock.json')).not.toMatch(/"resolved": "https?:/);
});

test('the lock file holds a checksum of everything it installs', () => {
  const bare = Object.entries(lock.packages).filter(([path, entry]) => path !== '' && !entry.integrity);
  expect(bare).toEqual([]);
});

test.for(wanted)('%s is pinned to exactly one version, the one in the lock file', ([name, version]) => {
  expect(version).toMatch(/^\d+\.\d+\.\d+$/);
  expect(lock.packages[`node_modules/${name}`]?.version).toBe(version);
});
