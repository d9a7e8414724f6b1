/**
 * Random plans. `validPlan` fills every key, every kind of block, wiring and room with values from the whole allowed range;
 * `plausiblePlan` keeps to drivers, boxes and goals that could be built. All data invented.
 */
import fc from 'fast-check';
import { driverGaps } from '$lib/engine/driver/derive';
import { shapingRangeProblem } from '$lib/engine/shaping/range';
import type { Plan } from '$lib/plan/schema';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import { driverSheet, toChain } from '$lib/plan/to-chain';
import { displaced } from './displaced';

export { plausiblePlan } from './plausible-plan';

type Driver = Plan['driver'];

/** A number in a range: any double, its ends, or one as people type them. */
const within = (min: number, max: number): fc.Arbitrary<number> =>
  fc
    .oneof(
      { weight: 3, arbitrary: fc.double({ min, max, noNaN: true }) },
      { weight: 3, arbitrary: fc.double({ min, max, noNaN: true }).map((x) => Number(x.toPrecision(3))) },
      { weight: 1, arbitrary: fc.constantFrom(min, max) }
    )
    .map((x) => Math.min(max, Math.max(min, x)) + 0);

const whole = (min: number, max: number) => fc.integer({ min, max });
const text = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 12 }),
  fc.string({ unit: 'grapheme', maxLength: 12 })
);

/** Optional keys: left out, null, or a value. */
function keys<R extends object, O extends object>(
  must: { [K in keyof R]: fc.Arbitrary<R[K]> },
  may: { [K in keyof O]: fc.Arbitrary<O[K]> }
): fc.Arbitrary<R & { [K in keyof O]?: O[K] | null }> {
  const optional = Object.fromEntries(
    Object.entries<fc.Arbitrary<unknown>>(may).map(([k, a]) => [k, fc.option(a, { nil: null, freq: 9 })])
  );
  return fc.record({ ...must, ...optional }, { requiredKeys: Object.keys(must) as never[] }) as fc.Arbitrary<
    R & { [K in keyof O]?: O[K] | null }
  >;
}

const common = { id: text, label: text, bypass: fc.boolean(), fixed: fc.boolean() };
const hz = within(1, 2000);
const q = within(0.1, 30);
const order12 = fc.constantFrom<1 | 2>(1, 2);
// In steps, so that the signs of quotients below cannot be lost to underflow.
const coefficient = fc
  .oneof(within(-100, 100), within(0, 1e4), fc.constant(0))
  .map((x) => Math.round(x * 1e6) / 1e6 + 0);

const stable = (a: readonly number[]): boolean =>
  a[0] !== 0 ? a[1] / a[0] >= 0 && a[2] / a[0] >= 0 : a[1] !== 0 ? a[2] / a[1] >= 0 : a[2] !== 0;

const pass = fc.oneof(
  keys(
    {
      kind: fc.constantFrom('low-pass', 'high-pass'),
      family: fc.constantFrom('butterworth', 'bessel'),
      order: whole(1, 8),
      corner_Hz: hz
    },
    common
  ),
  keys(
    {
      kind: fc.constantFrom('low-pass', 'high-pass'),
      family: fc.constant('linkwitz-riley'),
      order: fc.constantFrom(2, 4, 6, 8),
      corner_Hz: hz
    },
    common
  )
);

/** Any block of any kind. */
export const validBlock = fc.oneof(
  pass,
  keys(
    {
      kind: fc.constant('linkwitz-transform'),
      from_Hz: fc.oneof(hz, fc.constant('box')),
      from_q: fc.oneof(q, fc.constant('box')),
      to_Hz: hz,
      to_q: q
    },
    common
  ),
  keys(
    { kind: fc.constant('low-shelf'), order: order12, corner_Hz: hz, gain_dB: within(-40, 40) },
    { q, ...common }
  ),
  keys({ kind: fc.constant('peak'), centre_Hz: hz, gain_dB: within(-40, 40) }, { q, ...common }),
  keys({ kind: fc.constant('gain'), gain_dB: within(-60, 60) }, common),
  keys({ kind: fc.constant('polarity') }, common),
  keys({ kind: fc.constant('delay'), delay_ms: within(0, 1000) }, common),
  keys({ kind: fc.constant('all-pass'), order: order12, corner_Hz: hz }, { q, ...common }),
  keys(
    {
      kind: fc.constant('section'),
      b: fc.tuple(coefficient, coefficient, coefficient).filter((b) => b.some((x) => x !== 0)),
      a: fc.tuple(coefficient, coefficient, coefficient).filter(stable)
    },
    common
  )
) as fc.Arbitrary<PlanBlock>;

