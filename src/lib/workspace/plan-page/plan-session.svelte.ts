/** A plan opened from the shelf, from an example or begun anew, and kept on the shelf from its first edit on. */
import { readPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { Autosave, type AutosaveStatus } from '$lib/shelf/autosave';
import { EMPTY_HISTORY, type History } from '$lib/shelf/history';
import type { Shelf } from '$lib/shelf/shelf';
import { ChangedElsewhere } from '$lib/shelf/shelf-error';
import { outline } from '$lib/shelf/summary';
import { PlanDesk } from '../desk/plan-desk.svelte';
import type { Solver } from '../desk/solver';

export interface SessionOptions {
  readonly shelf: Shelf;
  readonly solver: Solver;
  readonly now: () => number;
  readonly newId: () => string;
  /** Told when the plan gets its place on the shelf. */
  readonly onstored?: (id: string) => void;
}

/** What became of opening a plan. */
export type Opened =
  | { readonly is: 'open' }
  | { readonly is: 'missing' }
  | { readonly is: 'unreadable'; readonly title: string; readonly problems: readonly string[] };

export class PlanSession {
  readonly #options: SessionOptions;
  #desk = $state.raw<PlanDesk | null>(null);
  #saved = $state.raw<AutosaveStatus>({ state: 'saved', lastSaved: null, reason: null });
  #changedElsewhere = $state(false);
  #id = $state<string | null>(null);
  #created: number;
  #base: number | undefined;
  #force = false;
  readonly autosave: Autosave;

  constructor(options: SessionOptions) {
    this.#options = options;
    this.#created = options.now();
    this.autosave = new Autosave({
      save: () => this.#save(),
      now: options.now,
      onStatus: (status) => (this.#saved = status)
    });
  }

  get desk(): PlanDesk | null {
    return this.#desk;
  }
  get saved(): AutosaveStatus {
    return this.#saved;
  }
  get id(): string | null {
    return this.#id;
  }
  /** Another tab has stored this plan since; nothing of either is lost until one is chosen. */
  get changedElsewhere(): boolean {
    return this.#changedElsewhere;
  }

  async open(id: string): Promise<Opened> {
    const found = await this.#options.shelf.get(id);
    if (found === null) return { is: 'missing' };
    if (!found.readable)
      return {
        is: 'unreadable',
        title: found.summary.title,
        problems: found.problems.map((p) => `${p.path}: ${p.message}`)
      };
    this.#id = id;
    this.#created = found.record.created;
    this.#base = found.revision;
    this.#show(found.record.plan, found.history);
    return { is: 'open' };
  }

  /** An example is shown and stored only once edited. */
  openText(text: string): Opened {
    const read = readPlan(text);
    if (!read.ok)
      return {
        is: 'unreadable',
        title: 'Example',
        problems: read.problems.map((p) => `${p.path}: ${p.message}`)
      };
    this.#show(read.plan, EMPTY_HISTORY);
    return { is: 'open' };
  }

  /** A plan just begun is worth keeping at once. */
  begin(plan: Plan): void {
    this.#show(plan, EMPTY_HISTORY);
    this.autosave.edited();
  }

  /** Called when the shelf says that another tab has stored or removed this plan. */
  heard(): void {
    this.#changedElsewhere = true;
  }
  /** Takes what the other tab has stored. */
  async takeTheirs(): Promise<void> {
    if (this.#id === null) return;
    const found = await this.#options.shelf.get(this.#id);
    if (found === null || !found.readable) return;
    this.#base = found.revision;
    this.#changedElsewhere = false;
    this.#desk?.replace(found.record.plan, found.history);
  }
  /** Stores this tab's plan over the other's. */
  async keepMine(): Promise<void> {
    this.#force = true;
    this.#changedElsewhere = false;
    this.autosave.edited();
    await this.autosave.flush();
  }

  close(): void {
    void this.autosave.flush().finally(() => this.autosave.stop());
  }

  #show(plan: Plan, history: History): void {
    this.#desk = new PlanDesk(plan, history, {
      solver: this.#options.solver,
      now: this.#options.now,
      onchange: () => this.autosave.edited()
    });
  }

  async #save(): Promise<void> {
    const desk = this.#desk;
    if (desk === null) return;
    const { shelf, now, newId, onstored } = this.#options;
    const first = this.#id === null;
    const id = this.#id ?? newId();
    const record = {
      id,
      plan: desk.plan,
      created: this.#created,
      changed: now(),
      ...outline(desk.chain, desk.budget)
    };
    try {
      const base = this.#force || this.#base === undefined ? {} : { base: this.#base };
      const summary = await shelf.put(record, desk.history, base);
      this.#base = summary.revision;
      this.#force = false;
      this.#id = id;
    } catch (error) {
      if (error instanceof ChangedElsewhere) this.#changedElsewhere = true;
      throw error;
    }
    if (first) onstored?.(id);
  }
}
