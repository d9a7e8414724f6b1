/** Finding what a chain is told, and the value at which it is told it. */
import { expect } from 'vitest';
import type { Budget, Finding, FindingCode, Severity } from '$lib/engine/budget/budget';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain, DriverSheet } from '$lib/engine/chain';
import { quietChain } from './quiet-chain';

export const budget = (chain: Chain): Budget => evaluate(chain, { waysOut: false });

export const quiet = (part: Partial<Chain>): Chain => ({ ...quietChain, ...part });
export const quietDriver = (part: Partial<DriverSheet>): Chain =>
  quiet({ driver: { ...quietChain.driver, ...part } });
export const atLevel = (chain: Chain, level: number): Chain => ({ ...chain, goal: { ...chain.goal, level } });

/** The one finding of this code, or none. */
export function findingOf<C extends FindingCode>(
  chain: Chain,
  code: C
): Extract<Finding, { code: C }> | null {
  const found = budget(chain).findings.filter((f) => f.code === code);
  expect(found.length).toBeLessThan(2);
  return (found[0] as Extract<Finding, { code: C }> | undefined) ?? null;
}

export const severityOf = (chain: Chain, code: FindingCode): Severity | null =>
  findingOf(chain, code)?.severity ?? null;

/** x between `low` and `high` where a measure that moves one way all along is `wanted`. */
export function solve(measure: (x: number) => number, wanted: number, low: number, high: number): number {
  const rising = measure(high) > measure(low);
  let [a, b] = [low, high];
  for (let i = 0; i < 200 && b - a > 1e-15 * Math.abs(b); i++) {
    const middle = (a + b) / 2;
    if (measure(middle) < wanted === rising) a = middle;
    else b = middle;
  }
  const x = (a + b) / 2;
  expect(measure(x)).toBeCloseTo(wanted, 6);
  return x;
}

/** How grave a code is where a measure of the chain stands just under a threshold, and just over it. */
export interface Edge {
  readonly code: FindingCode;
  readonly make: (x: number) => Chain;
  readonly measure: (b: Budget, chain: Chain) => number;
  /** Where x is looked for. */
  readonly range: readonly [number, number];
  readonly threshold: number;
  readonly under: Severity | null;
  readonly over: Severity | null;
  /** How far from the threshold either side is tried. */
  readonly by?: number;
}

export function expectEdge({ code, make, measure, range, threshold, under, over, by = 1e-3 }: Edge): void {
  const of = (x: number) => {
    const chain = make(x);
    return measure(budget(chain), chain);
  };
  const [low, high] = range;
  const at = (value: number) => severityOf(make(solve(of, value, low, high)), code);
  expect(at(threshold - by), `just under ${threshold}`).toBe(under);
  expect(at(threshold + by), `just over ${threshold}`).toBe(over);
}
