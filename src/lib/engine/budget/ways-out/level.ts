import type { WayOut } from '../budget';
import { atLevel, type Workings } from '../workings';
import { cures, marginOf, offer, settle, type Cure } from './cure';

/** Lowest level a plan file may ask for, dB. */
const LOWEST_LEVEL = 40;

/** The highest level that meets the cure: margins fall decibel for decibel with it. */
export function levelWayOut(w: Workings, cure: Cure): WayOut | null {
  const { level } = w.chain.goal;
  const value = settle(level + marginOf(w, cure, false), 0.1, 'down', (v) => cures(atLevel(w, v), cure));
  if (value === null || value < LOWEST_LEVEL || value >= level) return null;
  return offer(w, 'level', [{ set: 'level', value }], { value, before: level, givesUp: level - value });
}
