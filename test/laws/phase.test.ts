/** Phase stays in one turn, and its slope is the group delay. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { curves, wrapDegrees } from '$lib/engine/budget/curves';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import { toEngineBlock } from '$lib/plan/schema/blocks/blocks';
import { extremeChain, plausibleChain } from './chain-arbitrary';
import { close, law } from './law';
import { validBlock } from './valid-plan';

const GRID = logGrid(5, 500, 80);
const STEP = 1e-4;

/** Degrees from one phase to another the short way round. */
const turn = (from: number, to: number): number => ((((to - from) % 360) + 540) % 360) - 180;

/** A zero or pole on the axis turns the phase in a jump, which has no slope: coefficients of such sections are left out. */
const smooth = (chain: Chain): boolean =>
  chain.shaping.every(
    (b) => b.kind !== 'section' || [b.b, b.a].every(([, middle]) => Math.abs(middle) > 1e-3)
  );

const shaped = fc
  .tuple(plausibleChain, fc.array(validBlock.map(toEngineBlock), { maxLength: 4 }))
  .map(([chain, shaping]) => ({ ...chain, shaping: [...chain.shaping, ...shaping] }))
  .filter(smooth);

describe('phase', () => {
  test.each([
    [0, 0],
    [Math.PI, 180],
    [-Math.PI, 180],
    [3 * Math.PI, 180],
    [-Math.PI / 2, -90],
    [2 * Math.PI, 0]
  ])('%d radians are %d degrees', (radians, degrees) => expect(wrapDegrees(radians)).toBe(degrees));

  law('lies above −180 degrees, up to 180', fc.oneof(extremeChain, shaped), 100, (chain) => {
    for (const degrees of curves(chain, GRID).phase) {
      expect(degrees).toBeGreaterThan(-180);
      expect(degrees).toBeLessThanOrEqual(180);
    }
  });

  law('falls with frequency as the group delay says', shaped, 100, (chain) => {
    const { groupDelay } = curves(chain, GRID);
    const below = curves(
      chain,
      GRID.map((f) => f * (1 - STEP))
    ).phase;
    const above = curves(
      chain,
      GRID.map((f) => f * (1 + STEP))
    ).phase;
    GRID.forEach((f, i) => {
      const seconds = -turn(below[i], above[i]) / 360 / (2 * STEP * f);
      close(groupDelay[i], seconds, 1e-6 + 2e-4 * Math.abs(seconds), `group delay at ${f} Hz`);
    });
  });
});
