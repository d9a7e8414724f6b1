/**
 * Findings about shaping and box, at each side of each threshold.
 * Thresholds: common practice, no source, unless one is named beside the check.
 */
import { describe, expect, test } from 'vitest';
import type { Budget } from '$lib/engine/budget/budget';
import { curves } from '$lib/engine/budget/curves';
import type { Chain } from '$lib/engine/chain';
import type { Block } from '$lib/engine/shaping/block';
import { atLevel, budget, expectEdge, findingOf, quiet, quietDriver, severityOf } from './find';
import { quietChain } from './quiet-chain';

const active = { bypass: false, fixed: false };

describe('shaping', () => {
  const shelf = (gain: number): Chain =>
    quiet({ shaping: [{ ...active, kind: 'low-shelf', order: 2, corner: 20, gain, q: Math.SQRT1_2 }] });
  const boost = {
    code: 'boost-high',
    make: shelf,
    measure: (b: Budget) => b.system.boost,
    range: [1, 20]
  } as const;

  test('boost-high: above 6 dB a note, above 9 a caution, above 12 a strong one, with the power it costs', () => {
    expectEdge({ ...boost, threshold: 6, under: null, over: 'note' });
    expectEdge({ ...boost, threshold: 9, under: 'note', over: 'caution' });
    expectEdge({ ...boost, threshold: 12, under: 'caution', over: 'caution' });
    const strong = findingOf(shelf(16), 'boost-high');
    expect(strong?.facts.strong).toBe(true);
    // 10^(B/10): the definition of the decibel.
    expect(strong?.facts.power).toBeCloseTo(Math.pow(10, (strong?.facts.boost ?? 0) / 10), 9);
    expect(findingOf(shelf(11), 'boost-high')?.facts.strong).toBe(false);
  });

  test('boost-short: where the limit that is over is one that shaping lifts, by how much', () => {
    const loud = (gain: number) => atLevel(shelf(gain), 130);
    const boostHere = (b: Budget, chain: Chain) => {
      const at = curves(chain, new Float64Array([b.verdict.worst, chain.goal.pivot])).shaping;
      return at[0] - at[1];
    };
    const edge = {
      code: 'boost-short',
      make: loud,
      measure: boostHere,
      range: [0, 6],
      threshold: 0.5
    } as const;
    expectEdge({ ...edge, under: null, over: 'caution' });
    const found = findingOf(loud(6), 'boost-short');
    expect(found?.facts.short).toBeCloseTo(found?.facts.boostHere ?? NaN, 9);
    expect(severityOf(shelf(6), 'boost-short')).toBeNull();
  });

  test('transform-large: a transform that lifts more than 15 dB', () => {
    // 40·log10(f0/fp) at 0 Hz: Linkwitz, "Loudspeaker System Design", Wireless World, 1978.
    const make = (to: number, bypass = false): Chain =>
      quiet({
        shaping: [{ bypass, fixed: false, kind: 'linkwitz-transform', from: 80, fromQ: 0.7, to, toQ: 0.7 }]
      });
    const to = (lift: number) => 80 / Math.pow(10, lift / 40);
    expect(severityOf(make(to(14.999)), 'transform-large')).toBeNull();
    expect(findingOf(make(to(15.001)), 'transform-large')).toMatchObject({
      severity: 'caution',
      facts: { block: 0 }
    });
    expect(severityOf(make(to(20), true), 'transform-large')).toBeNull();
    const bound: Block = {
      ...active,
      kind: 'linkwitz-transform',
      from: 'box',
      fromQ: 'box',
      to: 10,
      toQ: 0.7
    };
    const lift = 40 * Math.log10(budget(quietChain).alignment.fc / 10);
    expect(findingOf(quiet({ shaping: [bound] }), 'transform-large')?.facts.lift).toBeCloseTo(lift, 9);
  });

  test('goal-short: a level not reached inside the band, beyond the tolerance', () => {
    const { short, at } = budget(quietChain).goalShort;
    const make = (tolerance: number) => quiet({ goal: { ...quietChain.goal, tolerance } });
    expect(severityOf(make(short + 1e-3), 'goal-short')).toBeNull();
    const found = findingOf(make(short - 1e-3), 'goal-short');
    expect(found).toMatchObject({ severity: 'caution', at, facts: { short, level: 92, shapingHere: 0 } });
    expect(budget(make(short - 1e-3)).verdict.holds).toBe(true);
  });
});

