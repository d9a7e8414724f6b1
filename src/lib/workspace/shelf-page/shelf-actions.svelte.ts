/** What can be done to the plans on the shelf, and what is to be said about it. Every verb ends with the list up to date; none rejects. */
import { exportAll, exportShelved } from '$lib/shelf/export-plans';
import { importPlans, type ImportResult } from '$lib/shelf/import-plans';
import type { PlanSummary } from '$lib/shelf/plan-record';
import type { Shelf } from '$lib/shelf/shelf';
import { NotOnShelf } from '$lib/shelf/shelf-error';
import { zipFiles } from '$lib/shelf/zip-files';
import { exportFile } from '../session/export-file';
import { readFiles } from '../session/read-files';
import type { ShelfSession } from '../session/shelf-session.svelte';

export type RefusedFile = ImportResult & { readonly ok: false };
export type Titled = Pick<PlanSummary, 'id' | 'title'>;

export interface ShelfActionsOptions {
  readonly exportFile?: typeof exportFile;
  /** ms since 1970. */
  readonly now?: () => number;
}

export class ShelfActions {
  readonly #session: ShelfSession;
  readonly #exportFile: typeof exportFile;
  readonly #now: () => number;
  #said = $state('');
  #trouble = $state<string | null>(null);
  #refused = $state.raw<readonly RefusedFile[]>([]);
  #deleted = $state.raw<readonly Titled[]>([]);

  constructor(session: ShelfSession, options: ShelfActionsOptions = {}) {
    this.#session = session;
    this.#exportFile = options.exportFile ?? exportFile;
    this.#now = options.now ?? Date.now;
  }

  /** What was done last, for those who hear the page. */
  get said(): string {
    return this.#said;
  }
  /** Why the last verb was not done; null where it was. */
  get trouble(): string | null {
    return this.#trouble;
  }
  /** Files of the last import that are no plans. */
  get refused(): readonly RefusedFile[] {
    return this.#refused;
  }
  /** Plans deleted on this page that can be put back, the last one last. */
  get deleted(): readonly Titled[] {
    return this.#deleted;
  }

  /** The copy, or null where it was not made. */
  duplicate({ id }: Titled): Promise<Titled | null> {
    return this.#do(async (shelf) => {
      const copy = await shelf.duplicate(id);
      this.#said = `${copy.title} added.`;
      return copy;
    });
  }

  /** A title without a letter changes nothing. */
  async rename({ id, title: before }: Titled, title: string): Promise<void> {
    const after = title.trim();
    if (after === '' || after === before) return;
    await this.#do(async (shelf) => {
      await shelf.rename(id, after);
      this.#said = `Renamed to ${after}.`;
    });
  }

  /** True where it was deleted. */
  async remove({ id, title }: Titled): Promise<boolean> {
    const done = await this.#do(async (shelf) => {
      await shelf.remove(id);
      this.#deleted = [...this.#deleted.filter((plan) => plan.id !== id), { id, title }];
      this.#said = `${title} deleted.`;
      return true;
    });
    return done ?? false;
  }

  /** Puts back a plan, the one deleted last unless another is named; null where it could not be. */
  restore(plan: Titled | undefined = this.#deleted.at(-1)): Promise<Titled | null> {
    return this.#do(async (shelf) => {
      if (plan === undefined) return null;
      await shelf.restore(plan.id);
      this.#deleted = this.#deleted.filter(({ id }) => id !== plan.id);
      this.#said = `${plan.title} is back.`;
      return plan;
    });
  }

  /** Offers no more to undo; the plans can still be put back from the list of deleted ones. */
  letGo(): void {
    this.#deleted = [];
  }

  async export({ id }: Titled): Promise<void> {
    await this.#do(async (shelf) => {
      const shelved = await shelf.get(id);
      if (shelved === null) throw new NotOnShelf(id);
      const { name, text } = exportShelved(shelved);
      this.#exportFile(name, text);
      this.#said = `Exported as ${name}.`;
    });
  }

  async exportAll(): Promise<void> {
    await this.#do(async (shelf) => {
      const files = await exportAll(shelf);
      const name = `sealwright-plans-${dayOf(this.#now())}.zip`;
      this.#exportFile(name, await zipFiles(files, this.#now()));
      this.#said = `${plans(files.length)} exported as ${name}.`;
    });
  }

  /** Every file that is a plan goes on the shelf; what is wrong with the others is kept in `refused`. */
  async import(files: readonly File[]): Promise<void> {
    await this.#do(async (shelf) => {
      const results: ImportResult[] = [];
      for (const read of await readFiles(files))
        results.push(...(read.ok ? await importPlans(shelf, [read.file]) : [read]));
      this.#refused = results.filter((result) => !result.ok);
      const stored = results.length - this.#refused.length;
      this.#said = stored === 0 ? '' : `${plans(stored)} added.`;
    });
  }

  dismissRefused(): void {
    this.#refused = [];
  }

  async #do<T>(work: (shelf: Shelf) => Promise<T>): Promise<T | null> {
    const shelf = await this.#session.whenOpen();
    // What was said is said again even where the words are the same.
    this.#said = '';
    this.#trouble = null;
    try {
      return await work(shelf);
    } catch (error) {
      this.#trouble = error instanceof Error ? error.message : String(error);
      return null;
    } finally {
      await this.#session.reload();
    }
  }
}

const plans = (count: number): string => (count === 1 ? '1 plan' : `${count} plans`);

/** The day by the device's calendar: 2025-11-12. */
function dayOf(at: number): string {
  const day = new Date(at);
  const two = (value: number) => String(value).padStart(2, '0');
  return `${day.getFullYear()}-${two(day.getMonth() + 1)}-${two(day.getDate())}`;
}
