/** A plan file read: the plan and its chain, or every problem in words. Nothing here throws, whatever the file holds. */
import type { z } from 'zod';
import type { Chain } from '$lib/engine/chain';
import { pointer } from './json-pointer';
import { readJsonText } from './json-text';
import { migrate, type Migration } from './migrations';
import { problem, type Problem } from './problem';
import { problemsFromZod } from './problems-from-zod';
import { netVolumeRule, volumeRule } from './rules/box-rules';
import { driverRule } from './rules/driver-rules';
import { goalRule } from './rules/goal-rules';
import { blocksRule, shapingTogether } from './rules/shaping-rules';
import { planSchema, type Plan } from './schema';
import { toChain } from './to-chain';

export type PlanResult = { ok: true; plan: Plan; chain: Chain } | { ok: false; problems: Problem[] };

export interface ReadOptions {
  /** Steps from older versions; the program's own when left out. */
  readonly migrations?: readonly Migration[];
}

/** More problems than this are counted, not listed. */
export const MOST_PROBLEMS = 50;

/** Reads the bytes or the text of a plan file. */
export function readPlan(input: string | Uint8Array, options: ReadOptions = {}): PlanResult {
  const json = readJsonText(input);
  return json.ok ? checkPlan(json.value, options) : refuse(json.problems, json.count);
}

/** Checks a value that has been parsed already, as from a store or a patch. */
export function checkPlan(value: unknown, { migrations }: ReadOptions = {}): PlanResult {
  const current = migrate(value, migrations);
  if (!current.ok) return current;
  const parsed = planSchema.safeParse(current.value);
  const { problems, count } = parsed.success
    ? { problems: [], count: 0 }
    : problemsFromZod(parsed.error.issues, current.value, MOST_PROBLEMS);
  const across = rulesAcross(current.value as Plan, parsed.success ? [] : parsed.error.issues.map(placeOf));
  if (!parsed.success || across.length > 0) return refuse([...problems, ...across], count + across.length);
  const chain = toChain(parsed.data);
  const together = shapingTogether(chain);
  return together.length > 0 ? { ok: false, problems: together } : { ok: true, plan: parsed.data, chain };
}

/** The problems of every rule whose parts are free of problems so far. */
function rulesAcross(plan: Plan, places: readonly string[]): Problem[] {
  if (places.includes('')) return [];
  const unclear = [...places];
  const found: Problem[] = [];
  for (const rule of [goalRule, driverRule, volumeRule, netVolumeRule, ...blocksRule(plan)]) {
    if (rule.needs.some((part) => unclear.some((place) => overlap(place, part)))) continue;
    const problems = rule.check(plan);
    found.push(...problems);
    unclear.push(...problems.map((p) => p.path));
  }
  return found;
}

const overlap = (a: string, b: string): boolean => `${a}/`.startsWith(`${b}/`) || `${b}/`.startsWith(`${a}/`);

/** Where an issue stands; an unknown key stands at itself, not at its parent. */
const placeOf = (issue: z.core.$ZodIssue): string =>
  pointer(issue.code === 'unrecognized_keys' ? [...issue.path, issue.keys[0]] : issue.path);

function refuse(problems: readonly Problem[], count: number): PlanResult {
  const listed = problems.slice(0, MOST_PROBLEMS);
  const rest = count - listed.length;
  if (rest > 0)
    listed.push(
      problem({
        path: '',
        found: `${count} problems`,
        allowed: 'none',
        message: `and ${rest} more ${rest === 1 ? 'problem' : 'problems'}.`
      })
    );
  return { ok: false, problems: listed };
}
