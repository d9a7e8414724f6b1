import type { Budget, Finding, FindingFacts, Severity, WayOut } from '../budget';
import type { Workings } from '../workings';

/** What findings are computed from. Ways out are costly: `solve` runs only when they are wanted. */
export interface Context {
  readonly w: Workings;
  readonly figures: Omit<Budget, 'findings'>;
  readonly solve: (ways: () => readonly (WayOut | null)[]) => readonly WayOut[];
}

export function finding(
  facts: FindingFacts,
  severity: Severity,
  at: number | null = null,
  waysOut: readonly WayOut[] = []
): Finding {
  return { ...facts, severity, at, waysOut };
}
