/** The table of allowed values in the file format, row by row: each end is allowed, what lies just outside is not. */
import { describe, expect, test } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { fullPlan, withValue } from './full-plan';

/** Pointer, least, most, and what must change beside it so that the rules across keys stay kept. */
type Row = readonly [string, number, number, ((plan: Plan) => void)?];

const alone = (block: unknown) => (plan: Plan) => {
  plan.shaping = [block] as Plan['shaping'];
};
const block = (b: object, key: string, min: number, max: number): Row => [
  `/shaping/0/${key}`,
  min,
  max,
  alone(b)
];
const open = (plan: Plan) => {
  plan.shaping = [];
  plan.goal = { level_dB: 100, from_Hz: 5, to_Hz: 500, pivot_Hz: 50 };
};
const bigBox = (plan: Plan) => {
  plan.box = { inner_L: 5000, bracing_L: 0 };
};
const net = (plan: Plan) => {
  plan.box = { net_L: 85 };
};
const noCheckValues = (plan: Plan) => {
  bigBox(plan);
  plan.driver = { ...plan.driver, qts: null };
};
const fromMass = (plan: Plan) => {
  bigBox(plan);
  plan.driver.vas_L = null;
};

const transform = { kind: 'linkwitz-transform', from_Hz: 40, from_q: 0.8, to_Hz: 25, to_q: 0.6 };
const shelf = { kind: 'low-shelf', order: 2, corner_Hz: 40, gain_dB: 3, q: 0.7 };
const peak = { kind: 'peak', centre_Hz: 32, q: 4, gain_dB: -5 };

const ROWS: readonly Row[] = [
  ['/air/temperature_C', -40, 60],
  ['/air/pressure_kPa', 50, 110],
  ['/goal/level_dB', 40, 150],
  ['/goal/tolerance_dB', 0, 20],
  ['/goal/from_Hz', 5, 200, (p) => ((p.goal.to_Hz = 500), (p.goal.pivot_Hz = null))],
  ['/goal/to_Hz', 10, 500, (p) => ((p.goal.from_Hz = 5), (p.goal.pivot_Hz = null))],
  ['/goal/pivot_Hz', 5, 500, open],
  ['/programme/lowest_Hz', 1, 200],
  ['/programme/crest_factor_dB', 3.01, 30],
  ['/copies', 1, 16],
  block({ kind: 'low-pass', family: 'butterworth', order: 2, corner_Hz: 80 }, 'corner_Hz', 1, 2000),
  block({ kind: 'low-pass', family: 'bessel', order: 2, corner_Hz: 80 }, 'order', 1, 8),
  block({ kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 15 }, 'corner_Hz', 1, 2000),
  block({ kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 15 }, 'order', 1, 8),
  block(transform, 'from_Hz', 1, 2000),
  block(transform, 'from_q', 0.1, 30),
  block(transform, 'to_Hz', 1, 2000),
  block(transform, 'to_q', 0.1, 30),
  block(shelf, 'corner_Hz', 1, 2000),
  block(shelf, 'gain_dB', -40, 40),
  block(shelf, 'q', 0.1, 30),
  block(shelf, 'order', 1, 2),
  block(peak, 'centre_Hz', 1, 2000),
  block(peak, 'q', 0.1, 30),
  block(peak, 'gain_dB', -40, 40),
  block({ kind: 'gain', gain_dB: 0 }, 'gain_dB', -60, 60),
  block({ kind: 'delay', delay_ms: 0 }, 'delay_ms', 0, 1000),
  block({ kind: 'all-pass', order: 2, corner_Hz: 60, q: 1 }, 'corner_Hz', 1, 2000),
  block({ kind: 'all-pass', order: 2, corner_Hz: 60, q: 1 }, 'q', 0.1, 30),
  block({ kind: 'all-pass', order: 2, corner_Hz: 60, q: 1 }, 'order', 1, 2),
  ['/amplifier/ratings/1/power_W', 0.1, 20000],
  ['/amplifier/ratings/1/load_ohm', 0.25, 64],
  ['/amplifier/gain_dB', -40, 80],
  ['/amplifier/output_ohm', 0, 50],
  ['/amplifier/minimum_load_ohm', 0.1, 64],
  ['/amplifier/efficiency', 0.05, 1],
  ['/cable/resistance_ohm', 0, 20],
  ['/driver/count', 1, 16, bigBox],
  ['/driver/coils', 1, 4],
  ['/driver/fs_Hz', 5, 200],
  ['/driver/qms', 0.2, 50, noCheckValues],
  ['/driver/qes', 0.05, 20, noCheckValues],
  ['/driver/qts', 0.05, 20],
  ['/driver/vas_L', 0.1, 5000],
  ['/driver/sd_cm2', 5, 5000, bigBox],
  ['/driver/re_ohm', 0.1, 100],
  ['/driver/le_mH', 0, 100],
  ['/driver/l2_mH', 0, 200],
  ['/driver/r2_ohm', 0.01, 1000],
  ['/driver/mms_g', 0.5, 5000, fromMass],
  ['/driver/cms_mm_per_N', 0.001, 50],
  ['/driver/bl_Tm', 0.1, 200],
  ['/driver/rms_kg_per_s', 0.01, 100],
  ['/driver/xmax_mm', 0.1, 100, (p) => (p.driver.xmech_mm = null)],
  ['/driver/xmech_mm', 0.1, 200, (p) => (p.driver.xmax_mm = null)],
  ['/driver/power_W', 1, 20000],
  ['/driver/coil_rise_K', 0, 300],
  ['/driver/displacement_L', 0, 100, bigBox],
  ['/box/inner_L', 0.2, 5000, (p) => ((p.driver.displacement_L = 0), (p.box.bracing_L = 0))],
  ['/box/net_L', 0.2, 5000, net],
  ['/box/bracing_L', 0, 500, bigBox],
  ['/box/fill_gain', 1, 1.4],
  ['/box/q_absorption', 1, 1000],
  ['/box/q_leakage', 1, 1000],
  ['/room/length_m', 1, 60],
  ['/room/width_m', 1, 60],
  ['/room/height_m', 1, 60],
  ['/room/cap_dB', 0, 40],
  ['/room/boundary_distances_m/2', 0, 30],
  ['/room/distance_loss_dB', 0, 10],
  ['/room/doubt_dB', 0, 12],
  ['/seat/distance_m', 0.3, 100]
];

