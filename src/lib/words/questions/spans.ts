/** Where along a sweep the limits are kept: spans of the swept value, and what they are called. */
import type { LimitName } from '$lib/engine/budget/budget';
import type { Sweep, SweepRow } from '$lib/engine/budget/sweep-types';
import { listed } from '../limit-names';
import { sweptValue } from '../sweep-answer';
import type { System } from '../units/unit';
import { edgeText, type Column } from './swept-text';

/** In the file's own unit. An open end is the end of the sweep, not of what is within limits. */
export interface Span {
  readonly from: number;
  readonly to: number;
  readonly openBelow: boolean;
  readonly openAbove: boolean;
}

export const ALL_LIMITS: readonly LimitName[] = [
  'amplifier-voltage',
  'amplifier-current',
  'cone-travel',
  'mechanical-stop',
  'coil-heat'
];
export const AMPLIFIER: readonly LimitName[] = ['amplifier-voltage', 'amplifier-current'];

/** dB in hand of the tightest of these limits; what is not judged is left out. */
export const inHand = ({ margins }: SweepRow, limits: readonly LimitName[]): number =>
  Math.min(...limits.map((name) => margins[name] ?? Infinity));

/** Stretches of the sweep within these limits, from the lowest; ends between two rows lie where the margin crosses zero. */
export function spans(sweep: Sweep, limits: readonly LimitName[] = ALL_LIMITS): Span[] {
  const { rows } = sweep;
  const found: Span[] = [];
  let from: number | null = null;
  for (const [i, row] of rows.entries()) {
    const keeps = inHand(row, limits) >= 0;
    const edge = () => sweptValue(sweep, i === 0 ? row.value : crossing(rows[i - 1], row, limits));
    if (keeps && from === null) from = edge();
    if (!keeps && from !== null) {
      found.push(span(sweep, from, edge(), false));
      from = null;
    }
  }
  if (from !== null) found.push(span(sweep, from, sweptValue(sweep, rows[rows.length - 1].value), true));
  return found;
}

const span = (sweep: Sweep, from: number, to: number, openAbove: boolean): Span => ({
  from,
  to,
  openBelow: from === sweptValue(sweep, sweep.rows[0].value),
  openAbove
});

function crossing(a: SweepRow, b: SweepRow, limits: readonly LimitName[]): number {
  const [before, after] = [inHand(a, limits), inHand(b, limits)];
  return a.value + ((b.value - a.value) * before) / (before - after);
}

/** "from 62 L", "up to 140 L", "from 62 L to 140 L"; of a boost "down to 24.5 Hz". Empty for the whole sweep. */
export function spanText(column: Column, { from, to, openBelow, openAbove }: Span, system: System): string {
  if (openBelow && openAbove) return '';
  const lower = edgeText(column, from, 'lower', system);
  const upper = edgeText(column, to, 'upper', system);
  if (openAbove) return column === 'boost_to_Hz' ? `down to ${lower}` : `from ${lower}`;
  return openBelow ? `up to ${upper}` : `from ${lower} to ${upper}`;
}

/**
 * All spans of a sweep in words; null where there is none, empty where they are the whole of it. `answer` is the sweep's own, seen to
 * hold: it stands in for the end that it settles, so that both say the same.
 */
export function spansText(
  sweep: Sweep,
  found: readonly Span[],
  answer: number | null,
  system: System
): string | null {
  if (found.length === 0) return null;
  const { column } = sweep;
  const settled = answer === null ? found : found.map((one, i) => settle(sweep, one, i, found, answer));
  return listed(settled.map((one) => spanText(column, one, system)));
}

function settle(sweep: Sweep, one: Span, i: number, all: readonly Span[], answer: number): Span {
  const value = sweptValue(sweep, answer);
  const lowest = sweep.column === 'net_L' || sweep.column === 'boost_to_Hz';
  if (lowest) return i === 0 && !one.openBelow ? { ...one, from: value } : one;
  return i === all.length - 1 && !one.openAbove ? { ...one, to: value } : one;
}
