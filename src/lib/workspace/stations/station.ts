/** What every station's form is given, and how what it wants changed is said. */
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Problem } from '$lib/plan/problem';
import type { Plan } from '$lib/plan/schema';
import type { Report } from '$lib/words/report';
import type { System } from '$lib/words/units/unit';

/**
 * Makes a patch, in the file's units, on the plan. Returns the problems that made it refused; empty when it was taken.
 * Edits with the same `merge` in a row become one entry of the history.
 */
export type OnEdit = (label: string, patch: JsonPatch, options?: { merge?: string }) => readonly Problem[];

export interface StationProps {
  plan: Plan;
  /** Null until the plan has been worked through. */
  report: Report | null;
  system: System;
  onedit: OnEdit;
}

/** The problems of a refused edit as one sentence for the field; null when it was taken. */
export function refusal(problems: readonly Problem[]): string | null {
  if (problems.length === 0) return null;
  const { message, hint } = problems[0];
  const text = hint === null ? message : `${message} ${hint}`;
  return text.charAt(0).toUpperCase() + text.slice(1);
}
