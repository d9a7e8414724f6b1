/** Finding one's way in the schema beside a value. */
import { z } from 'zod';
import { valueAt } from './json-pointer';
import { planSchema } from './schema';

/** The schema without "may be left out" and "may be null". */
export function bare(schema: z.core.$ZodType): z.core.$ZodType {
  let s = schema;
  while (s instanceof z.ZodOptional || s instanceof z.ZodNullable) s = s.unwrap();
  return s;
}

/** The schema of what stands at `path` in a plan; null where the plan knows no such place. */
export function schemaAt(path: readonly PropertyKey[], plan: unknown): z.core.$ZodType | null {
  let schema: z.core.$ZodType = planSchema;
  for (let i = 0; i < path.length; i++) {
    const next = inside(objectFor(bare(schema), valueAt(plan, path.slice(0, i))), path[i]);
    if (next === null) return null;
    schema = next;
  }
  return schema;
}

/** The object schema that fits `value`, where the schema is a choice by `kind`; else the schema itself. */
export function objectFor(schema: z.core.$ZodType, value: unknown): z.core.$ZodType {
  if (!(schema instanceof z.ZodDiscriminatedUnion)) return schema;
  const kind = valueAt(value, ['kind']);
  return schema.options.find((o) => kindOf(o) === kind) ?? schema;
}

/** The keys an object schema knows, in their order. */
export const keysOf = (schema: z.core.$ZodType): string[] =>
  schema instanceof z.ZodObject ? Object.keys(schema.shape) : [];

/** The kinds a choice by `kind` knows. */
export const kindsOf = (schema: z.core.$ZodType): string[] =>
  schema instanceof z.ZodDiscriminatedUnion ? schema.options.map(kindOf).filter((k) => k !== null) : [];

function kindOf(option: z.core.$ZodType): string | null {
  if (!(option instanceof z.ZodObject)) return null;
  const kind: unknown = option.shape.kind;
  return kind instanceof z.ZodLiteral ? String(kind.value) : null;
}

function inside(schema: z.core.$ZodType, key: PropertyKey): z.core.$ZodType | null {
  if (schema instanceof z.ZodObject) {
    const shape: Record<PropertyKey, z.core.$ZodType> = schema.shape;
    return Object.hasOwn(shape, key) ? shape[key] : null;
  }
  if (schema instanceof z.ZodArray) return schema.element;
  if (schema instanceof z.ZodTuple) return schema.def.items[Number(key)] ?? null;
  return null;
}
