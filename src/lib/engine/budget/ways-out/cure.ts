/** What a way out has to reach, and how it is told that it did. */
import type { Chain } from '../../chain';
import { EngineError } from '../../error';
import type { Change, LimitMargin, LimitName, WayOut } from '../budget';
import { applyChanges } from '../change';
import { limitMargins, tightest } from '../limit-margins';
import { loadTooLow, workOut, type Workings } from '../workings';

/** Points of a quick look; a solution found with it is always checked again in full. */
const QUICK_POINTS = 120;

export interface Cure {
  /** The limits that must hold; null for all of them. */
  readonly limits: readonly LimitName[] | null;
  /** Hz; content from here up. */
  readonly from: number;
  /** dB of margin that must be left. */
  readonly inHand: number;
}

export const fullCure = (chain: Chain): Cure => ({ limits: null, from: chain.programme.lowest, inHand: 0 });

const wanted = (cure: Cure, name: LimitName): boolean => cure.limits === null || cure.limits.includes(name);

/** Smallest margin among the limits the cure is for. */
export function marginOf(w: Workings, cure: Cure, quick: boolean): number {
  const margins = limitMargins(
    w,
    quick ? { from: cure.from, points: QUICK_POINTS, refine: false } : { from: cure.from }
  );
  let least = Infinity;
  for (const m of margins) if (wanted(cure, m.limit)) least = Math.min(least, m.margin);
  return least - cure.inHand;
}

export const cures = (w: Workings, cure: Cure, quick = false): boolean => marginOf(w, cure, quick) >= 0;

/** The chain with the changes made; null where they leave no box to speak of. */
export function tryChanges(chain: Chain, changes: readonly Change[]): Workings | null {
  try {
    return workOut(applyChanges(chain, changes));
  } catch (error) {
    if (error instanceof EngineError) return null;
    throw error;
  }
}

/** What blocks the plan: limits over, and a load too low. */
function standing(w: Workings, margins: readonly LimitMargin[]): WayOut['remaining'] {
  const over = margins
    .filter((m) => m.margin < 0)
    .map((m) => ({ code: `limit-${m.limit}` as const, by: -m.margin }));
  return loadTooLow(w) ? [...over, { code: 'load-low', by: null }] : over;
}

/** A way out as it will be offered, evaluated again with its rounded values. Null where the changes cannot be made. */
export function offer(
  w: Workings,
  kind: WayOut['kind'],
  changes: readonly Change[],
  facts: WayOut['facts']
): WayOut | null {
  const after = tryChanges(w.chain, changes);
  if (after === null) return null;
  const moved = Math.abs(after.alignment.qtc / w.alignment.qtc - 1) > 1e-6;
  const margins = limitMargins(after, { from: w.chain.programme.lowest });
  return {
    kind,
    changes,
    facts: moved ? { ...facts, qtc: after.alignment.qtc } : facts,
    marginAfter: tightest(margins).margin,
    remaining: standing(after, margins)
  };
}

/** `value` as a whole number of `step`s, upward or downward, without the noise of the last bit. */
export function roundTo(value: number, step: number, direction: 'up' | 'down'): number {
  const steps = value / step;
  const whole = direction === 'up' ? Math.ceil(steps - 1e-9) : Math.floor(steps + 1e-9);
  return Number((whole * step).toPrecision(12));
}

/**
 * The rounded value nearest to `start` that `holds` in full: a few steps onward in the safe direction when rounding was not enough,
 * a few back when the quick look that gave `start` was too careful.
 */
export function settle(
  start: number,
  step: number,
  direction: 'up' | 'down',
  holds: (value: number) => boolean,
  tries = 6
): number | null {
  const moved = (value: number, steps: number) =>
    Number((value + (direction === 'up' ? steps : -steps) * step).toPrecision(12));
  let value = roundTo(start, step, direction);
  if (holds(value)) {
    for (let i = 0; i < 2 && holds(moved(value, -1)); i++) value = moved(value, -1);
    return value;
  }
  for (let i = 1; i < tries; i++) {
    value = moved(value, 1);
    if (holds(value)) return value;
  }
  return null;
}

/**
 * Walks `values` (from where the plan is, outward) to the first that passes, then narrows the gap to the one before.
 * Null where none passes.
 */
export function firstPassing(
  values: readonly number[],
  passes: (value: number) => boolean,
  tolerance: number
): number | null {
  let before = values[0];
  for (const value of values) {
    if (passes(value)) {
      let no = before;
      let yes = value;
      while (Math.abs(yes - no) > tolerance) {
        const middle = (no + yes) / 2;
        if (passes(middle)) yes = middle;
        else no = middle;
      }
      return yes;
    }
    before = value;
  }
  return null;
}
