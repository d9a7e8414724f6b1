import { alignBox } from '../../box/alignment';
import { logGrid } from '../../quantity/grid';
import { bisect } from '../../quantity/search';
import type { Change, WayOut } from '../budget';
import { volumeChange } from '../change';
import type { Workings } from '../workings';
import { cures, firstPassing, offer, settle, tryChanges, type Cure } from './cure';

/** Boxes from 0.35 to 3 times the present one are looked at, within what a plan file may hold (m³). */
const SMALLEST = 0.2e-3;
const LARGEST = 5;

/** Whole litres; tenths for a small box. */
const stepOf = (net: number): number => (net < 10e-3 ? 1e-4 : 1e-3);

/** The change that sets this net volume, rounded as given in the file: the inner volume when that is what is given. */
function change(w: Workings, net: number): Change {
  return volumeChange(w.chain, net, w.driver.displacement);
}

function volumeOffer(w: Workings, value: number): WayOut | null {
  const { net } = w.alignment;
  return offer(w, 'volume', [change(w, value)], { value, before: net });
}

/** The box nearest in size to the present one, larger or smaller, that meets the cure. */
export function volumeWayOut(w: Workings, cure: Cure): WayOut | null {
  const { net } = w.alignment;
  const at = (value: number) => tryChanges(w.chain, [change(w, value)]);
  const passes = (value: number, quick: boolean) => {
    const after = at(value);
    return after !== null && cures(after, cure, quick);
  };
  const step = stepOf(net);
  const found: number[] = [];
  for (const end of [Math.min(LARGEST, 3 * net), Math.max(SMALLEST, 0.35 * net)]) {
    const larger = end > net;
    if (larger ? !(end > net * 1.01) : !(end < net * 0.99)) continue;
    const values = larger ? Array.from(logGrid(net, end, 14)) : Array.from(logGrid(end, net, 14)).reverse();
    const first = firstPassing(values, (v) => passes(v, true), step / 4);
    const value =
      first === null ? null : settle(first, step, larger ? 'up' : 'down', (v) => passes(v, false));
    if (value !== null && value >= SMALLEST && value <= LARGEST) found.push(value);
  }
  if (found.length === 0) return null;
  const distance = (value: number) => Math.abs(Math.log(value / net));
  return volumeOffer(
    w,
    found.reduce((a, b) => (distance(b) < distance(a) ? b : a))
  );
}

/** The box that brings Qtc to `target`, where one does. Qtc falls as the box grows. */
export function volumeForQtc(w: Workings, target: number): WayOut | null {
  const { chain, driver } = w;
  const qtcAt = (net: number) =>
    alignBox(driver, { ...chain.box, net, inner: null }, chain.air, w.sourceResistance).qtc;
  const { net } = w.alignment;
  const [low, high] = [Math.max(SMALLEST, 0.1 * net), Math.min(LARGEST, 10 * net)];
  if (!(qtcAt(high) <= target && qtcAt(low) >= target)) return null;
  const exact = bisect((v) => qtcAt(v) <= target, low, high, 1e-6);
  return volumeOffer(w, Math.round(exact / stepOf(exact)) * stepOf(exact));
}
