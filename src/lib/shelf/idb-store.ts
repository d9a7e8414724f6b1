/**
 * Rows in IndexedDB. Summaries stand in a store of their own, so that a list reads nothing but them; whole plans and histories are
 * read one at a time.
 */
import type { DBSchema, IDBPDatabase, IDBPTransaction } from 'idb';
import type { PlanSummary } from './plan-record';
import type { PlanRow, PlanStore, RemovedRow, StoredRow } from './plan-store';
import { revisionOf } from './read-summary';
import { ChangedElsewhere, ShelfClosed, ShelfError, ShelfFull } from './shelf-error';

/** The database: names and shapes as stored. A new store or index raises DATABASE_VERSION and is made in `upgrade`. */
export const DATABASE = 'sealwright';
export const DATABASE_VERSION = 1;

export interface ShelfSchema extends DBSchema {
  summaries: { key: string; value: { id: string } & Record<string, unknown> };
  plans: { key: string; value: { id: string; plan: unknown; drafts?: unknown } };
  histories: { key: string; value: { id: string; history: unknown } };
  removed: { key: string; value: RemovedRow };
}

type StoreName = 'summaries' | 'plans' | 'histories' | 'removed';
type Transaction = IDBPTransaction<ShelfSchema, StoreName[], IDBTransactionMode>;
type Writing = IDBPTransaction<ShelfSchema, StoreName[], 'readwrite'>;

const PARTS: StoreName[] = ['summaries', 'plans', 'histories'];
const ALL: StoreName[] = [...PARTS, 'removed'];

/** Brings a database of any older version, 0 for none, up to this one. */
export function upgrade(db: IDBPDatabase<ShelfSchema>, from: number): void {
  if (from < 1) for (const name of ALL) db.createObjectStore(name, { keyPath: 'id' });
}

export class IdbStore implements PlanStore {
  readonly #db: IDBPDatabase<ShelfSchema>;

  constructor(db: IDBPDatabase<ShelfSchema>) {
    this.#db = db;
  }

  list(): Promise<unknown[]> {
    return this.#reading(['summaries'], (tx) => tx.objectStore('summaries').getAll());
  }

  read(id: string): Promise<StoredRow | null> {
    return this.#reading(PARTS, (tx) => readRow(tx, id));
  }

  write(row: PlanRow, base?: number): Promise<number> {
    const { id } = row.summary;
    return this.#writing(ALL, async (tx) => {
      const before = await tx.objectStore('summaries').get(id);
      const stored = before === undefined ? (base ?? 0) : revisionOf(before);
      if (base !== undefined && base !== stored) throw new ChangedElsewhere(id);
      const revision = stored + 1;
      await putRow(tx, id, { ...row, summary: { ...row.summary, revision } });
      await tx.objectStore('removed').delete(id);
      return revision;
    });
  }

  writeSummary(summary: PlanSummary): Promise<void> {
    return this.#writing(['summaries'], async (tx) => {
      const before = await tx.objectStore('summaries').get(summary.id);
      if (before === undefined || revisionOf(before) !== summary.revision) return;
      await tx.objectStore('summaries').put({ ...summary });
    });
  }

  remove(id: string, at: number): Promise<boolean> {
    return this.#writing(ALL, async (tx) => {
      const row = await readRow(tx, id);
      if (row === null) return false;
      await together([
        ...PARTS.map((name) => () => tx.objectStore(name).delete(id)),
        () => tx.objectStore('removed').put({ id, at, row })
      ]);
      return true;
    });
  }

  restore(id: string): Promise<boolean> {
    return this.#writing(ALL, async (tx) => {
      const removed = await tx.objectStore('removed').get(id);
      if (removed === undefined) return false;
      await tx.objectStore('removed').delete(id);
      if ((await tx.objectStore('summaries').count(id)) === 0) await putRow(tx, id, removed.row);
      return true;
    });
  }

  removed(): Promise<RemovedRow[]> {
    return this.#reading(['removed'], (tx) => tx.objectStore('removed').getAll());
  }

  forget(at: number): Promise<void> {
    return this.#writing(['removed'], async (tx) => {
      const store = tx.objectStore('removed');
      const old = (await store.getAll()).filter((removed) => removed.at < at);
      await together(
        old.map(
          ({ id }) =>
            () =>
              store.delete(id)
        )
      );
    });
  }

  close(): void {
    this.#db.close();
  }

  async #reading<T>(stores: StoreName[], work: (tx: Transaction) => Promise<T>): Promise<T> {
    const tx = this.#begin(() => this.#db.transaction(stores, 'readonly'));
    return finish(tx, () => work(tx));
  }

  async #writing<T>(stores: StoreName[], work: (tx: Writing) => Promise<T>): Promise<T> {
    const tx = this.#begin(() => this.#db.transaction(stores, 'readwrite'));
    return finish(tx, () => work(tx));
  }

  #begin<T>(open: () => T): T {
    try {
      return open();
    } catch (cause) {
      throw named(cause, 'InvalidStateError') ? new ShelfClosed({ cause }) : cause;
    }
  }
}

/** Does the work and waits until it is on disk; on any failure nothing of it is. */
async function finish<T>(tx: Transaction, work: () => Promise<T>): Promise<T> {
  // A transaction that aborts while the work fails must not be a second, unhandled failure.
  tx.done.catch(() => undefined);
  try {
    const result = await work();
    await tx.done;
    return result;
  } catch (error) {
    abort(tx);
    if (error instanceof ShelfError) throw error;
    // A request cut off by the abort says AbortError; the transaction knows why.
    const full = [error, tx.error].some((e) => named(e, 'QuotaExceededError'));
    throw full ? new ShelfFull({ cause: error }) : error;
  }
}

function abort(tx: Transaction): void {
  try {
    tx.abort();
  } catch {
    // It is over already.
  }
}

const named = (error: unknown, name: string): boolean => error instanceof Error && error.name === name;

async function readRow(tx: Transaction, id: string): Promise<StoredRow | null> {
  const [summary, plan, history] = await Promise.all([
    tx.objectStore('summaries').get(id),
    tx.objectStore('plans').get(id),
    tx.objectStore('histories').get(id)
  ]);
  if (summary === undefined) return null;
  return { summary, plan: plan?.plan, drafts: plan?.drafts, history: history?.history };
}

async function putRow(tx: Writing, id: string, { summary, plan, drafts, history }: StoredRow): Promise<void> {
  await together([
    () => tx.objectStore('summaries').put({ ...Object(summary), id }),
    () => tx.objectStore('plans').put({ id, plan, drafts }),
    () => tx.objectStore('histories').put({ id, history })
  ]);
}

/** Requests made at once. One that throws outright must not leave those before it to fail unheard. */
const together = (requests: readonly (() => Promise<unknown>)[]): Promise<unknown> =>
  Promise.all(requests.map(async (request) => request()));
