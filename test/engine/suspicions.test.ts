/**
 * Suspicions about a data sheet: silent on ordinary subwoofer drivers, heard on the usual slips.
 * The drivers are invented, each put together from cone area, moving mass, suspension and motor as such sizes are built (common practice, no source).
 */
import { describe, expect, test } from 'vitest';
import type { DriverSheet } from '$lib/engine/chain';
import { deriveDriver } from '$lib/engine/driver/derive';
import { contradictions, suspicions } from '$lib/engine/driver/sheet-check';
import { quietChain } from './quiet-chain';

/** As on a sheet: size, cm², g, Hz, Qms, Qes, ohm per coil, coils, mH, mm, W. */
const DRIVERS: readonly (readonly [
  string,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number
])[] = [
  ['8 in, light cone for a small box', 214, 38, 34, 4.1, 0.48, 5.4, 1, 1.1, 6.5, 120],
  ['8 in, long throw, heavy', 210, 88, 29, 6.5, 0.52, 3.2, 1, 1.4, 14, 200],
  ['8 in, two coils, high Q', 220, 62, 36, 7.2, 0.72, 3.6, 2, 0.9, 9, 150],
  ['8 in, shallow', 205, 70, 42, 5.5, 0.68, 3.4, 1, 0.8, 7, 130],
  ['10 in, paper, soft surround', 330, 64, 26, 3.6, 0.42, 5.8, 1, 1.6, 8, 180],
  ['10 in, aluminium cone', 352, 115, 24, 4.8, 0.38, 3.5, 1, 0.9, 12, 250],
  ['10 in, two coils, very long throw', 330, 205, 25, 5.2, 0.44, 1.8, 2, 0.7, 21, 500],
  ['10 in, shallow, for a car', 340, 128, 38, 7.5, 0.66, 3.4, 1, 1.2, 9, 300],
  ['10 in, high efficiency', 345, 45, 38, 4.2, 0.35, 5.6, 1, 0.9, 5, 250],
  ['12 in, classic sealed', 490, 110, 22, 4.5, 0.45, 5.6, 1, 1.5, 9, 200],
  ['12 in, long throw', 500, 165, 21, 5.5, 0.42, 3.4, 1, 1.7, 14, 400],
  ['12 in, two coils, very long throw', 470, 265, 24, 6.0, 0.48, 1.7, 2, 0.8, 24, 700],
  ['12 in, four coils', 480, 240, 26, 6.5, 0.55, 1.9, 4, 0.5, 19, 600],
  ['12 in, free air', 505, 95, 24, 4.0, 0.7, 6.2, 1, 1.2, 7, 150],
  ['12 in, for halls', 530, 82, 38, 6.0, 0.32, 5.3, 1, 1.2, 7, 450],
  ['12 in, stiff and damped', 495, 140, 30, 2.6, 0.5, 3.6, 1, 2.4, 11, 300],
  ['15 in, hi-fi', 810, 190, 20, 5.2, 0.49, 3.3, 1, 1.8, 12, 300],
  ['15 in, long throw', 800, 290, 19, 5.8, 0.44, 3.5, 1, 2.2, 18, 600],
  ['15 in, for halls', 855, 125, 36, 7.0, 0.34, 5.2, 1, 1.6, 8, 600],
  ['15 in, two coils, very long throw', 790, 420, 22, 6.5, 0.46, 1.9, 2, 0.9, 30, 1200],
  ['15 in, open baffle', 850, 110, 28, 6.0, 0.85, 6.0, 1, 1.1, 7, 200],
  ['18 in, hi-fi', 1160, 330, 18, 6.0, 0.47, 3.4, 1, 2.5, 14, 500],
  ['18 in, for halls', 1210, 205, 33, 6.5, 0.31, 5.1, 1, 2.0, 9, 900],
  ['18 in, long throw for halls', 1220, 290, 28, 7.5, 0.35, 5.2, 1, 2.3, 14, 1600],
  ['18 in, two coils, very long throw', 1180, 640, 20, 6.8, 0.45, 1.8, 2, 1.1, 32, 2000],
  ['18 in, infinite baffle', 1200, 260, 17, 8.0, 0.62, 3.6, 2, 1.5, 12, 400]
];

function sheetOf(d: (typeof DRIVERS)[number]): DriverSheet {
  const [, sd, mms, fs, qms, qes, re, coils, le, xmax, power] = d;
  return {
    ...quietChain.driver,
    ...{ fs, qms, qes, re, coils, power },
    coilWiring: coils > 1 ? 'parallel' : 'single',
    sd: sd / 1e4,
    mms: mms / 1e3,
    vas: null,
    le: le / 1e3,
    xmax: xmax / 1e3,
    xmech: (1.6 * xmax) / 1e3,
    displacement: null
  };
}

