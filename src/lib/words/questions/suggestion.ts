/** The sweep's own answer as something to do: "Make it 62 L", "the smallest box within limits". */
import type { Sweep } from '$lib/engine/budget/sweep-types';
import { sweptValue } from '../sweep-answer';
import type { System } from '../units/unit';
import { ALL_LIMITS, AMPLIFIER, spans } from './spans';
import { edgeValue, sweptText, type Column } from './swept-text';

export interface Suggestion {
  /** In the file's own unit. */
  readonly value: number;
  readonly act: string;
  readonly outcome: string;
}

const WORDS: { readonly [C in Column]: readonly [act: (value: string) => string, most: string] } = {
  net_L: [(v) => `Make it ${v}`, 'the smallest box'],
  boost_to_Hz: [(v) => `Boost down to ${v}`, 'the most boost'],
  boost_gain_dB: [(v) => `Set the shelf to ${v}`, 'the most boost'],
  level_dB: [(v) => `Set ${v}`, 'the highest level']
};

/** `now` is where the plan stands. Null where nothing is to be done, and where the answer is only the end of what was looked at. */
export function suggestion(sweep: Sweep, now: number, system: System): Suggestion | null {
  const { column, answer, amplifierAnswer } = sweep;
  const found = answer ?? amplifierAnswer;
  const kept = spans(sweep, answer === null ? AMPLIFIER : ALL_LIMITS);
  if (found === null || kept.length === 0) return null;
  const lowest = column === 'net_L' || column === 'boost_to_Hz';
  if (lowest ? kept[0].openBelow : kept[kept.length - 1].openAbove) return null;
  const value = edgeValue(column, sweptValue(sweep, found), lowest ? 'lower' : 'upper', system);
  if (Math.abs(value - now) < 1e-6 * Math.abs(now)) return null;
  const [act, most] = WORDS[column];
  return {
    value,
    act: act(sweptText(column, value, system)),
    outcome: answer === null ? `${most} this amplifier carries` : `${most} within limits`
  };
}
