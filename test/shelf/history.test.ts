import { describe, expect, test } from 'vitest';
import type { JsonPatch } from '$lib/plan/json-patch';
import { PatchError } from '$lib/shelf/apply-patch';
import {
  beginGroup,
  canRedo,
  canUndo,
  edit,
  EMPTY_HISTORY,
  endGroup,
  MOST_STEPS,
  redo,
  redoEntry,
  undo,
  undoEntry,
  type Edited
} from '$lib/shelf/history';
import { isSame } from '$lib/shelf/join-entries';
import { readHistory } from '$lib/shelf/read-history';
import { add, remove, replace, smallPlan } from './specimen';

const start = (): Edited => ({ plan: smallPlan(), history: EMPTY_HISTORY });
const level = (state: Edited, dB: number, at: number, key?: string): Edited =>
  edit(state, replace('/goal/level_dB', dB), { label: 'Level', at, key });

function undoAll(state: Edited): Edited {
  while (canUndo(state.history)) state = undo(state);
  return state;
}

function redoAll(state: Edited): Edited {
  while (canRedo(state.history)) state = redo(state);
  return state;
}

describe('steps', () => {
  test('an edit can be undone and redone, and is called by its label', () => {
    const edited = level(start(), 104, 0);
    expect(edited.plan.goal.level_dB).toBe(104);
    expect(undoEntry(edited.history)?.label).toBe('Level');
    expect(redoEntry(edited.history)).toBeNull();
    const undone = undo(edited);
    expect(undone.plan).toEqual(smallPlan());
    expect(undoEntry(undone.history)).toBeNull();
    expect(redoEntry(undone.history)?.label).toBe('Level');
    expect(redo(undone).plan).toEqual(edited.plan);
  });

  test('with nothing to undo or redo the plan stays', () => {
    expect(undo(start()).plan).toEqual(smallPlan());
    expect(redo(start()).plan).toEqual(smallPlan());
  });

  test('an edit after an undo drops what could have been redone', () => {
    const undone = undo(level(level(start(), 101, 0), 102, 5000));
    const other = edit(undone, add('/notes', 'x'), { label: 'Notes', at: 9000 });
    expect(canRedo(other.history)).toBe(false);
    expect(other.history.entries.map((e) => e.label)).toEqual(['Level', 'Notes']);
  });

  test('an edit that changes nothing is no step', () => {
    const before = start();
    expect(level(before, 100, 0)).toBe(before);
  });

  test('a patch that does not fit throws and leaves the state as it was', () => {
    const before = level(start(), 101, 0);
    const copy = structuredClone(before);
    expect(() => edit(before, replace('/notes', 'x'), { label: 'Notes', at: 1 })).toThrow(PatchError);
    expect(before).toEqual(copy);
  });

  test('what the caller does to the patch later changes nothing', () => {
    const block = { kind: 'gain', gain_dB: 3 };
    const edited = edit(start(), add('/shaping/-', block), { label: 'Add', at: 0 });
    block.gain_dB = -60;
    expect(edited.plan.shaping?.[1]).toEqual({ kind: 'gain', gain_dB: 3 });
    expect(redo(undo(edited)).plan.shaping?.[1]).toEqual({ kind: 'gain', gain_dB: 3 });
  });

  test('at least 100 steps are kept, and no more than the most', () => {
    let state = start();
    for (let i = 1; i <= MOST_STEPS + 30; i++) state = level(state, 60 + i / 10, i * 5000);
    expect(MOST_STEPS).toBeGreaterThanOrEqual(100);
    expect(state.history.entries).toHaveLength(MOST_STEPS);
    // The 30 oldest are gone: the 30th edit is the first state that can be reached.
    expect(undoAll(state).plan.goal.level_dB).toBe(63);
    expect(redoAll(undoAll(state)).plan).toEqual(state.plan);
  });
});

