/** What the plan asks of amplifier and cone: each figure its own maximum over the programme's band, as of a steady tone with the programme's peak. */
import type { CircuitPoint } from '../box/circuit';
import { powerFromDb, SINE_CREST } from '../quantity/decibel';
import type { Demand } from './budget';
import type { Peak } from './extremes';
import { current, terminalVolts, travel, type Quantity } from './limits/limit';
import type { Workings } from './workings';

const realPower: Quantity = (p: CircuitPoint) => p.zRe / p.total2;
const apparentPower: Quantity = (p: CircuitPoint) => Math.sqrt(p.z2) / p.total2;

/** What `demandFrom` needs scanned besides the limits' own quantities. */
export const DEMANDED: readonly Quantity[] = [realPower, apparentPower];

export function demandFrom(w: Workings, peakOf: (quantity: Quantity) => Peak): Demand {
  const volts = Math.sqrt(peakOf(terminalVolts).value);
  const cone = peakOf(travel);
  const realW = peakOf(realPower).value;
  return {
    peakV: Math.SQRT2 * volts,
    peakA: Math.SQRT2 * Math.sqrt(peakOf(current).value),
    realW,
    apparentVA: peakOf(apparentPower).value,
    ratedW: (volts * volts) / w.driver.nominal,
    travel: Math.sqrt(cone.value),
    travelAt: cone.f,
    mainsW: (realW * powerFromDb(-(w.chain.programme.crest - SINE_CREST))) / w.chain.amplifier.efficiency,
    terminalV: volts
  };
}
