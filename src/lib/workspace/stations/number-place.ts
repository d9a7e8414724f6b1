/** What the schema says about a number at one place of the plan: its range, its default, whether it may be left out. */
import { z } from 'zod';
import { isWhole, numberIn, rangeOf, type Range } from '$lib/plan/allowed';
import { valueAt } from '$lib/plan/json-pointer';
import { schemaAt } from '$lib/plan/schema-at';
import type { Plan } from '$lib/plan/schema';
import { quantityOfKey } from '$lib/words/units/quantity-of-key';
import type { Quantity } from '$lib/words/units/quantity';
import type { Path } from './edit-key';

export interface NumberPlace {
  readonly value: number | null;
  readonly quantity: Quantity;
  readonly range: Range | null;
  readonly whole: boolean;
  readonly optional: boolean;
  readonly initial: number | null;
}

/** Throws where the plan knows no number at `path`: a slip of the form's, not of its user. */
export function numberPlace(plan: Plan, path: Path): NumberPlace {
  const schema = schemaAt(path, plan);
  const number = schema === null ? null : numberIn(schema);
  if (schema === null || !(number instanceof z.ZodNumber))
    throw new Error(`no number at /${path.join('/')} in a plan`);
  const value = valueAt(plan, path);
  const initial = z.globalRegistry.get(schema)?.default;
  const key = path.findLast((part) => typeof part === 'string') ?? '';
  return {
    value: typeof value === 'number' ? value : null,
    quantity: quantityOfKey(String(key)),
    range: rangeOf(number),
    whole: isWhole(number),
    optional: schema instanceof z.ZodOptional,
    initial: typeof initial === 'number' ? initial : null
  };
}
