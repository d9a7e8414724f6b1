/** The shelf: where plans are kept on this device. */
import type { Plan } from '$lib/plan/schema';
import type { History } from './history';
import type { ImportedFile, ImportResult } from './import-plans';
import type { MemoryReason } from './open-database';
import type { PlanRecord, PlanSummary, RemovedPlan, ShelvedPlan } from './plan-record';

/** Calls reject with a `ShelfError` where something stands in the way: see `shelf-error.ts`. */
export interface Shelf {
  /** Whether plans outlast the page. */
  readonly kind: 'stored' | 'memory';
  /** Why they do not; null where they do. */
  readonly reason: MemoryReason | null;
  /** Every plan, the one changed last first; those that cannot be read too, with their trouble. */
  list(): Promise<PlanSummary[]>;
  /** Null where there is no such plan. */
  get(id: string): Promise<ShelvedPlan | null>;
  /** Stores a plan not seen before. */
  add(plan: Plan): Promise<PlanSummary>;
  /**
   * Stores a record with its history. With `base`, the revision the caller last saw, a plan that another tab has stored since is left
   * alone (`ChangedElsewhere`). The summary given back has the new revision. `ShelfFull` stores nothing.
   */
  put(record: PlanRecord, history: History, options?: { base?: number }): Promise<PlanSummary>;
  /** Takes the plan off the shelf; the function given back restores it, and so does `restore` for 30 days. */
  remove(id: string): Promise<() => Promise<void>>;
  /** Plans taken off that can be restored, the last first. */
  removed(): Promise<RemovedPlan[]>;
  restore(id: string): Promise<void>;
  /** A copy with a title of its own and no history. */
  duplicate(id: string): Promise<PlanSummary>;
  /** An edit like any other: it can be undone in the plan. */
  rename(id: string, title: string): Promise<PlanSummary>;
  /** Stores each file that is a plan, and says of the others what is wrong. */
  importTexts(files: readonly ImportedFile[]): Promise<ImportResult[]>;
  /** Works the figures beside a plan out again; the plan, its history and `changed` stay. */
  refresh(id: string): Promise<void>;
  close(): void;
}

/** What another tab must hear of. */
export interface ShelfNotice {
  readonly kind: 'changed' | 'removed';
  readonly id: string;
}

export interface ShelfOptions {
  /** ms since 1970. */
  readonly now: () => number;
  /** An id no other plan has. */
  readonly newId: () => string;
  /** Told of every plan stored, restored or removed by this shelf. */
  readonly notify?: (notice: ShelfNotice) => void;
}
