/**
 * Findings about driver, amplifier, cable and room, at each side of each threshold.
 * Thresholds: common practice, no source, unless one is named beside the check.
 */
import { describe, expect, test } from 'vitest';
import type { Chain, DriverSheet } from '$lib/engine/chain';
import { deriveDriver } from '$lib/engine/driver/derive';
import { atLevel, budget, expectEdge, findingOf, quiet, quietDriver, severityOf } from './find';
import { quietChain } from './quiet-chain';

describe('driver', () => {
  const derived = deriveDriver(quietChain.driver);

  test.each(['qts', 'mms', 'cms', 'bl', 'rms'] as const)(
    'driver-contradiction: a redundant %s beyond 5 % a note, beyond 10 % a caution',
    (key) => {
      const given = (ratio: number) => quietDriver({ [key]: derived[key] * ratio });
      for (const [inside, ratio, severity] of [
        [1.0499, 1.0501, 'note'],
        [0.9501, 0.9499, 'note']
      ] as const) {
        expect(severityOf(given(inside), 'driver-contradiction')).toBeNull();
        expect(severityOf(given(ratio), 'driver-contradiction')).toBe(severity);
      }
      for (const ratio of [1.0999, 0.9001])
        expect(severityOf(given(ratio), 'driver-contradiction')).toBe('note');
      for (const ratio of [1.1001, 0.8999]) {
        const found = findingOf(given(ratio), 'driver-contradiction');
        expect(found).toMatchObject({ severity: 'caution', facts: { key, slip: null } });
        expect(found?.facts.ratio).toBeCloseTo(ratio, 9);
        expect(found?.facts.derived).toBeCloseTo(derived[key], 9);
        // The winning values stand: nothing is averaged.
        expect(budget(given(ratio)).limits).toEqual(budget(quietChain).limits);
      }
    }
  );

  test.each([
    [2, 'factor-two'],
    [0.5, 'factor-two'],
    [4, 'factor-four'],
    [0.25, 'factor-four'],
    [1000, 'unit-thousand'],
    [0.001, 'unit-thousand'],
    [3, null]
  ])('driver-contradiction: × %d is named as %s', (ratio, slip) => {
    expect(findingOf(quietDriver({ mms: derived.mms * ratio }), 'driver-contradiction')?.facts.slip).toBe(
      slip
    );
  });

  test('driver-contradiction: the force factor of both coils in place of one', () => {
    const twin: DriverSheet = { ...quietChain.driver, coils: 2, coilWiring: 'series', re: 2.8 };
    const bl = 2 * deriveDriver(twin).bl;
    expect(findingOf(quiet({ driver: { ...twin, bl } }), 'driver-contradiction')?.facts.slip).toBe('coils');
  });

  test('driver-suspicious: a caution with the usual range', () => {
    const found = findingOf(quietDriver({ xmax: 39e-3, xmech: 45e-3 }), 'driver-suspicious');
    expect(found).toMatchObject({ severity: 'caution', facts: { what: 'xmax-large', value: 39e-3, low: 0 } });
  });

  test.each(['down', 'up'] as const)(
    'sag: facing %s, with creep above a twentieth of Xmax a note, a tenth a caution',
    (facing) => {
      // Rest g/(2π·fs)², half again for creep.
      const rest = 9.80665 / (2 * Math.PI * 24) ** 2;
      const make = (share: number) => quietDriver({ facing, xmax: (1.5 * rest) / share, xmech: null });
      expect(severityOf(make(0.0499), 'sag')).toBeNull();
      expect(severityOf(make(0.0501), 'sag')).toBe('note');
      expect(severityOf(make(0.0999), 'sag')).toBe('note');
      const found = findingOf(make(0.1001), 'sag');
      expect(found).toMatchObject({ severity: 'caution', facts: { facing } });
      expect(found?.facts.sag).toBeCloseTo(rest, 9);
      expect(found?.facts.withCreep).toBeCloseTo(1.5 * rest, 9);
    }
  );

  test('sag: not on its side, nor where the facing or Xmax is not known', () => {
    const soft = { fs: 12, xmech: null };
    expect(severityOf(quietDriver({ ...soft, facing: 'down' }), 'sag')).toBe('caution');
    expect(severityOf(quietDriver({ ...soft, facing: 'side' }), 'sag')).toBeNull();
    expect(severityOf(quietDriver({ ...soft, facing: null }), 'sag')).toBeNull();
    expect(severityOf(quietDriver({ ...soft, facing: 'down', xmax: null }), 'sag')).toBeNull();
  });
});

