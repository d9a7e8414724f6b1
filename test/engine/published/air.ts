/** Air: numbers 1–8 of the published checks. */
import type { Air } from '$lib/engine/chain';
import { density, soundSpeed } from '$lib/engine/quantity/air';
import { percent, absolute } from '../../tolerance';
import { equivalentDriver } from '$lib/engine/driver/equivalent';
import { one, type CheckRow } from './check-row';
import { ROOM_AIR, workedChain } from './worked-chain';

const at = (celsius: number, pascal = 101_325): Air => ({ temperature: 273.15 + celsius, pressure: pascal });

const IDEAL_GAS = 'ideal gas, ρ = p/(RT), c = √(γRT), R = 287.05 J/(kg·K), γ = 1.400';
const ISO_2533 = 'ISO 2533, Standard Atmosphere, 1975 (from memory, reproduced by calculation)';
const HANDBOOK = 'handbook values (from memory, reproduced by calculation)';

/** dB at 1 m in half space from 1 W of sound: what the engine's reference level holds beyond the efficiency. */
function oneAcousticWatt(): number {
  const driver = equivalentDriver(workedChain().driver, ROOM_AIR);
  return driver.level1W - 10 * Math.log10(driver.efficiency);
}

export const air: readonly CheckRow[] = [
  one(1, 'density at 20 °C, kg/m³', 1.20412, percent(0.01), IDEAL_GAS, () => density(at(20))),
  one(2, 'speed of sound at 20 °C, m/s', 343.232, percent(0.01), IDEAL_GAS, () => soundSpeed(at(20))),
  one(3, 'density of the standard atmosphere at sea level, kg/m³', 1.225, percent(0.01), ISO_2533, () =>
    density(at(15))
  ),
  one(3, 'speed of sound of the standard atmosphere at sea level, m/s', 340.29, percent(0.01), ISO_2533, () =>
    soundSpeed(at(15))
  ),
  one(4, 'density at 0 °C, kg/m³', 1.2923, percent(0.02), HANDBOOK, () => density(at(0))),
  one(4, 'speed of sound at 0 °C, m/s', 331.3, percent(0.02), HANDBOOK, () => soundSpeed(at(0))),
  ...[-40, 8, 20, 60].map((celsius) =>
    one(5, `ρc² = γp at ${celsius} °C, 101.325 kPa`, 141_855, percent(0.001), IDEAL_GAS, () => {
      return density(at(celsius)) * soundSpeed(at(celsius)) ** 2;
    })
  ),
  one(5, 'ρc² = γp at 80 kPa', 112_000, percent(0.001), IDEAL_GAS, () => {
    return density(at(8, 80_000)) * soundSpeed(at(8, 80_000)) ** 2;
  }),
  one(6, 'characteristic impedance at 20 °C, Pa·s/m', 413.29, percent(0.01), IDEAL_GAS, () => {
    return density(at(20)) * soundSpeed(at(20));
  }),
  one(
    7,
    'level at 1 m in half space from 1 acoustic watt, dB',
    112.16,
    absolute(0.005),
    'L. L. Beranek, Acoustics, 1954 (intensity of a source in half space)',
    oneAcousticWatt
  ),
  one(8, 'density at 8 °C, 80 kPa, kg/m³', 0.991275, percent(0.01), IDEAL_GAS, () => density(at(8, 80_000))),
  one(8, 'speed of sound at 8 °C, m/s', 336.134, percent(0.01), IDEAL_GAS, () => soundSpeed(at(8, 80_000)))
];
