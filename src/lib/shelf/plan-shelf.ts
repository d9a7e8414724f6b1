/** The shelf over any store of rows. */
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { VERSION } from '$lib/plan/version';
import { titleOf } from '$lib/words/title';
import { copyTitle } from './copy-title';
import { ENGINE_VERSION } from './engine-version';
import { edit, EMPTY_HISTORY, type History } from './history';
import { importPlans, type ImportedFile, type ImportResult } from './import-plans';
import type { MemoryReason } from './open-database';
import type { PlanRecord, PlanSummary, RemovedPlan, ShelvedPlan } from './plan-record';
import type { PlanStore } from './plan-store';
import { readDrafts } from './read-drafts';
import { readHistory } from './read-history';
import { readSummary } from './read-summary';
import type { Shelf, ShelfNotice, ShelfOptions } from './shelf';
import { ChangedElsewhere, NotOnShelf, UnreadablePlan } from './shelf-error';
import { outlineOrNone, recordOf, summaryOf, troubleOf } from './summary';

/** ms: a plan taken off the shelf can be restored for 30 days. */
export const REMOVED_KEPT = 30 * 24 * 60 * 60 * 1000;

type Readable = ShelvedPlan & { readable: true };

export class PlanShelf implements Shelf {
  readonly kind: Shelf['kind'];
  readonly #store: PlanStore;
  readonly #options: ShelfOptions;

  constructor(
    store: PlanStore,
    options: ShelfOptions,
    readonly reason: MemoryReason | null
  ) {
    this.kind = reason === null ? 'stored' : 'memory';
    this.#store = store;
    this.#options = options;
  }

  async list(): Promise<PlanSummary[]> {
    const summaries = (await this.#store.list()).map(readSummary);
    return summaries.sort((a, b) => b.changed - a.changed || a.title.localeCompare(b.title));
  }

  async get(id: string): Promise<ShelvedPlan | null> {
    const row = await this.#store.read(id);
    if (row === null) return null;
    const summary = readSummary(row.summary);
    const { revision } = summary;
    const read = checkPlan(row.plan);
    if (!read.ok) {
      const trouble = troubleOf(summary.planVersion, read.problems);
      const { problems } = read;
      return { readable: false, summary: { ...summary, trouble }, raw: row.plan, problems, revision };
    }
    const { created, changed, verdict, curve, engineVersion } = summary;
    const drafts = readDrafts(row.drafts);
    const record: PlanRecord = {
      ...{ id, plan: read.plan, created, changed, verdict, curve, engineVersion },
      ...(drafts === null ? {} : { drafts })
    };
    // Steps written for an older version of the file do not fit the plan as it is now.
    const history = versionOf(row.plan) === VERSION ? readHistory(row.history, read.plan) : EMPTY_HISTORY;
    return { readable: true, record, history, revision };
  }

  add(plan: Plan): Promise<PlanSummary> {
    const at = this.#options.now();
    return this.put(recordOf(plan, { id: this.#options.newId(), created: at, changed: at }), EMPTY_HISTORY);
  }

  async put(record: PlanRecord, history: History, { base }: { base?: number } = {}): Promise<PlanSummary> {
    const summary: PlanSummary = { ...summaryOf(record), revision: base ?? 0 };
    const { plan, drafts } = record;
    const revision = await this.#store.write({ summary, plan, drafts, history }, base);
    this.#notify({ kind: 'changed', id: record.id });
    return { ...summary, revision };
  }

  async remove(id: string): Promise<() => Promise<void>> {
    if (await this.#store.remove(id, this.#options.now())) this.#notify({ kind: 'removed', id });
    else if (!(await this.#store.removed()).some((removed) => removed.id === id)) throw new NotOnShelf(id);
    return () => this.restore(id);
  }

  async removed(): Promise<RemovedPlan[]> {
    const removed = await this.#store.removed();
    return removed
      .map(({ at, row }) => ({ at, summary: readSummary(row.summary) }))
      .sort((a, b) => b.at - a.at);
  }

  async restore(id: string): Promise<void> {
    if (await this.#store.restore(id)) this.#notify({ kind: 'changed', id });
    else if ((await this.#store.read(id)) === null) throw new NotOnShelf(id);
  }

  async duplicate(id: string): Promise<PlanSummary> {
    const { record } = await this.#readable(id);
    const titles = (await this.list()).map(({ title }) => title);
    const at = this.#options.now();
    const plan = { ...record.plan, title: copyTitle(titleOf(record.plan), titles) };
    const copy = { ...record, id: this.#options.newId(), plan, created: at, changed: at };
    return this.put(copy, EMPTY_HISTORY);
  }

  async rename(id: string, title: string): Promise<PlanSummary> {
    for (let tries = 1; ; tries++) {
      const { record, history, revision } = await this.#readable(id);
      const at = this.#options.now();
      const patch = [{ op: 'add', path: '/title', value: title } as const];
      const renamed = edit({ plan: record.plan, history }, patch, { label: 'Title', at });
      try {
        const changed = { ...record, plan: renamed.plan, changed: at };
        return await this.put(changed, renamed.history, { base: revision });
      } catch (error) {
        // Another tab came between reading and writing: its edit is kept, the title goes on top.
        if (!(error instanceof ChangedElsewhere) || tries === MOST_TRIES) throw error;
      }
    }
  }

  importTexts(files: readonly ImportedFile[]): Promise<ImportResult[]> {
    return importPlans(this, files);
  }

  async refresh(id: string): Promise<void> {
    const row = await this.#store.read(id);
    if (row === null) return;
    const summary = readSummary(row.summary);
    const read = checkPlan(row.plan);
    const figures = read.ok
      ? { ...outlineOrNone(read.chain), trouble: null }
      : { trouble: troubleOf(summary.planVersion, read.problems), engineVersion: ENGINE_VERSION };
    await this.#store.writeSummary({ ...summary, ...figures });
  }

  close(): void {
    this.#store.close();
  }

  async #readable(id: string): Promise<Readable> {
    const shelved = await this.get(id);
    if (shelved === null) throw new NotOnShelf(id);
    if (!shelved.readable) throw new UnreadablePlan(id, shelved.summary.trouble ?? '');
    return shelved;
  }

  #notify(notice: ShelfNotice): void {
    this.#options.notify?.(notice);
  }
}

const MOST_TRIES = 5;

const versionOf = (plan: unknown): unknown => Object(plan).version;
