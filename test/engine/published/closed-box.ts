/** The closed box in general: numbers 9–25 of the published checks. */
import { f3Ratio, responsePeak } from '$lib/engine/box/alignment';
import { passbandPressure } from '$lib/engine/box/circuit';
import { curves } from '$lib/engine/budget/curves';
import { equivalentDriver } from '$lib/engine/driver/equivalent';
import { toDb } from '$lib/engine/quantity/decibel';
import { absolute, percent, share } from '../../tolerance';
import { one, type CheckRow } from './check-row';
import { impedanceAt, pressureAt, ROOM_AIR, travelAt, worked, workedChain } from './worked-chain';

const SMALL_I = 'R. H. Small, Closed-Box Loudspeaker Systems, Part I: Analysis, JAES 20(10), 1972';
const SMALL_II = 'R. H. Small, Closed-Box Loudspeaker Systems, Part II: Synthesis, JAES 21(1), 1973';
const SMALL_DIRECT = 'R. H. Small, Direct-Radiator Loudspeaker System Analysis, JAES 20(5), 1972';
const THOMSON =
  'W. E. Thomson, Delay networks having maximally flat frequency characteristics, Proc. IEE, 1949';
const BERANEK = 'L. L. Beranek, Acoustics, 1954 (from memory)';

/** The worked driver with the Qes that brings the 60 L box to this Qtc, and no mechanical loss to speak of. */
function boxOf(qtc: number) {
  const rise = Math.sqrt(3);
  const w = worked({ driver: { qms: 1e9, qes: qtc / rise } });
  return { w, fc: w.alignment.fc, qtc: w.alignment.qtc };
}

/** dB of the circuit's own pressure, re its passband, at a multiple of fc. */
function levelAt(qtc: number, ratio: number): number {
  const { w, fc } = boxOf(qtc);
  return toDb(pressureAt(w, fc * ratio) / passbandPressure(w.circuit));
}

const TIGHT = absolute(1e-5);

const F3S: readonly [number: number, qtc: number, ratio: number][] = [
  [10, 0.5, 1.553774],
  [12, 0.8, 0.89716],
  [13, 1, 0.786151],
  [14, 1.2, 0.735815],
  [15, 1.5, 0.699345]
];
const f3s = F3S.map(([number, qtc, ratio]) =>
  one(number, `f3/fc at Qtc ${qtc}`, ratio, TIGHT, SMALL_I, () => f3Ratio(qtc))
);

const PEAKS: readonly [number: number, qtc: number, db: number, ratio: number][] = [
  [12, 0.8, 0.21295, 2.13809],
  [13, 1, 1.24939, Math.SQRT2],
  [14, 1.2, 2.41178, 1.237705],
  [15, 1.5, 4.03335, 1.133893]
];

const peaks = PEAKS.flatMap(([number, qtc, db, ratio]): CheckRow[] => {
  const common = { number, tolerance: TIGHT, source: SMALL_I };
  const found = responsePeak(qtc);
  return [
    { ...common, what: `peak at Qtc ${qtc}, dB`, value: db, actual: () => found.db },
    { ...common, what: `peak at Qtc ${qtc}, f/fc`, value: ratio, actual: () => found.ratio ?? NaN },
    {
      ...common,
      what: `circuit at the peak of Qtc ${qtc}, dB`,
      value: db,
      actual: () => levelAt(qtc, ratio)
    },
    // Number 25: the travel's peak mirrors the pressure's about fc.
    {
      ...common,
      number: 25,
      what: `travel at its peak re 0 Hz, Qtc ${qtc}, dB`,
      value: db,
      source: SMALL_I,
      actual: () => {
        const { w, fc } = boxOf(qtc);
        return toDb(travelAt(w, fc / ratio) / travelAt(w, 1e-4));
      }
    },
    {
      ...common,
      number: 25,
      what: `travel beside its peak is below it, Qtc ${qtc}`,
      value: 1,
      source: SMALL_I,
      actual: () => {
        const { w, fc } = boxOf(qtc);
        const top = travelAt(w, fc / ratio);
        return travelAt(w, (fc / ratio) * 1.02) < top && travelAt(w, fc / ratio / 1.02) < top ? 1 : 0;
      }
    }
  ];
});

/** Half space at 1 m, dB: the ceiling the cone's travel sets with this Sd (m²) and Xmax (m) at f. */
function travelCeiling(f: number, sd: number, xmax: number): number {
  const chain = workedChain({ driver: { sd, xmax } });
  return curves(chain, Float64Array.of(f)).ceilings['cone-travel']?.[0] ?? NaN;
}

