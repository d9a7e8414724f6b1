/** What a number field makes of the text in it: a number to take, nothing, or trouble in words. */
import { parseQuantity, type Reading } from '$lib/words/units/parse-quantity';
import type { Quantity } from '$lib/words/units/quantity';
import { quantityText, rangeText } from '$lib/words/units/quantity-text';
import { slipReadings } from '$lib/words/units/slip-readings';
import type { System } from '$lib/words/units/unit';
import { trouble, type Trouble } from './trouble';

export interface NumberRange {
  readonly min: number;
  readonly max: number;
}

export interface EntryRules {
  readonly label: string;
  readonly quantity: Quantity;
  readonly system: System;
  /** In the stored unit. */
  readonly range: NumberRange | null;
  readonly whole: boolean;
  readonly optional: boolean;
  /** The value in use, stored; null where there is none. */
  readonly value: number | null;
  /** Taken where the value is left out. */
  readonly initial: number | null;
}

export type Entry =
  | { readonly is: 'taken'; readonly stored: number | null }
  | { readonly is: 'trouble'; readonly trouble: Trouble };

const taken = (stored: number | null): Entry => ({ is: 'taken', stored });
const refused = (sentence: string, readings: readonly Reading[] = []): Entry => ({
  is: 'trouble',
  trouble: trouble(sentence, readings)
});

export function readEntry(text: string, rules: EntryRules): Entry {
  const { label, quantity, system, optional } = rules;
  if (text.trim() === '') return optional ? taken(null) : refused(`${label} is needed. ${stillUsing(rules)}`);
  const parsed = parseQuantity(text, quantity, system);
  if (parsed.kind === 'refused') return refused(`${parsed.sentence} ${stillUsing(rules)}`);
  if (parsed.kind === 'ask') {
    const allowed = parsed.readings.filter((reading) => fault(reading.stored, rules) === null);
    // Where the range leaves one reading, there is nothing to ask.
    if (allowed.length === 1) return taken(allowed[0].stored);
    if (allowed.length === 0)
      return refused(`${fault(parsed.readings[0].stored, rules)} ${stillUsing(rules)}`);
    return refused(`“${text.trim()}” can be read in two ways. Which one?`, allowed);
  }
  const wrong = fault(parsed.stored, rules);
  if (wrong === null) return taken(parsed.stored);
  const slips =
    parsed.bare && rules.range !== null
      ? slipReadings(parsed.typed.value, quantity, system, rules.range)
      : [];
  return refused(`${wrong} ${stillUsing(rules)}`, slips);
}

/** "High-pass must be 5 to 60 Hz."; null where the number is allowed. */
function fault(stored: number, { label, quantity, system, range, whole }: EntryRules): string | null {
  const outside = range !== null && (stored < range.min || stored > range.max);
  if (!outside && !(whole && !Number.isInteger(stored))) return null;
  const span = range === null ? '' : rangeText(range.min, range.max, quantity, system);
  return whole
    ? `${label} must be a whole number${span === '' ? '' : `, ${span}`}.`
    : `${label} must be ${span}.`;
}

/** The last good value stays in use, and says so. */
export function stillUsing({ value, initial, quantity, system }: EntryRules): string {
  const used = value ?? initial;
  return used === null ? 'Still left out.' : `Still using ${quantityText(used, quantity, system)}.`;
}
