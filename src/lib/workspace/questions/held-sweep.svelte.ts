/**
 * The sweep that is on the screen. Moving the handle leaves it true, so it stays and with it the axes; another takes its place when
 * something else in the plan has changed, or when a drag has ended near the edge of what it covers.
 */
import type { Sweep, SweepOver } from '$lib/engine/budget/sweep-types';
import { sweptValue } from '$lib/words/sweep-answer';
import type { PlanDesk } from '../desk/plan-desk.svelte';
import { sweepBasis } from './sweep-chain';

export interface HeldSweep {
  readonly sweep: Sweep;
  /** Whether it belongs to the plan as it stands. */
  readonly fresh: boolean;
}

/** This share of the axis at either end is its edge. */
const EDGE = 0.08;

/** `value` in the file's own unit. */
export function heldSweep(
  desk: () => PlanDesk,
  over: SweepOver,
  value: () => number
): { current: HeldSweep | null } {
  let held: { readonly desk: PlanDesk; readonly basis: string; readonly sweep: Sweep } | null = null;
  const current = $derived.by((): HeldSweep | null => {
    const from = desk();
    const basis = sweepBasis(from.chain, over);
    const now = from.sweep(over);
    if (held?.desk !== from) held = null;
    const stays = held !== null && held.basis === basis && (from.dragging || isAmid(held.sweep, value()));
    if (now !== null && !stays) {
      if (now.fresh) held = { desk: from, basis, sweep: now.sweep };
      else held ??= { desk: from, basis: '', sweep: now.sweep };
    }
    return held === null ? null : { sweep: held.sweep, fresh: held.basis === basis };
  });
  return {
    get current() {
      return current;
    }
  };
}

/** Whether the value lies on the axis and not at its edge. */
function isAmid(sweep: Sweep, value: number): boolean {
  const ends = [sweep.rows[0], sweep.rows[sweep.rows.length - 1]].map((row) => sweptValue(sweep, row.value));
  const along = sweep.over === 'volume' ? Math.log : (v: number) => v;
  const share = (along(value) - along(ends[0])) / (along(ends[1]) - along(ends[0]));
  return share >= EDGE && share <= 1 - EDGE;
}
