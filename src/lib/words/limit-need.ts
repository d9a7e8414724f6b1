/** What a limit's worst frequency asks for against its rating, in words. */
import type { LimitName } from '$lib/engine/budget/budget';
import { apart } from './format-number';
import { LIMIT_UNITS } from './limit-names';

const WHO: { readonly [L in LimitName]: (need: string, rating: string) => string } = {
  'amplifier-voltage': (need, rating) => `the amplifier would need ${need} of its ${rating}`,
  'amplifier-current': (need, rating) => `the amplifier would need ${need} of its ${rating}`,
  'cone-travel': (need, rating) => `the cone would need ${need} of its ${rating}`,
  'mechanical-stop': (need, rating) => `the cone would need ${need} of the ${rating} to its stop`,
  'coil-heat': (need, rating) => `the coil would carry ${need} of the ${rating} its heat allows`
};

/** "the cone would need 19.4 mm of its 16 mm": demanded and allowed in SI, told apart by as many digits as that takes. */
export function limitNeed(limit: LimitName, demanded: number, allowed: number): string {
  const { unit, factor } = LIMIT_UNITS[limit];
  const [need, rating] = apart(demanded * factor, allowed * factor);
  return WHO[limit](`${need} ${unit}`, `${rating} ${unit}`);
}
