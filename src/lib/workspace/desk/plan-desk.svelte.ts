/**
 * The open plan: what the user typed, its history, and everything computed from it. One class owns it; the screen calls verbs on it.
 * Verdict, account and curves follow every edit in place; ways out and sweeps come from the solver, the old ones marked stale until then.
 */
import { accountOf } from '$lib/engine/budget/account';
import type { Finding } from '$lib/engine/budget/budget';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Sweep, SweepOver } from '$lib/engine/budget/sweep-types';
import { workOut } from '$lib/engine/budget/workings';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Problem } from '$lib/plan/problem';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { patched } from '$lib/shelf/apply-patch';
import {
  beginGroup,
  canRedo,
  canUndo,
  edit,
  endGroup,
  redo,
  redoEntry,
  undo,
  undoEntry,
  type Edited,
  type History
} from '$lib/shelf/history';
import { accountPage } from '$lib/words/account-lines';
import { report } from '$lib/words/report';
import type { Solver } from './solver';

/** What the plots show: 10 to 200 Hz. */
export const PLOT_FROM = 10;
export const PLOT_TO = 200;
const PLOT_GRID = logGrid(PLOT_FROM, PLOT_TO, 241);

const onPlot = (f: number): number => Math.min(PLOT_TO, Math.max(PLOT_FROM, f));

interface Open extends Edited {
  readonly chain: Chain;
}

export interface DeskOptions {
  readonly solver: Solver;
  /** ms since 1970. */
  readonly now: () => number;
  /** Told of every change, to be stored. */
  readonly onchange?: () => void;
}

export class PlanDesk {
  readonly #options: DeskOptions;
  #open: Open;
  #cursor: number;
  /** Findings with their ways out, and the chain they belong to. */
  #solved: { chain: Chain; findings: readonly Finding[] } | null;
  #sweeps: { readonly [Over in SweepOver]?: { chain: Chain; sweep: Sweep } };
  #wanted: readonly SweepOver[] = [];
  #held: Chain | null;
  #dragging: boolean;

  constructor(plan: Plan, history: History, options: DeskOptions) {
    const checked = checkPlan(plan);
    if (!checked.ok) throw new Error(checked.problems.map((p) => p.message).join('; '));
    this.#options = options;
    this.#open = $state.raw({ plan, history: endGroup(history), chain: checked.chain });
    this.#solved = $state.raw(null);
    this.#sweeps = $state.raw({});
    this.#held = $state.raw(null);
    this.#dragging = $state(false);
    this.#cursor = $state(onPlot(this.budget.verdict.worst));
    this.#solve();
  }

