/** What the limits are called. */
import type { LimitName } from '$lib/engine/budget/budget';

const NAMES: { readonly [L in LimitName]: { readonly long: string; readonly short: string } } = {
  'amplifier-voltage': { long: 'amplifier volts', short: 'volts' },
  'amplifier-current': { long: 'amplifier amps', short: 'amps' },
  'cone-travel': { long: 'cone travel', short: 'travel' },
  'mechanical-stop': { long: "cone's stop", short: 'stop' },
  'coil-heat': { long: 'coil heat', short: 'heat' }
};

/** In a sentence: "cone travel". */
export const limitName = (limit: LimitName): string => NAMES[limit].long;
/** Volts and amps run out, travel runs out. */
export const isPlural = (limit: LimitName): boolean => limit.startsWith('amplifier-');
/** Where space is short: "travel". */
export const shortLimitName = (limit: LimitName): string => NAMES[limit].short;

/** First letter large, for the start of a sentence. */
export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** "a", "a and b", "a, b and c". */
export function listed(items: readonly string[], last = 'and'): string {
  if (items.length < 2) return items.join('');
  return `${items.slice(0, -1).join(', ')} ${last} ${items[items.length - 1]}`;
}

/** The unit a limit is counted in, and what one SI unit is of it. Heat is counted by the RMS current that makes it. */
export const LIMIT_UNITS: {
  readonly [L in LimitName]: { readonly unit: 'V' | 'A' | 'mm'; readonly factor: number };
} = {
  'amplifier-voltage': { unit: 'V', factor: 1 },
  'amplifier-current': { unit: 'A', factor: 1 },
  'cone-travel': { unit: 'mm', factor: 1000 },
  'mechanical-stop': { unit: 'mm', factor: 1000 },
  'coil-heat': { unit: 'A', factor: 1 }
};
