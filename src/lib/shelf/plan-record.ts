/** A plan on the shelf, and the figures kept beside it so that a list of plans needs no engine. */
import type { Problem } from '$lib/plan/problem';
import type { Plan } from '$lib/plan/schema';
import type { History } from './history';

export interface PlanVerdict {
  readonly holds: boolean;
  readonly sentence: string;
  /** dB, the smallest over all limits judged. */
  readonly margin: number;
}

/** Delivered level over frequency, small enough for a thumbnail. */
export interface PlanCurve {
  /** Hz. */
  readonly f: readonly number[];
  /** dB at the seat. */
  readonly delivered: readonly number[];
  /** dB, the goal's level. */
  readonly wanted: number;
}

/** Texts of fields that cannot be read as a value yet, by the JSON pointer of the field. */
export type Drafts = Readonly<Record<string, string>>;

export interface PlanRecord {
  readonly id: string;
  /** As the user typed it: no default filled in. */
  readonly plan: Plan;
  /** ms since 1970. */
  readonly created: number;
  readonly changed: number;
  /** Null where the engine cannot work the plan through. */
  readonly verdict: PlanVerdict | null;
  readonly curve: PlanCurve | null;
  readonly engineVersion: string;
  readonly drafts?: Drafts;
}

/** What a list of plans shows. */
export interface PlanSummary {
  readonly id: string;
  readonly title: string;
  readonly created: number;
  readonly changed: number;
  readonly verdict: PlanVerdict | null;
  readonly curve: PlanCurve | null;
  readonly engineVersion: string;
  /** `version` of the plan as stored; null where it has none. */
  readonly planVersion: number | null;
  /** Counts the times the plan was stored: tells whether another tab has stored it since. */
  readonly revision: number;
  /** Why the plan cannot be opened, in a few words; null where it can. */
  readonly trouble: string | null;
}

/** A plan taken from the shelf, or what is kept of one that this Sealwright cannot read. */
export type ShelvedPlan =
  | {
      readonly readable: true;
      readonly record: PlanRecord;
      readonly history: History;
      readonly revision: number;
    }
  | {
      readonly readable: false;
      readonly summary: PlanSummary;
      /** What is stored, untouched. */
      readonly raw: unknown;
      readonly problems: readonly Problem[];
      readonly revision: number;
    };

/** A plan taken off the shelf that can still be put back. */
export interface RemovedPlan {
  readonly summary: PlanSummary;
  /** ms since 1970. */
  readonly at: number;
}
