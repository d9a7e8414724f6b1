/** What is offered as a way out is one: made in the chain or in the plan file and evaluated again, it does what it says. */
import fc from 'fast-check';
import { immutableJSONPatch, type JSONPatchDocument, type JSONValue } from 'immutable-json-patch';
import { describe, expect, test } from 'vitest';
import type { Budget, Finding, WayOut } from '$lib/engine/budget/budget';
import { applyChanges } from '$lib/engine/budget/change';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { formatProblem } from '$lib/plan/problem';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { toChain } from '$lib/plan/to-chain';
import { toPatch } from '$lib/plan/to-patch';
import { strainedPlan } from './chain-arbitrary';
import { close, law } from './law';
import { validPlan } from './valid-plan';

const plans = fc.oneof({ weight: 3, arbitrary: strainedPlan }, { weight: 1, arbitrary: validPlan });

/** Each way out of each finding of each plan, with what comes of it. */
interface Offer {
  readonly plan: Plan;
  readonly chain: Chain;
  readonly finding: Finding;
  readonly way: WayOut;
  readonly name: string;
}

function offersOf(plan: Plan): Offer[] {
  const chain = toChain(plan);
  return evaluate(chain).findings.flatMap((finding) =>
    finding.waysOut.map((way) => ({ plan, chain, finding, way, name: `${finding.code} → ${way.kind}` }))
  );
}

const blocking = (b: Budget): string[] =>
  b.findings.filter((f) => f.severity === 'blocking').map((f) => f.code);

const after = ({ chain, way }: Offer): Budget =>
  evaluate(applyChanges(chain, way.changes), { waysOut: false });

function afterPatch({ plan, way, name }: Offer): Budget {
  const patched = immutableJSONPatch(plan as JSONValue, toPatch(plan, way.changes) as JSONPatchDocument);
  const read = checkPlan(patched);
  if (!read.ok) throw new Error(`${name}: ${read.problems.map(formatProblem).join('\n')}`);
  return evaluate(read.chain, { waysOut: false });
}

/** What a way out says of itself against what comes of it. */
function asSaid({ finding, way, name }: Offer, b: Budget): void {
  close(b.verdict.margin, way.marginAfter, 1e-6, `${name}, smallest margin`);
  expect(way.remaining.map((r) => r.code).sort(), `${name}, what still stands`).toEqual(blocking(b).sort());
  for (const { code, by } of way.remaining) {
    const limit = b.limits.find((l) => `limit-${l.limit}` === code);
    if (limit) close(by ?? NaN, -limit.margin, 1e-6, `${name}, ${code} over by`);
    else expect(by).toBeNull();
  }
  if (b.findings.some((f) => f.code === finding.code) && !way.remaining.some((r) => r.code === finding.code))
    throw new Error(`${name}: ${finding.code} stands unsaid after ${JSON.stringify(way.changes)}`);
}

const RUNS = 75;

describe('a way out', () => {
  law('made in the chain does what it says, and its finding is gone', plans, RUNS, (plan) => {
    for (const offer of offersOf(plan)) asSaid(offer, after(offer));
  });

  law(
    'made in the plan file by JSON Patch is a plan the file allows, and does what it says',
    plans,
    RUNS,
    (plan) => {
      for (const offer of offersOf(plan)) asSaid(offer, afterPatch(offer));
    }
  );

  law('leaves blocks that are built into the amplifier alone', plans, 50, (plan) => {
    for (const { chain, way, name } of offersOf(plan))
      for (const change of way.changes)
        if ('block' in change) expect(chain.shaping[change.block].fixed, name).toBe(false);
  });

  law('of a limit is a full one wherever one of its fellows is', plans, 50, (plan) => {
    const offers = offersOf(plan).filter((o) => o.finding.code.startsWith('limit-'));
    const partial = offers.map((o) => o.way.remaining.some((r) => r.code.startsWith('limit-')));
    expect(new Set(partial).size).toBeLessThan(2);
  });

  law('says by how much the level falls, and raises nothing', plans, 50, (plan) => {
    for (const { chain, way, name } of offersOf(plan)) {
      if (way.kind !== 'level') continue;
      close(way.facts.givesUp ?? NaN, chain.goal.level - way.facts.value, 1e-9, name);
      expect(way.facts.value).toBeLessThan(chain.goal.level);
      expect(way.facts.before).toBe(chain.goal.level);
    }
  });
});

/** Every kind of cure that a finding can have, so that the laws above are not kept for want of cases. */
const EXPECTED = [
  ...['level', 'high-pass', 'transform', 'shelf', 'drivers', 'drivers-and-box', 'amplifier', 'volume'].map(
    (kind) => `limit → ${kind}`
  ),
  ...['margin-thin → level', 'room-doubt → level', 'hot-coil → level', 'goal-short → band'],
  ...['infrasonic → high-pass', 'no-high-pass → high-pass', 'qtc-high → volume', 'qtc-low → volume'],
  ...['cable-loss → cable', 'load-low → wiring', 'boost-short → transform', 'boost-short → shelf']
];

test('the plans of these laws meet every kind of way out', () => {
  const met = new Set<string>();
  fc.assert(
    fc.property(plans, (plan) => {
      for (const { finding, way } of offersOf(plan))
        met.add(`${finding.code.replace(/^limit-.*/, 'limit')} → ${way.kind}`);
    }),
    { seed: 4, numRuns: 200 }
  );
  expect([...met].sort()).toEqual(expect.arrayContaining(EXPECTED));
});
