/** Opens the database, or says why the browser stores nothing. */
import { openDB, type IDBPDatabase } from 'idb';
import { DATABASE, DATABASE_VERSION, upgrade, type ShelfSchema } from './idb-store';

/** Why plans are kept in memory alone. */
export interface MemoryReason {
  readonly code: 'absent' | 'refused' | 'newer' | 'blocked' | 'slow';
  readonly text: string;
}

const GONE = 'Plans are kept until this page is closed: export what you want to keep.';
const REASONS: { readonly [C in MemoryReason['code']]: string } = {
  absent: `This browser stores nothing here. ${GONE}`,
  refused: `The browser refuses to store anything here, as in a private window. ${GONE}`,
  newer: `The plans on this device were stored by a newer Sealwright: reload the page to get it. ${GONE}`,
  blocked: `Another tab holds the shelf in an older Sealwright: close that tab, then reload. ${GONE}`,
  slow: `The browser did not open its store. ${GONE}`
};

export const memoryReason = (code: MemoryReason['code']): MemoryReason => ({ code, text: REASONS[code] });

export type Opened = { ok: true; db: IDBPDatabase<ShelfSchema> } | { ok: false; reason: MemoryReason };

/** Never rejects. `patience` in ms; `onClosed` is called when the store is closed under the page. */
export async function openDatabase(patience: number, onClosed: () => void): Promise<Opened> {
  if (!present()) return refused('absent');
  return new Promise((resolve) => {
    let waiting = true;
    const settle = (result: Opened) => {
      waiting = false;
      clearTimeout(timer);
      resolve(result);
    };
    const timer = setTimeout(() => settle(refused('slow')), patience);
    open(() => settle(refused('blocked')), onClosed).then(
      // Too late, the page works in memory by now: it must not hold the store open.
      (db) => (waiting ? settle({ ok: true, db }) : db.close()),
      (error: unknown) => settle(refused(nameOf(error) === 'VersionError' ? 'newer' : 'refused'))
    );
  });
}

/** Async, so that a store that throws at once rejects like any other. */
const open = async (blocked: () => void, onClosed: () => void): Promise<IDBPDatabase<ShelfSchema>> =>
  openDB<ShelfSchema>(DATABASE, DATABASE_VERSION, {
    upgrade,
    blocked,
    // A newer Sealwright wants to upgrade the store: this page must let go of it.
    blocking: (_have, _want, event) => {
      (event.target as IDBDatabase).close();
      onClosed();
    },
    terminated: onClosed
  });

const refused = (code: MemoryReason['code']): Opened => ({ ok: false, reason: memoryReason(code) });

const nameOf = (error: unknown): string => (error instanceof Error ? error.name : '');

/** Merely asking for the store throws where the page may not store. */
function present(): boolean {
  try {
    return typeof indexedDB === 'object' && indexedDB !== null;
  } catch {
    return false;
  }
}
