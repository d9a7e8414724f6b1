/** Finds plans by words of their titles and notes. Notes are read from the shelf once something is looked for. */
import { SvelteMap } from 'svelte/reactivity';
import type { PlanSummary } from '$lib/shelf/plan-record';
import type { Shelf } from '$lib/shelf/shelf';

export class PlanSearch {
  query = $state('');
  /** By id, with the revision they were read at. */
  readonly #notes = new SvelteMap<string, { revision: number; text: string }>();

  /** The plans that hold every word, in title or notes, in any order. */
  found(list: readonly PlanSummary[]): readonly PlanSummary[] {
    const words = fold(this.query).split(/\s+/).filter(Boolean);
    if (words.length === 0) return list;
    return list.filter(({ id, title }) => {
      const text = `${fold(title)}\n${this.#notes.get(id)?.text ?? ''}`;
      return words.every((word) => text.includes(word));
    });
  }

  /** Reads the notes of plans that have changed since. A plan that cannot be read is found by its title alone. */
  async readNotes(shelf: Pick<Shelf, 'get'>, list: readonly PlanSummary[]): Promise<void> {
    for (const { id, revision } of list) {
      if (this.#notes.get(id)?.revision === revision) continue;
      const plan = await shelf.get(id).catch(() => null);
      const notes = plan?.readable ? (plan.record.plan.notes ?? '') : '';
      this.#notes.set(id, { revision, text: fold(notes) });
    }
  }
}

/** Without case and accents: "Küche" is found by "kuche". */
const fold = (text: string): string => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();
