import { describe, expect, test } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { fullPlan } from './full-plan';

const lines = (change: (plan: Plan) => void): string[] => {
  const plan = fullPlan();
  change(plan);
  const result = checkPlan(plan);
  return result.ok ? [] : result.problems.map(formatProblem);
};

const drive = (driver: Partial<Plan['driver']>) => (plan: Plan) => {
  const bare = { re_ohm: 3.3, sd_cm2: 810, displacement_L: 4 };
  plan.driver = { ...bare, ...driver };
};

describe('rules across keys', () => {
  test('the band runs upward', () => {
    const [line] = lines((p) => Object.assign(p.goal, { from_Hz: 80, to_Hz: 20, pivot_Hz: null }));
    expect(line).toBe('/goal/to_Hz: 20 Hz is not above from_Hz, 80 Hz. The two swapped?');
    expect(lines((p) => Object.assign(p.goal, { from_Hz: 50, to_Hz: 50, pivot_Hz: null }))).toHaveLength(1);
  });

  test('the pivot lies in the band, its ends included', () => {
    expect(lines((p) => (p.goal.pivot_Hz = 19.9))[0]).toMatch(/^\/goal\/pivot_Hz: /);
    expect(lines((p) => (p.goal.pivot_Hz = 20))).toEqual([]);
    expect(lines((p) => (p.goal.pivot_Hz = 80))).toEqual([]);
  });

  test('the stop lies at Xmax or beyond', () => {
    expect(lines((p) => (p.driver.xmech_mm = 15.9))[0]).toMatch(/^\/driver\/xmech_mm: /);
    expect(lines((p) => (p.driver.xmech_mm = 16))).toEqual([]);
  });

  test('wiring is asked for where there is more than one', () => {
    expect(lines((p) => delete p.driver.coil_wiring)).toEqual([
      '/driver/coil_wiring: missing: with 2 coils it is "single", "series" or "parallel".'
    ]);
    expect(lines((p) => (p.driver.driver_wiring = null))[0]).toMatch(/^\/driver\/driver_wiring: missing/);
    expect(
      lines((p) => Object.assign(p.driver, { coils: 1, count: 1, coil_wiring: null, driver_wiring: null }))
    ).toEqual([]);
    expect(lines((p) => Object.assign(p.driver, { coils: 1, coil_wiring: 'single' }))).toEqual([]);
  });

  test('l2_mH and r2_ohm only together', () => {
    expect(lines((p) => (p.driver.l2_mH = null))[0]).toMatch(/^\/driver\/l2_mH: missing: r2_ohm is given/);
    expect(lines((p) => delete p.driver.r2_ohm)[0]).toMatch(/^\/driver\/r2_ohm: missing: l2_mH is given/);
    expect(lines((p) => Object.assign(p.driver, { l2_mH: null, r2_ohm: null }))).toEqual([]);
  });

  test.each([
    ['nothing', {}, ['fs_Hz', 'mms_g beside vas_L'], ['qms'], ['qes, or bl_Tm, or qts beside qms']],
    ['no compliance', { fs_Hz: 21, qms: 5, qes: 0.5 }, ['vas_L, or mms_g, or cms_mm_per_N']],
    ['no damping but qts', { fs_Hz: 21, vas_L: 200, qts: 0.4 }, ['qms, or rms_kg_per_s'], ['qes, or bl_Tm']]
  ])('a sheet with %s names what would do', (_, driver, ...groups) => {
    const found = lines(drive(driver));
    expect(found).toHaveLength(groups.length);
    groups.forEach((words, i) => {
      expect(found[i]).toMatch(/^\/driver: nothing gives /);
      for (const word of words as string[]) expect(found[i]).toContain(word);
    });
  });

  test.each([
    { fs_Hz: 21, qms: 5, qes: 0.5, vas_L: 200 },
    { mms_g: 240, cms_mm_per_N: 0.24, rms_kg_per_s: 6, bl_Tm: 15 },
    { mms_g: 240, vas_L: 220, qts: 0.45, qms: 5 },
    { fs_Hz: 21, mms_g: 240, qts: 0.45, qes: 0.5 },
    { fs_Hz: 21, cms_mm_per_N: 0.24, qts: 0.4, bl_Tm: 15 }
  ])('a sheet that suffices: %j', (driver) => expect(lines(drive(driver))).toEqual([]));

  test('the total Q is the smallest', () => {
    expect(lines(drive({ fs_Hz: 21, vas_L: 200, qms: 0.5, qts: 0.6 }))[0]).toMatch(
      /^\/driver\/qts: 0.6 is not below/
    );
  });

  test('one volume, and some of it left', () => {
    expect(lines((p) => (p.box = {}))[0]).toMatch(/^\/box: neither/);
    expect(lines((p) => (p.box.net_L = 85))[0]).toMatch(/^\/box: net_L and inner_L are both given/);
    // Two drivers of 4.5 L and 5 L of bracing: 14 L inner leaves nothing, 14.5 L leaves half a litre.
    expect(lines((p) => (p.box.inner_L = 14))[0]).toMatch(
      /^\/box: no air is left: 14 L inner, less 9 L of drivers and 5 L/
    );
    expect(lines((p) => (p.box.inner_L = 14.5))).toEqual([]);
    // 810 cm² without a displacement: 0.2·0.081^1.5 m³ = 4.61 L each, so 14.2 L is too little.
    expect(lines((p) => ((p.box.inner_L = 14.2), delete p.driver.displacement_L))[0]).toMatch(
      /^\/box: no air/
    );
  });

  test('linkwitz-riley is even', () => {
    for (const order of [1, 3, 5, 7])
      expect(
        lines((p) => (p.shaping = [{ kind: 'low-pass', family: 'linkwitz-riley', order, corner_Hz: 80 }]))[0]
      ).toMatch(/^\/shaping\/0\/order: \d is odd: linkwitz-riley has order 2, 4, 6 or 8\./);
    for (const order of [2, 4, 6, 8])
      expect(
        lines((p) => (p.shaping = [{ kind: 'low-pass', family: 'linkwitz-riley', order, corner_Hz: 80 }]))
      ).toEqual([]);
  });

  test.each([
    // S² − S + 1, S² − 1, −S² + S − 1 (the first again), S − 1: each has a root to the right.
    [[1, -1, 1]],
    [[1, 0, -1]],
    [[-1, 1, -1]],
    [[0, 1, -1]],
    [[1e300, -1e300, 1e300]],
    [[0, 0, 0]]
  ] as [number, number, number][][])('a section with the denominator %j is refused', (a) => {
    expect(lines((p) => (p.shaping = [{ kind: 'section', b: [0, 0, 1], a }]))[0]).toMatch(
      /^\/shaping\/0\/a: /
    );
  });

  test.each([[[1, 1, 1]], [[-1, -1, -1]], [[0, 1, 1]], [[0, 0, -3]], [[1, 2, 0]]] as [
    number,
    number,
    number
  ][][])('a section with the denominator %j is taken', (a) =>
    expect(lines((p) => (p.shaping = [{ kind: 'section', b: [1, 1, 1], a }]))).toEqual([])
  );

  test('a section that lets nothing through is refused', () => {
    expect(lines((p) => (p.shaping = [{ kind: 'section', b: [0, 0, 0], a: [0, 0, 1] }]))[0]).toMatch(
      /^\/shaping\/0\/b: /
    );
  });

  test('shaping that leaves nothing is refused as a whole', () => {
    const deep = { kind: 'high-pass', family: 'butterworth', order: 8, corner_Hz: 2000 } as const;
    // Eighth order, 50 Hz under 2000 Hz: 8·20·log10(40) = 256.3 dB each.
    expect(lines((p) => (p.shaping = [deep, deep]))).toEqual([
      '/shaping: together these blocks take 513 dB away at the pivot: nothing is left to plan with.'
    ]);
    expect(lines((p) => (p.shaping = [deep]))).toEqual([]);
    const lift = { kind: 'gain', gain_dB: 60 } as const;
    expect(lines((p) => (p.shaping = Array.from({ length: 7 }, () => lift)))[0]).toMatch(
      /^\/shaping: together .* add 420 dB/
    );
  });

  test('rules are asked of every part that is right in itself, in one go', () => {
    const found = lines((p) => {
      p.seat.distance_m = -1;
      p.goal.pivot_Hz = 90;
      p.driver.xmech_mm = 1;
      p.box = {};
      p.shaping = [{ kind: 'low-pass', family: 'linkwitz-riley', order: 3, corner_Hz: 80 }];
    });
    expect(found.map((line) => line.split(':')[0])).toEqual([
      '/seat/distance_m',
      '/goal/pivot_Hz',
      '/driver/xmech_mm',
      '/box',
      '/shaping/0/order'
    ]);
  });
});
