import type { FindingCode, FindingFacts, Severity } from '$lib/engine/budget/budget';

/** A finding in words: what is wrong, by how much and where; then what it means. */
export interface Said {
  /** One sentence that can stand alone in the verdict. */
  readonly fact: string;
  readonly meaning: string;
}

/** Where and how grave, beside the facts. */
export interface Circumstance {
  readonly at: number | null;
  readonly severity: Severity;
}

export type FactsOf<C extends FindingCode> = Extract<FindingFacts, { readonly code: C }>['facts'];
