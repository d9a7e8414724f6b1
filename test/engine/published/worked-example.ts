/**
 * The worked example: numbers 26–38 of the published checks. Its values were found by hand from the closed forms and again by an AC circuit
 * simulation. Sources: R. H. Small, "Closed-Box Loudspeaker Systems, Part I", JAES 20(10), 1972 (26–36); of the box losses (37, 38):
 * "Vented-Box Loudspeaker Systems, Part I: Small-Signal Analysis", JAES 21(5), 1973, its definitions from memory.
 */
import { curves } from '$lib/engine/budget/curves';
import { driverBoxLevel } from '$lib/engine/budget/workings';
import { logGrid } from '$lib/engine/quantity/grid';
import { goldenMaximum } from '$lib/engine/quantity/search';
import { toDb } from '$lib/engine/quantity/decibel';
import { absolute, percent, type Tolerance } from '../../tolerance';
import { rowsOf, type CheckRow } from './check-row';
import { impedanceAngleAt, impedanceAt, pressureAt, travelAt, worked, workedChain } from './worked-chain';

const SMALL_I = 'R. H. Small, Closed-Box Loudspeaker Systems, Part I: Analysis, JAES 20(10), 1972';
const SMALL_VENTED =
  'R. H. Small, Vented-Box Loudspeaker Systems, Part I: Small-Signal Analysis, JAES 21(5), 1973 (from memory)';
const FINE = percent(0.01);
const DB = absolute(0.001);

const w = worked();
const { driver, alignment } = w;
const absorbing = worked({ box: { qAbsorption: 10 } });
const leaking = worked({ box: { qLeakage: 10 } });

const one = (
  number: number,
  what: string,
  value: number,
  tolerance: Tolerance,
  actual: () => number,
  source = SMALL_I
): CheckRow => ({ number, what, value, tolerance, source, actual });

/** Largest impedance of the leaking box about fc, Ω. */
function leakyPeak(): number {
  const grid = logGrid(30, 60, 60);
  let best = 1;
  grid.forEach((f, i) => {
    if (i > 0 && i < 59 && impedanceAt(leaking, f) > impedanceAt(leaking, grid[best])) best = i;
  });
  return goldenMaximum((f) => impedanceAt(leaking, f), grid[best - 1], grid[best + 1], 1e-6).value;
}

/** dB of radiated over cone volume velocity: pressure over travel, re the same without the leak. */
const leakLoss = (f: number): number =>
  toDb(pressureAt(leaking, f) / travelAt(leaking, f) / (pressureAt(w, f) / travelAt(w, f)));

const travelCeilings = curves(workedChain(), Float64Array.of(20, 40)).ceilings['cone-travel'];
const otherBox = curves(workedChain({ box: { net: 0.02, qLeakage: null } }), Float64Array.of(20, 40));

