/** The JSON Patch (RFC 6902) that sets or clears keys which may or may not be in the plan. */
import type { JsonPatch } from '$lib/plan/json-patch';
import { pointer, valueAt } from '$lib/plan/json-pointer';
import type { Plan } from '$lib/plan/schema';

export type Path = readonly (string | number)[];

/** `null` or `undefined` clears: the key leaves the file. */
export type KeyEdit = readonly [path: Path, value: unknown];

/** One key set or cleared. Empty where that changes nothing. */
export const editKey = (plan: Plan, path: Path, value: unknown): JsonPatch => editKeys(plan, [[path, value]]);

/**
 * Several keys, in order: each finds what the ones before it made. A key the file has is replaced, one it lacks is added with the
 * parents it needs, an optional object left without a key goes with its last one.
 */
export function editKeys(plan: Plan, edits: readonly KeyEdit[]): JsonPatch {
  const patch: JsonPatch = [];
  // Through text: a plan may be a proxy, which a structured clone would refuse.
  const copy: unknown = JSON.parse(JSON.stringify(plan));
  for (const [path, value] of edits) {
    if (value === null || value === undefined) clear(copy, path, patch);
    else set(copy, path, value, patch);
  }
  return patch;
}

type Holder = Record<string | number, unknown>;

function holderOf(copy: unknown, path: Path): Holder | null {
  const holder = valueAt(copy, path.slice(0, -1));
  return typeof holder === 'object' && holder !== null ? (holder as Holder) : null;
}

function set(copy: unknown, path: Path, value: unknown, patch: JsonPatch): void {
  const key = path[path.length - 1];
  const holder = holderOf(copy, path);
  if (holder === null) return set(copy, path.slice(0, -1), { [key]: value }, patch);
  const there = Object.hasOwn(holder, key);
  if (there && JSON.stringify(holder[key]) === JSON.stringify(value)) return;
  patch.push({ op: there ? 'replace' : 'add', path: pointer(path), value });
  holder[key] = JSON.parse(JSON.stringify(value));
}

/** Objects of the plan that may be left out whole. */
const OPTIONAL = ['air', 'programme', 'cable'];

function clear(copy: unknown, path: Path, patch: JsonPatch): void {
  const key = path[path.length - 1];
  const holder = holderOf(copy, path);
  if (holder === null || !Object.hasOwn(holder, key)) return;
  const emptied = path.length === 2 && OPTIONAL.includes(String(path[0])) && Object.keys(holder).length === 1;
  if (emptied) return clear(copy, path.slice(0, 1), patch);
  patch.push({ op: 'remove', path: pointer(path) });
  if (Array.isArray(holder)) holder.splice(Number(key), 1);
  else delete holder[key];
}
