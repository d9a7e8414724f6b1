import { powerFromDb } from '../../quantity/decibel';
import type { LimitName, WayOut } from '../budget';
import { limitMargins } from '../limit-margins';
import type { Workings } from '../workings';
import { cures, offer, roundTo, tryChanges, type Cure } from './cure';

const AMPLIFIER: readonly LimitName[] = ['amplifier-voltage', 'amplifier-current'];
/** Largest power a rating may have, W. */
const MOST_WATTS = 20_000;

/** Watts as amplifiers are bought: whole watts when small, coarser when large. */
function buyable(power: number): number {
  const step = power < 20 ? 1 : power < 200 ? 5 : power < 1000 ? 10 : 50;
  return roundTo(power, step, 'up');
}

/** A bigger amplifier of the same make-up: every rating times the power that volts and amps lack. */
export function amplifierWayOut(w: Workings, cure: Cure): WayOut | null {
  const { ratings } = w.chain.amplifier;
  const lacking = limitMargins(w, { from: cure.from })
    .filter((m) => AMPLIFIER.includes(m.limit))
    .reduce((most, m) => Math.max(most, -m.margin), 0);
  if (!(lacking > 0)) return null;
  for (let extra = 0; extra < 3; extra++) {
    const powers = ratings.map((r) => buyable(r.power * powerFromDb(lacking + 0.02 * extra)));
    if (powers.some((p) => p > MOST_WATTS)) return null;
    const changes = [{ set: 'ratings', powers }] as const;
    const after = tryChanges(w.chain, changes);
    if (after === null || !cures(after, cure)) continue;
    const bought = ratings.map((r, i) => ({ power: powers[i], load: r.load }));
    return offer(w, 'amplifier', changes, { value: powers[0], before: ratings[0].power, ratings: bought });
  }
  return null;
}
