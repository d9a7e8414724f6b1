/** One question at the desk: its value, its sweep, its axis, and the hand that moves it. The handle writes the plan. */
import { untrack } from 'svelte';
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import { settleDomain } from '$lib/charts/settle-domain.svelte';
import type { Domain } from '$lib/charts/plot-types';
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Problem } from '$lib/plan/problem';
import { sweptValue } from '$lib/words/sweep-answer';
import { shownUnit } from '$lib/words/units/quantity';
import { stepQuantity } from '$lib/words/units/step-quantity';
import { clean, type System } from '$lib/words/units/unit';
import type { PlanDesk } from '../desk/plan-desk.svelte';
import { heldSweep } from './held-sweep.svelte';
import { madeAgain, sweepPatch, type SweptPlan } from './sweep-patch';
import { sweptOf } from './swept-value';

export class Question {
  readonly over: SweepOver;
  readonly #desk: () => PlanDesk;
  readonly #system: () => System;
  readonly #held: ReturnType<typeof heldSweep>;
  readonly #axis: { readonly current: Domain };
  #problems: readonly Problem[];
  /** The plan as it was when the drag began. */
  #start: SweptPlan | null = null;

  constructor(over: SweepOver, desk: () => PlanDesk, system: () => System) {
    this.over = over;
    this.#desk = desk;
    this.#system = system;
    this.#problems = $state.raw([]);
    this.#held = heldSweep(desk, over, () => this.swept.value);
    this.#axis = settleDomain(
      () => this.#wantedAxis(),
      () => desk().dragging
    );
    // Asked for as long as the view is there. Untracked: the desk itself asks again after every edit.
    $effect(() => {
      const at = desk();
      untrack(() => at.want(over));
      return () => at.forget(over);
    });
  }

  readonly swept = $derived.by(() => {
    const { chain, budget } = this.desk;
    return sweptOf(this.over, chain, budget, this.system);
  });

  get desk(): PlanDesk {
    return this.#desk();
  }
  get system(): System {
    return this.#system();
  }
  get held() {
    return this.#held.current;
  }
  /** Why the last move was not taken. */
  get problems(): readonly Problem[] {
    return this.#problems;
  }
  get unit() {
    return shownUnit(this.swept.quantity, this.system);
  }
  /** Where the handle stands, in the unit shown. */
  get shown(): number {
    return this.unit.fromStored(this.swept.value);
  }
  /** What is swept, and the value itself where that lies outside; in the unit shown. */
  get axis(): Domain {
    return this.#axis.current;
  }
  /** What the handle reaches: the whole steps on the axis. */
  get range(): Domain {
    const { snap } = this.swept;
    const [low, high] = this.axis.map((end) => clean(end / snap));
    return [clean(Math.ceil(low) * snap), clean(Math.floor(high) * snap)];
  }

  readonly snap = (shown: number): number => {
    const { snap } = this.swept;
    return clean(Math.round(clean(shown / snap)) * snap);
  };

  /** The values of a swept column in the unit shown. */
  readonly shownOf = (si: number): number => this.unit.fromStored(sweptValue({ over: this.over }, si));

  readonly start = (): void => {
    this.#start = this.#plan();
    this.desk.beginDrag(this.swept.label);
  };
  readonly move = (shown: number): void => {
    const patch = sweepPatch(this.#start ?? this.#plan(), this.over, this.unit.toStored(shown));
    this.#edit(madeAgain(patch, this.desk.plan));
  };
  readonly end = (): void => {
    this.#start = null;
    this.desk.endDrag();
  };
  /** Keys and buttons; one after another they are one change. */
  readonly step = (direction: 1 | -1, large = false): void => {
    const { value, quantity, range, steps } = this.swept;
    const up = direction > 0;
    const next = stepQuantity(value, { quantity, system: this.system, up, large, range, stepping: steps });
    this.#edit(sweepPatch(this.#plan(), this.over, next), `sweep/${this.over}`);
  };
  /** Sets the value at once, in the file's own unit. */
  readonly set = (stored: number): void => this.#edit(sweepPatch(this.#plan(), this.over, stored));

  #plan(): SweptPlan {
    const { plan, chain, budget } = this.desk;
    return { plan, chain, displacement: budget.driver.displacement };
  }

  #edit(patch: JsonPatch, merge?: string): void {
    this.#problems = this.desk.edit(this.swept.label, patch, merge === undefined ? {} : { merge });
  }

  #wantedAxis(): Domain {
    const sweep = this.held?.sweep;
    if (!sweep) return [0, 1];
    const ends = [sweep.rows[0], sweep.rows[sweep.rows.length - 1]].map((row) => this.shownOf(row.value));
    return [Math.min(ends[0], this.shown), Math.max(ends[1], this.shown)];
  }
}
