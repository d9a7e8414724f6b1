/** The engine keeps nothing and touches nothing: the same chain gives the same answer, and stays as it was. */
import fc from 'fast-check';
import { describe, expect } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { sweep } from '$lib/engine/budget/sweep';
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import { toChain } from '$lib/plan/to-chain';
import { anyChain, strainedPlan } from './chain-arbitrary';
import { law } from './law';

const GRID = logGrid(5, 500, 50);

function frozen<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    Object.freeze(value);
    Object.values(value).forEach(frozen);
  }
  return value;
}

/** Answers twice, with others in between, and once more on a frozen copy. */
function steady<T>(chain: Chain, other: Chain, answer: (chain: Chain) => T): void {
  const before = structuredClone(chain);
  const first = answer(chain);
  answer(other);
  expect(answer(chain)).toEqual(first);
  expect(chain).toEqual(before);
  expect(answer(frozen(structuredClone(before)))).toEqual(first);
}

const two = fc.tuple(fc.oneof(strainedPlan.map(toChain), anyChain), anyChain);

describe('pure', () => {
  law('a budget, ways out included', two, 25, ([chain, other]) => steady(chain, other, (c) => evaluate(c)));

  law('curves', two, 40, ([chain, other]) => steady(chain, other, (c) => curves(c, GRID)));

  law(
    'a sweep',
    fc.tuple(two, fc.constantFrom<SweepOver>('volume', 'boost', 'level')),
    20,
    ([[chain, other], over]) => steady(chain, other, (c) => sweep(c, { over, points: 9 }))
  );

  law('without ways out the budget is the same, less the ways out', two, 40, ([chain]) => {
    const full = evaluate(chain);
    const bare = evaluate(chain, { waysOut: false });
    expect(bare).toEqual({ ...full, findings: full.findings.map((f) => ({ ...f, waysOut: [] })) });
  });
});
