/** The answer of a sweep in words. */
import type { Sweep } from '$lib/engine/budget/sweep-types';
import { fixed, significant } from './format-number';
import { scaled } from './quantities';

/** A swept value in the file's own unit: litres, hertz or decibels. */
export const sweptValue = ({ over }: Pick<Sweep, 'over'>, value: number): number =>
  over === 'volume' ? scaled(value, 1000) : value;

type Which = 'answer' | 'amplifierAnswer';
type Column = Sweep['column'];

const FOUND: { readonly [C in Column]: { readonly [W in Which]: (value: string) => string } } = {
  net_L: {
    answer: (v) => `smallest box that holds: ${v}`,
    amplifierAnswer: (v) => `smallest box this amplifier carries: ${v} (volts and amps alone)`
  },
  boost_to_Hz: {
    answer: (v) => `most boost that holds: down to ${v}`,
    amplifierAnswer: (v) => `most boost this amplifier carries: down to ${v} (volts and amps alone)`
  },
  boost_gain_dB: {
    answer: (v) => `most boost that holds: ${v}`,
    amplifierAnswer: (v) => `most boost this amplifier carries: ${v} (volts and amps alone)`
  },
  level_dB: {
    answer: (v) => `highest level within limits: ${v}`,
    amplifierAnswer: (v) => `highest level this amplifier carries: ${v} (volts and amps alone)`
  }
};

const THING: { readonly [C in Column]: string } = {
  net_L: 'box volume',
  boost_to_Hz: 'boost',
  boost_gain_dB: 'boost',
  level_dB: 'level'
};

const SHOWN: { readonly [C in Column]: (value: number) => string } = {
  net_L: (v) => `${significant(v, 4)} L`,
  boost_to_Hz: (v) => `${fixed(v, 1)} Hz`,
  boost_gain_dB: (v) => `${fixed(v, 1)} dB`,
  level_dB: (v) => `${fixed(v, 1)} dB`
};

/** "smallest box that holds: 62 L"; or that nothing in the range does. */
export function sweepAnswerText(sweep: Sweep, which: Which): string {
  const value = sweep[which];
  const show = SHOWN[sweep.column];
  if (value !== null) return FOUND[sweep.column][which](show(sweptValue(sweep, value)));
  const values = sweep.rows.map((row) => row.value);
  const from = show(sweptValue(sweep, Math.min(...values)));
  const to = show(sweptValue(sweep, Math.max(...values)));
  const does = which === 'answer' ? 'holds' : 'is carried by this amplifier';
  return `no ${THING[sweep.column]} from ${from} to ${to} ${does}`;
}
