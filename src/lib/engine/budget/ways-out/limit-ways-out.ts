/**
 * Ways out of exceeded limits. Full cures come first and serve every exceeded limit alike, so they are solved once;
 * a partial one, that mends its own limit alone, is looked for only where no full one exists.
 */
import type { LimitMargin, WayOut } from '../budget';
import type { Workings } from '../workings';
import { amplifierWayOut } from './amplifier';
import { boostWayOut } from './boost';
import { fullCure, type Cure } from './cure';
import { driversWayOut } from './drivers';
import { highPassWayOut } from './high-pass';
import { levelWayOut } from './level';
import { volumeWayOut } from './volume';

const present = (ways: (WayOut | null)[]): WayOut[] => ways.filter((way) => way !== null);

/** Whether an excess lies so low that a high-pass takes it away without taking the goal's band with it. */
const liesLow = (w: Workings, m: LimitMargin): boolean => m.worst < 1.3 * w.chain.goal.from;

function solveAll(w: Workings, over: readonly LimitMargin[], cure: Cure): WayOut[] {
  return present([
    levelWayOut(w, cure),
    over.some((m) => liesLow(w, m)) ? highPassWayOut(w, cure) : null,
    boostWayOut(w, cure),
    amplifierWayOut(w, cure),
    driversWayOut(w, cure),
    volumeWayOut(w, cure)
  ]);
}

/** For each exceeded limit its ways out. */
export function limitWaysOut(
  w: Workings,
  over: readonly LimitMargin[]
): ReadonlyMap<LimitMargin, readonly WayOut[]> {
  if (over.length === 0) return new Map();
  const cure = fullCure(w.chain);
  const full = solveAll(w, over, cure);
  return new Map(
    over.map((m) => [m, full.length > 0 ? full : solveAll(w, [m], { ...cure, limits: [m.limit] })])
  );
}
