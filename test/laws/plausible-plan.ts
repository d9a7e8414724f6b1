/** Random plans that somebody could build. All data invented. */
import fc from 'fast-check';
import type { Plan } from '$lib/plan/schema';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import { displaced } from './displaced';

type Driver = Plan['driver'];

const whole = (min: number, max: number) => fc.integer({ min, max });
const order12 = fc.constantFrom<1 | 2>(1, 2);

const typed = (min: number, max: number, digits = 3) =>
  fc.double({ min, max, noNaN: true }).map((x) => Number(x.toPrecision(digits)) + 0);

/** Air of 1 m³ acts as stiff as γ·p, here in the units of the file: vas_L from cone area (cm²), mass (g) and resonance (Hz). */
const vasOf = (sd: number, mms: number, fs: number): number =>
  Number(
    (((1.4 * 101325 * (sd / 1e4) ** 2) / ((2 * Math.PI * fs) ** 2 * (mms / 1000))) * 1000).toPrecision(4)
  );

const plausibleDriver: fc.Arbitrary<Driver> = fc
  .record({
    sd: typed(210, 1200),
    gramsPerCm2: typed(0.22, 0.45),
    fs_Hz: typed(17, 38),
    qms: typed(2.8, 8),
    qes: typed(0.32, 0.75),
    coils: fc.constantFrom(1, 1, 2),
    count: fc.constantFrom(1, 1, 2, 4),
    re: typed(2.6, 6.4),
    le_mH: typed(0.3, 2.5),
    lossy: fc.boolean(),
    xmax_mm: typed(6, 20),
    stop: typed(1.4, 1.9),
    power_W: typed(100, 900),
    coil_wiring: fc.constantFrom('series' as const, 'parallel' as const, 'single' as const),
    driver_wiring: fc.constantFrom('series' as const, 'parallel' as const),
    facing: fc.constantFrom('side' as const, 'down' as const, 'up' as const)
  })
  .map(({ sd, gramsPerCm2, re, lossy, stop, coils, count, coil_wiring, driver_wiring, ...d }) => ({
    ...d,
    count,
    coils,
    ...(coils > 1 ? { coil_wiring } : {}),
    ...(count > 1 ? { driver_wiring } : {}),
    vas_L: vasOf(sd, sd * gramsPerCm2, d.fs_Hz),
    sd_cm2: sd,
    re_ohm: Number((re / coils).toPrecision(3)),
    ...(lossy ? { l2_mH: d.le_mH * 1.5, r2_ohm: 4 } : {}),
    xmech_mm: Number((d.xmax_mm * stop).toPrecision(3))
  }));

const plausibleShaping: fc.Arbitrary<PlanBlock[]> = fc
  .tuple(
    fc.option(
      fc.record({
        kind: fc.constant('low-pass' as const),
        family: fc.constantFrom('linkwitz-riley' as const, 'butterworth' as const),
        order: fc.constantFrom(2, 4),
        corner_Hz: typed(70, 130)
      })
    ),
    fc.option(
      fc.record({
        kind: fc.constant('high-pass' as const),
        family: fc.constantFrom('bessel' as const, 'butterworth' as const),
        order: whole(1, 4),
        corner_Hz: typed(10, 20)
      })
    ),
    fc.option(
      fc.record({
        kind: fc.constant('linkwitz-transform' as const),
        from_Hz: fc.constant('box' as const),
        from_q: fc.constant('box' as const),
        to_Hz: typed(18, 32),
        to_q: typed(0.5, 0.75)
      })
    ),
    fc.option(
      fc.record({
        kind: fc.constant('low-shelf' as const),
        order: order12,
        corner_Hz: typed(25, 50),
        gain_dB: typed(0.5, 5)
      })
    ),
    fc.option(
      fc.record({
        kind: fc.constant('peak' as const),
        centre_Hz: typed(25, 70),
        q: typed(1, 8),
        gain_dB: typed(-8, 2)
      })
    ),
    fc.option(fc.record({ kind: fc.constant('gain' as const), gain_dB: typed(-6, 6) })),
    fc.option(fc.record({ kind: fc.constant('delay' as const), delay_ms: typed(0, 8) })),
    fc.option(fc.record({ kind: fc.constant('polarity' as const) })),
    fc.option(fc.record({ kind: fc.constant('all-pass' as const), order: order12, corner_Hz: typed(40, 90) }))
  )
  .map((blocks) => blocks.filter((b) => b !== null));

/** A plan somebody could build: it need not hold. */
export const plausiblePlan: fc.Arbitrary<Plan> = plausibleDriver.chain((driver) =>
  fc
    .record({
      level: typed(85, 106),
      from_Hz: typed(18, 35),
      to_Hz: typed(70, 120),
      crest: typed(6, 12),
      lowest_Hz: typed(8, 18),
      shaping: plausibleShaping,
      power: typed(60, 1200),
      gain: fc.option(typed(23, 35)),
      output_ohm: typed(0, 0.4),
      resistance_ohm: typed(0, 0.5),
      alpha: typed(0.6, 4),
      fill_gain: typed(1, 1.25),
      q_absorption: fc.option(typed(3, 30)),
      q_leakage: fc.option(typed(7, 50)),
      givesInner: fc.boolean(),
      indoors: fc.boolean(),
      length_m: typed(3, 9),
      width_m: typed(2.5, 6),
      airtightness: fc.constantFrom('tight' as const, 'typical' as const, 'leaky' as const),
      boundaries: fc.array(typed(0.15, 1.2), { maxLength: 3 }),
      distance_m: typed(1, 5)
    })
    .map((r): Plan => {
      const net = Number((((driver.count ?? 1) * (driver.vas_L ?? 0)) / r.alpha).toPrecision(3));
      const lossesOf = { fill_gain: r.fill_gain, q_absorption: r.q_absorption, q_leakage: r.q_leakage };
      return {
        format: 'sealwright-plan',
        version: 1,
        title: 'A plan of chance',
        goal: { level_dB: r.level, from_Hz: r.from_Hz, to_Hz: r.to_Hz },
        programme: { lowest_Hz: r.lowest_Hz, crest_factor_dB: r.crest },
        shaping: r.shaping,
        amplifier: {
          ratings: [
            { power_W: r.power, load_ohm: 8 },
            { power_W: r.power * 1.7, load_ohm: 4 }
          ],
          gain_dB: r.gain,
          output_ohm: r.output_ohm
        },
        cable: { resistance_ohm: r.resistance_ohm },
        driver,
        box: r.givesInner
          ? { inner_L: Math.ceil(net + displaced(driver) + 2), bracing_L: 2, ...lossesOf }
          : { net_L: net, ...lossesOf },
        room: r.indoors
          ? {
              kind: 'pressure-gain',
              length_m: r.length_m,
              width_m: r.width_m,
              height_m: 2.5,
              airtightness: r.airtightness,
              boundary_distances_m: r.boundaries
            }
          : { kind: 'open-air' },
        seat: { distance_m: r.distance_m }
      };
    })
);
