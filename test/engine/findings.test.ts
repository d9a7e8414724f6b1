/**
 * Limits and the verdict: over, thin, not judged, turned by the room, the hot coil or what lies below the programme.
 * Thresholds are common practice unless a source is named: 3 dB and more of margin is comfortable; content may lurk from 5 Hz up.
 */
import { describe, expect, test } from 'vitest';
import type { LimitName } from '$lib/engine/budget/budget';
import type { Chain } from '$lib/engine/chain';
import type { Block } from '$lib/engine/shaping/block';
import { atLevel, budget, expectEdge, findingOf, quiet, quietDriver, severityOf, solve } from './find';
import { quietChain } from './quiet-chain';

const active = { bypass: false, fixed: false };
const ratings = (...list: { power: number; load: number }[]) =>
  quiet({ amplifier: { ...quietChain.amplifier, ratings: list } });
const margin = (chain: Chain, limit: LimitName) =>
  budget(chain).limits.find((l) => l.limit === limit)?.margin ?? NaN;

test('a modest, well-matched plan has nothing to remark on', () => {
  expect(budget(quietChain).findings).toEqual([]);
  expect(budget(quietChain).verdict.holds).toBe(true);
});

/** One rating made small while the others stay ample. A rating of P into R reaches √(P·R) V and √(P/R) A. */
const TIGHT: { readonly [L in LimitName]: { make: (x: number) => Chain; range: [number, number] } } = {
  'amplifier-voltage': {
    make: (x) => ratings({ power: x, load: 64 }, { power: 30, load: 0.25 }),
    range: [0.1, 2]
  },
  'amplifier-current': {
    make: (x) => ratings({ power: 30, load: 64 }, { power: x, load: 0.25 }),
    range: [0.12, 2]
  },
  'cone-travel': { make: (xmax) => quietDriver({ xmax }), range: [1e-3, 10e-3] },
  'mechanical-stop': { make: (xmech) => quietDriver({ xmax: null, xmech }), range: [1e-3, 10e-3] },
  'coil-heat': { make: (power) => quietDriver({ power }), range: [0.1, 20] }
};

describe.each(Object.entries(TIGHT))('limit-%s', (name, { make, range }) => {
  const limit = name as LimitName;
  const code = `limit-${limit}` as const;

  test('blocks from where the margin is gone, and not before', () => {
    expectEdge({
      code,
      make,
      measure: (b) => b.limits.find((l) => l.limit === limit)?.margin ?? NaN,
      range,
      threshold: 0,
      under: 'blocking',
      over: null
    });
    expect(severityOf(quietChain, code)).toBeNull();
  });

  test('says what is allowed, what is asked, and how loud it can be', () => {
    const chain = make(solve((x) => margin(make(x), limit), -2, ...range));
    const found = findingOf(chain, code);
    const b = budget(chain);
    expect(b.verdict).toMatchObject({ limit, holds: false });
    expect(found?.facts.margin).toBeCloseTo(-2, 6);
    expect(20 * Math.log10((found?.facts.allowed ?? 0) / (found?.facts.demanded ?? 0))).toBeCloseTo(-2, 6);
    expect(found?.facts.level).toBe(quietChain.goal.level);
    expect(found?.facts.maxLevel).toBeCloseTo(quietChain.goal.level - 2, 6);
    expect(found?.at).toBe(b.verdict.worst);
  });
});

describe('margins', () => {
  const verdictMargin = (x: number) => budget(atLevel(quietChain, x)).verdict.margin;
  const withMargin = (m: number): Chain => atLevel(quietChain, solve(verdictMargin, m, 80, 120));

  test.each([
    [3.001, null],
    [2.999, 'caution'],
    [0.001, 'caution'],
    [-0.001, null]
  ])('%d dB in hand: margin-thin is %s', (m, severity) => {
    expect(severityOf(withMargin(m), 'margin-thin')).toBe(severity);
  });

  test.each([
    [4.001, null],
    [3.999, 'caution'],
    [0.5, 'caution'],
    [-3.999, 'caution'],
    [-4.001, null]
  ])('%d dB in hand under 4 dB of doubt: room-doubt is %s', (m, severity) => {
    const doubted: Chain = { ...withMargin(m), room: { kind: 'open-air', doubt: 4 } };
    const found = findingOf(doubted, 'room-doubt');
    expect(found?.severity ?? null).toBe(severity);
    if (found === null) return;
    expect(found.facts).toMatchObject({ holds: m > 0, doubt: 4 });
    expect(found.facts.turnsAt).toBeCloseTo(Math.abs(m), 6);
  });

  test('no doubt, nothing to turn the verdict', () => {
    expect(severityOf(withMargin(0.001), 'room-doubt')).toBeNull();
  });

  test.each([
    ['xmax', 'cone-travel'],
    ['xmech', 'mechanical-stop'],
    ['power', 'coil-heat']
  ] as const)('without %s its limit is not judged', (key, limit) => {
    const chain = quietDriver({ [key]: null });
    expect(findingOf(chain, 'not-judged')).toMatchObject({ severity: 'caution', facts: { missing: [key] } });
    expect(budget(chain).notJudged).toEqual([limit]);
    expect(budget(chain).limits.map((l) => l.limit)).not.toContain(limit);
  });

  test('every rating that is missing is named', () => {
    const chain = quietDriver({ xmax: null, xmech: null, power: null });
    expect(findingOf(chain, 'not-judged')?.facts.missing).toEqual(['xmax', 'xmech', 'power']);
  });
});

