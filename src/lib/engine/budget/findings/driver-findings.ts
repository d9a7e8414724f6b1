/** The driver's data against itself, and how it hangs. Thresholds: common practice, no source. */
import { contradictions, suspicions } from '../../driver/sheet-check';
import type { Finding } from '../budget';
import { finding, type Context } from './context';

const CAUTION = 0.1;

export function driverData({ w }: Context): Finding[] {
  const sheet = w.chain.driver;
  return [
    ...contradictions(sheet).map((facts) =>
      finding(
        { code: 'driver-contradiction', facts },
        Math.abs(facts.ratio - 1) > CAUTION ? 'caution' : 'note'
      )
    ),
    ...suspicions(sheet).map((facts) => finding({ code: 'driver-suspicious', facts }, 'caution'))
  ];
}

/** m/s². */
const GRAVITY = 9.80665;
/** Half again for creep. */
const CREEP = 1.5;
const SAG_NOTE = 0.05;
const SAG_CAUTION = 0.1;

/** Static sag of a cone that faces down or up: g/(2π·fs)², the free-air fs, since leaks equalise. */
export function sag({ w }: Context): Finding[] {
  const { facing, xmax } = w.chain.driver;
  if ((facing !== 'down' && facing !== 'up') || xmax === null) return [];
  const rest = GRAVITY / (2 * Math.PI * w.driver.fs) ** 2;
  const share = (CREEP * rest) / xmax;
  if (!(share > SAG_NOTE)) return [];
  return [
    finding(
      { code: 'sag', facts: { sag: rest, withCreep: CREEP * rest, share, facing } },
      share > SAG_CAUTION ? 'caution' : 'note'
    )
  ];
}