describe('ordinary drivers', () => {
  test.for(DRIVERS)('%s: nothing odd', (driver) => {
    const sheet = sheetOf(driver);
    expect(suspicions(sheet)).toEqual([]);
    // Nor when every redundant value is on the sheet, or the stop or the nominal impedance.
    const { vas, cms, bl, rms, qts } = deriveDriver(sheet);
    const full: DriverSheet = { ...sheet, vas, cms, bl, rms, qts };
    expect(contradictions(full)).toEqual([]);
    expect(suspicions(full)).toEqual([]);
  });
});

/** A 12-inch driver as its sheet has it, and what was typed instead. */
const TWELVE = sheetOf(DRIVERS[10]);
const derived = deriveDriver(TWELVE);
const BY_VOLUME: DriverSheet = { ...TWELVE, vas: derived.vas, mms: null };
const radius = Math.sqrt(TWELVE.sd / Math.PI);
const EFFICIENCY = (4 * Math.PI ** 2 * derived.fs ** 3 * derived.vas) / (343.2 ** 3 * derived.qes);

/** What is typed so that the value stands at `x`. The ranges are common practice, no source. */
const EDGES: readonly (readonly [string, string, number, 'low' | 'high', (x: number) => DriverSheet])[] = [
  [
    'travel over 0.3 of the radius',
    'xmax-large',
    0.3 * radius,
    'high',
    (x) => ({ ...TWELVE, xmax: x, xmech: null })
  ],
  [
    'a stop just past Xmax',
    'xmech-close',
    1.05,
    'low',
    (x) => ({ ...TWELVE, xmech: x * (TWELVE.xmax as number) })
  ],
  [
    'a stop far past Xmax',
    'xmech-close',
    6,
    'high',
    (x) => ({ ...TWELVE, xmech: x * (TWELVE.xmax as number) })
  ],
  ['too light a cone', 'mass-area', 0.2, 'low', (x) => ({ ...TWELVE, mms: x * TWELVE.sd })],
  ['too heavy a cone', 'mass-area', 15, 'high', (x) => ({ ...TWELVE, mms: x * TWELVE.sd })],
  ['nominal far above Re', 'nominal-re', 0.6, 'low', (x) => ({ ...TWELVE, nominal: TWELVE.re / x })],
  ['nominal below Re', 'nominal-re', 1.05, 'high', (x) => ({ ...TWELVE, nominal: TWELVE.re / x })],
  ['Qts too low', 'qts-range', 0.12, 'low', (x) => ({ ...TWELVE, qes: null, qts: x })],
  ['Qts too high', 'qts-range', 1.5, 'high', (x) => ({ ...TWELVE, qes: null, qts: x })],
  ['inductance too large', 'inductance-large', 2.5e-3, 'high', (x) => ({ ...TWELVE, nominal: 4, le: 4 * x })],
  [
    'too little output',
    'efficiency-range',
    2e-5,
    'low',
    (x) => ({ ...TWELVE, qes: (derived.qes * EFFICIENCY) / x })
  ],
  [
    'too much output',
    'efficiency-range',
    0.08,
    'high',
    (x) => ({ ...TWELVE, qms: 1e4, qes: (derived.qes * EFFICIENCY) / x })
  ],
  ['too soft for its area', 'area-size', 0.03, 'low', (x) => ({ ...BY_VOLUME, vas: TWELVE.sd / x })],
  ['too stiff for its area', 'area-size', 60, 'high', (x) => ({ ...BY_VOLUME, vas: TWELVE.sd / x })]
];

const heard = (sheet: DriverSheet, what: string) => suspicions(sheet).filter((s) => s.what === what);

describe('odd values', () => {
  test.each(EDGES)('%s (%s, from %d)', (_, what, edge, side, sheet) => {
    const [inside, outside] = side === 'low' ? [edge * 1.001, edge / 1.001] : [edge / 1.001, edge * 1.001];
    expect(heard(sheet(inside), what)).toEqual([]);
    const [odd] = heard(sheet(outside), what);
    expect(odd.value).toBeCloseTo(outside, 9);
    expect(odd[side]).toBeCloseTo(edge, 9);
  });

  test('an area in square metres, a diameter for an area, a travel peak to peak and grams for kilograms are heard', () => {
    const small = (sd: number) => suspicions({ ...BY_VOLUME, sd: sd / 1e4 }).map((s) => s.what);
    expect(small(0.05)).toContain('area-size');
    expect(small(25.2)).toContain('area-size');
    const twice = suspicions({ ...TWELVE, sd: 214e-4, mms: 88e-3, xmax: 28e-3, xmech: null });
    expect(twice).toMatchObject([{ what: 'xmax-large', slip: 'peak-to-peak' }]);
    expect(suspicions({ ...TWELVE, mms: 165e-6 }).map((s) => s.what)).toContain('mass-area');
  });

  test('two coils’ nominal load beside one coil’s resistance is heard as that slip', () => {
    const twin: DriverSheet = { ...TWELVE, coils: 2, coilWiring: 'series', re: 1.7, nominal: 4 };
    expect(suspicions(twin)).toMatchObject([{ what: 'nominal-re', slip: 'coils' }]);
  });
});