export const workedExample: readonly CheckRow[] = [
  one(26, 'Qts', 0.454545, FINE, () => driver.qts),
  one(26, 'Cms, m/N', 0.338374e-3, FINE, () => driver.cms),
  one(26, 'Mms, kg', 0.1197743, FINE, () => driver.mms),
  one(27, 'Rms, kg/s', 3.762821, FINE, () => driver.rms),
  one(27, 'Bl, T·m', 15.02562, FINE, () => driver.bl),
  one(28, 'η₀', 0.00366124, FINE, () => driver.efficiency),
  one(28, '1 W at 1 m, dB', 87.7964, absolute(0.005), () => driver.level1W),
  one(28, '√8 V at 1 m, dB', 89.0458, absolute(0.005), () => driver.level2V83),
  one(29, 'α', 2, FINE, () => alignment.alpha),
  one(29, 'fc, Hz', 43.30127, FINE, () => alignment.fc),
  one(29, 'Qec', 0.866025, FINE, () => alignment.qec),
  one(29, 'Qmc', 8.660254, FINE, () => alignment.qmc),
  one(30, 'Qtc', 0.787296, FINE, () => alignment.qtc),
  one(30, 'f3, Hz', 39.33472, FINE, () => alignment.f3),
  one(30, 'peak, dB', 0.165441, FINE, () => alignment.peak),
  one(30, 'peak at, Hz', 98.4798, FINE, () => alignment.peakAt ?? NaN),
  ...rowsOf<number>(
    { number: 31, what: 'response re 1/6 W, dB, at Hz', tolerance: DB, source: SMALL_I },
    [
      [20, -13.2552],
      [30, -6.5655],
      [43.30127, -2.0772],
      [50, -1.0466],
      [100, 0.1653],
      [200, 0.0697]
    ],
    (f) => driverBoxLevel(w.circuit, f) - (driver.level1W + 10 * Math.log10(1 / 6))
  ),
  ...rowsOf<number>(
    { number: 32, what: 'impedance, Ω, at Hz', tolerance: FINE, source: SMALL_I },
    [
      [20, 7.46763],
      [30, 11.65695],
      [43.30127, 66],
      [50, 25.13687],
      [100, 7.23174],
      [200, 6.2426]
    ],
    (f) => impedanceAt(w, f)
  ),
  ...rowsOf<number>(
    { number: 33, what: 'impedance phase, degrees, at Hz', tolerance: absolute(0.005), source: SMALL_I },
    [
      [20, 32.8357],
      [30, 50.6746],
      [25 * Math.sqrt(3), 0],
      [50, -55.3944],
      [100, -30.5735],
      [200, -14.5916]
    ],
    (f) => impedanceAngleAt(w, f)
  ),
  ...rowsOf<number>(
    { number: 34, what: 'travel for 1 V, m one-way peak, at Hz', tolerance: FINE, source: SMALL_I },
    [
      [1e-3, 0.399458e-3],
      [20, 0.407055e-3],
      [30, 0.3908e-3],
      [50, 0.265585e-3],
      [100, 0.0763374e-3]
    ],
    (f) => travelAt(w, f)
  ),
  one(35, 'ceiling by travel at 20 Hz, dB', 94.5667, absolute(0.005), () => travelCeilings?.[0] ?? NaN),
  one(35, 'ceiling by travel at 40 Hz, dB', 106.6079, absolute(0.005), () => travelCeilings?.[1] ?? NaN),
  one(35, '… at 20 Hz in a third of the box, dB', 94.5667, absolute(0.005), () => {
    return otherBox.ceilings['cone-travel']?.[0] ?? NaN;
  }),
  one(36, 'P_AR at 20 Hz, W', 0.0174041, percent(0.02), () => {
    const oneWatt = driver.level1W - 10 * Math.log10(driver.efficiency);
    return 10 ** (((travelCeilings?.[0] ?? NaN) - oneWatt) / 10);
  }),
  one(37, 'Qmc with Q_absorption 10', 5.490381, FINE, () => absorbing.alignment.qmc, SMALL_VENTED),
  one(37, 'Qtc with Q_absorption 10', 0.748034, FINE, () => absorbing.alignment.qtc, SMALL_VENTED),
  one(
    37,
    'impedance at fc with Q_absorption 10, Ω',
    44.0385,
    FINE,
    () => impedanceAt(absorbing, absorbing.alignment.fc),
    SMALL_VENTED
  ),
  one(38, 'Qmc with Q_leakage 10', 5.490381, FINE, () => leaking.alignment.qmc, SMALL_VENTED),
  one(38, 'Qtc with Q_leakage 10', 0.748034, FINE, () => leaking.alignment.qtc, SMALL_VENTED),
  one(38, 'largest impedance with Q_leakage 10, Ω', 44.158, FINE, leakyPeak, SMALL_VENTED),
  ...rowsOf<number>(
    { number: 38, what: 'radiated re cone volume velocity, dB, at Hz', tolerance: DB, source: SMALL_VENTED },
    [
      [5, -2.4304],
      [10, -0.7463],
      [20, -0.1989]
    ],
    leakLoss
  )
];
