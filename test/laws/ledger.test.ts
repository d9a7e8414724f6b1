/** Decibels add up exactly, in the ledger and in the curves, and the two say the same. */
import fc from 'fast-check';
import { describe, expect } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { logGrid, THIRD_OCTAVES } from '$lib/engine/quantity/grid';
import { anyChain } from './chain-arbitrary';
import { close, law, near } from './law';

const GRID = logGrid(5, 500, 80);

describe('ledger', () => {
  law(
    'delivered is driver and box, shaping, room, copies and master drive, to the last digit',
    anyChain,
    60,
    (chain) => {
      const b = evaluate(chain, { waysOut: false });
      const v0 = 20 * Math.log10(b.masterDrive);
      for (const row of b.ledger) {
        close(
          row.delivered,
          row.driverBox + row.shaping + row.room + row.copies + v0,
          1e-9,
          `${row.nominal} Hz`
        );
        close(row.room, row.distance + row.roomGain, 1e-9, `room at ${row.nominal} Hz`);
        close(row.copies, 20 * Math.log10(chain.copies), 1e-9, 'copies');
        near(row.driveV, b.masterDrive * Math.pow(10, row.shaping / 20), 1e-9, `drive at ${row.nominal} Hz`);
      }
    }
  );

  // Bands as people give them: by nominal frequencies, where 20 Hz is calculated at 19.95.
  const nominal = fc.constantFrom(...THIRD_OCTAVES.map((row) => row.nominal));
  const banded = fc.tuple(anyChain, nominal, nominal, nominal).map(([chain, lowest, one, other]): Chain => {
    const [from, to] = [Math.min(one, other), Math.max(one, other) + 0.01];
    return {
      ...chain,
      programme: { ...chain.programme, lowest },
      goal: { ...chain.goal, from, to, pivot: from }
    };
  });

  law('a row is wanted, and judged, by its nominal frequency', banded, 60, (chain) => {
    const { goal, programme } = chain;
    for (const row of evaluate(chain, { waysOut: false }).ledger) {
      expect(row.wanted).toBe(row.nominal >= goal.from && row.nominal <= goal.to ? goal.level : null);
      expect(row.margin === null).toBe(row.nominal < programme.lowest);
      expect(row.limit === null).toBe(row.margin === null);
    }
  });

  law('its rows are the curves at the same frequencies', anyChain, 60, (chain) => {
    const { ledger, verdict } = evaluate(chain, { waysOut: false });
    const c = curves(chain, new Float64Array(ledger.map((row) => row.f)));
    ledger.forEach((row, i) => {
      for (const key of ['delivered', 'driverBox', 'shaping', 'room'] as const)
        close(row[key], c[key][i], 1e-9, `${key} at ${row.nominal} Hz`);
      for (const key of ['driveV', 'currentA', 'realW', 'travel'] as const)
        near(row[key], c[key][i], 1e-9, `${key} at ${row.nominal} Hz`);
      if (row.margin === null) return;
      const margins = Object.entries(c.ceilings)
        .filter(([, ceiling]) => ceiling !== null)
        .map(([name, ceiling]) => ({ name, margin: (ceiling as Float64Array)[i] - c.delivered[i] }));
      const least = margins.reduce((a, b) => (b.margin < a.margin ? b : a));
      close(row.margin, least.margin, 1e-8, `margin at ${row.nominal} Hz`);
      const named = margins.find((m) => m.name === row.limit);
      close(named?.margin ?? NaN, least.margin, 1e-8, `margin of the limit named at ${row.nominal} Hz`);
      if (row.f >= chain.programme.lowest) expect(row.margin).toBeGreaterThan(verdict.margin - 1e-6);
    });
  });
});

describe('curves', () => {
  law('delivered is the sum of the other columns, and the level at the pivot', anyChain, 60, (chain) => {
    const v0 = 20 * Math.log10(evaluate(chain, { waysOut: false }).masterDrive);
    const c = curves(chain, GRID);
    for (let i = 0; i < GRID.length; i++)
      close(c.delivered[i], c.driverBox[i] + c.shaping[i] + c.room[i] + c.copies + v0, 1e-9, `${GRID[i]} Hz`);
    const { pivot, level } = chain.goal;
    close(curves(chain, new Float64Array([pivot])).delivered[0], level, 1e-9, 'at the pivot');
  });

  law('power, volts, amps and load agree with each other', anyChain, 60, (chain) => {
    const c = curves(chain, GRID);
    for (let i = 0; i < GRID.length; i++) {
      near(c.apparentVA[i], c.currentA[i] ** 2 * c.impedance[i], 1e-9, `VA at ${GRID[i]} Hz`);
      const cosine = Math.cos((c.impedancePhase[i] * Math.PI) / 180);
      close(c.realW[i] / c.apparentVA[i], cosine, 1e-9, `power factor at ${GRID[i]} Hz`);
    }
  });
});
