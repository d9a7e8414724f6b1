/** Plans on the shelf that this Sealwright cannot read are kept, listed, and can be taken away as files. */
import { beforeEach, describe, expect, test } from 'vitest';
import { VERSION } from '$lib/plan/version';
import { ENGINE_VERSION, isStale } from '$lib/shelf/engine-version';
import { exportShelved } from '$lib/shelf/export-plans';
import { EMPTY_HISTORY } from '$lib/shelf/history';
import { IdbStore } from '$lib/shelf/idb-store';
import { MemoryStore } from '$lib/shelf/memory-store';
import { memoryReason, openDatabase } from '$lib/shelf/open-database';
import { PlanShelf } from '$lib/shelf/plan-shelf';
import type { PlanSummary } from '$lib/shelf/plan-record';
import type { PlanRow, PlanStore } from '$lib/shelf/plan-store';
import { refreshStale } from '$lib/shelf/refresh-stale';
import { UnreadablePlan } from '$lib/shelf/shelf-error';
import { recordOf, summaryOf } from '$lib/shelf/summary';
import { fakeWorld, freshBrowser, readable, smallPlan } from './specimen';

const storedSummary = (id: string): PlanSummary => ({
  ...summaryOf(recordOf(smallPlan(), { id, created: 1, changed: 2 })),
  revision: 0
});

/** As a later version might store it. */
const fromTheFuture: PlanRow = {
  summary: { ...storedSummary('later'), planVersion: VERSION + 1, engineVersion: '99' },
  plan: {
    format: 'sealwright-plan',
    version: VERSION + 1,
    title: 'Loft corner',
    rooms: [{ kind: 'unheard of' }]
  },
  history: { entries: 'written otherwise' }
};

const withUnknownKey: PlanRow = {
  summary: storedSummary('key'),
  plan: { ...smallPlan(), rooms: [] },
  history: EMPTY_HISTORY
};

const damaged: PlanRow = {
  summary: { id: 'damaged', verdict: 'yes', curve: [1], changed: 'today' } as unknown as PlanSummary,
  plan: undefined,
  history: undefined
};

const STORES: { name: string; open: () => Promise<PlanStore> }[] = [
  { name: 'memory', open: async () => new MemoryStore() },
  {
    name: 'stored',
    open: async () => {
      const opened = await openDatabase(20_000, () => undefined);
      if (!opened.ok) throw new Error(opened.reason.text);
      return new IdbStore(opened.db);
    }
  }
];

describe.for(STORES)('on a $name shelf', ({ open }) => {
  let store: PlanStore;
  let shelf: PlanShelf;

  beforeEach(async () => {
    freshBrowser();
    store = await open();
    shelf = new PlanShelf(store, fakeWorld(), memoryReason('absent'));
  });

  test('one of a newer version needs a newer Sealwright, and is kept raw', async () => {
    await store.write(fromTheFuture);
    expect(await shelf.list()).toMatchObject([
      { id: 'later', title: 'Loft corner', trouble: 'Needs a newer Sealwright.' }
    ]);
    const shelved = await shelf.get('later');
    expect(shelved).toMatchObject({
      readable: false,
      raw: fromTheFuture.plan,
      summary: { trouble: 'Needs a newer Sealwright.' }
    });
    if (shelved === null || shelved.readable) return expect.unreachable();
    expect(shelved.problems.map(({ path }) => path)).toEqual(['/version']);
    const file = exportShelved(shelved);
    expect(file.name).toBe('loft-corner.sealwright.json');
    expect(JSON.parse(file.text)).toEqual(fromTheFuture.plan);
  });

  test('it can be neither renamed nor copied, but removed and restored as it was', async () => {
    await store.write(fromTheFuture);
    await expect(shelf.rename('later', 'x')).rejects.toThrow(UnreadablePlan);
    await expect(shelf.duplicate('later')).rejects.toThrow('Needs a newer Sealwright.');
    const before = await store.read('later');
    const restore = await shelf.remove('later');
    await restore();
    expect(await store.read('later')).toEqual(before);
    expect(before).toMatchObject({ plan: fromTheFuture.plan, history: fromTheFuture.history });
  });

  test('figures of a newer engine are left alone', async () => {
    await store.write(fromTheFuture);
    const before = await store.read('later');
    expect(await refreshStale(shelf, { idle: async () => undefined })).toBe(0);
    expect(await store.read('later')).toEqual(before);
  });

  test('a key from a newer Sealwright in a file of this version says so too', async () => {
    await store.write(withUnknownKey);
    expect(await shelf.get('key')).toMatchObject({
      readable: false,
      raw: { rooms: [] },
      summary: { trouble: 'Needs a newer Sealwright.' }
    });
    await shelf.refresh('key');
    expect((await shelf.list())[0].trouble).toBe('Needs a newer Sealwright.');
  });

  test('a damaged row is listed, and does not hide the others', async () => {
    await store.write(damaged);
    await shelf.add(smallPlan('Sound'));
    expect((await shelf.list()).map(({ id, title }) => [id, title])).toEqual([
      ['plan-1', 'Sound'],
      ['damaged', 'Untitled plan']
    ]);
    expect(await shelf.get('damaged')).toMatchObject({
      readable: false,
      summary: { trouble: 'Cannot be read.' }
    });
    expect(await refreshStale(shelf, { idle: async () => undefined })).toBe(1);
    expect((await shelf.list())[1].trouble).toBe('Cannot be read.');
    // Not tried over and over.
    expect(await refreshStale(shelf, { idle: async () => undefined })).toBe(0);
  });

  test('a plan whose history is damaged opens without it', async () => {
    const { id } = await shelf.add(smallPlan());
    const row = await store.read(id);
    await store.write({ ...(row as PlanRow), history: { entries: [{ label: 7 }], position: 9 } });
    expect((await readable(shelf, id)).history).toEqual(EMPTY_HISTORY);
    expect((await readable(shelf, id)).record.plan).toEqual(smallPlan());
  });

  test('figures of an older engine are worked out again, one plan at a time in idle time', async () => {
    const fresh = await shelf.add(smallPlan('Fresh'));
    for (const title of ['Old', 'Older']) {
      const { id } = await shelf.add(smallPlan(title));
      const { record, history } = await readable(shelf, id);
      await shelf.put(
        { ...record, engineVersion: '0', verdict: { holds: true, sentence: 'Out of date.', margin: 9 } },
        history
      );
    }
    const done: string[] = [];
    let idles = 0;
    const idle = async () => void idles++;
    expect(await refreshStale(shelf, { idle, onRefreshed: (id) => void done.push(id) })).toBe(2);
    expect(idles).toBe(2);
    expect(done.sort()).toEqual(['plan-2', 'plan-3']);
    for (const { engineVersion, verdict } of await shelf.list()) {
      expect(engineVersion).toBe(ENGINE_VERSION);
      expect(verdict).toEqual(fresh.verdict);
    }
  });
});

test('versions of the engine are numbers in order', () => {
  expect(isStale(ENGINE_VERSION)).toBe(false);
  expect(isStale(String(Number(ENGINE_VERSION) + 1))).toBe(false);
  expect(isStale(String(Number(ENGINE_VERSION) - 1))).toBe(true);
  expect(isStale('')).toBe(true);
  expect(isStale('unknown')).toBe(true);
});