const anyDriver = keys(
  { re_ohm: within(0.1, 100), sd_cm2: within(5, 5000) },
  {
    label: text,
    count: whole(1, 16),
    coils: whole(1, 4),
    coil_wiring: fc.constantFrom('single', 'series', 'parallel'),
    driver_wiring: fc.constantFrom('series', 'parallel'),
    fs_Hz: within(5, 200),
    qms: within(0.2, 50),
    qes: within(0.05, 20),
    qts: within(0.05, 20),
    vas_L: within(0.1, 5000),
    le_mH: within(0, 100),
    l2_mH: within(0, 200),
    r2_ohm: within(0.01, 1000),
    nominal_ohm: within(0.1, 100),
    mms_g: within(0.5, 5000),
    cms_mm_per_N: within(0.001, 50),
    bl_Tm: within(0.1, 200),
    rms_kg_per_s: within(0.01, 100),
    xmax_mm: within(0.1, 100),
    xmech_mm: within(0.1, 200),
    facing: fc.constantFrom('side', 'down', 'up'),
    coil_rise_K: within(0, 300),
    power_W: within(1, 20000),
    displacement_L: within(0, 100)
  }
) as fc.Arbitrary<Driver>;

/** Keeps the rules across keys: wiring where it is needed, the stop beyond Xmax, a sheet that suffices. */
function kept(d: Driver): Driver {
  const driver: Driver = { ...d };
  if ((driver.coils ?? 1) > 1) driver.coil_wiring ??= 'parallel';
  if ((driver.count ?? 1) > 1) driver.driver_wiring ??= 'series';
  if (driver.xmax_mm != null && driver.xmech_mm != null)
    driver.xmech_mm = Math.max(driver.xmax_mm, driver.xmech_mm);
  if ((driver.l2_mH == null) !== (driver.r2_ohm == null)) driver.l2_mH = driver.r2_ohm = null;
  if (driverGaps(driverSheet(driver)).length > 0)
    Object.assign(driver, {
      fs_Hz: driver.fs_Hz ?? 25,
      qms: driver.qms ?? 4,
      qes: driver.qes ?? 0.4,
      vas_L: driver.vas_L ?? 90
    });
  return driver;
}

const losses = { fill_gain: within(1, 1.4), q_absorption: within(1, 1000), q_leakage: within(1, 1000) };

const boxFor = (d: Driver): fc.Arbitrary<Plan['box']> =>
  fc.oneof(
    keys({ net_L: within(0.2, 5000) }, { ...losses, inner_L: fc.constant(null) as fc.Arbitrary<never> }),
    within(0, 500).chain((bracing) =>
      keys({ inner_L: within(displaced(d) + bracing + 0.2, 5000), bracing_L: fc.constant(bracing) }, losses)
    )
  );

const goal = within(5, 200).chain((from) =>
  within(Math.max(10, from * 1.01 + 0.1), 500).chain((to) =>
    keys(
      { level_dB: within(40, 150), from_Hz: fc.constant(from), to_Hz: fc.constant(to) },
      { pivot_Hz: within(from, to), tolerance_dB: within(0, 20) }
    )
  )
);

const room = fc.oneof(
  keys({ kind: fc.constant('open-air' as const) }, { doubt_dB: within(0, 12) }),
  keys(
    {
      kind: fc.constant('pressure-gain' as const),
      length_m: within(1, 60),
      width_m: within(1, 60),
      height_m: within(1, 60)
    },
    {
      airtightness: fc.constantFrom('tight' as const, 'typical' as const, 'leaky' as const),
      cap_dB: within(0, 40),
      boundary_distances_m: fc.array(within(0, 30), { maxLength: 3 }),
      distance_loss_dB: within(0, 10),
      doubt_dB: within(0, 12)
    }
  )
);

const amplifier = keys(
  {
    ratings: fc.array(fc.record({ power_W: within(0.1, 20000), load_ohm: within(0.25, 64) }), {
      minLength: 1,
      maxLength: 16
    })
  },
  {
    label: text,
    gain_dB: within(-40, 80),
    output_ohm: within(0, 50),
    minimum_load_ohm: within(0.1, 64),
    efficiency: within(0.05, 1)
  }
);

/** Every plan the file allows; shaping that leaves nothing to plan with is left out, as the file refuses it. */
export const validPlan: fc.Arbitrary<Plan> = anyDriver
  .map(kept)
  .chain((driver) =>
    keys(
      {
        format: fc.constant('sealwright-plan' as const),
        version: fc.constant(1 as const),
        goal,
        amplifier,
        driver: fc.constant(driver),
        box: boxFor(driver),
        seat: fc.record({ distance_m: within(0.3, 100) })
      },
      {
        title: text,
        notes: text,
        air: keys({}, { temperature_C: within(-40, 60), pressure_kPa: within(50, 110) }),
        programme: keys({}, { lowest_Hz: within(1, 200), crest_factor_dB: within(3.01, 30) }),
        copies: whole(1, 16),
        shaping: fc.array(validBlock, { maxLength: 6 }),
        cable: keys({}, { resistance_ohm: within(0, 20) }),
        room
      }
    )
  )
  .filter((plan) => shapingRangeProblem(toChain(plan as Plan)) === null) as fc.Arbitrary<Plan>;
