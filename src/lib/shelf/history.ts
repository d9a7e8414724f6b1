/** Undo and redo of a plan: a list of JSON Patches with their reverts and a place in it. Pure; times are given. */
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Plan } from '$lib/plan/schema';
import { applyPatch, patched } from './apply-patch';
import { changesNothing, isSame, joinEntries } from './join-entries';

export interface HistoryEntry {
  /** What the edit is called: "Undo: net volume". */
  readonly label: string;
  readonly forward: JsonPatch;
  readonly back: JsonPatch;
  /** ms since 1970 of the last edit in it. */
  readonly at: number;
  /** Edits with the same key in quick succession are one entry; null stands alone. */
  readonly key: string | null;
}

export interface History {
  readonly entries: readonly HistoryEntry[];
  /** Entries before this place are done, the others can be redone. */
  readonly position: number;
  /** A drag under way, and whether it has an entry yet; everything until its end is one entry. */
  readonly group: { readonly label: string; readonly begun: boolean } | null;
}

/** A plan with the edits that led to it. */
export interface Edited {
  readonly plan: Plan;
  readonly history: History;
}

/** What an edit is called, when it was made, and which edits it may be joined to. */
export interface EditNote {
  readonly label: string;
  /** ms since 1970. */
  readonly at: number;
  /** As a rule the path of the field being typed in. */
  readonly key?: string;
}

/** Steps that can be undone at most; the oldest go first. */
export const MOST_STEPS = 200;

/** Edits of the same field this close together, in ms, are one step. */
export const QUICK_SUCCESSION = 1000;

export const EMPTY_HISTORY: History = { entries: [], position: 0, group: null };

/** The plan with a patch made on it and noted. Throws `PatchError` and changes nothing where the patch does not fit. */
export function edit(state: Edited, patch: JsonPatch, { label, at, key }: EditNote): Edited {
  const forward = structuredClone(patch);
  const { value: plan, back } = applyPatch(state.plan, forward);
  if (isSame(plan, state.plan)) return state;
  const { position, group } = state.history;
  const done = state.history.entries.slice(0, position);
  const entry: HistoryEntry = { label: group?.label ?? label, forward, back, at, key: key ?? null };
  const last = done.at(-1);
  if (last !== undefined && joins(state.history, last, entry)) {
    const joined = joinEntries(last, entry);
    // A field typed back to what it was is no step; a drag may yet move on from there.
    const keep = group !== null || !changesNothing(joined);
    return { plan, history: noted([...done.slice(0, -1), ...(keep ? [joined] : [])], group) };
  }
  return { plan, history: noted([...done, entry], group === null ? null : { ...group, begun: true }) };
}

function joins({ entries, position, group }: History, last: HistoryEntry, next: HistoryEntry): boolean {
  if (group !== null) return group.begun;
  const gap = next.at - last.at;
  const atEnd = position === entries.length;
  return atEnd && next.key !== null && next.key === last.key && gap >= 0 && gap <= QUICK_SUCCESSION;
}

function noted(entries: readonly HistoryEntry[], group: History['group']): History {
  const kept = entries.slice(-MOST_STEPS);
  return { entries: kept, position: kept.length, group };
}

/** Opens a group, as when a drag begins; one still open is ended first. */
export const beginGroup = (history: History, label: string): History => ({
  ...endGroup(history),
  group: { label, begun: false }
});

/** Ends the group; one that led back to where it began leaves no entry. */
export function endGroup(history: History): History {
  if (history.group === null) return history;
  const last = history.entries[history.position - 1];
  const vain = history.group.begun && last !== undefined && changesNothing(last);
  if (vain) return noted(history.entries.slice(0, history.position - 1), null);
  // Later edits of the same field are not part of the drag.
  const entries = history.group.begun
    ? history.entries.with(history.position - 1, { ...last, key: null })
    : history.entries;
  return { ...history, entries, group: null };
}

export const canUndo = (history: History): boolean => history.position > 0;
export const canRedo = (history: History): boolean => history.position < history.entries.length;

/** The entry that `undo` would take back, and the one that `redo` would make again. */
export const undoEntry = (history: History): HistoryEntry | null =>
  history.entries[history.position - 1] ?? null;
export const redoEntry = (history: History): HistoryEntry | null => history.entries[history.position] ?? null;

/** One step back; the same state where there is none. A group still open is ended first. */
export function undo({ plan, history }: Edited): Edited {
  const ended = endGroup(history);
  const entry = undoEntry(ended);
  if (entry === null) return { plan, history: ended };
  return { plan: patched(plan, entry.back), history: { ...ended, position: ended.position - 1 } };
}

/** One step forward again; the same state where there is none. */
export function redo({ plan, history }: Edited): Edited {
  const ended = endGroup(history);
  const entry = redoEntry(ended);
  if (entry === null) return { plan, history: ended };
  return { plan: patched(plan, entry.forward), history: { ...ended, position: ended.position + 1 } };
}
