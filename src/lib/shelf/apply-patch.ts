/**
 * A JSON Patch (RFC 6902) made on a plan, and the patch that takes it back. Stricter than the library, which lets a `replace` or
 * `remove` of something that is not there pass in silence: what cannot be done as written is refused whole.
 */
import { immutableJSONPatch, parseJSONPointer, revertJSONPatch } from 'immutable-json-patch';
import type { JsonPatch, JsonPatchOperation } from '$lib/plan/json-patch';
import { valueAt } from '$lib/plan/json-pointer';

/** A patch that does not fit the value it is made on. */
export class PatchError extends Error {
  override readonly name = 'PatchError';
}

export interface Patched<T> {
  readonly value: T;
  /** Undoes the patch, exactly but for the order of keys. */
  readonly back: JsonPatch;
}

/** The value with every operation made in order; the value given is left as it was. Throws `PatchError`. */
export function applyPatch<T>(value: T, patch: JsonPatch): Patched<T> {
  let at = value;
  const back: JsonPatch = [];
  for (const operation of patch) {
    requireFit(at, operation);
    // The revert of add, replace and remove is made of these three alone.
    back.unshift(...(revertJSONPatch(at, [operation]) as JsonPatch));
    at = immutableJSONPatch<T, T>(at, [operation]);
  }
  return { value: at, back };
}

/** The value alone, where the way back is known already. Throws `PatchError`. */
export function patched<T>(value: T, patch: JsonPatch): T {
  let at = value;
  for (const operation of patch) {
    requireFit(at, operation);
    at = immutableJSONPatch<T, T>(at, [operation]);
  }
  return at;
}

function requireFit(value: unknown, operation: JsonPatchOperation): void {
  const { op, path } = operation;
  const refuse = (why: string): never => {
    throw new PatchError(`cannot ${op} ${path === '' ? 'the whole' : path}: ${why}`);
  };
  if (op !== 'add' && op !== 'replace' && op !== 'remove') refuse('no such operation');
  if (op !== 'remove' && operation.value === undefined) refuse('no value');
  if (!path.startsWith('/')) refuse('not a path inside the plan');
  const keys = parseJSONPointer(path);
  const key = keys[keys.length - 1];
  const parent = valueAt(value, keys.slice(0, -1));
  if (Array.isArray(parent)) {
    const slots = op === 'add' ? parent.length + 1 : parent.length;
    const appends = op === 'add' && key === '-';
    if (!appends && !(/^(0|[1-9]\d*)$/.test(key) && Number(key) < slots)) refuse('no such place in the list');
    return;
  }
  if (typeof parent !== 'object' || parent === null) refuse('nothing there to hold it');
  // Own keys alone: the library would find `constructor` in anything, and set a prototype by its name.
  if (key === '__proto__') refuse('not a key of a plan');
  if (op !== 'add' && !Object.hasOwn(parent as object, key)) refuse('nothing there');
}
