/** What is kept beside a plan for the list: verdict, level curve, and why it cannot be opened if it cannot. */
import type { Chain } from '$lib/engine/chain';
import type { Budget } from '$lib/engine/budget/budget';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { EngineError } from '$lib/engine/error';
import { logGrid } from '$lib/engine/quantity/grid';
import { formatProblem, type Problem } from '$lib/plan/problem';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { VERSION } from '$lib/plan/version';
import { sentence } from '$lib/words/sentence';
import { titleOf } from '$lib/words/title';
import { ENGINE_VERSION } from './engine-version';
import type { PlanRecord, PlanSummary } from './plan-record';

/** The curve's frequencies: 10–200 Hz in even steps of log f. */
const FREQUENCIES = logGrid(10, 200, 48);

export type Outline = Pick<PlanRecord, 'verdict' | 'curve' | 'engineVersion'>;

/** The figures of a chain; the budget is worked out here unless it is at hand. */
export function outline(chain: Chain, budget: Budget = evaluate(chain, { waysOut: false })): Outline {
  const { f, delivered } = curves(chain, FREQUENCIES);
  const { holds, margin } = budget.verdict;
  return {
    verdict: { holds, margin, sentence: sentence(chain, budget) },
    curve: { f: [...f], delivered: [...delivered], wanted: chain.goal.level },
    engineVersion: ENGINE_VERSION
  };
}

/** The figures of a plan; empty where it cannot be worked through. */
export function outlineOf(plan: Plan): Outline {
  const read = checkPlan(plan);
  return read.ok ? outlineOrNone(read.chain) : NO_OUTLINE;
}

const NO_OUTLINE: Outline = { verdict: null, curve: null, engineVersion: ENGINE_VERSION };

export function outlineOrNone(chain: Chain): Outline {
  try {
    return outline(chain);
  } catch (error) {
    // A plan the engine balks at is kept all the same.
    if (error instanceof EngineError) return NO_OUTLINE;
    throw error;
  }
}

/** A record of a plan that has none yet, or of one edited: the figures are worked out. */
export function recordOf(
  plan: Plan,
  { id, created, changed }: Pick<PlanRecord, 'id' | 'created' | 'changed'>
): PlanRecord {
  return { id, plan, created, changed, ...outlineOf(plan) };
}

/** The list's view of a record. */
export const summaryOf = (record: PlanRecord): Omit<PlanSummary, 'revision'> => ({
  id: record.id,
  title: titleOf(record.plan),
  created: record.created,
  changed: record.changed,
  verdict: record.verdict,
  curve: record.curve,
  engineVersion: record.engineVersion,
  planVersion: record.plan.version,
  trouble: null
});

export const NEEDS_NEWER = 'Needs a newer Sealwright.';
const CANNOT_BE_READ = 'Cannot be read.';

export const isNewer = (planVersion: number | null): boolean => planVersion !== null && planVersion > VERSION;

/** In a few words; the problems themselves say the rest. */
export const troubleOf = (planVersion: number | null, problems: readonly Problem[]): string =>
  isNewer(planVersion) || problems.some((p) => formatProblem(p).includes('a newer Sealwright'))
    ? NEEDS_NEWER
    : CANNOT_BE_READ;
