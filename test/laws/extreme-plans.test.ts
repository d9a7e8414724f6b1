/** Whatever the file allows, the engine answers: in numbers, and soon. */
import fc from 'fast-check';
import { describe } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { sweep } from '$lib/engine/budget/sweep';
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import { readPlan } from '$lib/plan/read-plan';
import { serialisePlan } from '$lib/plan/serialise-plan';
import { law } from './law';
import { validPlan } from './valid-plan';

/** Every number in a value is one. `mayLack` names the keys where NaN stands for nothing. */
function numbersIn(value: unknown, path: string, mayLack: readonly string[] = []): void {
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new Error(`${path} is ${value}`);
  } else if (typeof value === 'object' && value !== null) {
    for (const [key, part] of Object.entries(value))
      if (!mayLack.includes(key)) numbersIn(part, `${path}.${key}`, mayLack);
  }
}

/** A plan as it comes from a file: nothing here is reached past the reader. */
function read(plan: Parameters<typeof serialisePlan>[0]): Chain {
  const result = readPlan(serialisePlan(plan));
  if (!result.ok) throw new Error('the plan is not valid');
  return result.chain;
}

/** Answers within a second: once more where the machine was busy with something else. */
function soon<T>(what: string, answer: () => T): T {
  let taken = 0;
  for (let tries = 0; tries < 3; tries++) {
    const start = performance.now();
    const result = answer();
    taken = performance.now() - start;
    if (taken < 1000) return result;
  }
  throw new Error(`${what} took ${taken} ms`);
}

const GRID = logGrid(1, 2000, 120);

describe('any plan the file allows', () => {
  law('has a budget of numbers alone', validPlan, 150, (plan) =>
    numbersIn(
      soon('evaluate', () => evaluate(read(plan))),
      'budget'
    )
  );

  law('has curves of numbers alone, but for what is wanted outside the band', validPlan, 150, (plan) =>
    numbersIn(
      soon('curves', () => curves(read(plan), GRID)),
      'curves',
      ['wanted']
    )
  );

  const over = fc.constantFrom<SweepOver>('volume', 'boost', 'level');
  law('has sweeps of numbers alone', fc.tuple(validPlan, over), 60, ([plan, decision]) =>
    numbersIn(
      soon('sweep', () => sweep(read(plan), { over: decision, points: 101 })),
      'sweep'
    )
  );
});
