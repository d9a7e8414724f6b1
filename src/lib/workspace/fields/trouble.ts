/** What keeps an entry from being taken, in a sentence, and what it may have meant. */
import type { Reading } from '$lib/words/units/parse-quantity';

export interface Trouble {
  readonly sentence: string;
  /** Offered as buttons; each is one press away from being taken. */
  readonly readings: readonly Reading[];
}

export const trouble = (sentence: string, readings: readonly Reading[] = []): Trouble => ({
  sentence,
  readings
});
