/** What a sweep says about the whole range: where it is within limits, what the amplifier carries, what no value cures. */
import type { Sweep } from '$lib/engine/budget/sweep-types';
import { limitName, listed } from '../limit-names';
import { marginSize } from '../margin-text';
import { sweptValue } from '../sweep-answer';
import type { System } from '../units/unit';
import { over, say, sentences, within, type Phrase } from './phrases';
import { ALL_LIMITS, AMPLIFIER, spans, spansText } from './spans';
import { sweptText, type Column } from './swept-text';

const THING: { readonly [C in Column]: string } = {
  net_L: 'box',
  boost_to_Hz: 'boost',
  boost_gain_dB: 'boost',
  level_dB: 'level'
};

/** "within limits from 62 L"; null where nothing in the sweep is. For the tint on the plots too. */
export function withinText(sweep: Sweep, system: System): string | null {
  const text = spansText(sweep, spans(sweep), sweep.answer, system);
  return text === null ? null : `within limits ${text || 'throughout'}`;
}

/** "amplifier is enough from 185 L"; null where it never is. */
export function enoughText(sweep: Sweep, system: System): string | null {
  const text = spansText(sweep, spans(sweep, AMPLIFIER), sweep.amplifierAnswer, system);
  return text === null ? null : `amplifier is enough ${text || 'throughout'}`;
}

/** " from 30 L to 255 L": what was looked at. */
function looked(sweep: Sweep, system: System): string {
  const shown = (row: number) => sweptText(sweep.column, sweptValue(sweep, sweep.rows[row].value), system);
  return ` from ${shown(0)} to ${shown(sweep.rows.length - 1)}`;
}

export function reach(sweep: Sweep, system: System): Phrase[] {
  const thing = THING[sweep.column];
  const range = looked(sweep, system);
  const where = spansText(sweep, spans(sweep), sweep.answer, system);
  if (where === '') return [within(`Every ${thing}${range} is within limits.`)];
  if (where !== null) return [within(`Within limits ${where}.`)];
  const enough = spansText(sweep, spans(sweep, AMPLIFIER), sweep.amplifierAnswer, system);
  const carries = enough === null ? [] : [say(`The amplifier is enough ${enough || 'throughout'}.`)];
  return sentences(carries, cureless(sweep, thing, range));
}

/** The limits that are over at every value, and by how little at best. */
function cureless(sweep: Sweep, thing: string, range: string): Phrase[] {
  const never = ALL_LIMITS.flatMap((name) => {
    const margins = sweep.rows.map((row) => row.margins[name] ?? Infinity);
    const best = Math.max(...margins);
    return best < 0 ? [{ name, best }] : [];
  });
  if (never.length === 0) return [over(`No ${thing}${range} is within every limit at once.`)];
  const names = listed(never.map(({ name }) => limitName(name)));
  const least = listed(never.map(({ best }) => `${marginSize(best)} dB`));
  return [over(`No ${thing}${range} cures ${names}:`), say(` at best still ${least} over.`)];
}
