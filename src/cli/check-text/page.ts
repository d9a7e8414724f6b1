import type { Budget } from '$lib/engine/budget/budget';
import type { Chain } from '$lib/engine/chain';
import type { Plan } from '$lib/plan/schema';
import type { Ink } from '../colour';

/** All a block of the check report draws from. */
export interface Page {
  readonly plan: Plan;
  readonly chain: Chain;
  readonly budget: Budget;
  readonly ink: Ink;
  readonly width: number;
}

/** A heading over its lines. */
export const block = (page: Page, heading: string, lines: readonly string[]): string[] => [
  page.ink.bold(heading),
  ...lines
];
