/** A summary as it comes out of a store: what cannot be used is left out, the plan behind it is listed all the same. */
import { z } from 'zod';
import { DEFAULTS } from '$lib/plan/defaults';
import type { PlanSummary } from './plan-record';
import { isNewer, NEEDS_NEWER } from './summary';

const verdict = z.object({ holds: z.boolean(), sentence: z.string(), margin: z.number() });
const curve = z.object({ f: z.array(z.number()), delivered: z.array(z.number()), wanted: z.number() });

const stored = z.object({
  id: z.string().catch(''),
  title: z.string().catch(DEFAULTS.title),
  created: z.number().catch(0),
  changed: z.number().catch(0),
  verdict: verdict.nullable().catch(null),
  curve: curve.nullable().catch(null),
  engineVersion: z.string().catch(''),
  planVersion: z.number().nullable().catch(null),
  revision: z.number().catch(0),
  trouble: z.string().nullable().catch(null)
});

export function readSummary(value: unknown): PlanSummary {
  const summary = stored.parse(typeof value === 'object' && value !== null ? value : {});
  return isNewer(summary.planVersion) ? { ...summary, trouble: NEEDS_NEWER } : summary;
}

/** The revision in a stored summary; 0 where it has none. */
export const revisionOf = (value: unknown): number => stored.shape.revision.parse(Object(value).revision);
