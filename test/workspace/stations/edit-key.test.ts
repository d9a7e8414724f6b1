import { expect, test } from 'vitest';
import type { JsonPatch } from '$lib/plan/json-patch';
import { readPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { applyPatch } from '$lib/shelf/apply-patch';
import { editKey, editKeys, type KeyEdit } from '$lib/workspace/stations/edit-key';
import { examplePlan } from './desk';

const full = examplePlan();
/** The plan without some of its optional parts. */
function without<T extends object, K extends keyof T>(from: T, ...keys: K[]): Omit<T, K> {
  const copy = { ...from };
  for (const key of keys) delete copy[key];
  return copy;
}
const bare: Plan = without(full, 'programme', 'cable', 'shaping', 'room');
const goal = without(full.goal, 'pivot_Hz');

/** RFC 6902: `add` puts a member in an object, `replace` needs the member to be there, `remove` too. */
test.for<[string, Plan, KeyEdit[], JsonPatch]>([
  [
    'a key that is there',
    full,
    [[['goal', 'level_dB'], 99]],
    [{ op: 'replace', path: '/goal/level_dB', value: 99 }]
  ],
  ['the same value again', full, [[['goal', 'level_dB'], full.goal.level_dB]], []],
  [
    'a key that is not there',
    { ...full, goal },
    [[['goal', 'pivot_Hz'], 40]],
    [{ op: 'add', path: '/goal/pivot_Hz', value: 40 }]
  ],
  [
    'a key whose parent is not there',
    bare,
    [[['cable', 'resistance_ohm'], 0.1]],
    [{ op: 'add', path: '/cable', value: { resistance_ohm: 0.1 } }]
  ],
  [
    'a key whose parent is null',
    { ...bare, cable: null },
    [[['cable', 'resistance_ohm'], 0.1]],
    [{ op: 'replace', path: '/cable', value: { resistance_ohm: 0.1 } }]
  ],
  ['a key cleared', full, [[['goal', 'pivot_Hz'], null]], [{ op: 'remove', path: '/goal/pivot_Hz' }]],
  ['a key cleared that is not there', { ...full, goal }, [[['goal', 'pivot_Hz'], null]], []],
  [
    'the last key of an optional object cleared',
    { ...bare, cable: { resistance_ohm: 1 } },
    [[['cable', 'resistance_ohm'], null]],
    [{ op: 'remove', path: '/cable' }]
  ],
  [
    'two keys of an object that is not there',
    bare,
    [
      [['programme', 'lowest_Hz'], 16],
      [['programme', 'crest_factor_dB'], 6]
    ],
    [
      { op: 'add', path: '/programme', value: { lowest_Hz: 16 } },
      { op: 'add', path: '/programme/crest_factor_dB', value: 6 }
    ]
  ],
  [
    'an entry put behind a list',
    full,
    [[['amplifier', 'ratings', 2], { power_W: 1, load_ohm: 16 }]],
    [{ op: 'add', path: '/amplifier/ratings/2', value: { power_W: 1, load_ohm: 16 } }]
  ],
  [
    'an entry taken from a list',
    full,
    [[['amplifier', 'ratings', 0], null]],
    [{ op: 'remove', path: '/amplifier/ratings/0' }]
  ]
])('%s', ([, plan, edits, patch]) => {
  const before = JSON.stringify(plan);
  expect(editKeys(plan, edits)).toEqual(patch);
  expect(JSON.stringify(plan)).toBe(before);
  const made = applyPatch(plan, patch).value;
  expect(readPlan(JSON.stringify(made))).toMatchObject({ ok: true });
});

test('a plan behind a proxy is read all the same', () => {
  const seen = new Proxy(full, {});
  expect(editKey(seen, ['goal', 'to_Hz'], 90)).toEqual([{ op: 'replace', path: '/goal/to_Hz', value: 90 }]);
});
