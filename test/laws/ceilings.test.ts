/** What each limit allows at the seat. */
import fc from 'fast-check';
import { describe, expect } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import { anyChain } from './chain-arbitrary';
import { close, law } from './law';

const GRID = logGrid(5, 500, 60);

/** In the open, one metre off, one set, nothing leaks: the half space of the source. */
const halfSpace = fc
  .tuple(anyChain, fc.double({ min: 0.1e-3, max: 0.1, noNaN: true }))
  .map(([chain, xmax]): Chain => ({
    ...chain,
    copies: 1,
    room: { kind: 'open-air', doubt: 0 },
    seatDistance: 1,
    box: { ...chain.box, qLeakage: null },
    driver: { ...chain.driver, xmax, xmech: null }
  }));

function travelCeiling(chain: Chain): Float64Array {
  const ceiling = curves(chain, GRID).ceilings['cone-travel'];
  if (ceiling === null) throw new Error('travel is not judged');
  return ceiling;
}

describe('travel ceiling in half space', () => {
  // P_AR = 4π³ρ f⁴ Vd²/c: R. H. Small, "Closed-Box Loudspeaker Systems, Part II: Synthesis", JAES 21(1), 1973.
  // Its level at 1 m: power through the half sphere, p² = P·ρc/(2π).
  law('is that of Small’s displacement-limited power', halfSpace, 60, (chain) => {
    const { temperature, pressure } = chain.air;
    const c = Math.sqrt(1.4 * 287.05 * temperature);
    const rho = pressure / (287.05 * temperature);
    const vd = chain.driver.count * chain.driver.sd * (chain.driver.xmax as number);
    travelCeiling(chain).forEach((level, i) => {
      const watts = (4 * Math.PI ** 3 * rho * GRID[i] ** 4 * vd ** 2) / c;
      const wanted = 10 * Math.log10((watts * rho * c) / (2 * Math.PI * 20e-6 ** 2));
      close(level, wanted, 1e-8, `at ${GRID[i]} Hz`);
    });
  });

  law(
    'does not depend on box, amplifier, shaping or level',
    fc.tuple(halfSpace, anyChain),
    60,
    ([chain, other]) => {
      const changed = {
        ...chain,
        amplifier: other.amplifier,
        cableResistance: other.cableResistance,
        box: { ...chain.box, net: other.box.net ?? 0.03, inner: null, fillGain: other.box.fillGain },
        goal: { ...chain.goal, level: other.goal.level },
        shaping: []
      };
      const before = travelCeiling(chain);
      travelCeiling(changed).forEach((level, i) => close(level, before[i], 1e-8, `at ${GRID[i]} Hz`));
    }
  );
});

describe('ceilings', () => {
  law(
    'stand above what is delivered by each limit’s margin, at that limit’s worst frequency',
    anyChain,
    60,
    (chain) => {
      const { limits, notJudged } = evaluate(chain, { waysOut: false });
      const c = curves(chain, new Float64Array(limits.map((l) => l.worst)));
      limits.forEach((l, i) => {
        const ceiling = c.ceilings[l.limit];
        if (ceiling === null) throw new Error(`${l.limit} has a margin and no ceiling`);
        close(ceiling[i] - c.delivered[i], l.margin, 1e-6, l.limit);
        close(20 * Math.log10(l.allowed / l.demanded), l.margin, 1e-9, `${l.limit}, allowed over demanded`);
        expect(l.worst).toBeGreaterThanOrEqual(chain.programme.lowest);
        expect(l.worst).toBeLessThanOrEqual(500);
      });
      for (const name of notJudged) expect(c.ceilings[name]).toBeNull();
      expect([...limits.map((l) => l.limit), ...notJudged].sort()).toEqual(Object.keys(c.ceilings).sort());
    }
  );

  law('do not depend on level or shaping', anyChain, 60, (chain) => {
    const a = curves(chain, GRID);
    const b = curves({ ...chain, goal: { ...chain.goal, level: chain.goal.level - 7 }, shaping: [] }, GRID);
    for (const [name, ceiling] of Object.entries(a.ceilings))
      ceiling?.forEach((level, i) =>
        close(
          level,
          b.ceilings[name as keyof typeof b.ceilings]?.[i] ?? NaN,
          1e-8,
          `${name} at ${GRID[i]} Hz`
        )
      );
  });
});
