/** Rows in memory, for where the browser stores nothing: gone with the page. Copies in and out, as a database would. */
import type { PlanSummary } from './plan-record';
import type { PlanRow, PlanStore, RemovedRow, StoredRow } from './plan-store';
import { revisionOf } from './read-summary';
import { ChangedElsewhere } from './shelf-error';

export class MemoryStore implements PlanStore {
  readonly #rows = new Map<string, StoredRow>();
  readonly #removed = new Map<string, RemovedRow>();

  async list(): Promise<unknown[]> {
    return structuredClone([...this.#rows.values()].map(({ summary }) => summary));
  }

  async read(id: string): Promise<StoredRow | null> {
    return structuredClone(this.#rows.get(id) ?? null);
  }

  async write(row: PlanRow, base?: number): Promise<number> {
    const { id } = row.summary;
    const before = this.#rows.get(id);
    const stored = before === undefined ? (base ?? 0) : revisionOf(before.summary);
    if (base !== undefined && base !== stored) throw new ChangedElsewhere(id);
    const revision = stored + 1;
    this.#rows.set(id, structuredClone({ ...row, summary: { ...row.summary, revision } }));
    this.#removed.delete(id);
    return revision;
  }

  async writeSummary(summary: PlanSummary): Promise<void> {
    const row = this.#rows.get(summary.id);
    if (row === undefined || revisionOf(row.summary) !== summary.revision) return;
    this.#rows.set(summary.id, { ...row, summary: structuredClone(summary) });
  }

  async remove(id: string, at: number): Promise<boolean> {
    const row = this.#rows.get(id);
    if (row === undefined) return false;
    this.#rows.delete(id);
    this.#removed.set(id, { id, at, row });
    return true;
  }

  async restore(id: string): Promise<boolean> {
    const removed = this.#removed.get(id);
    if (removed === undefined) return false;
    this.#removed.delete(id);
    if (!this.#rows.has(id)) this.#rows.set(id, removed.row);
    return true;
  }

  async removed(): Promise<RemovedRow[]> {
    return structuredClone([...this.#removed.values()]);
  }

  async forget(at: number): Promise<void> {
    for (const removed of this.#removed.values()) if (removed.at < at) this.#removed.delete(removed.id);
  }

  close(): void {}
}
