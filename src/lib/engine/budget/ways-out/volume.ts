import { logGrid } from '../../quantity/grid';
import { bisect } from '../../quantity/search';
import type { WayOut } from '../budget';
import { boxSetting, LARGEST_BOX, SMALLEST_BOX } from '../box-setting';
import type { Workings } from '../workings';
import { cures, firstPassing, offer, roundTo, settle, tryChanges, type Cure } from './cure';

/** Whole litres; tenths for a small box. */
const stepOf = (volume: number): number => (volume < 10e-3 ? 1e-4 : 1e-3);

/** Boxes from 0.35 to 3 times the present net volume are looked at. */
const SMALLER = 0.35;
const LARGER = 3;

function volumeOffer(w: Workings, volume: number): WayOut | null {
  const box = boxSetting(w.chain, w.driver.displacement);
  return offer(w, 'volume', [box.change(volume)], { value: volume - box.taken, before: w.alignment.net });
}

/** The box nearest in size to the present one, larger or smaller, that meets the cure. */
export function volumeWayOut(w: Workings, cure: Cure): WayOut | null {
  const box = boxSetting(w.chain, w.driver.displacement);
  const { net } = w.alignment;
  const passes = (volume: number, quick: boolean) => {
    const after = tryChanges(w.chain, [box.change(volume)]);
    return after !== null && cures(after, cure, quick);
  };
  const step = stepOf(box.value);
  const found: number[] = [];
  for (const factor of [LARGER, SMALLER]) {
    const end = Math.min(LARGEST_BOX, Math.max(SMALLEST_BOX, factor * net + box.taken));
    const larger = factor > 1;
    if (larger ? !(end > box.value * 1.01) : !(end < box.value * 0.99)) continue;
    const values = Array.from(larger ? logGrid(box.value, end, 14) : logGrid(end, box.value, 14).reverse());
    const first = firstPassing(values, (v) => passes(v, true), step / 4);
    if (first === null) continue;
    const value = settle(first, step, larger ? 'up' : 'down', (v) => passes(v, false));
    if (value !== null && value >= SMALLEST_BOX && value <= LARGEST_BOX) found.push(value);
  }
  if (found.length === 0) return null;
  const distance = (volume: number) => Math.abs(Math.log((volume - box.taken) / net));
  return volumeOffer(
    w,
    found.reduce((a, b) => (distance(b) < distance(a) ? b : a))
  );
}

/** The box that brings Qtc nearest to the first of `targets` whose result is `good`. Qtc falls as the box grows. */
export function volumeForQtc(
  w: Workings,
  targets: readonly number[],
  good: (after: Workings) => boolean
): WayOut | null {
  const box = boxSetting(w.chain, w.driver.displacement);
  const qtcAt = (volume: number) => tryChanges(w.chain, [box.change(volume)])?.alignment.qtc ?? Infinity;
  const low = Math.max(SMALLEST_BOX, 0.1 * w.alignment.net + box.taken);
  const high = Math.min(LARGEST_BOX, 10 * w.alignment.net + box.taken);
  const step = stepOf(box.value);
  for (const target of targets) {
    if (!(qtcAt(high) <= target && qtcAt(low) >= target)) continue;
    const volume = roundTo(
      bisect((v) => qtcAt(v) <= target, low, high, step / 16),
      step,
      'up'
    );
    const after = tryChanges(w.chain, [box.change(volume)]);
    if (after !== null && volume <= LARGEST_BOX && good(after)) return volumeOffer(w, volume);
  }
  return null;
}
