import { bisect } from '../../quantity/search';
import type { Change, WayOut } from '../budget';
import { goalShortfall } from '../system';
import { deliveredLevel, type Workings } from '../workings';
import { offer, roundTo, tryChanges } from './cure';

/** What a plan file allows the band's ends to be, Hz. */
const HIGHEST_FROM = 200;
const LOWEST_TO = 10;

/** A narrower goal: the band in which the level does arrive within the tolerance. */
export function bandWayOut(w: Workings): WayOut | null {
  const { level, from, to, pivot, tolerance } = w.chain.goal;
  const within = (f: number) => level - deliveredLevel(w, f) <= tolerance;
  const changes: Change[] = [];
  if (!within(from) && pivot > from) {
    const value = roundTo(bisect(within, from, pivot, 0.01), 0.5, 'up');
    if (value > pivot || value > HIGHEST_FROM) return null;
    changes.push({ set: 'goal-from', value });
  }
  if (!within(to) && pivot < to) {
    const value = roundTo(bisect(within, to, pivot, 0.01), 0.5, 'down');
    if (value < pivot) return null;
    changes.push({ set: 'goal-to', value });
  }
  if (changes.length === 0) return null;
  const after = tryChanges(w.chain, changes);
  if (after === null || !(after.chain.goal.to > after.chain.goal.from) || after.chain.goal.to < LOWEST_TO)
    return null;
  if (goalShortfall(after).beyondTolerance) return null;
  const first = changes[0] as { set: 'goal-from' | 'goal-to'; value: number };
  return offer(w, 'band', changes, { value: first.value, before: first.set === 'goal-from' ? from : to });
}
