/** A desk for the stations' forms: keeps a plan, makes patches on it as the shelf does, and refuses what the plan file refuses. */
import { render } from '@testing-library/svelte';
import type { Component } from 'svelte';
import { readFileSync } from 'node:fs';
import { vi } from 'vitest';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { applyPatch } from '$lib/shelf/apply-patch';
import type { OnEdit, StationProps } from '$lib/workspace/stations/station';

/** An invented plan of the examples that ship with the program. */
export function examplePlan(name = 'film-den'): Plan {
  const file = `static/examples/${name}.sealwright.json`;
  return JSON.parse(readFileSync(file, 'utf8')) as Plan;
}

export function showForm<P extends StationProps>(
  form: Component<P>,
  start: Plan,
  more: Omit<P, keyof StationProps>,
  system: 'metric' | 'imperial' = 'metric'
) {
  let plan = start;
  const onedit = vi.fn<OnEdit>((_label, patch) => {
    const next = checkPlan(applyPatch(plan, patch).value);
    if (!next.ok) return next.problems;
    plan = next.plan;
    void view.rerender({ plan } as Partial<P>);
    return [];
  });
  const view = render(form, { plan, report: null, system, onedit, ...more } as unknown as P);
  return { ...view, onedit, plan: () => plan, patch: () => onedit.mock.lastCall?.[1] };
}