const PUSH = 'volume displacement in half space, p = ρω²Vd/(2√2π)';

export const closedBox: readonly CheckRow[] = [
  one(9, 'f3/fc at Qtc 1/√2', 1, absolute(1e-6), SMALL_I, () => f3Ratio(Math.SQRT1_2)),
  one(9, 'circuit at fc, Qtc 1/√2, dB', 10 * Math.log10(1 / 2), absolute(1e-6), SMALL_I, () =>
    levelAt(Math.SQRT1_2, 1)
  ),
  one(10, 'circuit at fc, Qtc 0.5, dB', 20 * Math.log10(1 / 2), TIGHT, SMALL_I, () => levelAt(0.5, 1)),
  one(11, 'f3/fc at Qtc 1/√3', 1.27202, TIGHT, `${SMALL_I}; ${THOMSON}`, () => f3Ratio(1 / Math.sqrt(3))),
  ...f3s,
  ...peaks,
  one(16, 'circuit at fc, Qtc 0.9, dB', -0.91515, TIGHT, SMALL_I, () => levelAt(0.9, 1)),
  one(17, 'slope far below fc, dB an octave', 12.04, absolute(0.01), SMALL_I, () => {
    return levelAt(0.7, 1 / 200) - levelAt(0.7, 1 / 400);
  }),
  one(18, 'efficiency constant 4π²/c³, s³/m³', 9.7633e-7, percent(0.02), SMALL_DIRECT, () => {
    const { efficiency, qes, fs, vas } = equivalentDriver(workedChain().driver, ROOM_AIR);
    return (efficiency * qes) / (fs ** 3 * vas);
  }),
  one(
    19,
    'displacement-limited acoustic power P_AR/(f⁴Vd²), W·s⁴/m⁶',
    0.435102,
    percent(0.02),
    `${SMALL_I}; ${SMALL_II}: P_AR = 4π³ρf⁴Vd²/c`,
    () => {
      const driver = equivalentDriver(workedChain().driver, ROOM_AIR);
      const oneWatt = driver.level1W - 10 * Math.log10(driver.efficiency);
      const watts = 10 ** ((travelCeiling(20, 0.05, 0.02) - oneWatt) / 10);
      return watts / (20 ** 4 * 1e-3 ** 2);
    }
  ),
  one(20, 'ceiling by travel, 20 Hz, Vd 1 L, dB', 100.587, absolute(0.005), PUSH, () =>
    travelCeiling(20, 0.05, 0.02)
  ),
  one(21, '… an octave higher, dB more', 12.041, absolute(0.001), PUSH, () => {
    return travelCeiling(40, 0.05, 0.02) - travelCeiling(20, 0.05, 0.02);
  }),
  one(21, '… with twice the Vd, by travel, dB more', 6.021, absolute(0.001), PUSH, () => {
    return travelCeiling(20, 0.05, 0.04) - travelCeiling(20, 0.05, 0.02);
  }),
  one(21, '… with twice the Vd, by area, dB more', 6.021, absolute(0.001), PUSH, () => {
    return travelCeiling(20, 0.1, 0.02) - travelCeiling(20, 0.05, 0.02);
  }),
  one(21, '… at four times the frequency, dB more', 24.082, absolute(0.001), PUSH, () => {
    return travelCeiling(80, 0.05, 0.02) - travelCeiling(20, 0.05, 0.02);
  }),
  one(22, 'impedance at fc over Re·(1 + Qmc/Qec)', 1, percent(0.05), SMALL_I, () => {
    const w = worked();
    const { fc, qmc, qec } = w.alignment;
    return impedanceAt(w, fc) / (w.driver.coil.re * (1 + qmc / qec));
  }),
  one(23, 'Qec with 0.7 Ω before 3.3 Ω, times', 1.212121, share(1e-6), SMALL_DIRECT, () => {
    const driver = { re: 3.3 };
    return worked({ driver, cable: 0.7 }).alignment.qec / worked({ driver }).alignment.qec;
  }),
  one(
    24,
    'α at the isothermal limit of filling, times',
    1 / 1.4,
    share(1e-12),
    `${BERANEK}; ${SMALL_I}`,
    () => {
      return worked({ box: { fillGain: 1.4 } }).alignment.alpha / worked().alignment.alpha;
    }
  )
];
