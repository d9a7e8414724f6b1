/** What a change of level, of copies or of the room's estimate does to margins and demand: decibel for decibel, no more and no less. */
import fc from 'fast-check';
import { describe, expect } from 'vitest';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { anyChain, plausibleChain } from './chain-arbitrary';
import { close, law, near } from './law';

const quick = (chain: Chain) => evaluate(chain, { waysOut: false });
const raised = (chain: Chain, db: number): Chain => ({
  ...chain,
  goal: { ...chain.goal, level: chain.goal.level + db }
});

describe('level', () => {
  law(
    'one decibel more lowers every electrical, heat and travel margin by one decibel',
    anyChain,
    60,
    (chain) => {
      const before = quick(chain);
      const after = quick(raised(chain, 1));
      expect(after.limits.map((l) => l.limit)).toEqual(before.limits.map((l) => l.limit));
      after.limits.forEach((l, i) => close(l.margin, before.limits[i].margin - 1, 1e-9, l.limit));
      close(after.verdict.margin, before.verdict.margin - 1, 1e-9, 'smallest margin');
      close(after.maxLevel, before.maxLevel, 1e-9, 'highest level');
    }
  );

  law(
    'n copies at a level n times (20·log10 n) higher ask of each set what one set was asked',
    fc.tuple(anyChain, fc.integer({ min: 2, max: 16 })),
    60,
    ([chain, n]) => {
      const one = quick({ ...chain, copies: 1 });
      const many = quick({ ...raised(chain, 20 * Math.log10(n)), copies: n });
      for (const [key, value] of Object.entries(one.demand))
        near(many.demand[key as keyof typeof many.demand], value, 1e-9, key);
      many.limits.forEach((l, i) => close(l.margin, one.limits[i].margin, 1e-9, l.limit));
      close(many.maxLevel, one.maxLevel + 20 * Math.log10(n), 1e-9, 'highest level');
    }
  );

  law('at the highest level the smallest margin is nothing', anyChain, 60, (chain) => {
    const b = quick(chain);
    close(b.maxLevel, chain.goal.level + b.verdict.margin, 1e-9, 'highest level');
    expect(b.verdict.margin).toBe(Math.min(...b.limits.map((l) => l.margin)));
    const atMost = quick(raised(chain, b.verdict.margin));
    close(atMost.verdict.margin, 0, 1e-9, 'smallest margin');
    near(atMost.demand.terminalV, b.limiter.terminalV, 1e-9, 'volts a limiter is set to');
  });
});

describe('doubt about the room', () => {
  law('moves the margin by exactly itself, either way', anyChain, 60, (chain) => {
    const { verdict, roomDoubt } = quick(chain);
    expect(roomDoubt.doubt).toBe(chain.room.doubt);
    close(roomDoubt.worstMargin, verdict.margin - chain.room.doubt, 1e-9, 'worse');
    close(roomDoubt.bestMargin, verdict.margin + chain.room.doubt, 1e-9, 'better');
  });

  law(
    'is what a room that gives so much less or more does in earnest',
    fc.tuple(plausibleChain, fc.double({ min: 0.1, max: 12, noNaN: true })),
    60,
    ([plain, doubt]) => {
      const chain = { ...plain, room: { ...plain.room, doubt } };
      const b = quick(chain);
      // A seat further off, or nearer, by just so many decibels.
      const factor =
        chain.room.kind === 'open-air'
          ? Math.pow(10, doubt / 20)
          : Math.pow(2, doubt / chain.room.distanceLoss);
      const seatAt = (seatDistance: number) => quick({ ...chain, seatDistance }).verdict.margin;
      close(seatAt(chain.seatDistance * factor), b.roomDoubt.worstMargin, 1e-9, 'worse');
      close(seatAt(chain.seatDistance / factor), b.roomDoubt.bestMargin, 1e-9, 'better');
    }
  );
});

describe('hot coil', () => {
  law('that has not warmed is the cold one', anyChain, 60, (chain) => {
    const { hot, alignment, driver, verdict } = quick({ ...chain, driver: { ...chain.driver, coilRise: 0 } });
    near(hot.re, driver.coil.re, 1e-12, 'resistance');
    near(hot.qtc, alignment.qtc, 1e-12, 'Qtc');
    close(hot.levelLoss, 0, 1e-9, 'level lost');
    close(hot.margin, verdict.margin, 1e-9, 'margin');
    expect(hot.limit).toBe(verdict.limit);
    expect(hot.holds).toBe(verdict.holds);
  });

  law(
    'is a coil of so much more resistance, its filters left as they were set',
    plausibleChain,
    60,
    (chain) => {
      const cold = quick(chain);
      const { fs, qms, qes, vas } = cold.driver.each;
      // Copper: 0.393 % per kelvin (IEC 60028, from memory).
      const ratio = 1 + 0.00393 * chain.driver.coilRise;
      const warmed = quick({
        ...chain,
        shaping: chain.shaping.map((b) =>
          b.kind === 'linkwitz-transform' ? { ...b, from: cold.alignment.fc, fromQ: cold.alignment.qtc } : b
        ),
        driver: {
          ...chain.driver,
          ...{ fs, qms, qes: qes * ratio, qts: null, vas, mms: null, cms: null, bl: null, rms: null },
          re: chain.driver.re * ratio,
          // A rating of heat stays one of current through the cold coil.
          power: chain.driver.power === null ? null : chain.driver.power * ratio
        }
      });
      near(cold.hot.re, warmed.driver.coil.re, 1e-9, 'resistance');
      near(cold.hot.qtc, warmed.alignment.qtc, 1e-9, 'Qtc');
      close(cold.hot.margin, warmed.verdict.margin, 1e-6, 'margin');
      close(cold.hot.levelLoss, 20 * Math.log10(warmed.masterDrive / cold.masterDrive), 1e-9, 'level lost');
    }
  );
});
