/** The schema's complaints as problems in words: each says where, what was found and what is allowed. */
import { z } from 'zod';
import { allowedText, choicesOf, isWhole, lengthsOf, numberIn, rangeOf } from './allowed';
import { pointer, valueAt } from './json-pointer';
import { nearestKey } from './nearest-key';
import { problem, type Problem } from './problem';
import { bare, keysOf, objectFor, schemaAt } from './schema-at';
import { orList, showKey, showValue } from './show-value';
import { textSlip, unitSlip } from './slips';
import { RESERVED_KEYS } from './version';

type Issue = z.core.$ZodIssue;

const NEWER = 'or the file needs a newer Sealwright';

/** At most `limit` problems, in the order the schema found them, and how many there are in all. */
export function problemsFromZod(
  issues: readonly Issue[],
  plan: unknown,
  limit: number
): { problems: Problem[]; count: number } {
  const problems: Problem[] = [];
  let count = 0;
  for (const issue of issues) {
    const keys = issue.code === 'unrecognized_keys' ? issue.keys : [null];
    count += keys.length;
    for (const key of keys.slice(0, Math.max(0, limit - problems.length)))
      problems.push(key === null ? problemAt(issue.path, plan) : unknownKey([...issue.path, key], plan));
  }
  return { problems, count };
}

function unknownKey(path: readonly PropertyKey[], plan: unknown): Problem {
  const key = String(path[path.length - 1]);
  const shown = showKey(key);
  if (path.length === 1 && RESERVED_KEYS.includes(key))
    return problem({
      path: pointer(path),
      found: `the key ${shown}`,
      allowed: 'no such key in this version',
      message: `the key ${shown} is reserved for a newer Sealwright: this file needs one.`
    });
  const parent = path.slice(0, -1);
  const schema = schemaAt(parent, plan);
  const value = valueAt(plan, parent);
  const known = schema === null ? [] : keysOf(objectFor(bare(schema), value));
  const nearest = nearestKey(key, known);
  return problem({
    path: pointer(path),
    found: `the key ${shown}`,
    allowed: orList(known),
    message:
      nearest === null
        ? `unknown key ${shown}, ${NEWER}.`
        : `unknown key ${shown}: the nearest known key is ${nearest}, ${NEWER}.`
  });
}

function problemAt(path: readonly PropertyKey[], plan: unknown): Problem {
  const value = valueAt(plan, path);
  const key = nameOf(path);
  const schema = bare(schemaAt(path, plan) ?? choiceAbove(path, plan));
  const allowed = allowedText(schema, key);
  const found = value === undefined ? 'nothing' : showValue(value);
  const say = (message: string, hint: string | null = null) =>
    problem({ path: pointer(path), found, allowed, message, hint });
  if (value === undefined) return say(`missing: ${allowed} belongs here.`);
  if (value === null) return say(`null where ${allowed} belongs.`);
  const choices = choicesOf(schema);
  if (choices.length > 0) return wrongChoice(value, choices, say);
  const number = numberIn(schema);
  if (number instanceof z.ZodNumber) return wrongNumber(value, number, key, allowed, say);
  if (Array.isArray(value) && (schema instanceof z.ZodArray || schema instanceof z.ZodTuple))
    return wrongLength(value.length, schema, allowed, say);
  return say(`${found} where ${allowed} belongs.`);
}

type Say = (message: string, hint?: string | null) => Problem;

function wrongChoice(value: unknown, choices: readonly (string | number)[], say: Say): Problem {
  const list = orList(choices.map((c) => JSON.stringify(c)));
  const text = `${showValue(value)} is not among what is allowed: ${list}.`;
  if (typeof value !== 'string') return say(text);
  if (value.includes('|')) return say(text, 'That is the list of choices: keep one.');
  const nearest = nearestKey(value, choices.map(String));
  return say(
    text,
    choices.length > 1 && nearest !== null ? `The nearest is ${JSON.stringify(nearest)}.` : null
  );
}

function wrongNumber(value: unknown, schema: z.ZodNumber, key: string, allowed: string, say: Say): Problem {
  const found = showValue(value);
  if (typeof value === 'string')
    return say(`text ${found} where a number belongs: ${allowed}.`, textSlip(value, key));
  if (typeof value !== 'number') return say(`${found} where a number belongs: ${allowed}.`);
  if (!Number.isFinite(value)) return say(`${found} is not a finite number: ${allowed} belongs here.`);
  const range = rangeOf(schema);
  if (range !== null && value < range.min)
    return say(`${found} is below what is allowed, ${allowed}.`, unitSlip(value, key, range));
  if (range !== null && value > range.max)
    return say(`${found} is above what is allowed, ${allowed}.`, unitSlip(value, key, range));
  return say(
    isWhole(schema) ? `${found} is not a whole number: ${allowed} belongs here.` : `${found} is not allowed.`
  );
}

function wrongLength(length: number, schema: z.ZodArray | z.ZodTuple, allowed: string, say: Say): Problem {
  if (schema instanceof z.ZodTuple) return say(`${length} numbers where ${schema.def.items.length} belong.`);
  const { min } = lengthsOf(schema);
  if (length === 0) return say(`an empty list where at least ${min} is needed.`);
  return say(`${length} entries where ${allowed} belongs.`);
}

/** The key that says the unit: of an entry in a list, the list's. */
function nameOf(path: readonly PropertyKey[]): string {
  const key = path.findLast((k) => typeof k === 'string');
  return key === undefined ? '' : String(key);
}

/** Where `kind` itself is wrong, the choice it stands in. */
const choiceAbove = (path: readonly PropertyKey[], plan: unknown): z.core.$ZodType =>
  schemaAt(path.slice(0, -1), plan) ?? z.unknown();
