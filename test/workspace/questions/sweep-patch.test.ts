/** What the handle writes into the plan is what the engine swept: the plan read back gives the figures of that row. */
import { describe, expect, test } from 'vitest';
import { evaluate } from '$lib/engine/budget/evaluate';
import { sweep } from '$lib/engine/budget/sweep';
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { applyPatch } from '$lib/shelf/apply-patch';
import { sweptValue } from '$lib/words/sweep-answer';
import { sweepBasis } from '$lib/workspace/questions/sweep-chain';
import { madeAgain, sweepPatch, type SweptPlan } from '$lib/workspace/questions/sweep-patch';
import { sweptBlock } from '$lib/workspace/questions/swept-block';
import { examplePlan } from './open-desk';

function chainOf(plan: Plan) {
  const checked = checkPlan(plan);
  if (!checked.ok) throw new Error(checked.problems.map((p) => p.message).join());
  return checked.chain;
}

const swept = (plan: Plan): SweptPlan => {
  const chain = chainOf(plan);
  return { plan, chain, displacement: evaluate(chain, { waysOut: false }).driver.displacement };
};

const without = (plan: Plan): Plan => ({ ...plan, shaping: undefined });
const PLANS: readonly [name: string, plan: Plan][] = [
  ['film-den', examplePlan('film-den')],
  ['organ-practice', examplePlan('organ-practice')],
  ['film-den without shaping', JSON.parse(JSON.stringify(without(examplePlan('film-den'))))],
  ['loft-corner given by its inside', inside(examplePlan('loft-corner'))]
];

function inside(plan: Plan): Plan {
  return { ...plan, box: { ...plan.box, net_L: undefined, inner_L: 70, bracing_L: 2 } };
}

describe.each(PLANS)('%s', (_, plan) => {
  test.each<SweepOver>(['volume', 'boost', 'level'])('over %s', (over) => {
    const before = swept(JSON.parse(JSON.stringify(plan)));
    const found = sweep(before.chain, { over, points: 3 });
    expect(sweptBlock(before.chain).kind === 'none' ? null : sweptBlock(before.chain).index).toBe(
      over === 'boost' ? found.block : sweep(before.chain, { over: 'boost', points: 2 }).block
    );
    for (const row of found.rows) {
      const patch = sweepPatch(before, over, sweptValue(found, row.value));
      const after = chainOf(applyPatch(before.plan, patch).value);
      const budget = evaluate(after, { waysOut: false });
      expect(budget.verdict.margin).toBeCloseTo(row.margins[row.limit] as number, 6);
      expect(budget.alignment.qtc).toBeCloseTo(row.qtc, 8);
      expect(budget.demand.ratedW / row.ratedW).toBeCloseTo(1, 6);
      // The sweep seen from there is the same sweep.
      expect(sweepBasis(after, over)).toBe(sweepBasis(before.chain, over));
    }
  });
});

test('the inner volume is written where the plan gives that', () => {
  const before = swept(JSON.parse(JSON.stringify(inside(examplePlan('loft-corner')))));
  const [operation, ...rest] = sweepPatch(before, 'volume', 60);
  expect(rest).toEqual([]);
  const litres = 60 + 2 + before.displacement * 1000;
  expect(operation).toMatchObject({ op: 'replace', path: '/box/inner_L' });
  expect(operation.op === 'replace' && operation.value).toBeCloseTo(litres, 6);
});

test('another edit makes it another sweep', () => {
  const plan = examplePlan('film-den');
  const { chain } = swept(plan);
  const other = { ...chain, seatDistance: chain.seatDistance + 1 };
  for (const over of ['volume', 'boost', 'level'] as const)
    expect(sweepBasis(other, over)).not.toBe(sweepBasis(chain, over));
});

test('a transform added in a drag is replaced by the next move', () => {
  const plan = JSON.parse(JSON.stringify(without(examplePlan('film-den')))) as Plan;
  const first = sweepPatch(swept(plan), 'boost', 24);
  const block = { kind: 'linkwitz-transform', from_Hz: 'box', from_q: 'box', to_Hz: 24, to_q: 0.707 };
  expect(first).toEqual([{ op: 'add', path: '/shaping', value: [block] }]);
  const next = sweepPatch(swept(plan), 'boost', 22);
  expect(madeAgain(next, plan)).toEqual(next);
  expect(madeAgain(next, applyPatch(plan, first).value)).toEqual([
    { op: 'replace', path: '/shaping', value: [{ ...block, to_Hz: 22 }] }
  ]);
});
