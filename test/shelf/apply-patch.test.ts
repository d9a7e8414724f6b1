import { immutableJSONPatch } from 'immutable-json-patch';
import { describe, expect, test } from 'vitest';
import type { JsonPatch } from '$lib/plan/json-patch';
import { applyPatch, patched, PatchError } from '$lib/shelf/apply-patch';
import { add, remove, replace, smallPlan } from './specimen';

test('the library lets a replace and a remove of nothing pass: the reason for the guard', () => {
  const value = { a: 1 };
  expect(immutableJSONPatch(value, [{ op: 'replace', path: '/b', value: 2 }])).toEqual({ a: 1 });
  expect(immutableJSONPatch(value, [{ op: 'remove', path: '/b' }])).toEqual({ a: 1 });
});

// Each is an error by RFC 6902, "JavaScript Object Notation (JSON) Patch", 2013, section 4, but for the last two, which are this project's own rule.
test.for<[string, JsonPatch, RegExp]>([
  ['replace of a missing key', replace('/notes', 'x'), /cannot replace \/notes: nothing there/],
  ['remove of a missing key', remove('/notes'), /cannot remove \/notes: nothing there/],
  ['add under a missing parent', add('/room/kind', 'open-air'), /nothing there to hold it/],
  ['replace beyond the list', replace('/shaping/1', {}), /no such place in the list/],
  ['add beyond the end of the list', add('/shaping/2', {}), /no such place in the list/],
  ['a list index with a leading zero', replace('/shaping/00', {}), /no such place in the list/],
  ['replace at the end of the list', replace('/shaping/-', {}), /no such place in the list/],
  ['a key everything inherits', replace('/goal/constructor', 1), /nothing there/],
  ['a key inside a number', add('/goal/level_dB/x', 1), /nothing there to hold it/],
  ['no value', add('/notes', undefined), /no value/],
  [
    'an operation it does not have',
    [{ op: 'move', path: '/a' }] as unknown as JsonPatch,
    /no such operation/
  ],
  ['a prototype', add('/goal/__proto__', { level_dB: 1 }), /not a key of a plan/],
  ['the whole plan', replace('', {}), /not a path inside the plan/]
])('%s is refused', ([, patch, message]) => {
  const plan = smallPlan();
  expect(() => applyPatch(plan, patch)).toThrow(PatchError);
  expect(() => patched(plan, patch)).toThrow(message);
  expect(plan).toEqual(smallPlan());
});

describe('a patch and its way back', () => {
  const patches: JsonPatch[] = [
    replace('/goal/level_dB', 105),
    add('/goal/level_dB', 105),
    add('/notes', 'By the window.'),
    remove('/title'),
    add('/shaping/0', { kind: 'polarity' }),
    add('/shaping/-', { kind: 'polarity' }),
    remove('/shaping/0'),
    [...add('/room', { kind: 'open-air' }), ...replace('/room', { kind: 'open-air', doubt_dB: 2 })],
    [...remove('/box/net_L'), ...add('/box/inner_L', 100), ...add('/box/bracing_L', 3)],
    [
      ...add('/shaping/0', { kind: 'polarity' }),
      ...remove('/shaping/1'),
      ...add('/shaping/1', { kind: 'gain', gain_dB: 1 })
    ]
  ];

  test.for(patches.map((patch) => [JSON.stringify(patch), patch] as const))('%s', ([, patch]) => {
    const plan = smallPlan();
    const { value, back } = applyPatch(plan, patch);
    expect(value).not.toEqual(plan);
    expect(plan).toEqual(smallPlan());
    expect(patched(plan, patch)).toEqual(value);
    expect(patched(value, back)).toEqual(smallPlan());
  });
});