describe('box', () => {
  const sized = (net: number): Chain => quiet({ box: { ...quietChain.box, net } });
  const qtc = (b: Budget) => b.alignment.qtc;

  test('Qtc: 0.6 to 0.8 is left be; outside a note; below 0.5 and above 0.9 a caution', () => {
    const high = { code: 'qtc-high', make: sized, measure: qtc, range: [5e-3, 0.3] } as const;
    expectEdge({ ...high, threshold: 0.8, under: null, over: 'note', by: 1e-4 });
    expectEdge({ ...high, threshold: 0.9, under: 'note', over: 'caution', by: 1e-4 });
    const soft = (net: number): Chain => ({ ...sized(net), driver: { ...quietChain.driver, qes: 0.3 } });
    const low = { code: 'qtc-low', make: soft, measure: qtc, range: [5e-3, 0.3] } as const;
    expectEdge({ ...low, threshold: 0.6, under: 'note', over: null, by: 1e-4 });
    expectEdge({ ...low, threshold: 0.5, under: 'caution', over: 'note', by: 1e-4 });
  });

  test('Qtc: above 1.2 the caution carries the peak', () => {
    const chain = sized(10e-3);
    const { qtc: q, peak, peakAt } = budget(chain).alignment;
    expect(q).toBeGreaterThan(1.2);
    // Peak of a second-order high-pass: Small, "Closed-Box Loudspeaker Systems, Part I", JAES 20(10), 1972.
    expect(peak).toBeCloseTo(20 * Math.log10(q ** 2 / Math.sqrt(q ** 2 - 0.25)), 9);
    expect(findingOf(chain, 'qtc-high')).toMatchObject({
      severity: 'caution',
      at: peakAt,
      facts: { qtc: q, peak, peakAt }
    });
  });

  test('Qtc: well cold, above 1.2 hot is a note', () => {
    const warm = (coilRise: number) => quietDriver({ coilRise });
    const hot = { code: 'qtc-high', make: warm, measure: (b: Budget) => b.hot.qtc, range: [0, 300] } as const;
    expectEdge({ ...hot, threshold: 1.2, under: null, over: 'note', by: 1e-4 });
  });

  test('losses-missing: what is left out is named, and that Qtc is an upper bound follows', () => {
    const box = (part: Partial<Chain['box']>) => quiet({ box: { ...quietChain.box, ...part } });
    expect(findingOf(box({ qAbsorption: null }), 'losses-missing')).toMatchObject({
      severity: 'note',
      facts: { absorption: true, leakage: false, fill: false }
    });
    expect(findingOf(box({ qLeakage: null, fillGain: 1.2 }), 'losses-missing')).toMatchObject({
      facts: { absorption: false, leakage: true, fill: true }
    });
    expect(severityOf(quietChain, 'losses-missing')).toBeNull();
  });

  test('air-spring: peak displaced volume above 5 % of the box a note, 10 % a caution, with its second harmonic', () => {
    const make = (level: number) => atLevel(quietChain, level);
    const share = (b: Budget) => (b.driver.sd * b.demand.travel) / b.alignment.net;
    const edge = { code: 'air-spring', make, measure: share, range: [80, 140] } as const;
    expectEdge({ ...edge, threshold: 0.05, under: null, over: 'note', by: 1e-4 });
    expectEdge({ ...edge, threshold: 0.1, under: 'note', over: 'caution', by: 1e-4 });
    const facts = findingOf(make(125), 'air-spring')?.facts;
    // Adiabatic series, (γ + 1)/4 of Vd/Vb: L. L. Beranek, "Acoustics", 1954.
    expect(facts?.secondHarmonic).toBeCloseTo(((1.4 + 1) / 4) * (facts?.share ?? NaN), 9);
  });

  test('net-small: less air than the driver itself takes', () => {
    const make = (net: number) => sized(net);
    const { displacement } = budget(quietChain).driver;
    expect(severityOf(make(displacement * 1.001), 'net-small')).toBeNull();
    expect(findingOf(make(displacement / 1.001), 'net-small')).toMatchObject({
      severity: 'caution',
      facts: { displacement, estimated: false }
    });
  });

  test('displacement-estimated: where the inner volume is given and the driver’s own is not', () => {
    const inner = { ...quietChain.box, net: null, inner: 64e-3 };
    const unknown = { ...quietChain.driver, displacement: null };
    // 0.2·Sd^1.5 (common practice): 0.05 m² takes 2.236 L.
    const each = 0.2 * Math.pow(0.05, 1.5);
    const found = findingOf(quiet({ box: inner, driver: unknown }), 'displacement-estimated');
    expect(found?.severity).toBe('note');
    expect(found?.facts.each).toBeCloseTo(each, 12);
    expect(severityOf(quiet({ driver: unknown }), 'displacement-estimated')).toBeNull();
    expect(severityOf(quiet({ box: inner }), 'displacement-estimated')).toBeNull();
  });

  describe('alignment-differs', () => {
    const make = (le: number) => quietDriver({ qes: 0.3, le });
    /** f3 of the circuit re its passband, from the curves, over that of the alignment; Small 1972: ρ·Bl·Sd/(2π·Re·Mms) Pa at 1 m per volt. */
    const ratio = (b: Budget, chain: Chain) => {
      const { bl, sd, mms, coil } = b.driver;
      const passband = 20 * Math.log10((1.20412 * bl * sd) / (2 * Math.PI * coil.re * mms) / 20e-6);
      let [below, above] = [5, 2 * b.alignment.f3];
      for (let i = 0; i < 60; i++) {
        const f = Math.sqrt(below * above);
        if (curves(chain, new Float64Array([f])).driverBox[0] < passband - 10 * Math.log10(2)) below = f;
        else above = f;
      }
      return above / b.alignment.f3;
    };

    test('the full response is 3 dB down 5 % away from the alignment', () => {
      const edge = { code: 'alignment-differs', make, measure: ratio, range: [0, 2e-3] } as const;
      expectEdge({ ...edge, threshold: 0.95, under: 'note', over: null, by: 1e-4 });
      expect(findingOf(make(1.5e-3), 'alignment-differs')?.facts.circuitF3).toBeCloseTo(
        ratio(budget(make(1.5e-3)), make(1.5e-3)) * budget(make(1.5e-3)).alignment.f3,
        3
      );
    });

    test('so much inductance that it never comes up to half of the passband’s power', () => {
      expect(findingOf(quietDriver({ le: 60e-3 }), 'alignment-differs')?.facts.circuitF3).toBeNull();
    });

    test('not where the alignment is low and nothing pulls', () => {
      const low = quietDriver({ qes: 0.2, le: 0 });
      expect(ratio(budget(low), low)).toBeCloseTo(1, 2);
      expect(severityOf(low, 'alignment-differs')).toBeNull();
    });
  });
});
