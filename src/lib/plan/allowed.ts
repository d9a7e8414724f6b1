/** What the schema allows at one place, in words. */
import { z } from 'zod';
import { bare, kindsOf } from './schema-at';
import { orList } from './show-value';
import { unitOf } from './unit-of';

export interface Range {
  readonly min: number;
  readonly max: number;
}

/** "5 to 5000 cm²", "a whole number from 1 to 16", "\"series\" or \"parallel\"". `key` says the unit. */
export function allowedText(schema: z.core.$ZodType, key: string): string {
  const s = bare(schema);
  const range = rangeOf(s);
  if (range !== null) {
    const unit = unitOf(key);
    const span = `${range.min} to ${range.max}${unit === null ? '' : ` ${unit}`}`;
    return isWhole(s) ? `a whole number from ${span}` : span;
  }
  const choices = choicesOf(s);
  if (choices.length > 0) return orList(choices.map((c) => JSON.stringify(c)));
  if (s instanceof z.ZodUnion) return s.options.map((o: z.core.$ZodType) => allowedText(o, key)).join(' or ');
  if (s instanceof z.ZodNumber) return 'a number';
  if (s instanceof z.ZodString) return 'text';
  if (s instanceof z.ZodBoolean) return 'true or false';
  if (s instanceof z.ZodTuple) return `a list of ${s.def.items.length} numbers`;
  if (s instanceof z.ZodArray) return listText(s);
  return 'an object';
}

/** The choices of text or numbers at one place. */
export function choicesOf(s: z.core.$ZodType): (string | number)[] {
  if (s instanceof z.ZodEnum) return [...s.options];
  if (s instanceof z.ZodLiteral) return [...s.values] as (string | number)[];
  if (s instanceof z.ZodDiscriminatedUnion) return kindsOf(s);
  if (s instanceof z.ZodUnion && s.options.every((o) => o instanceof z.ZodLiteral))
    return s.options.flatMap((o) => choicesOf(o as z.core.$ZodType));
  return [];
}

/** The range of a number, in a choice of a number or a word too; null where there is none. */
export function rangeOf(schema: z.core.$ZodType): Range | null {
  const s = bare(schema);
  if (!(s instanceof z.ZodNumber)) return null;
  const { minValue: min, maxValue: max } = s;
  return min === null || max === null || !Number.isFinite(min) || !Number.isFinite(max) ? null : { min, max };
}

/** The number inside a choice of a number or a word; else the schema itself. */
export function numberIn(schema: z.core.$ZodType): z.core.$ZodType {
  const s = bare(schema);
  if (!(s instanceof z.ZodUnion)) return s;
  return (s.options as z.core.$ZodType[]).find((o) => o instanceof z.ZodNumber) ?? s;
}

export const isWhole = (schema: z.core.$ZodType): boolean => {
  const s = bare(schema);
  return s instanceof z.ZodNumber && s.isInt;
};

/** How many entries a list may have. */
export function lengthsOf(s: z.ZodArray): { min: number; max: number } {
  let min = 0;
  let max = Infinity;
  for (const check of s.def.checks ?? []) {
    if (check instanceof z.core.$ZodCheckMinLength) min = check._zod.def.minimum;
    if (check instanceof z.core.$ZodCheckMaxLength) max = check._zod.def.maximum;
  }
  return { min, max };
}

function listText(s: z.ZodArray): string {
  const { min, max } = lengthsOf(s);
  return min > 0 ? `a list of ${min} to ${max}` : `a list of at most ${max}`;
}
