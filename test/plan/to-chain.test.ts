import { describe, expect, test } from 'vitest';
import { toChain } from '$lib/plan/to-chain';
import type { Plan } from '$lib/plan/schema';
import { fullPlan } from './full-plan';

const least: Plan = {
  format: 'sealwright-plan',
  version: 1,
  goal: { level_dB: 95, from_Hz: 30, to_Hz: 80 },
  amplifier: { ratings: [{ power_W: 100, load_ohm: 8 }] },
  driver: { re_ohm: 6, sd_cm2: 330 },
  box: { net_L: 85 },
  seat: { distance_m: 3 }
};

describe('units at the edge', () => {
  test('every key of the full plan in SI, each to the last digit', () => {
    const common = { bypass: false, fixed: false };
    // Written out by hand from the units in the keys; 18 °C is 291.15 K.
    expect(toChain(fullPlan())).toEqual({
      air: { temperature: 291.15, pressure: 100_000 },
      goal: { level: 100, from: 20, to: 80, pivot: 50, tolerance: 3 },
      programme: { lowest: 10, crest: 9 },
      copies: 2,
      shaping: [
        { kind: 'low-pass', family: 'linkwitz-riley', order: 4, corner: 80, bypass: false, fixed: true },
        { kind: 'high-pass', family: 'butterworth', order: 2, corner: 15, ...common },
        { kind: 'linkwitz-transform', from: 'box', fromQ: 'box', to: 24, toQ: 0.6, ...common },
        { kind: 'low-shelf', order: 2, corner: 40, gain: 3, q: 0.7, ...common },
        { kind: 'peak', centre: 32, q: 4, gain: -5, ...common },
        { kind: 'gain', gain: 6, ...common },
        { kind: 'polarity', ...common },
        { kind: 'delay', delay: 0.0015, ...common },
        { kind: 'all-pass', order: 2, corner: 60, q: 0.7, ...common },
        { kind: 'section', b: [0, 0, 1], a: [0, 0, 1], ...common }
      ],
      amplifier: {
        ratings: [
          { power: 500, load: 4 },
          { power: 280, load: 8 }
        ],
        gain: 29,
        outputResistance: 0.02,
        minimumLoad: 2,
        efficiency: 0.85
      },
      cableResistance: 0.05,
      driver: {
        count: 2,
        coils: 2,
        coilWiring: 'series',
        driverWiring: 'parallel',
        fs: 21,
        qms: 5.2,
        qes: 0.49,
        qts: 0.448,
        vas: 0.22,
        re: 1.7,
        le: 0.0009,
        l2: 0.0012,
        r2: 4,
        sd: 0.081,
        nominal: 2,
        mms: 0.243,
        cms: 0.000236,
        bl: 7.5,
        rms: 6.2,
        xmax: 0.016,
        xmech: 0.027,
        facing: 'side',
        coilRise: 150,
        power: 600,
        displacement: 0.0045
      },
      box: { net: null, inner: 0.18, bracing: 0.005, fillGain: 1.1, qAbsorption: 8, qLeakage: 20 },
      room: {
        kind: 'pressure-gain',
        length: 6.2,
        width: 4.4,
        height: 2.5,
        airtightness: 'typical',
        cap: 12,
        boundaries: [0.4, 0.5, 0.3],
        distanceLoss: 3,
        doubt: 4
      },
      seatDistance: 3
    });
  });

  test('the defaults of the file format', () => {
    expect(toChain(least)).toMatchObject({
      air: { temperature: 293.15, pressure: 101_325 },
      goal: { pivot: 50, tolerance: 3 },
      programme: { lowest: 10, crest: 9 },
      copies: 1,
      shaping: [],
      amplifier: { gain: null, outputResistance: 0, minimumLoad: 0, efficiency: 0.85 },
      cableResistance: 0,
      driver: {
        count: 1,
        coils: 1,
        coilWiring: 'single',
        le: 0,
        l2: null,
        r2: null,
        coilRise: 150,
        displacement: null
      },
      box: { net: 0.085, inner: null, bracing: 0, fillGain: 1, qAbsorption: null, qLeakage: null },
      room: { kind: 'open-air', doubt: 0 }
    });
    const indoors = toChain({
      ...least,
      room: { kind: 'pressure-gain', length_m: 5, width_m: 4, height_m: 2.5 }
    });
    expect(indoors.room).toMatchObject({
      airtightness: 'typical',
      cap: null,
      boundaries: [],
      distanceLoss: 3,
      doubt: 4
    });
  });

  test.each([
    [30, 45, 45],
    [60, 90, 60],
    [20, 80, 50]
  ])('in a band of %d to %d Hz the pivot left out is %d Hz', (from_Hz, to_Hz, pivot) => {
    expect(toChain({ ...least, goal: { level_dB: 95, from_Hz, to_Hz } }).goal.pivot).toBe(pivot);
  });

  test('a block without q has 1/√2', () => {
    const shaping: Plan['shaping'] = [
      { kind: 'low-shelf', order: 2, corner_Hz: 40, gain_dB: 3 },
      { kind: 'peak', centre_Hz: 40, gain_dB: 3, q: null },
      { kind: 'all-pass', order: 2, corner_Hz: 40 }
    ];
    for (const block of toChain({ ...least, shaping }).shaping)
      expect(block).toMatchObject({ q: Math.SQRT1_2 });
  });
});
