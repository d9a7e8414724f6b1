import { IdbStore } from './idb-store';
import { MemoryStore } from './memory-store';
import { openDatabase, type MemoryReason } from './open-database';
import { PlanShelf, REMOVED_KEPT } from './plan-shelf';
import type { Shelf, ShelfOptions } from './shelf';

export interface OpenShelfOptions extends ShelfOptions {
  /** ms to wait for the browser's store before working in memory. */
  readonly patience?: number;
  /** Called when the store is closed under the page; calls reject with `ShelfClosed` from then on. */
  readonly onClosed?: () => void;
}

/** The shelf of this device, or one in memory with the reason. Never rejects. Plans removed over 30 days ago are given up. */
export async function openShelf({
  patience = 5000,
  onClosed = () => undefined,
  ...options
}: OpenShelfOptions): Promise<Shelf> {
  const opened = await openDatabase(patience, onClosed);
  if (!opened.ok) return memoryShelf(options, opened.reason);
  const store = new IdbStore(opened.db);
  // Housekeeping: if it fails, the next visit does it.
  await store.forget(options.now() - REMOVED_KEPT).catch(() => undefined);
  return new PlanShelf(store, options, null);
}

/** A shelf that is gone with the page. */
export const memoryShelf = (options: ShelfOptions, reason: MemoryReason): Shelf =>
  new PlanShelf(new MemoryStore(), options, reason);
