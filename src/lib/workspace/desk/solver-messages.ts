/** What the page asks its worker, and what comes back. Chains and budgets are plain data: they cross as they are. */
import type { Finding } from '$lib/engine/budget/budget';
import type { Sweep, SweepRequest } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';

export type SolverTask =
  | { readonly kind: 'findings'; readonly chain: Chain }
  | { readonly kind: 'sweep'; readonly chain: Chain; readonly request: SweepRequest };

export type SolverResult =
  | { readonly kind: 'findings'; readonly findings: readonly Finding[] }
  | { readonly kind: 'sweep'; readonly sweep: Sweep };

export interface SolverQuestion {
  readonly id: number;
  readonly task: SolverTask;
}

export interface SolverAnswer {
  readonly id: number;
  /** Null where the engine refused; the page then keeps what it had. */
  readonly result: SolverResult | null;
}
