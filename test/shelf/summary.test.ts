import fc from 'fast-check';
import { expect, test } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { checkPlan } from '$lib/plan/read-plan';
import { toChain } from '$lib/plan/to-chain';
import { outlineOf, recordOf, summaryOf } from '$lib/shelf/summary';
import { report } from '$lib/words/report';
import { plausiblePlan, validPlan } from '../laws/valid-plan';
import { smallPlan } from './specimen';

test('verdict and sentence are those of the full report', () => {
  fc.assert(
    fc.property(plausiblePlan, (plan) => {
      const read = checkPlan(plan);
      if (!read.ok) return expect.unreachable();
      const full = report(read.plan, read.chain, evaluate(read.chain));
      const { verdict } = outlineOf(plan);
      expect(verdict).toMatchObject({ holds: full.holds, sentence: full.sentence });
      expect(verdict?.margin).toBe(Math.min(...full.limits.map(({ margin_dB }) => margin_dB as number)));
    }),
    { numRuns: 20 }
  );
});

test('the curve has 48 points from 10 to 200 Hz, evenly spaced on a log axis, at the level delivered', () => {
  const { curve } = outlineOf(smallPlan());
  const f = curve?.f ?? [];
  expect(f).toHaveLength(48);
  expect([f[0], f[47]]).toEqual([10, 200]);
  for (let i = 1; i < 48; i++) expect(f[i] / f[i - 1]).toBeCloseTo(20 ** (1 / 47), 12);
  expect(curve?.wanted).toBe(100);
  for (const i of [0, 20, 47])
    expect(curve?.delivered[i]).toBeCloseTo(
      curves(toChain(smallPlan()), new Float64Array([f[i]])).delivered[0],
      12
    );
});

test('every plan the file allows has a summary that a store can hold', () => {
  fc.assert(
    fc.property(validPlan, (plan) => {
      const summary = summaryOf(recordOf(plan, { id: 'x', created: 1, changed: 2 }));
      expect(structuredClone(summary)).toEqual(summary);
      expect(summary.title).not.toBe('');
      expect(summary.trouble).toBeNull();
    }),
    { numRuns: 50 }
  );
});

test('a plan that cannot be read has no figures', () => {
  const plan = smallPlan();
  plan.goal.level_dB = 1000;
  expect(outlineOf(plan)).toMatchObject({ verdict: null, curve: null });
});
