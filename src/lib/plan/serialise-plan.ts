/** A plan as the text of its file: two spaces, keys in the order of the schema, a newline at the end. */
import { z } from 'zod';
import { planSchema, type Plan } from './schema';
import { bare, keysOf, objectFor } from './schema-at';

export const serialisePlan = (plan: Plan): string =>
  `${JSON.stringify(ordered(plan, planSchema), null, 2)}\n`;

/** The same value with its keys in the schema's order; keys the schema does not know come last, as they stood. */
function ordered(value: unknown, schema: z.core.$ZodType | null): unknown {
  const s = schema === null ? null : objectFor(bare(schema), value);
  if (Array.isArray(value)) return value.map((v) => ordered(v, s instanceof z.ZodArray ? s.element : null));
  if (typeof value !== 'object' || value === null) return value;
  const object = value as Record<string, unknown>;
  const known = s === null ? [] : keysOf(s);
  const shape: Record<string, z.core.$ZodType> = s instanceof z.ZodObject ? s.shape : {};
  const keys = [...known, ...Object.keys(object).filter((k) => !known.includes(k))];
  return Object.fromEntries(
    keys
      .filter((k) => Object.hasOwn(object, k))
      .map((k) => [k, ordered(object[k], Object.hasOwn(shape, k) ? shape[k] : null)])
  );
}