  readonly budget = $derived.by(() => evaluate(this.chain, { waysOut: false }));
  readonly workings = $derived.by(() => workOut(this.chain));
  readonly curves = $derived.by(() => curves(this.chain, PLOT_GRID));
  /** The curves held for comparison: before the last edit, or as they were when held. */
  readonly heldCurves = $derived.by(() => (this.#held === null ? null : curves(this.#held, PLOT_GRID)));
  /** The account at the cursor, exact, and as it is shown. */
  readonly exactAccount = $derived.by(() => accountOf(this.workings, this.#cursor));
  readonly account = $derived.by(() => accountPage(this.exactAccount));
  /** Findings as they are shown: of this very plan once solved, else freshly found with the old ways out. */
  readonly report = $derived.by(() => {
    const solved = this.#solved;
    const budget = this.budget;
    if (solved === null) return report(this.plan, this.chain, budget);
    const findings =
      solved.chain === this.chain
        ? solved.findings
        : budget.findings.map((f) => ({
            ...f,
            waysOut: solved.findings.find((old) => old.code === f.code)?.waysOut ?? []
          }));
    return report(this.plan, this.chain, { ...budget, findings });
  });

  get plan(): Plan {
    return this.#open.plan;
  }
  get chain(): Chain {
    return this.#open.chain;
  }
  get history(): History {
    return this.#open.history;
  }
  /** Whether the ways out shown are those of the plan as it stands. */
  get fresh(): boolean {
    return this.#solved?.chain === this.chain;
  }
  get cursor(): number {
    return this.#cursor;
  }
  set cursor(f: number) {
    this.#cursor = onPlot(f);
  }
  get dragging(): boolean {
    return this.#dragging;
  }
  get canUndo(): boolean {
    return canUndo(this.history);
  }
  get canRedo(): boolean {
    return canRedo(this.history);
  }
  get undoLabel(): string | null {
    return undoEntry(this.history)?.label ?? null;
  }
  get redoLabel(): string | null {
    return redoEntry(this.history)?.label ?? null;
  }

  /**
   * Makes an edit. Where the plan would not be one any more it stays as it is and the problems say why; empty when the edit was taken.
   * Edits with the same `merge` key in quick succession are one step of undo.
   */
  edit(label: string, patch: JsonPatch, { merge }: { merge?: string } = {}): readonly Problem[] {
    const checked = checkPlan(patched(this.plan, patch));
    if (!checked.ok) return checked.problems;
    const note = { label, at: this.#options.now(), ...(merge === undefined ? {} : { key: merge }) };
    const next = edit({ plan: this.plan, history: this.history }, patch, note);
    if (next.plan !== this.plan) this.#set({ ...next, chain: checked.chain });
    return [];
  }

  /** From here to `endDrag` everything is one step of undo, and the axes stand still. */
  beginDrag(label: string): void {
    this.#dragging = true;
    this.#open = { ...this.#open, history: beginGroup(this.history, label) };
  }
  endDrag(): void {
    if (!this.#dragging) return;
    this.#dragging = false;
    this.#set({ ...this.#open, history: endGroup(this.history) });
  }

  undo(): void {
    this.#step(undo({ plan: this.plan, history: this.history }));
  }
  redo(): void {
    this.#step(redo({ plan: this.plan, history: this.history }));
  }

  /** Takes over a plan that another tab has stored. */
  replace(plan: Plan, history: History): void {
    this.#step({ plan, history });
  }

  /** Holds the curves as they are now on the plots, beside what comes. */
  hold(): void {
    this.#held = this.chain;
  }
  letGo(): void {
    this.#held = null;
  }
  get holding(): boolean {
    return this.#held !== null;
  }

  /** The sweep of a question, if it has been asked for; `fresh` tells whether it belongs to the plan as it stands. */
  sweep(over: SweepOver): { sweep: Sweep; fresh: boolean } | null {
    const known = this.#sweeps[over];
    return known === undefined ? null : { sweep: known.sweep, fresh: known.chain === this.chain };
  }
  /** Asks for a sweep now and after every edit, until `forget`. */
  want(over: SweepOver): void {
    if (!this.#wanted.includes(over)) this.#wanted = [...this.#wanted, over];
    this.#sweep(over);
  }
  forget(over: SweepOver): void {
    this.#wanted = this.#wanted.filter((o) => o !== over);
  }

  #step(next: Edited): void {
    const checked = checkPlan(next.plan);
    if (checked.ok) this.#set({ ...next, chain: checked.chain });
  }

  #set(open: Open): void {
    this.#open = open;
    this.#options.onchange?.();
    this.#solve();
  }

  #solve(): void {
    const { chain } = this;
    if (this.#solved?.chain !== chain)
      this.#options.solver.ask({ kind: 'findings', chain }, (result) => {
        if (result?.kind === 'findings') this.#solved = { chain, findings: result.findings };
      });
    for (const over of this.#wanted) this.#sweep(over);
  }

  #sweep(over: SweepOver): void {
    const { chain } = this;
    if (this.#sweeps[over]?.chain === chain) return;
    this.#options.solver.ask({ kind: 'sweep', chain, request: { over } }, (result) => {
      if (result?.kind === 'sweep')
        this.#sweeps = { ...this.#sweeps, [over]: { chain, sweep: result.sweep } };
    });
  }
}
