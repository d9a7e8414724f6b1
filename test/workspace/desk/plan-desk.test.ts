import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { applyChanges } from '$lib/engine/budget/change';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Plan } from '$lib/plan/schema';
import { EMPTY_HISTORY } from '$lib/shelf/history';
import { PlanDesk } from '$lib/workspace/desk/plan-desk.svelte';
import { Solver, type SolverPort } from '$lib/workspace/desk/solver';
import { solveTask } from '$lib/workspace/desk/solve-task';
import type { SolverAnswer, SolverQuestion } from '$lib/workspace/desk/solver-messages';

const filmDen = JSON.parse(readFileSync('static/examples/film-den.sealwright.json', 'utf8')) as Plan;

/** A worker that answers when told to. */
class Bench implements SolverPort {
  readonly asked: SolverQuestion[] = [];
  #hear: (answer: SolverAnswer) => void = () => undefined;
  post(question: SolverQuestion) {
    this.asked.push(question);
  }
  listen(heard: (answer: SolverAnswer) => void) {
    this.#hear = heard;
  }
  close() {}
  answer() {
    for (const { id, task } of this.asked.splice(0)) this.#hear({ id, result: solveTask(task) });
  }
}

function desk(plan = filmDen) {
  const bench = new Bench();
  let time = 1000;
  let changes = 0;
  const opened = new PlanDesk(plan, EMPTY_HISTORY, {
    solver: new Solver(bench),
    now: () => (time += 5000),
    onchange: () => changes++
  });
  return { desk: opened, bench, changes: () => changes };
}

const setLevel = (value: number) => [{ op: 'replace', path: '/goal/level_dB', value }] as const;

describe('edits', () => {
  test('an edit moves verdict, curves and account at once, and can be undone and redone', () => {
    const { desk: d, changes } = desk();
    const before = d.report.sentence;
    const seat = d.account.closing;
    expect(d.edit('Wanted level', [...setLevel(100)])).toEqual([]);
    expect(d.plan.goal.level_dB).toBe(100);
    expect(d.report.holds).toBe(true);
    expect(d.account.closing).toBeCloseTo(seat - 10, 6);
    expect(d.undoLabel).toBe('Wanted level');
    d.undo();
    expect(d.report.sentence).toBe(before);
    d.redo();
    expect(d.plan.goal.level_dB).toBe(100);
    expect(changes()).toBe(3);
  });

  test('what would be no plan is refused with its problems, and nothing moves', () => {
    const { desk: d, changes } = desk();
    const problems = d.edit('Wanted level', [...setLevel(900)]);
    expect(problems.map((p) => p.path)).toEqual(['/goal/level_dB']);
    expect(d.plan).toEqual(filmDen);
    expect(d.canUndo).toBe(false);
    expect(changes()).toBe(0);
  });

  test('a drag is one step of undo', () => {
    const { desk: d } = desk();
    d.beginDrag('Loudness');
    expect(d.dragging).toBe(true);
    for (const level of [109, 108, 107]) d.edit('Wanted level', [...setLevel(level)]);
    d.endDrag();
    expect(d.dragging).toBe(false);
    expect(d.history.entries).toHaveLength(1);
    d.undo();
    expect(d.plan).toEqual(filmDen);
  });
});

describe('the solver', () => {
  test('ways out arrive, go stale with the next edit, and are those of the command line again when fresh', () => {
    const { desk: d, bench } = desk();
    expect(d.fresh).toBe(false);
    expect(d.report.findings[0].ways_out).toEqual([]);
    bench.answer();
    expect(d.fresh).toBe(true);
    const ways = d.report.findings[0].ways_out;
    expect(ways.length).toBeGreaterThan(1);
    d.edit('Wanted level', [...setLevel(109)]);
    expect(d.fresh).toBe(false);
    expect(d.report.findings[0].ways_out.map((w) => w.act)).toEqual(ways.map((w) => w.act));
    bench.answer();
    expect(d.fresh).toBe(true);
    expect(d.report.findings.length).toBe(evaluate(d.chain).findings.length);
  });

  test('only the newest of several edits is asked about', () => {
    const { desk: d, bench } = desk();
    for (const level of [109, 108, 107, 106]) d.edit('Wanted level', [...setLevel(level)]);
    expect(bench.asked).toHaveLength(1);
    bench.answer();
    expect(bench.asked).toHaveLength(1);
    expect(d.fresh).toBe(false);
    bench.answer();
    expect(d.fresh).toBe(true);
  });

  test('one click on a way out makes the plan hold, one undo takes it back', () => {
    const { desk: d, bench } = desk();
    bench.answer();
    const [way] = d.report.findings[0].ways_out;
    expect(d.edit(way.act, way.change)).toEqual([]);
    expect(d.report.holds).toBe(true);
    const solved = evaluate(d.chain);
    expect(applyChanges(d.chain, []).goal.level).toBe(d.plan.goal.level_dB);
    expect(solved.verdict.holds).toBe(true);
    d.undo();
    expect(d.report.holds).toBe(false);
  });

  test('a sweep is worked out once wanted, and again after an edit', () => {
    const { desk: d, bench } = desk();
    bench.answer();
    expect(d.sweep('level')).toBeNull();
    d.want('level');
    bench.answer();
    expect(d.sweep('level')?.fresh).toBe(true);
    d.edit('Wanted level', [...setLevel(109)]);
    expect(d.sweep('level')?.fresh).toBe(false);
    bench.answer();
    expect(d.sweep('level')?.fresh).toBe(true);
    d.forget('level');
    d.edit('Wanted level', [...setLevel(108)]);
    bench.answer();
    expect(d.sweep('level')?.fresh).toBe(false);
  });
});

test('held curves stay while the plan moves on', () => {
  const { desk: d } = desk();
  d.hold();
  const held = d.heldCurves?.delivered[100];
  d.edit('Wanted level', [...setLevel(100)]);
  expect(d.heldCurves?.delivered[100]).toBe(held);
  expect(d.curves.delivered[100]).toBeCloseTo((held ?? 0) - 10, 6);
  d.letGo();
  expect(d.heldCurves).toBeNull();
});

test('the cursor opens at the worst frequency and keeps to the plots', () => {
  const { desk: d } = desk();
  expect(d.cursor).toBeCloseTo(d.budget.verdict.worst, 9);
  d.cursor = 5;
  expect(d.cursor).toBe(10);
  d.cursor = 900;
  expect(d.cursor).toBe(200);
});
