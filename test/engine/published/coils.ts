/** Coils and drivers together: numbers 39–43, 45 and 46 of the published checks (44 is a unit the engine does not know). */
import { passbandPressure } from '$lib/engine/box/circuit';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { driverBoxLevel, withHotCoil, type Workings } from '$lib/engine/budget/workings';
import type { DriverSheet } from '$lib/engine/chain';
import { nominalLoad } from '$lib/engine/driver/wiring';
import { toDb } from '$lib/engine/quantity/decibel';
import { absolute, EXACT, percent, share } from '../../tolerance';
import { one, type CheckRow } from './check-row';
import { impedanceAt, worked, workedChain } from './worked-chain';

const OHM = "common practice; Ohm's law";
const ENERGY = 'R. H. Small, Direct-Radiator Loudspeaker System Analysis, JAES 20(5), 1972 (energy argument)';
const COUPLING =
  'R. H. Small, Direct-Radiator Loudspeaker System Analysis, JAES 20(5), 1972 (mutual coupling at low frequency)';
const CIRCUIT = 'circuit theory, coupling k = 1';
const PASSIVE = "common practice, no source (the 1 Ω); Ohm's law";
const COPPER = 'IEC 60028, International standard of resistance for copper, 1925 (from memory)';

/** Same sums in another order: as good as exact. */
const SAME = share(1e-12);

/** Two coils of 3 Ω and 1 mH on the worked driver. */
const twin = (coilWiring: DriverSheet['coilWiring']) =>
  ({ driver: { coils: 2, coilWiring, re: 3, le: 1e-3, nominal: 8 } }) as const;
const series = worked(twin('series'));
const parallel = worked(twin('parallel'));
const single = worked(twin('single'));

/** W and A at the amplifier for the same level at f. */
function demandAt(wiring: 'series' | 'parallel', f: number): { watts: number; amps: number } {
  const c = curves(workedChain(twin(wiring)), Float64Array.of(f));
  return { watts: c.realW[0], amps: c.currentA[0] };
}

const alone = worked();
const pair = (driverWiring: DriverSheet['driverWiring']): Workings =>
  worked({ driver: { count: 2, driverWiring }, box: { net: 0.12 } });

const low = worked({ driver: { re: 3.3 } });
const passive = worked({ driver: { re: 3.3 }, cable: 1 });
const hundred = worked({ driver: { coilRise: 100 } });

export const coils: readonly CheckRow[] = [
  one(39, 'two 8-ohm coils side by side, Ω', 4, EXACT, OHM, () => {
    const { driver } = workedChain(twin('parallel'));
    return nominalLoad(driver, 'parallel', 'parallel');
  }),
  one(39, 'two 8-ohm coils in line, Ω', 16, EXACT, OHM, () => {
    const { driver } = workedChain(twin('series'));
    return nominalLoad(driver, 'series', 'parallel');
  }),
  one(
    40,
    'Qes, coils in line over side by side',
    1,
    SAME,
    ENERGY,
    () => series.driver.qes / parallel.driver.qes
  ),
  one(
    40,
    'fs, coils in line over side by side',
    1,
    SAME,
    ENERGY,
    () => series.driver.fs / parallel.driver.fs
  ),
  ...[15, 43.3, 120].flatMap((f) => [
    one(40, `watts for a level at ${f} Hz, in line over side by side`, 1, SAME, ENERGY, () => {
      return demandAt('series', f).watts / demandAt('parallel', f).watts;
    }),
    one(40, `current for a level at ${f} Hz, in line over side by side`, 0.5, SAME, ENERGY, () => {
      return demandAt('series', f).amps / demandAt('parallel', f).amps;
    }),
    one(40, `load at ${f} Hz, in line over side by side`, 4, SAME, ENERGY, () => {
      return impedanceAt(series, f) / impedanceAt(parallel, f);
    })
  ]),
  one(
    41,
    'Qes with one coil of two driven over both',
    2,
    SAME,
    ENERGY,
    () => single.driver.qes / parallel.driver.qes
  ),
  one(41, 'efficiency with one coil of two driven over both', 0.5, SAME, ENERGY, () => {
    return single.driver.efficiency / parallel.driver.efficiency;
  }),
  one(41, 'level from 1 W, one coil of two driven re both, dB', -3.0103, absolute(1e-4), ENERGY, () => {
    return single.driver.level1W - series.driver.level1W;
  }),
  ...(['parallel', 'series'] as const).flatMap((wiring) => {
    const two = pair(wiring);
    return [
      one(42, `two drivers in ${wiring}, twice the box: fc over one's`, 1, SAME, COUPLING, () => {
        return two.alignment.fc / alone.alignment.fc;
      }),
      one(42, `two drivers in ${wiring}, twice the box: Qtc over one's`, 1, SAME, COUPLING, () => {
        return two.alignment.qtc / alone.alignment.qtc;
      }),
      one(42, `two drivers in ${wiring}: per watt re one, dB`, 3.0103, absolute(0.001), COUPLING, () => {
        return two.driver.level1W - alone.driver.level1W;
      }),
      one(42, `two drivers in ${wiring}: η₀ over one's`, 2, SAME, COUPLING, () => {
        return two.driver.efficiency / alone.driver.efficiency;
      })
    ];
  }),
  ...[20, 43.3, 100].map((f) =>
    one(
      42,
      `two drivers in parallel per volt at ${f} Hz re one, dB`,
      6.0206,
      absolute(0.001),
      COUPLING,
      () => {
        return driverBoxLevel(pair('parallel').circuit, f) - driverBoxLevel(alone.circuit, f);
      }
    )
  ),
  one(
    43,
    'inductance of two coupled 1 mH coils in line, H',
    4e-3,
    SAME,
    CIRCUIT,
    () => series.driver.coil.le
  ),
  one(
    43,
    'inductance of two coupled 1 mH coils side by side, H',
    1e-3,
    SAME,
    CIRCUIT,
    () => parallel.driver.coil.le
  ),
  one(45, '1 Ω before 3.3 Ω: passband level, dB', -2.299, absolute(0.001), PASSIVE, () => {
    return toDb(passbandPressure(passive.circuit) / passbandPressure(low.circuit));
  }),
  one(45, '1 Ω before 3.3 Ω: level of the circuit at 20 kHz, dB', -2.299, absolute(0.001), PASSIVE, () => {
    return driverBoxLevel(passive.circuit, 20_000) - driverBoxLevel(low.circuit, 20_000);
  }),
  one(45, '1 Ω before 3.3 Ω: loss told by the finding, dB', 2.299, absolute(0.001), PASSIVE, () => {
    const { findings } = evaluate(passive.chain, { waysOut: false });
    const cable = findings.find((f) => f.code === 'cable-loss');
    return cable?.code === 'cable-loss' ? cable.facts.loss : NaN;
  }),
  one(45, '1 Ω before 3.3 Ω: Qec, times', 1.303, absolute(5e-4), PASSIVE, () => {
    return passive.alignment.qec / low.alignment.qec;
  }),
  one(46, 'resistance 100 K warmer, times', 1.393, percent(0.5), COPPER, () => {
    const { hot, driver } = evaluate(hundred.chain, { waysOut: false });
    return hot.re / driver.coil.re;
  }),
  one(46, '100 K warmer, level into resistance alone, dB', -2.879, percent(0.5), COPPER, () => {
    const hot = withHotCoil(hundred);
    return toDb(passbandPressure(hot.circuit) / passbandPressure(hundred.circuit));
  })
];
