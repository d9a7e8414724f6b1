/** Plans in and out as files. */
import { unzipSync } from 'fflate';
import fc from 'fast-check';
import { inflateRawSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';
import { serialisePlan } from '$lib/plan/serialise-plan';
import { copyTitle } from '$lib/shelf/copy-title';
import { exportAll, exportPlan } from '$lib/shelf/export-plans';
import { fileName, fileNames } from '$lib/shelf/file-name';
import { importPlans } from '$lib/shelf/import-plans';
import { newId } from '$lib/shelf/new-id';
import { memoryReason } from '$lib/shelf/open-database';
import { memoryShelf } from '$lib/shelf/open-shelf';
import { zipFiles } from '$lib/shelf/zip-files';
import { fakeWorld, readable, smallPlan } from './specimen';

const shelf = () => memoryShelf(fakeWorld(), memoryReason('absent'));

describe('import', () => {
  test('says of a bad file what the command line says, and stores nothing', async () => {
    const bad = { ...smallPlan(), box: { net_L: -1 }, colour: 'red' };
    const content = JSON.stringify(bad);
    const read = readPlan(content);
    if (read.ok) return expect.unreachable();
    const kept = shelf();
    expect(await importPlans(kept, [{ name: 'bad.json', content }])).toEqual([
      { ok: false, name: 'bad.json', problems: read.problems.map(formatProblem) }
    ]);
    expect(read.problems).toHaveLength(2);
    expect(await kept.list()).toEqual([]);
  });

  test('a failure that is no fault of file or shelf is not swallowed', async () => {
    const broken = { add: () => Promise.reject(new TypeError('broken')) };
    const file = { name: 'a.json', content: serialisePlan(smallPlan()) };
    await expect(importPlans(broken, [file])).rejects.toThrow('broken');
  });
});

describe('export', () => {
  test('what goes out comes in again as it was', async () => {
    const { name, text } = exportPlan(smallPlan());
    expect(name).toBe('loft-corner.sealwright.json');
    const other = shelf();
    const [result] = await importPlans(other, [{ name, content: text }]);
    if (!result.ok) return expect.unreachable();
    expect((await readable(other, result.id)).record.plan).toEqual(smallPlan());
  });

  test('every plan of the shelf, no two files of one name', async () => {
    const full = shelf();
    for (const title of ['Loft corner', 'loft  corner!', '', 'Cellar']) await full.add(smallPlan(title));
    const files = await exportAll(full);
    expect(files.map(({ name }) => name).sort()).toEqual([
      'cellar.sealwright.json',
      'loft-corner-2.sealwright.json',
      'loft-corner.sealwright.json',
      'untitled-plan.sealwright.json'
    ]);
    for (const { text } of files) expect(readPlan(text).ok).toBe(true);
  });
});

describe('an archive', () => {
  const files = [exportPlan(smallPlan('Dachkeller Süd')), exportPlan(smallPlan('小屋'))];
  const at = Date.UTC(2026, 4, 3, 12);

  test('holds each file', async () => {
    const entries = unzipSync(await zipFiles(files, at));
    expect(Object.keys(entries)).toEqual(files.map(({ name }) => name));
    for (const { name, text } of files) expect(new TextDecoder().decode(entries[name])).toBe(text);
  });

  test('is laid out as the published format has it, read here with nothing but zlib', async () => {
    const zip = Buffer.from(await zipFiles(files, at));
    expect(Object.fromEntries(readZip(zip))).toEqual(
      Object.fromEntries(files.map(({ name, text }) => [name, text]))
    );
  });
});

/** Names and texts by the central directory. Source of the layout: PKWARE, ".ZIP File Format Specification", 6.3, sections 4.3.7, 4.3.12 and 4.3.16. */
function* readZip(zip: Buffer): Generator<[string, string]> {
  const end = zip.lastIndexOf(Buffer.from([0x50, 0x4b, 5, 6]));
  let at = zip.readUInt32LE(end + 16);
  for (let left = zip.readUInt16LE(end + 10); left > 0; left--) {
    expect(zip.readUInt32LE(at)).toBe(0x02014b50);
    // Bit 11: the name is UTF-8.
    expect(zip.readUInt16LE(at + 8) & 0x0800).toBe(0x0800);
    const [size, nameLength] = [zip.readUInt32LE(at + 20), zip.readUInt16LE(at + 28)];
    const name = zip.toString('utf8', at + 46, at + 46 + nameLength);
    const local = zip.readUInt32LE(at + 42);
    expect(zip.readUInt32LE(local)).toBe(0x04034b50);
    const data = local + 30 + zip.readUInt16LE(local + 26) + zip.readUInt16LE(local + 28);
    expect(zip.readUInt16LE(at + 10)).toBe(8);
    yield [name, inflateRawSync(zip.subarray(data, data + size)).toString('utf8')];
    at += 46 + nameLength + zip.readUInt16LE(at + 30) + zip.readUInt16LE(at + 32);
  }
}

describe('file names', () => {
  test.for([
    ['Loft corner', 'loft-corner'],
    ['', 'untitled-plan'],
    ['   ', 'untitled-plan'],
    ['../../etc/passwd', 'etc-passwd'],
    ['a\\b:c*d?e"f<g>h|i', 'a-b-c-d-e-f-g-h-i'],
    ['.hidden', 'hidden'],
    ['trailing. ', 'trailing'],
    ['CON', 'plan-con'],
    ['lpt1', 'plan-lpt1'],
    ['Dachkeller Süd', 'dachkeller-süd'],
    ['小屋 2', '小屋-2'],
    ['line\nbreak\u0000\u202Eevil', 'line-break-evil'],
    ['😀', 'untitled-plan'],
    ['x'.repeat(300), 'x'.repeat(180)]
  ])('%j is %s', ([title, name]) => {
    expect(fileName(title)).toBe(`${name}.sealwright.json`);
  });

  test('no title makes a name that a file system would refuse or that leaves the folder', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 300 }), (title) => {
        const name = fileName(title);
        expect(name).toMatch(/^[^\p{C}\p{Z}\\/:*?"<>|.-][^\p{C}\p{Z}\\/:*?"<>|.]*\.sealwright\.json$/u);
        expect(new TextEncoder().encode(name).length).toBeLessThanOrEqual(240);
      })
    );
  });

  test('alike titles get numbers, and a number that is taken is passed over', () => {
    expect(fileNames(['A', 'a-2', 'a', 'A!'])).toEqual([
      'a.sealwright.json',
      'a-2.sealwright.json',
      'a-3.sealwright.json',
      'a-4.sealwright.json'
    ]);
  });
});

test('copies count on', () => {
  expect(copyTitle('A', [])).toBe('A (copy)');
  expect(copyTitle('A', ['A (copy)'])).toBe('A (copy 2)');
  expect(copyTitle('A (copy)', ['A', 'A (copy)'])).toBe('A (copy 2)');
  expect(copyTitle('A (copy 7)', ['A (copy 7)'])).toBe('A (copy)');
  expect(copyTitle('A (copyright)', [])).toBe('A (copyright) (copy)');
});

test('ids are 128 bits as text, each another', () => {
  const ids = Array.from({ length: 1000 }, newId);
  for (const id of ids) expect(id).toMatch(/^[0-9a-f]{32}$/);
  expect(new Set(ids).size).toBe(1000);
});
