/** The work itself, the same in the worker and in place where there is none. */
import { evaluate } from '$lib/engine/budget/evaluate';
import { sweep } from '$lib/engine/budget/sweep';
import type { SolverResult, SolverTask } from './solver-messages';

export function solveTask(task: SolverTask): SolverResult {
  switch (task.kind) {
    case 'findings':
      return { kind: 'findings', findings: evaluate(task.chain).findings };
    case 'sweep':
      return { kind: 'sweep', sweep: sweep(task.chain, task.request) };
  }
}
