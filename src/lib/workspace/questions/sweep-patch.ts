/** The JSON Patch (RFC 6902) that sets the swept value in the plan file. */
import { netVolumeChange } from '$lib/engine/budget/box-setting';
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';
import type { JsonPatch } from '$lib/plan/json-patch';
import { valueAt } from '$lib/plan/json-pointer';
import type { Plan } from '$lib/plan/schema';
import { toPatch } from '$lib/plan/to-patch';
import { sweptBlock, TRIAL_Q } from './swept-block';

export interface SweptPlan {
  readonly plan: Plan;
  readonly chain: Chain;
  /** m³ that all drivers take from the box. */
  readonly displacement: number;
}

/** `value` in the file's own unit: litres net, Hz or dB of boost, dB at the seat. */
export function sweepPatch(
  { plan, chain, displacement }: SweptPlan,
  over: SweepOver,
  value: number
): JsonPatch {
  switch (over) {
    case 'volume':
      return toPatch(plan, [netVolumeChange(chain, value / 1000, displacement)]);
    case 'level':
      return toPatch(plan, [{ set: 'level', value }]);
    case 'boost': {
      const { kind, index: block } = sweptBlock(chain);
      if (kind === 'none') return addTransform(plan, value);
      return toPatch(plan, [{ set: kind === 'transform' ? 'block-to' : 'block-gain', block, value }]);
    }
  }
}

function addTransform(plan: Plan, to: number): JsonPatch {
  const block = { kind: 'linkwitz-transform', from_Hz: 'box', from_q: 'box', to_Hz: to, to_q: TRIAL_Q };
  if (Array.isArray(plan.shaping))
    return [{ op: 'add', path: `/shaping/${plan.shaping.length}`, value: block }];
  return [{ op: Object.hasOwn(plan, 'shaping') ? 'replace' : 'add', path: '/shaping', value: [block] }];
}

/** The same patch made again later in a drag: what it added then is there by now and is replaced. */
export const madeAgain = (patch: JsonPatch, plan: Plan): JsonPatch =>
  patch.map((operation) =>
    operation.op === 'add' && valueAt(plan, operation.path.slice(1).split('/')) !== undefined
      ? { ...operation, op: 'replace' }
      : operation
  );
