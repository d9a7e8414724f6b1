/** What only a shelf that stores can do, or fail to do. */
import { openDB } from 'idb';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { edit, EMPTY_HISTORY, redo, undo, type Edited } from '$lib/shelf/history';
import { DATABASE, DATABASE_VERSION, type ShelfSchema } from '$lib/shelf/idb-store';
import { openShelf } from '$lib/shelf/open-shelf';
import { REMOVED_KEPT } from '$lib/shelf/plan-shelf';
import { ChangedElsewhere, ShelfClosed, ShelfFull } from '$lib/shelf/shelf-error';
import { fakeWorld, freshBrowser, putPlan, readable, replace, smallPlan } from './specimen';

beforeEach(freshBrowser);
afterEach(() => {
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
});

const openRaw = () => openDB<ShelfSchema>(DATABASE, DATABASE_VERSION);

describe('over a reopening', () => {
  test('an empty database is brought up to date, and one that is stays', async () => {
    const first = await openShelf(fakeWorld());
    expect(first.kind).toBe('stored');
    const raw = await openRaw();
    expect([...raw.objectStoreNames].sort()).toEqual(['histories', 'plans', 'removed', 'summaries']);
    raw.close();
    const { id } = await first.add(smallPlan());
    first.close();
    const again = await openShelf(fakeWorld());
    expect((await again.list()).map((summary) => summary.id)).toEqual([id]);
  });

  test('plan and a history of 180 steps survive', async () => {
    const shelf = await openShelf(fakeWorld());
    const { id } = await shelf.add(smallPlan());
    let state: Edited = { plan: smallPlan(), history: EMPTY_HISTORY };
    for (let i = 1; i <= 180; i++)
      state = edit(state, replace('/goal/level_dB', 60 + i / 10), { label: `Step ${i}`, at: i * 5000 });
    await putPlan(shelf, id, state.plan, state.history);
    shelf.close();

    const { record, history } = await readable(await openShelf(fakeWorld()), id);
    expect(history.entries).toHaveLength(180);
    let walked: Edited = { plan: record.plan, history };
    for (let i = 0; i < 180; i++) walked = undo(walked);
    expect(walked.plan).toEqual(smallPlan());
    for (let i = 0; i < 180; i++) walked = redo(walked);
    expect(walked.plan).toEqual(state.plan);
  });

  test('a removed plan can be restored on a later visit, for 30 days', async () => {
    const world = fakeWorld();
    const first = await openShelf(world);
    for (const title of ['Early', 'Late']) await first.add(smallPlan(title));
    await first.remove('plan-1');
    world.time += 1;
    await first.remove('plan-2');
    first.close();
    world.time += REMOVED_KEPT;
    const later = await openShelf(world);
    expect((await later.removed()).map(({ summary }) => summary.title)).toEqual(['Late']);
    await later.restore('plan-2');
    expect((await readable(later, 'plan-2')).record.plan).toEqual(smallPlan('Late'));
  });
});

describe('two shelves at once', () => {
  test('see what the other stores', async () => {
    const world = fakeWorld();
    const [one, two] = [await openShelf(world), await openShelf(world)];
    const { id } = await one.add(smallPlan());
    await two.rename(id, 'From the other tab');
    expect((await one.list())[0].title).toBe('From the other tab');
    await one.remove(id);
    expect(await two.list()).toEqual([]);
  });

  test('neither overwrites the other unseen', async () => {
    const world = fakeWorld();
    const [one, two] = [await openShelf(world), await openShelf(world)];
    const { id } = await one.add(smallPlan());
    const seen = await readable(two, id);
    await one.rename(id, 'By the first');
    const edited = { ...seen.record, plan: { ...seen.record.plan, notes: 'By the second' } };
    await expect(two.put(edited, seen.history, { base: seen.revision })).rejects.toThrow(ChangedElsewhere);
    expect((await readable(one, id)).record.plan.title).toBe('By the first');
  });

  test('a title given by one goes on top of an edit by the other', async () => {
    const world = fakeWorld();
    const [one, two] = [await openShelf(world), await openShelf(world)];
    const { id } = await one.add(smallPlan());
    await Promise.all([
      two.rename(id, 'Renamed by the second'),
      one.rename(id, 'Renamed by the first'),
      two.rename(id, 'Renamed again')
    ]);
    const { history, revision } = await readable(one, id);
    expect(revision).toBe(4);
    expect(history.entries).toHaveLength(3);
  });
});

describe('no room left', () => {
  const exceeded = () => new DOMException('The quota has been exceeded.', 'QuotaExceededError');
  const original = () => IDBObjectStore.prototype.put;

  /** Browsers say so at the request, or only when the transaction ends. */
  const WAYS: [string, () => void][] = [
    [
      'at the request',
      () =>
        void vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(() => {
          throw exceeded();
        })
    ],
    [
      'at the end',
      () => {
        const put = original();
        vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(function (
          this: IDBObjectStore,
          value: unknown
        ) {
          const request = put.call(this, value);
          const inside = this.transaction as unknown as { _abort(name: string): void };
          queueMicrotask(() => this.transaction.error ?? inside._abort('QuotaExceededError'));
          return request;
        });
      }
    ]
  ];

  test.for(WAYS)('%s: a typed error, and nothing of what stood there is lost', async ([, fill]) => {
    const world = fakeWorld();
    const shelf = await openShelf(world);
    const { id } = await shelf.add(smallPlan());
    const before = await shelf.get(id);
    const { record } = await readable(shelf, id);
    const edited = { ...record, plan: { ...record.plan, notes: 'Long.' } };
    world.notices.length = 0;

    fill();
    const failure = await shelf.put(edited, EMPTY_HISTORY).catch((error: unknown) => error);
    expect(failure).toBeInstanceOf(ShelfFull);
    expect(String(failure)).toMatch(/no room left on this device\. Export the plan to a file/);
    const imported = await shelf.importTexts([{ name: 'a.json', content: JSON.stringify(smallPlan()) }]);
    expect(imported).toMatchObject([{ ok: false, problems: [(failure as ShelfFull).message] }]);
    await expect(shelf.remove(id)).rejects.toThrow(ShelfFull);

    vi.restoreAllMocks();
    expect(await shelf.get(id)).toEqual(before);
    expect(await shelf.list()).toHaveLength(1);
    expect(world.notices).toEqual([]);
    // Room again: the same record goes in.
    await shelf.put(edited, EMPTY_HISTORY);
    expect((await readable(shelf, id)).record.plan.notes).toBe('Long.');
  });
});

