/** The shaped system in the room: where it has fallen 3 and 10 dB below the pivot, how much shaping lifts, and where the goal falls short. */
import { bisect, goldenMaximum } from '../quantity/search';
import { powerFromDb } from '../quantity/decibel';
import { logGrid } from '../quantity/grid';
import type { System } from './budget';
import type { Peak } from './extremes';
import type { Quantity } from './limits/limit';
import { deliveredLevel, shapedPower, shapingLevel, type Workings } from './workings';

const LOWEST_SEARCHED = 1;
/** Largest step of the search downward: 1.2 % of the frequency. */
const STEP = 1.0119;

/** |H|² alone: the quantity behind the boost. */
export const shapingOnly: Quantity = () => 1;

/** First frequencies below the pivot where the delivered level has fallen 3.01 and 10 dB; null where it does not down to 1 Hz. */
export function fallPoints(w: Workings): { f3: number | null; f10: number | null } {
  const pivot = w.chain.goal.pivot;
  const top = shapedPower(w, pivot);
  const found: (number | null)[] = [null, null];
  const depths = [1 / 2, 1 / 10];
  let next = 0;
  let above = pivot;
  while (above > LOWEST_SEARCHED && next < depths.length) {
    const f = Math.max(LOWEST_SEARCHED, above / STEP);
    const power = shapedPower(w, f);
    while (next < depths.length && power <= top * depths[next]) {
      const wanted = top * depths[next];
      found[next++] = bisect((x) => shapedPower(w, x) <= wanted, above, f, f * 1e-9);
    }
    above = f;
  }
  return { f3: found[0], f10: found[1] };
}

export function systemFrom(w: Workings, peakOf: (quantity: Quantity) => Peak): System {
  const highest = peakOf(shapingOnly);
  const lift = 10 * Math.log10(highest.value / (w.masterDrive * w.masterDrive));
  const boost = lift - shapingLevel(w.cascade, w.chain.goal.pivot);
  return { ...fallPoints(w), boost, boostAt: highest.f, boostPower: powerFromDb(boost) };
}

const BAND_POINTS = 80;

/** Largest shortfall (dB, 0 or more) below the goal's level inside its band, and where. */
export function goalShortfall(w: Workings): { short: number; at: number; beyondTolerance: boolean } {
  const { level, from, to, tolerance } = w.chain.goal;
  const grid = logGrid(from, to, BAND_POINTS);
  let best = 0;
  let least = Infinity;
  for (let i = 0; i < grid.length; i++) {
    const power = shapedPower(w, grid[i]);
    if (power < least) {
      least = power;
      best = i;
    }
  }
  let at = grid[best];
  if (best > 0 && best < grid.length - 1) {
    const fine = goldenMaximum((f) => -shapedPower(w, f), grid[best - 1], grid[best + 1]);
    if (-fine.value < least) at = fine.x;
  }
  const short = level - deliveredLevel(w, at);
  return { short: Math.max(0, short), at, beyondTolerance: short > tolerance + 1e-9 };
}
