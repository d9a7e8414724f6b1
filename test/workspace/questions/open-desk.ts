/** A desk over one of the examples, with a solver in place that can be made to wait. */
import { readFileSync } from 'node:fs';
import type { Plan } from '$lib/plan/schema';
import { EMPTY_HISTORY } from '$lib/shelf/history';
import { PlanDesk } from '$lib/workspace/desk/plan-desk.svelte';
import { solveTask } from '$lib/workspace/desk/solve-task';
import { Solver } from '$lib/workspace/desk/solver';
import type { SolverAnswer, SolverQuestion } from '$lib/workspace/desk/solver-messages';

export function examplePlan(name: string, change: (plan: Plan) => Plan = (p) => p): Plan {
  return change(JSON.parse(readFileSync(`static/examples/${name}.sealwright.json`, 'utf8')) as Plan);
}

/** Sweeps are worked out when `answer` is called; findings never, they take long and are not looked at here. */
export function openDesk(plan: Plan) {
  let hear: (answer: SolverAnswer) => void = () => undefined;
  let asked: SolverQuestion[] = [];
  let at = 0;
  const solver = new Solver({
    post: (question) => void asked.push(question),
    listen: (heard) => (hear = heard),
    close: () => undefined
  });
  const desk = new PlanDesk(plan, EMPTY_HISTORY, { solver, now: () => at });
  return {
    desk,
    /** Time passes, ms. */
    wait: (ms: number) => (at += ms),
    sweepsAsked: () => asked.filter(({ task }) => task.kind === 'sweep').length,
    answer() {
      while (asked.some(({ task }) => task.kind === 'sweep')) {
        const now = asked;
        asked = now.filter(({ task }) => task.kind !== 'sweep');
        for (const { id, task } of now) if (task.kind === 'sweep') hear({ id, result: solveTask(task) });
      }
    }
  };
}
