import type { WayOut } from '../budget';
import type { Workings } from '../workings';
import { offer, roundTo } from './cure';

/** A thicker or shorter cable: the most resistance that loses no more than `loss` dB and `rise` of Qes. */
export function cableWayOut(w: Workings, loss: number, rise: number): WayOut | null {
  const re = w.driver.coil.re;
  const most = re * Math.min(Math.pow(10, loss / 20) - 1, rise);
  const value = roundTo(most, 0.01, 'down');
  if (!(value > 0)) return null;
  return offer(w, 'cable', [{ set: 'cable', value }], { value, before: w.chain.cableResistance });
}
