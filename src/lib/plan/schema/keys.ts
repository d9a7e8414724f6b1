/** How a key of the plan file is written down: its kind, its range, and a description with quantity, unit and usual meaning. */
import { z } from 'zod';

// zod would otherwise compile each schema with `new Function`: slower for the one plan a run reads, and the page's policy forbids it.
z.config({ jitless: true });

/** A number from `min` to `max`, both included, in the unit the key's name ends with. */
export const quantity = (min: number, max: number) => z.number().check(z.gte(min), z.lte(max));

/** A whole number from `min` to `max`, both included. */
export const whole = (min: number, max: number) => z.int().check(z.gte(min), z.lte(max));

/** Gives a schema its description in place: `.meta()` would build each schema once more, and a run has to wait for that. */
export function described<T extends z.ZodType>(schema: T, description: string, more: object = {}): T {
  z.globalRegistry.add(schema, { description, ...more });
  return schema;
}

/** A key that must be there. The schema must be its own: one instance carries one description. */
export const required = described;

/** A key that may be left out; null says the same. `initial` is what is then taken, for the reader of the JSON Schema. */
export const optional = <T extends z.ZodType>(
  schema: T,
  description: string,
  initial?: number | string | boolean | readonly never[]
) => described(schema.nullish(), description, initial === undefined ? {} : { default: initial });
