import { evaluate } from '$lib/engine/budget/evaluate';
import { EngineError } from '$lib/engine/error';
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';
import { report, type Report } from '$lib/words/report';

/** A plan worked through from its file to its report. */
export interface WorkedPlan {
  readonly ok: true;
  /** What the file is called. */
  readonly name: string;
  readonly report: Report;
}

/** A file that is no plan: what stands in the way, one line a problem. */
export interface RefusedFile {
  readonly ok: false;
  readonly name: string;
  readonly problems: readonly string[];
}

/** From the text of a plan file to what the screen shows. */
export function workThrough(name: string, text: string): WorkedPlan | RefusedFile {
  const read = readPlan(text);
  if (!read.ok) return { ok: false, name, problems: read.problems.map(formatProblem) };
  try {
    return { ok: true, name, report: report(read.plan, read.chain, evaluate(read.chain)) };
  } catch (trouble) {
    if (!(trouble instanceof EngineError)) throw trouble;
    return { ok: false, name, problems: [`The plan cannot be worked through: ${trouble.message}`] };
  }
}
