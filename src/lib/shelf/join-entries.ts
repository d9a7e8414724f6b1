/** Two history entries made one, without growing by every keystroke or step of a drag. */
import type { JsonPatch, JsonPatchOperation } from '$lib/plan/json-patch';
import type { HistoryEntry } from './history';

/** The earlier entry with the later one behind it. */
export function joinEntries(earlier: HistoryEntry, later: HistoryEntry): HistoryEntry {
  const overwritten = overwrite(earlier.forward, later.forward);
  return {
    ...later,
    label: earlier.label,
    forward: overwritten ?? [...earlier.forward, ...later.forward],
    back: overwritten === null ? [...later.back, ...earlier.back] : earlier.back
  };
}

/**
 * The earlier patch with the later one's values, where the later one replaces just what the earlier one wrote; else null.
 * Several operations must all be replacements: one that adds to a list would move the places of the others.
 */
function overwrite(earlier: JsonPatch, later: JsonPatch): JsonPatch | null {
  if (earlier.length !== later.length || !apart(earlier)) return null;
  if (earlier.length > 1 && earlier.some(({ op }) => op !== 'replace')) return null;
  const joined: JsonPatch = [];
  for (const [i, before] of earlier.entries()) {
    const after = later[i];
    if (before.op === 'remove' || after.op !== 'replace' || before.path !== after.path) return null;
    joined.push({ ...before, value: after.value });
  }
  return joined;
}

/** No path twice, and none inside another. */
const apart = (patch: JsonPatch): boolean =>
  patch.every((a, i) => patch.every((b, k) => i === k || !`${b.path}/`.startsWith(`${a.path}/`)));

/** True where the entry leaves everything as it found it. */
export function changesNothing({ forward, back }: HistoryEntry): boolean {
  if (forward.length !== back.length || !apart(forward)) return false;
  const restored = (o: JsonPatchOperation) =>
    o.op === 'replace' &&
    back.some((b) => b.op === 'replace' && b.path === o.path && isSame(b.value, o.value));
  return forward.every(restored);
}

/** The same JSON value, whatever the order of keys. */
export function isSame(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const keys = Object.keys(a);
  return (
    keys.length === Object.keys(b).length &&
    keys.every(
      (key) =>
        Object.hasOwn(b, key) &&
        isSame((a as Record<string, unknown>)[key], (b as Record<string, unknown>)[key])
    )
  );
}