test('hot-coil: a plan that holds cold and not hot is cautioned', () => {
  // Volts run out: a hot coil asks for more of them.
  const make = (power: number) => ratings({ power, load: 64 }, { power: 30, load: 0.25 });
  const range: [number, number] = [0.1, 2];
  const measure = (b: ReturnType<typeof budget>) => b.hot.margin;
  expectEdge({ code: 'hot-coil', make, measure, range, threshold: 0, under: 'caution', over: null });
  const over = make(solve((x) => margin(make(x), 'amplifier-voltage'), -0.01, ...range));
  expect(severityOf(over, 'hot-coil')).toBeNull();
  const found = findingOf(make(solve((x) => measure(budget(make(x))), -0.1, ...range)), 'hot-coil');
  expect(found?.facts).toMatchObject({ limit: 'amplifier-voltage', rise: 100 });
  expect(found?.facts.levelLoss).toBeGreaterThan(0);
});

describe('below the programme', () => {
  /** Lifts what lies under 20 Hz, where the programme ends. */
  const lift: Block = { ...active, kind: 'low-shelf', order: 2, corner: 9, gain: 8, q: Math.SQRT1_2 };
  const boosted = quiet({ shaping: [lift], programme: { lowest: 20, crest: 9 } });
  const from5 = (chain: Chain) => budget({ ...chain, programme: { lowest: 5, crest: 9 } }).verdict.margin;
  const withMarginFrom5 = (m: number, chain: Chain) =>
    atLevel(
      chain,
      solve((x) => from5(atLevel(chain, x)), m, 80, 120)
    );

  test('infrasonic: a limit over once the programme is taken from 5 Hz', () => {
    expect(severityOf(withMarginFrom5(0.001, boosted), 'infrasonic')).toBeNull();
    const over = withMarginFrom5(-0.001, boosted);
    expect(budget(over).verdict.holds).toBe(true);
    expect(findingOf(over, 'infrasonic')).toMatchObject({
      severity: 'caution',
      facts: { limit: 'cone-travel', from: 5 }
    });
    expect(findingOf(over, 'infrasonic')?.facts.margin).toBeCloseTo(-0.001, 6);
  });

  test('infrasonic: not where the programme reaches 5 Hz itself, and not where only the programme is over', () => {
    const over = withMarginFrom5(-1, boosted);
    expect(severityOf({ ...over, programme: { lowest: 5, crest: 9 } }, 'infrasonic')).toBeNull();
    // A narrow peak inside the programme, nothing below it.
    const peak: Block = { ...active, kind: 'peak', centre: 30, q: 5, gain: 12 };
    const inside = atLevel(quiet({ shaping: [peak], programme: { lowest: 20, crest: 9 } }), 110);
    expect(budget(inside).verdict.margin).toBeLessThan(0);
    expect(from5(inside)).toBeCloseTo(budget(inside).verdict.margin, 9);
    expect(severityOf(inside, 'infrasonic')).toBeNull();
  });

  const highPass: Block = { ...active, kind: 'high-pass', family: 'butterworth', order: 2, corner: 5 };
  const shelf = (gain: number): Block => ({
    ...active,
    ...{ kind: 'low-shelf', order: 2, corner: 25, gain, q: Math.SQRT1_2 }
  });

  test('no-high-pass: from 3 dB of boost a note, with a limit over below the programme a caution', () => {
    const make = (gain: number) => quiet({ shaping: [shelf(gain)] });
    const measure = (b: ReturnType<typeof budget>) => b.system.boost;
    const edge = { code: 'no-high-pass', make, measure, range: [0.5, 9], threshold: 3 } as const;
    expectEdge({ ...edge, under: null, over: 'note' });
    const loud = withMarginFrom5(
      -0.5,
      quiet({ shaping: [lift, shelf(9)], programme: { lowest: 20, crest: 9 } })
    );
    expect(severityOf(loud, 'infrasonic')).toBe('caution');
    expect(severityOf(loud, 'no-high-pass')).toBe('caution');
  });

  test('no-high-pass: not with one, unless it is bypassed', () => {
    expect(severityOf(quiet({ shaping: [shelf(6), highPass] }), 'no-high-pass')).toBeNull();
    expect(severityOf(quiet({ shaping: [shelf(6), { ...highPass, bypass: true }] }), 'no-high-pass')).toBe(
      'note'
    );
  });
});

test('blocking findings come first, then cautions, then notes', () => {
  const chain = atLevel(
    quiet({
      shaping: [{ ...active, kind: 'low-shelf', order: 1, corner: 30, gain: 8, q: 1 }],
      box: { ...quietChain.box, qLeakage: null },
      cableResistance: 0.5
    }),
    112
  );
  const order = ['blocking', 'caution', 'note'];
  const ranks = budget(chain).findings.map((f) => order.indexOf(f.severity));
  expect(new Set(ranks).size).toBe(3);
  expect(ranks).toEqual([...ranks].sort());
});
