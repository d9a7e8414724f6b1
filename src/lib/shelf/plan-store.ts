/** Rows of plans at rest, whatever they rest in. Values from a store are unknown until read. */
import type { Drafts, PlanSummary } from './plan-record';

export interface PlanRow {
  readonly summary: PlanSummary;
  readonly plan: unknown;
  readonly drafts?: Drafts;
  readonly history: unknown;
}

/** The same as it comes out. */
export interface StoredRow {
  readonly summary: unknown;
  readonly plan: unknown;
  readonly drafts?: unknown;
  readonly history: unknown;
}

/** A row taken off the shelf; `at` in ms since 1970. */
export interface RemovedRow {
  readonly id: string;
  readonly at: number;
  readonly row: StoredRow;
}

/** Each call is one transaction: it is done whole or not at all. Rejects with a `ShelfError`. */
export interface PlanStore {
  /** Every summary. */
  list(): Promise<unknown[]>;
  read(id: string): Promise<StoredRow | null>;
  /**
   * Stores a row under the next revision, which is returned. With `base`, a row another has stored since that revision is left alone
   * (`ChangedElsewhere`). A row of the same id that was taken off is given up.
   */
  write(row: PlanRow, base?: number): Promise<number>;
  /** Changes the summary alone, where the row is still at the summary's revision. */
  writeSummary(summary: PlanSummary): Promise<void>;
  /** Moves a row to the removed ones; false where there is none. */
  remove(id: string, at: number): Promise<boolean>;
  /** Moves a row back; false where there is none. One that stands in its place stays. */
  restore(id: string): Promise<boolean>;
  removed(): Promise<RemovedRow[]>;
  /** Gives up rows removed before `at`. */
  forget(at: number): Promise<void>;
  close(): void;
}