describe('edits in quick succession', () => {
  test('of the same field are one step, however many follow', () => {
    let state = start();
    for (let i = 0; i < 50; i++) state = level(state, 101 + i / 10, i * 900, '/goal/level_dB');
    expect(state.history.entries).toHaveLength(1);
    expect(state.history.entries[0].forward).toHaveLength(1);
    expect(state.history.entries[0].back).toEqual(replace('/goal/level_dB', 100));
    expect(undo(state).plan).toEqual(smallPlan());
    expect(redo(undo(state)).plan.goal.level_dB).toBe(105.9);
  });

  test.for<[string, number, string | undefined, number]>([
    ['over a second apart are two', 1001, '/goal/level_dB', 2],
    ['a second apart are one', 1000, '/goal/level_dB', 1],
    ['of another field are two', 10, '/goal/from_Hz', 2],
    ['without a key are two', 10, undefined, 2],
    ['with the clock set back are two', -10, '/goal/level_dB', 2]
  ])('%s', ([, gap, key, steps]) => {
    const state = level(level(start(), 101, 0, '/goal/level_dB'), 102, gap, key);
    expect(state.history.entries).toHaveLength(steps);
  });

  test('typed back to what it was, no step is left', () => {
    const state = level(level(start(), 101, 0, 'k'), 100, 200, 'k');
    expect(state.history.entries).toHaveLength(0);
    expect(state.plan).toEqual(smallPlan());
  });

  test('after an undo begin a step of their own', () => {
    const once = level(level(start(), 101, 0, 'k'), 102, 5000, 'k');
    const state = level(undo(once), 103, 100, 'k');
    expect(state.history.entries).toHaveLength(2);
    expect(undo(state).plan.goal.level_dB).toBe(101);
  });

  test('a key that appears and is then typed on goes away whole', () => {
    let state = edit(start(), add('/notes', 'a'), { label: 'Notes', at: 0, key: '/notes' });
    state = edit(state, replace('/notes', 'ab'), { label: 'Notes', at: 100, key: '/notes' });
    expect(state.history.entries[0].forward).toEqual(add('/notes', 'ab'));
    expect(undo(state).plan).toEqual(smallPlan());
  });

  test('of blocks just added are redone where they stood, though each moved the other', () => {
    const gain = (dB: number) => ({ kind: 'gain', gain_dB: dB });
    const note = { label: 'Blocks', key: 'k' };
    let state = edit(start(), [...add('/shaping/1', gain(1)), ...add('/shaping/0', gain(2))], {
      ...note,
      at: 0
    });
    state = edit(state, [...replace('/shaping/1', gain(3)), ...replace('/shaping/0', gain(4))], {
      ...note,
      at: 1
    });
    expect(state.history.entries).toHaveLength(1);
    expect(state.plan.shaping).toEqual([gain(4), gain(3), gain(1)]);
    expect(undo(state).plan).toEqual(smallPlan());
    expect(redo(undo(state)).plan).toEqual(state.plan);
  });

  test('of several values at once, with a list moving below them, go back to the start', () => {
    const note = { label: 'Blocks', key: 'k' };
    const two: JsonPatch = [
      ...add('/shaping/0', { kind: 'gain', gain_dB: 1 }),
      ...add('/shaping/0', { kind: 'gain', gain_dB: 2 })
    ];
    let state = edit(start(), two, { ...note, at: 0 });
    state = edit(state, [...replace('/shaping/0/gain_dB', 3), ...replace('/shaping/1/gain_dB', 4)], {
      ...note,
      at: 1
    });
    state = edit(state, [...replace('/shaping/0', { kind: 'polarity' }), ...remove('/shaping/1')], {
      ...note,
      at: 2
    });
    expect(state.history.entries).toHaveLength(1);
    expect(undo(state).plan).toEqual(smallPlan());
    expect(redo(undo(state)).plan).toEqual(state.plan);
  });
});

describe('a drag', () => {
  const drag = (state: Edited, levels: number[], at = 0): Edited => {
    let now: Edited = { ...state, history: beginGroup(state.history, 'Drag the level') };
    levels.forEach((dB, i) => (now = level(now, dB, at + i * 3000, '/goal/level_dB')));
    return { ...now, history: endGroup(now.history) };
  };

  test('is one step whatever its length in time and in edits, under its own label', () => {
    const state = drag(level(start(), 90, 0), [91, 92, 93, 94, 95]);
    expect(state.history.entries.map((e) => e.label)).toEqual(['Level', 'Drag the level']);
    expect(state.history.entries[1].forward).toEqual(replace('/goal/level_dB', 95));
    expect(undo(state).plan.goal.level_dB).toBe(90);
  });

  test('does not swallow the edit before it or the one after it', () => {
    let state = level(start(), 90, 0, '/goal/level_dB');
    state = drag(state, [91, 92], 10);
    state = level(state, 93, 3020, '/goal/level_dB');
    expect(state.history.entries).toHaveLength(3);
  });

  test('that ends where it began is no step', () => {
    expect(drag(start(), [101, 102, 100]).history.entries).toHaveLength(0);
    expect(drag(start(), []).history).toEqual(EMPTY_HISTORY);
  });

  test('through its start and on is one step', () => {
    const state = drag(start(), [101, 100, 99]);
    expect(state.history.entries).toHaveLength(1);
    expect(undo(state).plan).toEqual(smallPlan());
  });

  test('still open when undo is called is undone whole', () => {
    let state: Edited = { ...start(), history: beginGroup(EMPTY_HISTORY, 'Drag') };
    state = level(level(state, 101, 0), 102, 9000);
    const undone = undo(state);
    expect(undone.plan).toEqual(smallPlan());
    expect(undone.history.group).toBeNull();
  });
});

describe('from a store', () => {
  const two = level(level(start(), 101, 0), 102, 5000);

  test('a history comes back as it was, at any place', () => {
    for (const state of [two, undo(two), undoAll(two)])
      expect(readHistory(JSON.parse(JSON.stringify(state.history)), state.plan)).toEqual(state.history);
  });

  test('a drag still open is closed', () => {
    const open = beginGroup(two.history, 'Drag');
    expect(readHistory(structuredClone(open), two.plan)).toEqual(two.history);
  });

  const entry = two.history.entries[0];
  test.for<[string, unknown]>([
    ['nothing', undefined],
    ['text', 'history'],
    ['a place beyond the end', { entries: [entry], position: 2 }],
    ['a place before the start', { entries: [entry], position: -1 }],
    ['an entry without its way back', { entries: [{ ...entry, back: undefined }], position: 1 }],
    ['an operation unknown', { entries: [{ ...entry, back: [{ op: 'copy', path: '/a' }] }], position: 1 }],
    ['steps of another plan, to undo', { entries: [{ ...entry, back: remove('/notes') }], position: 1 }],
    ['steps of another plan, to redo', { entries: [{ ...entry, forward: remove('/notes') }], position: 0 }]
  ])('%s gives an empty history', ([, value]) => {
    expect(readHistory(value, smallPlan())).toEqual(EMPTY_HISTORY);
  });
});

test('sameness is of JSON values, whatever the order of keys', () => {
  expect(isSame({ a: 1, b: [1, { c: null }] }, { b: [1, { c: null }], a: 1 })).toBe(true);
  for (const [a, b] of [
    [{ a: 1 }, { a: 2 }],
    [{ a: 1 }, { b: 1 }],
    [{ a: 1 }, { a: 1, b: 1 }],
    [[], {}],
    [
      [1, 2],
      [2, 1]
    ],
    [null, {}],
    [1, '1']
  ])
    expect(isSame(a, b)).toBe(false);
});