describe('amplifier and cable', () => {
  test('cable-loss: above 0.3 dB (Qes up by 5 % would cost 0.42 dB, so the loss speaks first)', () => {
    const make = (loss: number) => quiet({ cableResistance: 5.6 * (Math.pow(10, loss / 20) - 1) });
    expect(severityOf(make(0.299), 'cable-loss')).toBeNull();
    const found = findingOf(make(0.301), 'cable-loss');
    expect(found?.severity).toBe('caution');
    expect(found?.facts.loss).toBeCloseTo(0.301, 9);
    expect(findingOf(quiet({ cableResistance: 0.56 }), 'cable-loss')?.facts.qesRise).toBeCloseTo(0.1, 9);
  });

  test('source-resistance: Qtc moved by 5 %', () => {
    const without = budget(quietChain).alignment.qtc;
    expectEdge({
      code: 'source-resistance',
      make: (outputResistance) => quiet({ amplifier: { ...quietChain.amplifier, outputResistance } }),
      measure: (b) => b.alignment.qtc / without,
      range: [0, 2],
      threshold: 1.05,
      under: null,
      over: 'caution',
      by: 1e-4
    });
  });

  test('load-low: a nominal load below the amplifier’s minimum blocks, whatever the margins', () => {
    const make = (minimumLoad: number) => quiet({ amplifier: { ...quietChain.amplifier, minimumLoad } });
    expect(severityOf(make(8), 'load-low')).toBeNull();
    const found = findingOf(make(8.01), 'load-low');
    expect(found).toMatchObject({ severity: 'blocking', facts: { nominal: 8, minimum: 8.01 } });
    const { verdict } = budget(make(8.01));
    expect(verdict.holds).toBe(false);
    expect(verdict.margin).toBeGreaterThan(3);
  });

  test('single-rating: one rating, current running out where the load dips below it', () => {
    const one = (load: number): Chain => ({
      ...atLevel(quietChain, 92),
      amplifier: { ...quietChain.amplifier, ratings: [{ power: load, load }] }
    });
    // 1 A from a rating of 8 W into 8 Ω, and the load dips near 6 Ω: a note; two ratings, a load that never dips, or ample margin: none.
    expect(findingOf(one(8), 'single-rating')).toMatchObject({ severity: 'note', facts: { load: 8 } });
    expect(findingOf(one(8), 'single-rating')?.facts.lowestImpedance).toBeLessThan(8);
    const two = { ...quietChain.amplifier, ratings: [...one(8).amplifier.ratings, { power: 4, load: 4 }] };
    expect(severityOf({ ...one(8), amplifier: two }, 'single-rating')).toBeNull();
    expect(severityOf(atLevel(one(8), 85), 'single-rating')).toBeNull();
    // A rating into less than the load ever is: volts run out before amps do.
    const lowest = findingOf(one(8), 'single-rating')?.facts.lowestImpedance ?? NaN;
    const free = { ...quietChain.amplifier, minimumLoad: 0 };
    const rated = (load: number): Chain => ({
      ...one(8),
      amplifier: { ...free, ratings: [{ power: load, load }] }
    });
    expect(severityOf(rated(lowest * 1.001), 'single-rating')).toBe('note');
    expect(severityOf(rated(lowest / 1.001), 'single-rating')).toBeNull();
  });
});

describe('room', () => {
  /** Three equal distances: 10·log10(1 + Σ sin(kd)/(kd)) re free field over seven images. Waterhouse, JASA 30(1), 1958. */
  const depth = (d: number, f: number): number => {
    const k = (2 * Math.PI * f) / Math.sqrt(1.4 * 287.05 * 293.15);
    const wave = (x: number) => Math.sin(k * x) / (k * x);
    return -10 * Math.log10(1 + 3 * wave(2 * d) + 3 * wave(2 * d * Math.SQRT2) + wave(2 * d * Math.sqrt(3)));
  };
  const corner = (...boundaries: number[]): Chain =>
    quiet({
      room: {
        ...{ kind: 'pressure-gain', length: 6, width: 4, height: 2.5, airtightness: 'typical', cap: null },
        ...{ boundaries, distanceLoss: 3, doubt: 0 }
      }
    });

  test('boundary-dip: three equal distances, from 3 dB below free field', () => {
    // Within the band to 80 Hz the hole grows with frequency until kd = 1.77 (Allison, JAES 22(5), 1974).
    expectEdge({
      code: 'boundary-dip',
      make: (d) => corner(d, d, d),
      measure: (_, chain) => depth(chain.room.kind === 'pressure-gain' ? chain.room.boundaries[0] : NaN, 80),
      range: [0.6, 1.1],
      threshold: 3,
      under: null,
      over: 'caution',
      by: 1e-2
    });
    // kd = 1.77 at 80 Hz: −11.4 dB re free field.
    const d = (1.77 * 343.232) / (2 * Math.PI * 80);
    expect(findingOf(corner(d, d, d), 'boundary-dip')?.facts.depth).toBeCloseTo(11.4, 1);
    expect(severityOf(corner(0.4, 0.5, 0.3), 'boundary-dip')).toBeNull();
    expect(severityOf(corner(), 'boundary-dip')).toBeNull();
  });

  test('exposure: a C-weighted peak above 135 dB, the lower action value of Directive 2003/10/EC (from memory)', () => {
    expectEdge({
      code: 'exposure',
      make: (level) => atLevel(quietChain, level),
      measure: (b) => b.exposure.peakC,
      range: [90, 150],
      threshold: 135,
      under: null,
      over: 'caution'
    });
  });
});
