/** A change means the same in the chain and in the plan file. */
import fc from 'fast-check';
import { immutableJSONPatch, type JSONPatchDocument, type JSONValue } from 'immutable-json-patch';
import { describe, expect } from 'vitest';
import type { Change } from '$lib/engine/budget/budget';
import { applyChanges } from '$lib/engine/budget/change';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { serialisePlan } from '$lib/plan/serialise-plan';
import { toChain } from '$lib/plan/to-chain';
import { toPatch } from '$lib/plan/to-patch';
import { strainedPlan } from './chain-arbitrary';
import { alike, law } from './law';
import { plausiblePlan, validPlan } from './valid-plan';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const anyPlan = fc.oneof(plausiblePlan, strainedPlan, validPlan);

/** Changes as ways out make them: wiring where there is something to wire. */
function changesOf(chain: Chain): fc.Arbitrary<Change> {
  const wiring = fc.constantFrom('series' as const, 'parallel' as const);
  const coil = fc.constantFrom('single' as const, 'series' as const, 'parallel' as const);
  const options: fc.Arbitrary<Change>[] = [
    fc.record({ set: fc.constant('level'), value: between(40, 150) }),
    fc.record({ set: fc.constant('goal-from'), value: between(5, 200) }),
    fc.record({ set: fc.constant('goal-to'), value: between(10, 500) }),
    fc.record({
      set: fc.constant('add-high-pass'),
      order: fc.integer({ min: 1, max: 8 }),
      value: between(1, 2000)
    }),
    fc.record({ set: fc.constant('drivers'), count: fc.integer({ min: 2, max: 16 }), wiring }),
    fc.record({
      set: fc.constant('wiring'),
      coilWiring: chain.driver.coils > 1 ? coil : fc.constant('single'),
      driverWiring: chain.driver.count > 1 ? wiring : fc.constant('parallel')
    }),
    fc.record({
      set: fc.constant('ratings'),
      powers: fc.tuple(...chain.amplifier.ratings.map(() => between(0.1, 20_000)))
    }),
    fc.record({ set: fc.constant('net-volume'), value: between(0.2e-3, 5) }),
    fc.record({ set: fc.constant('inner-volume'), value: between(0.2e-3, 5) }),
    fc.record({ set: fc.constant('cable'), value: between(0, 20) })
  ] as fc.Arbitrary<Change>[];
  chain.shaping.forEach((b, block) => {
    const value = (set: string, min: number, max: number) =>
      options.push(
        fc.record({
          set: fc.constant(set),
          block: fc.constant(block),
          value: between(min, max)
        }) as fc.Arbitrary<Change>
      );
    if ('corner' in b) value('block-corner', 1, 2000);
    if (b.kind === 'linkwitz-transform') value('block-to', 1, 2000);
    if ('gain' in b) value('block-gain', -40, 40);
  });
  return fc.oneof(...options);
}

const changed = anyPlan.chain((plan) => {
  const before = toChain(plan);
  return fc.record({
    plan: fc.constant(plan),
    changes: fc.array(changesOf(before), { minLength: 1, maxLength: 3 })
  });
});

const patched = (plan: Plan, changes: readonly Change[]): Plan =>
  immutableJSONPatch(plan as JSONValue, toPatch(plan, changes) as JSONPatchDocument) as unknown as Plan;

/** The pivot of a plan that does not name one follows the band; in the chain it is a number of its own. */
function pivotLeft(plan: Plan, chain: Chain): Chain {
  const asked = plan.goal.pivot_Hz;
  const { from, to } = chain.goal;
  return asked == null
    ? { ...chain, goal: { ...chain.goal, pivot: Math.min(Math.max(50, from), to) } }
    : chain;
}

describe('a plan file', () => {
  law('written and read again is the plan, and has the same budget', anyPlan, 80, (plan) => {
    const read = readPlan(serialisePlan(plan));
    if (!read.ok) throw new Error(read.problems.map(formatProblem).join('\n'));
    expect(read.plan).toEqual(plan);
    expect(read.chain).toEqual(toChain(plan));
    expect(evaluate(read.chain, { waysOut: false })).toEqual(evaluate(toChain(plan), { waysOut: false }));
  });

  law('with a patch is the chain with the changes', changed, 300, ({ plan, changes }) => {
    const wanted = pivotLeft(plan, applyChanges(toChain(plan), changes));
    alike(toChain(patched(plan, changes)), wanted, 1e-9);
  });
});
