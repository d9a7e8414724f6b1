/** Tints of a question's plots: where every limit is kept; where none is anywhere, where the amplifier is enough. */
import type { Range } from '$lib/charts/plot-types';
import type { Sweep } from '$lib/engine/budget/sweep-types';
import { enoughText, withinText } from '$lib/words/questions/reach';
import { AMPLIFIER, spans, type Span } from '$lib/words/questions/spans';
import { shownUnit, type Quantity } from '$lib/words/units/quantity';
import type { System } from '$lib/words/units/unit';

export interface QuestionRanges {
  readonly all: boolean;
  readonly ranges: readonly Range[];
}

export function questionRanges(sweep: Sweep, quantity: Quantity, system: System): QuestionRanges {
  const { fromStored } = shownUnit(quantity, system);
  const named = (found: readonly Span[], label: string | null, shortLabel: string): Range[] =>
    found.map(({ from, to }, i) => ({
      id: `${shortLabel} ${i}`,
      from: fromStored(from),
      to: fromStored(to),
      // Said once, in the first stretch.
      ...(i === 0 && label !== null ? { label, shortLabel } : {})
    }));
  const within = named(spans(sweep), withinText(sweep, system), 'within limits');
  if (within.length > 0) return { all: true, ranges: within };
  const enough = named(spans(sweep, AMPLIFIER), enoughText(sweep, system), 'amplifier enough');
  return { all: false, ranges: enough };
}
