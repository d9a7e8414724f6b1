/** The shelf as all pages share it: opened once, after the first page has come to life, and listed anew whenever a plan on it changes. */
import { createContext } from 'svelte';
import { newId } from '$lib/shelf/new-id';
import { openShelf, type OpenShelfOptions } from '$lib/shelf/open-shelf';
import type { PlanSummary, RemovedPlan } from '$lib/shelf/plan-record';
import { refreshStale } from '$lib/shelf/refresh-stale';
import type { Shelf, ShelfNotice } from '$lib/shelf/shelf';
import { ShelfClosed, ShelfError } from '$lib/shelf/shelf-error';
import { Tabs } from '$lib/shelf/tabs';
import { idle } from './idle';

export interface ShelfSessionOptions {
  readonly openShelf?: (options: OpenShelfOptions) => Promise<Shelf>;
  /** ms since 1970. */
  readonly now?: () => number;
}

type Listener = (notice: ShelfNotice) => void;

const UNREADABLE = 'The shelf could not be read. Reload the page; nothing on it was changed.';

export class ShelfSession {
  readonly #openShelf: (options: OpenShelfOptions) => Promise<Shelf>;
  readonly #now: () => number;
  #shelf = $state.raw<Shelf | null>(null);
  #list = $state.raw<readonly PlanSummary[] | null>(null);
  #removed = $state.raw<readonly RemovedPlan[]>([]);
  #listedAt = $state(0);
  #trouble = $state<string | null>(null);
  #opened: (shelf: Shelf) => void = () => undefined;
  readonly #whenOpen = new Promise<Shelf>((resolve) => (this.#opened = resolve));
  #listeners: readonly Listener[] = [];
  #again = false;
  #running: Promise<void> | null = null;

  constructor({ openShelf: open = openShelf, now = Date.now }: ShelfSessionOptions = {}) {
    this.#openShelf = open;
    this.#now = now;
  }

  /** Null until it is open. */
  get shelf(): Shelf | null {
    return this.#shelf;
  }
  /** Every plan, the one changed last first; null until they have been read. */
  get list(): readonly PlanSummary[] | null {
    return this.#list;
  }
  /** Plans taken off that can be put back, the last first. */
  get removed(): readonly RemovedPlan[] {
    return this.#removed;
  }
  /** When the list was read, ms since 1970: "today" is the day of it. */
  get listedAt(): number {
    return this.#listedAt;
  }
  /** Why plans are not stored, in a sentence; null where they are. */
  get trouble(): string | null {
    return this.#trouble;
  }

  /** Opens the shelf; in the browser alone, and once. Gives back how to close it. */
  open(): () => void {
    const tabs = new Tabs(newId(), (notice) => {
      for (const listener of this.#listeners) listener(notice);
      void this.reload();
    });
    const notify = (notice: ShelfNotice) => {
      tabs.say(notice);
      void this.reload();
    };
    const onClosed = () => (this.#trouble = new ShelfClosed().message);
    let left = false;
    void this.#openShelf({ now: this.#now, newId, notify, onClosed }).then((shelf) => {
      if (left) shelf.close();
      else void this.#take(shelf);
    });
    return () => {
      left = true;
      tabs.close();
      this.#shelf?.close();
    };
  }

  /** Resolves with the shelf when it is open. */
  whenOpen(): Promise<Shelf> {
    return this.#whenOpen;
  }

  /** Hears of plans that other tabs changed or removed. Gives back how to stop. */
  listen(listener: Listener): () => void {
    this.#listeners = [...this.#listeners, listener];
    return () => (this.#listeners = this.#listeners.filter((other) => other !== listener));
  }

  /** Reads the list again; resolves when it shows everything done before the call. Never rejects. */
  reload(): Promise<void> {
    this.#again = true;
    this.#running ??= this.#read().finally(() => (this.#running = null));
    return this.#running;
  }

  async #take(shelf: Shelf): Promise<void> {
    this.#shelf = shelf;
    this.#trouble = shelf.reason?.text ?? null;
    this.#opened(shelf);
    await this.reload();
    // Housekeeping: if it fails, the next visit does it.
    await refreshStale(shelf, { idle, onRefreshed: () => void this.reload() }).catch(() => undefined);
  }

  async #read(): Promise<void> {
    const shelf = this.#shelf;
    while (this.#again) {
      this.#again = false;
      if (shelf === null) return;
      try {
        const [list, removed] = await Promise.all([shelf.list(), shelf.removed()]);
        this.#list = list;
        this.#removed = removed;
        this.#listedAt = this.#now();
      } catch (error) {
        this.#trouble = error instanceof ShelfError ? error.message : UNREADABLE;
        this.#list ??= [];
      }
    }
  }
}

export const [getShelfSession, setShelfSession] = createContext<ShelfSession>();