describe('a store that does not open', () => {
  const lookedAt = (get: () => IDBFactory | undefined) =>
    Object.defineProperty(globalThis, 'indexedDB', { configurable: true, get });

  test.for<[string, string, () => unknown]>([
    ['absent', 'absent', () => lookedAt(() => undefined)],
    [
      'throws when looked at',
      'absent',
      () =>
        lookedAt(() => {
          throw new DOMException('no', 'SecurityError');
        })
    ],
    [
      'throws when opened',
      'refused',
      () =>
        vi.spyOn(IDBFactory.prototype, 'open').mockImplementation(() => {
          throw new DOMException('no', 'SecurityError');
        })
    ],
    [
      'never answers',
      'slow',
      () => vi.spyOn(IDBFactory.prototype, 'open').mockReturnValue(new IDBOpenDBRequest())
    ],
    [
      'stored by a newer Sealwright',
      'newer',
      async () => (await openDB(DATABASE, DATABASE_VERSION + 1)).close()
    ]
  ])('%s: a shelf in memory that says why', async ([, code, spoil]) => {
    await spoil();
    const shelf = await openShelf({ ...fakeWorld(), patience: 30 });
    expect(shelf.kind).toBe('memory');
    expect(shelf.reason?.code).toBe(code);
    expect(shelf.reason?.text).toMatch(/export what you want to keep\.$/);
    const { id } = await shelf.add(smallPlan());
    expect((await readable(shelf, id)).record.plan).toEqual(smallPlan());
  });

  test('held by a tab that does not let go: memory, and the store is not held open once it comes', async () => {
    const old = await openDB(DATABASE, DATABASE_VERSION + 1, { blocking: () => undefined });
    const deleting = indexedDB.deleteDatabase(DATABASE);
    await new Promise((resolve) => (deleting.onblocked = resolve));
    const shelf = await openShelf({ ...fakeWorld(), patience: 30 });
    expect(shelf.reason?.code).toBe('slow');
    old.close();
    const closed = vi.spyOn(IDBDatabase.prototype, 'close');
    await new Promise((resolve) => (deleting.onsuccess = resolve));
    await vi.waitFor(() => expect(closed).toHaveBeenCalledTimes(1));
  });

  test('an older tab that does not let go: memory, with the advice to close it', async () => {
    const old = await openDB(DATABASE, 0.5 + DATABASE_VERSION / 2, {
      upgrade: (db) => void db.createObjectStore('other'),
      blocking: () => undefined
    });
    expect(old.version).toBe(DATABASE_VERSION);
    const open = IDBFactory.prototype.open;
    vi.spyOn(IDBFactory.prototype, 'open').mockImplementation(function (this: IDBFactory, name: string) {
      return open.call(this, name, DATABASE_VERSION + 1);
    });
    const shelf = await openShelf({ ...fakeWorld(), patience: 20_000 });
    expect(shelf.reason).toMatchObject({
      code: 'blocked',
      text: expect.stringMatching(/^Another tab holds/)
    });
    old.close();
  });
});

test('a newer Sealwright in another tab gets the store; this one says that it is closed', async () => {
  const onClosed = vi.fn();
  const shelf = await openShelf({ ...fakeWorld(), onClosed });
  await shelf.add(smallPlan());
  const newer = await openDB(DATABASE, DATABASE_VERSION + 1);
  expect(newer.version).toBe(DATABASE_VERSION + 1);
  expect(onClosed).toHaveBeenCalledTimes(1);
  await expect(shelf.add(smallPlan())).rejects.toThrow(ShelfClosed);
  await expect(shelf.list()).rejects.toThrow(/Export the plan, then reload/);
});

test('500 plans are listed by one request for the summaries alone', async () => {
  const world = fakeWorld();
  const shelf = await openShelf(world);
  await shelf.add(smallPlan());
  const { record } = await readable(shelf, 'plan-1');
  for (let i = 2; i <= 500; i++) await shelf.put({ ...record, id: `plan-${i}`, changed: i }, EMPTY_HISTORY);

  const transactions = vi.spyOn(IDBDatabase.prototype, 'transaction');
  const gets = vi.spyOn(IDBObjectStore.prototype, 'get');
  const begun = performance.now();
  const list = await shelf.list();
  const took = performance.now() - begun;
  expect(list).toHaveLength(500);
  expect(list[0].curve?.delivered).toHaveLength(48);
  expect(transactions.mock.calls.map(([stores]) => stores)).toEqual([['summaries']]);
  expect(gets).toHaveBeenCalledTimes(0);
  console.info(`500 plans listed in ${took.toFixed(1)} ms (in a store of the tests, in memory)`);
});
