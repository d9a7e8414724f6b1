/** The three decisions: every row is the plan at that value, and the answer is the best value that holds. */
import fc from 'fast-check';
import { describe, expect } from 'vitest';
import type { Budget, Change } from '$lib/engine/budget/budget';
import { applyChanges } from '$lib/engine/budget/change';
import { evaluate } from '$lib/engine/budget/evaluate';
import { sweep } from '$lib/engine/budget/sweep';
import type { Sweep, SweepOver, SweepRow } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';
import { toChain } from '$lib/plan/to-chain';
import { strainedPlan } from './chain-arbitrary';
import { close, law, near } from './law';
import { plausiblePlan } from './valid-plan';

const OVER: readonly SweepOver[] = ['volume', 'boost', 'level'];

/** Whole steps of the answers, and whether the lowest value that holds is the best (plan format, sweeps). */
const STEPS = {
  net_L: { step: 1e-3, lowest: true },
  boost_to_Hz: { step: 0.5, lowest: true },
  boost_gain_dB: { step: 0.1, lowest: false },
  level_dB: { step: 0.1, lowest: false }
} as const;

/** The chain at a swept value, made without the sweep. */
function at(chain: Chain, s: Sweep, value: number): Chain {
  const with_ = (change: Change) => applyChanges(chain, [change]);
  switch (s.column) {
    case 'level_dB':
      return with_({ set: 'level', value });
    case 'boost_gain_dB':
      return with_({ set: 'block-gain', block: s.block as number, value });
    case 'boost_to_Hz': {
      if (s.block !== null) return with_({ set: 'block-to', block: s.block, value });
      const trial = {
        kind: 'linkwitz-transform',
        from: 'box',
        fromQ: 'box',
        bypass: false,
        fixed: false
      } as const;
      return { ...chain, shaping: [...chain.shaping, { ...trial, to: value, toQ: 0.707 }] };
    }
    case 'net_L': {
      if (chain.box.net !== null) return with_({ set: 'net-volume', value });
      const { displacement } = evaluate(chain, { waysOut: false }).driver;
      return with_({ set: 'inner-volume', value: value + displacement + chain.box.bracing });
    }
  }
}

const budgetAt = (chain: Chain, s: Sweep, value: number): Budget =>
  evaluate(at(chain, s, value), { waysOut: false });

const isAmplifier = (limit: string): boolean => limit.startsWith('amplifier-');
const meets = (b: Budget, amplifierOnly: boolean): boolean =>
  b.limits.every((l) => l.margin >= 0 || (amplifierOnly && !isAmplifier(l.limit)));
const rowMeets = (row: SweepRow, amplifierOnly: boolean): boolean =>
  Object.entries(row.margins).every(
    ([name, m]) => m === null || m >= 0 || (amplifierOnly && !isAmplifier(name))
  );

const swept = fc
  .tuple(fc.oneof(strainedPlan, plausiblePlan).map(toChain), fc.constantFrom(...OVER))
  .map(([chain, over]) => ({ chain, s: sweep(chain, { over, points: 51 }) }));

describe('sweep', () => {
  law('a row is the plan evaluated at that value', swept, 40, ({ chain, s }) => {
    for (const row of [s.rows[0], s.rows[17], s.rows[33], s.rows[50]]) {
      const b = budgetAt(chain, s, row.value);
      close(row.qtc, b.alignment.qtc, 1e-9, 'Qtc');
      near(row.fc, b.alignment.fc, 1e-9, 'fc');
      near(row.alignmentF3, b.alignment.f3, 1e-9, 'f3 of the alignment');
      expect(row.systemF3 === null).toBe(b.system.f3 === null);
      close(row.systemF3 ?? 0, b.system.f3 ?? 0, 1e-6, 'f3 of the system');
      close(row.shapingBoost, b.system.boost, 1e-6, 'boost');
      near(row.ratedW, b.demand.ratedW, 1e-6, 'watts');
      near(row.peakV, b.demand.peakV, 1e-6, 'peak volts');
      near(row.peakA, b.demand.peakA, 1e-6, 'peak amps');
      near(row.travel, b.demand.travel, 1e-6, 'travel');
      for (const l of b.limits) close(row.margins[l.limit] ?? NaN, l.margin, 1e-6, l.limit);
      for (const name of b.notJudged) expect(row.margins[name]).toBeNull();
      expect(row.limit).toBe(b.verdict.limit);
      expect(row.holds).toBe(b.verdict.holds);
    }
  });

  const answers = (s: Sweep) =>
    [
      { answer: s.answer, amplifierOnly: false },
      { answer: s.amplifierAnswer, amplifierOnly: true }
    ] as const;

  law('an answer holds when evaluated, in whole steps within the range', swept, 55, ({ chain, s }) => {
    const { step } = STEPS[s.column];
    for (const { answer, amplifierOnly } of answers(s)) {
      if (answer === null) continue;
      expect(meets(budgetAt(chain, s, answer), amplifierOnly)).toBe(true);
      expect(answer).toBeGreaterThanOrEqual(s.rows[0].value - 1e-9);
      expect(answer).toBeLessThanOrEqual(s.rows[s.rows.length - 1].value + 1e-9);
      close(answer / step, Math.round(answer / step), 1e-6, 'whole steps');
    }
  });

  law('no value one or two steps better holds', swept, 55, ({ chain, s }) => {
    const { step, lowest } = STEPS[s.column];
    const [low, high] = [s.rows[0].value, s.rows[s.rows.length - 1].value];
    for (const { answer, amplifierOnly } of answers(s)) {
      if (answer === null) continue;
      for (const steps of [1, 2]) {
        const better = answer + (lowest ? -steps : steps) * step;
        if (better < low || better > high) continue;
        if (meets(budgetAt(chain, s, better), amplifierOnly))
          throw new Error(`${s.column}: ${answer} is the answer, and ${better} holds`);
      }
    }
  });

  law('no row more than a step better than the answer holds', swept, 55, ({ s }) => {
    const { step, lowest } = STEPS[s.column];
    for (const { answer, amplifierOnly } of answers(s))
      for (const row of s.rows) {
        if (answer === null || !rowMeets(row, amplifierOnly)) continue;
        if (lowest ? row.value < answer - step : row.value > answer + step)
          throw new Error(`${s.column}: ${answer} is the answer, and the row at ${row.value} holds`);
      }
  });

  law(
    'there is no answer only where no row holds, or none with a whole step beside it in the range',
    swept,
    55,
    (t) => {
      const { chain, s } = t;
      const { step, lowest } = STEPS[s.column];
      const [low, high] = [s.rows[0].value, s.rows[s.rows.length - 1].value];
      for (const { answer, amplifierOnly } of answers(s))
        for (const { value } of s.rows.filter((row) => answer === null && rowMeets(row, amplifierOnly))) {
          const whole = (lowest ? Math.ceil : Math.floor)(value / step) * step;
          if (whole < low || whole > high) continue;
          if (meets(budgetAt(chain, s, whole), amplifierOnly))
            throw new Error(`${s.column}: no answer, and ${whole} holds`);
        }
    }
  );

  law('volts and amps alone never ask for more than all limits do', swept, 55, ({ s }) => {
    if (s.answer === null) return;
    const amplifier = s.amplifierAnswer ?? NaN;
    if (STEPS[s.column].lowest) expect(amplifier).toBeLessThanOrEqual(s.answer);
    else expect(amplifier).toBeGreaterThanOrEqual(s.answer);
  });
});
