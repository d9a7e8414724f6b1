/** The shaped system in the room, and the verdict. */
import { describe, expect } from 'vitest';
import type { Budget } from '$lib/engine/budget/budget';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import { toChain } from '$lib/plan/to-chain';
import { anyChain, plausibleChain, strainedPlan } from './chain-arbitrary';
import { close, law, near } from './law';

const quick = (chain: Chain): Budget => evaluate(chain, { waysOut: false });

describe('system', () => {
  law(
    'f3 and f10 are where the delivered level has first fallen so far below the pivot',
    plausibleChain,
    50,
    (chain) => {
      const { f3, f10 } = quick(chain).system;
      const { pivot, level } = chain.goal;
      for (const [f, depth] of [
        [f3, 10 * Math.log10(2)],
        [f10, 10]
      ] as const) {
        if (f === null) continue;
        close(curves(chain, new Float64Array([f])).delivered[0], level - depth, 1e-5, `level at ${f} Hz`);
        const above = curves(chain, logGrid(f * 1.0001, pivot * 1.0002, 1000));
        above.delivered.forEach((db, i) => {
          if (db <= level - depth) throw new Error(`fallen ${depth} dB at ${above.f[i]} Hz, above ${f} Hz`);
        });
      }
      if (f3 === null) expect(f10).toBeNull();
      if (f3 !== null && f10 !== null) expect(f10).toBeLessThanOrEqual(f3);
    }
  );

  law(
    'the boost is the most that shaping lifts re the pivot, and costs 10^(B/10) of the power',
    plausibleChain,
    30,
    (chain) => {
      const { boost, boostAt, boostPower } = quick(chain).system;
      const atPivot = curves(chain, new Float64Array([chain.goal.pivot])).shaping[0];
      const { shaping } = curves(chain, logGrid(chain.programme.lowest, 500, 8000));
      close(boost, Math.max(...shaping) - atPivot, 0.001, `boost at ${boostAt} Hz`);
      near(boostPower, Math.pow(10, boost / 10), 1e-9, 'power');
    }
  );

  law('the goal is short by the most that is lacking inside its band', plausibleChain, 30, (chain) => {
    const { goal } = chain;
    const { short, at, beyondTolerance } = quick(chain).goalShort;
    const { delivered } = curves(chain, logGrid(goal.from, goal.to, 4000));
    close(short, Math.max(0, goal.level - Math.min(...delivered)), 0.005, `short at ${at} Hz`);
    expect(beyondTolerance).toBe(short > goal.tolerance + 1e-9);
  });
});

describe('verdict', () => {
  const holdsAsItSays = (chain: Chain) => {
    const b = quick(chain);
    const blocked = b.findings.some((f) => f.severity === 'blocking');
    expect(b.verdict.holds).toBe(!blocked);
    for (const l of b.limits)
      expect(b.findings.some((f) => f.code === `limit-${l.limit}`)).toBe(l.margin < 0);
    if (b.limits.some((l) => l.margin < 0)) expect(b.verdict.holds).toBe(false);
  };
  law(
    'a plan holds when no limit is over and nothing blocks it',
    strainedPlan.map(toChain),
    100,
    holdsAsItSays
  );
  law('the same at the ends of what the file allows', anyChain, 100, holdsAsItSays);
});