const WHOLE = /\/(order|count|coils|copies)$/;

function planFor([, , , beside]: Row): Plan {
  const plan = fullPlan();
  // The many blocks of the full plan would add up to too much at the ends of the other ranges.
  plan.shaping = [];
  beside?.(plan);
  return plan;
}

const lines = (value: unknown): string[] => {
  const result = checkPlan(value);
  return result.ok ? [] : result.problems.map(formatProblem);
};

describe('allowed values', () => {
  test.each(ROWS.map((row) => ({ row, name: `${row[0]} from ${row[1]} to ${row[2]}` })))(
    '$name',
    ({ row }) => {
      const [pointer, min, max] = row;
      for (const inside of [min, max]) expect(lines(withValue(planFor(row), pointer, inside))).toEqual([]);
      const step = WHOLE.test(pointer) ? 1 : 1e-9 * Math.max(1, Math.abs(max));
      for (const [outside, word] of [
        [min - step, 'below'],
        [max + step, 'above']
      ] as const) {
        const result = checkPlan(withValue(planFor(row), pointer, outside));
        expect(result.ok).toBe(false);
        if (result.ok) continue;
        const [problem] = result.problems.filter((p) => p.path === pointer);
        // An order that is 1 or 2 is a choice, not a span.
        if (/order$/.test(pointer) && max === 2) expect(problem.message).toContain('1 or 2');
        else {
          expect(problem.message).toContain(word);
          expect(problem.allowed).toContain(`${min} to ${max}`);
        }
      }
      for (const wrong of ['1', true, [], {}, NaN, Infinity])
        expect(lines(withValue(planFor(row), pointer, wrong)).join('\n')).toContain(pointer);
    }
  );

  test('a transform from "box" is allowed, another word is not', () => {
    expect(lines(fullPlan())).toEqual([]);
    expect(lines(withValue(fullPlan(), '/shaping/2/from_Hz', 'cabinet'))[0]).toContain('/shaping/2/from_Hz');
  });

  test('lists: blocks, ratings, boundaries', () => {
    const many = (n: number, one: unknown) => Array.from({ length: n }, () => one);
    const gain = { kind: 'gain', gain_dB: 0 };
    const rating = { power_W: 100, load_ohm: 4 };
    expect(lines(withValue(fullPlan(), '/shaping', many(64, gain)))).toEqual([]);
    expect(lines(withValue(fullPlan(), '/shaping', many(65, gain)))).toEqual([
      '/shaping: 65 entries where a list of at most 64 belongs.'
    ]);
    expect(lines(withValue(fullPlan(), '/amplifier/ratings', many(16, rating)))).toEqual([]);
    expect(lines(withValue(fullPlan(), '/amplifier/ratings', many(17, rating)))).toEqual([
      '/amplifier/ratings: 17 entries where a list of 1 to 16 belongs.'
    ]);
    expect(lines(withValue(fullPlan(), '/amplifier/ratings', []))).toEqual([
      '/amplifier/ratings: an empty list where at least 1 is needed.'
    ]);
    expect(lines(withValue(fullPlan(), '/room/boundary_distances_m', many(4, 1)))).toEqual([
      '/room/boundary_distances_m: 4 entries where a list of at most 3 belongs.'
    ]);
  });

  test.each([
    '/goal',
    '/goal/level_dB',
    '/goal/from_Hz',
    '/goal/to_Hz',
    '/amplifier',
    '/amplifier/ratings',
    '/driver',
    '/driver/re_ohm',
    '/driver/sd_cm2',
    '/box',
    '/seat',
    '/seat/distance_m',
    '/room/length_m'
  ])('%s is required: missing and null are problems', (pointer) => {
    expect(lines(withValue(fullPlan(), pointer, undefined))[0]).toMatch(new RegExp(`^${pointer}: missing: `));
    expect(lines(withValue(fullPlan(), pointer, null))[0]).toMatch(new RegExp(`^${pointer}: null where `));
  });

  test.each([
    '/title',
    '/notes',
    '/air',
    '/air/temperature_C',
    '/goal/pivot_Hz',
    '/programme',
    '/copies',
    '/shaping',
    '/shaping/0/label',
    '/shaping/0/bypass',
    '/amplifier/gain_dB',
    '/cable',
    '/driver/le_mH',
    '/driver/qts',
    '/driver/label',
    '/box/bracing_L',
    '/room',
    '/room/cap_dB',
    '/room/doubt_dB'
  ])('%s is optional: missing and null say the same', (pointer) => {
    const without = checkPlan(withValue(fullPlan(), pointer, undefined));
    const withNull = checkPlan(withValue(fullPlan(), pointer, null));
    expect(without.ok && withNull.ok && without.chain).toEqual(withNull.ok && withNull.chain);
    expect(without.ok).toBe(true);
  });
});
