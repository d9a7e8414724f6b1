import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Plan } from '$lib/plan/schema';
import {
  beginGroup,
  canRedo,
  canUndo,
  edit,
  EMPTY_HISTORY,
  endGroup,
  redo,
  undo,
  type Edited
} from '$lib/shelf/history';
import { readHistory } from '$lib/shelf/read-history';
import { add, remove, replace, smallPlan } from './specimen';

function undoAll(state: Edited): Edited {
  while (canUndo(state.history)) state = undo(state);
  return state;
}

function redoAll(state: Edited): Edited {
  while (canRedo(state.history)) state = redo(state);
  return state;
}

/** Any patch that fits the plan at hand, from two numbers. */
function someEdit(plan: Plan, kind: number, n: number): JsonPatch {
  const blocks = plan.shaping?.length ?? 0;
  const block = { kind: 'gain', gain_dB: n % 60 };
  const moves: JsonPatch[] = [
    replace('/goal/level_dB', 60 + (n % 70)),
    replace('/box', n % 2 === 0 ? { net_L: 20 + n } : { inner_L: 40 + n, bracing_L: 2 }),
    plan.notes === undefined ? add('/notes', `${n}`) : remove('/notes'),
    add('/title', `Plan ${n % 5}`),
    plan.shaping === undefined ? add('/shaping', [block]) : add(`/shaping/${n % (blocks + 1)}`, block),
    plan.shaping === undefined || blocks === 0 ? add('/shaping', []) : remove(`/shaping/${n % blocks}`),
    plan.shaping === undefined ? add('/copies', 1 + (n % 16)) : remove('/shaping'),
    [
      ...add('/room', { kind: 'open-air' }),
      ...add('/room/doubt_dB', n % 12),
      ...add('/cable', { resistance_ohm: n })
    ],
    blocks === 0
      ? replace('/goal/from_Hz', 20)
      : replace(`/shaping/${n % blocks}`, { kind: 'delay', delay_ms: n })
  ];
  return moves[kind % moves.length];
}

const deed = fc.record({
  what: fc.constantFrom('edit', 'edit', 'edit', 'edit', 'edit', 'undo', 'redo', 'begin', 'end', 'store'),
  kind: fc.nat(8),
  n: fc.nat(199),
  gap: fc.nat(1500),
  key: fc.option(fc.constantFrom('a', 'b'), { nil: undefined })
});

test('any sequence of edits, undone wholly, gives the first plan; redone wholly, the last', () => {
  let edits = 0;
  let joined = 0;
  fc.assert(
    fc.property(fc.array(deed, { maxLength: 60, size: 'max' }), (deeds) => {
      let state: Edited = { plan: smallPlan(), history: EMPTY_HISTORY };
      let at = 0;
      for (const { what, kind, n, gap, key } of deeds) {
        at += gap;
        if (what === 'undo') state = undo(state);
        else if (what === 'redo') state = redo(state);
        else if (what === 'begin') state = { ...state, history: beginGroup(state.history, 'Drag') };
        else if (what === 'end') state = { ...state, history: endGroup(state.history) };
        else if (what === 'store') {
          const plan: Plan = JSON.parse(JSON.stringify(state.plan));
          const history = readHistory(JSON.parse(JSON.stringify(state.history)), plan);
          expect(history).toEqual({ ...state.history, group: null });
          state = { plan, history };
        } else {
          const before = state;
          state = edit(state, someEdit(state.plan, kind, n), { label: what, at, key });
          edits++;
          if (state.history.entries.length <= before.history.position) joined++;
        }
      }
      const last = redoAll(state);
      expect(undoAll(state).plan).toEqual(smallPlan());
      expect(redoAll(undoAll(state)).plan).toEqual(last.plan);
    }),
    { numRuns: 200 }
  );
  // The law says something only if steps were made and joined.
  expect(edits).toBeGreaterThan(2000);
  expect(joined).toBeGreaterThan(100);
});
