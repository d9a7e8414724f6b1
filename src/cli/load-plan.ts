import type { Chain } from '$lib/engine/chain';
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { InputError } from './input-error';
import { fileLabel, readInput } from './read-input';

/** Reads one plan, or throws `InputError` with one line a problem. */
export async function loadPlan(path: string): Promise<{ plan: Plan; chain: Chain }> {
  const read = readPlan(await readInput(path));
  if (read.ok) return read;
  throw new InputError(read.problems.map((problem) => `${fileLabel(path)}: ${formatProblem(problem)}`));
}
