import { scaleLinear, scaleLog } from 'd3';
import { describe, expect, test } from 'vitest';
import { HATCHES, hatchFill, hatchId } from '$lib/charts/hatch';
import { logTicks, thirdOctaves, thirdOctaveTicks } from '$lib/charts/log-ticks';
import { makeScale } from '$lib/charts/make-scale';
import { niceDomain, niceLogDomain } from '$lib/charts/nice-domain';
import { plainNumber } from '$lib/charts/plain-number';
import { textWidth } from '$lib/charts/text-width';
import { thinTicks } from '$lib/charts/thin-ticks';
import { toneInk } from '$lib/charts/tone-ink';
import { yTicks } from '$lib/charts/y-ticks';

describe('log ticks', () => {
  test('third-octaves are the nominal frequencies of ISO 266, exactly', () => {
    // Source: ISO 266:1997, table 1 (one-third-octave column), 10 Hz to 200 Hz.
    expect(thirdOctaves(10, 200)).toEqual([10, 12.5, 16, 20, 25, 31.5, 40, 50, 63, 80, 100, 125, 160, 200]);
  });

  test('where they do not all fit, 1, 2 and 5 of each decade are labelled', () => {
    expect(thirdOctaveTicks(10, 200, 14)).toHaveLength(14);
    expect(thirdOctaveTicks(10, 200, 6)).toEqual([10, 20, 50, 100, 200]);
    expect(thirdOctaveTicks(10, 200, 3)).toEqual([10, 100]);
  });

  test.for([2, 5, 7, 9, 12, 20])('no more than %i labels of litres where so many have room', (room) => {
    const ticks = logTicks(30, 250, room);
    expect(ticks.length).toBeLessThanOrEqual(room);
    expect(ticks.length).toBeGreaterThan(0);
    expect(ticks).toEqual([...ticks].sort((a, b) => a - b));
    expect(ticks.every((tick) => tick >= 30 && tick <= 250)).toBe(true);
  });

  test('more room gives more labels, and what is no log range gives none', () => {
    expect(logTicks(30, 250, 7)).toEqual([30, 50, 80, 100, 150, 200]);
    expect(logTicks(30, 250, 9)).toEqual([30, 50, 80, 100, 150, 200]);
    expect(logTicks(30, 250, 12).length).toBeGreaterThan(9);
    expect(logTicks(0, 100, 5)).toEqual([]);
    expect(logTicks(Number.NaN, 100, 5)).toEqual([]);
  });
});

describe('nice domains', () => {
  test('a linear axis ends on whole steps and holds what it must', () => {
    expect(niceDomain([3, 27.3], { include: [0] })).toEqual({
      kind: 'linear',
      domain: [0, 30],
      ticks: [0, 5, 10, 15, 20, 25, 30]
    });
    expect(niceDomain([-3.2, Number.NaN, Infinity, 4.1]).domain).toEqual([-4, 6]);
  });

  test('values on a step open no further one, and a level line still has an axis', () => {
    expect(niceDomain([0, 0.1 + 0.2], { steps: 3 }).domain[1]).toBeCloseTo(0.3, 12);
    const [low, high] = niceDomain([7, 7]).domain;
    expect(low).toBeLessThan(7);
    expect(high).toBeGreaterThan(7);
    expect(niceDomain([]).domain).toEqual([0, 1]);
  });

  test('a log axis leaves out what is not above zero', () => {
    const { domain, ticks } = niceLogDomain([0, -5, 260, 4100]);
    expect(domain).toEqual([200, 5000]);
    expect(ticks.every((tick) => tick >= 200 && tick <= 5000)).toBe(true);
    expect(niceLogDomain([500, 500]).domain).toEqual([500, 800]);
  });
});

describe('scales', () => {
  test('equal ratios are equal lengths on a log scale', () => {
    const x = makeScale('log', [10, 200], [0, 100]);
    expect(x(20) - x(10)).toBeCloseTo(x(80) - x(40), 9);
    expect(x.invert(x(31.5))).toBeCloseTo(31.5, 9);
  });

  test.for([
    { kind: 'log' as const, d3: scaleLog([10, 200], [46, 752]) },
    { kind: 'linear' as const, d3: scaleLinear([10, 200], [46, 752]) }
  ])("$kind: every value has d3's pixel", ({ kind, d3 }) => {
    const x = makeScale(kind, [10, 200], [46, 752]);
    for (const value of [1, 10, 12.5, 31.5, 200, 4000]) expect(x(value)).toBeCloseTo(d3(value), 9);
  });

  test('what has no place has no pixel', () => {
    const x = makeScale('log', [10, 200], [0, 100]);
    expect(Number.isFinite(x(0))).toBe(false);
    expect(Number.isFinite(x(-3))).toBe(false);
    expect(makeScale('linear', [0, 1], [0, 100])(Number.NaN)).toBeNaN();
  });

  test('ticks that would touch are left out, and those outside the frame', () => {
    expect(thinTicks([0, 5, 14, 27, 28], (px) => px, 14)).toEqual([0, 14, 28]);
    const y = makeScale('linear', [0, 10], [100, 0]);
    const screen = { x: y, y, left: 0, right: 10, top: 0, bottom: 100 };
    const ticks = yTicks({ kind: 'linear', domain: [0, 10], ticks: [-1, 0, 1, 5, 10, 11] }, screen);
    expect(ticks.map(({ value }) => value)).toEqual([0, 5, 10]);
  });

  test('numbers lose their noise and have a true minus sign', () => {
    expect(plainNumber(0.1 + 0.2)).toBe('0.3');
    expect(plainNumber(-4)).toBe('−4');
  });
});

describe('signs', () => {
  const LIMITS = ['volts', 'amps', 'travel', 'heat', 'stop'] as const;

  test('without colour no two limits look alike', () => {
    const marks = LIMITS.map((tone) => `${toneInk(tone).dash} ${toneInk(tone).width}`);
    expect(new Set(marks).size).toBe(LIMITS.length);
  });

  test("the stop has travel's colour, unbroken, 1 px", () => {
    expect(toneInk('stop')).toEqual({ colour: toneInk('travel').colour, dash: null, width: 1 });
  });

  test('the two hatches differ without colour and their ids belong to their panel', () => {
    expect(HATCHES.out.angle).not.toBe(HATCHES.over.angle);
    expect(HATCHES.out.gap).not.toBe(HATCHES.over.gap);
    const ids = ['a', 'b'].flatMap((owner) => [hatchId(owner, 'out'), hatchId(owner, 'over')]);
    expect(new Set(ids).size).toBe(4);
    expect(hatchFill('a', 'over')).toBe(`url(#${hatchId('a', 'over')})`);
  });
});

// Source: rendered widths at 1000 px in Chromium, Fira Sans Medium of @fontsource/fira-sans 5.3.0 with tabular figures.
// 4 %: classes of letters stand for letters, and pairs are not kerned.
test.for([
  { text: 'amplifier volts', measured: 6578 },
  { text: 'cone travel', measured: 5029 },
  { text: 'played', measured: 3065 },
  { text: 'Xmax 16 mm', measured: 5778 },
  { text: 'amplifier is enough from 185 L', measured: 13848 },
  { text: 'within limits up to 100.2 dB', measured: 12452 },
  { text: '20 Hz', measured: 2491 }
])('"$text" is as wide as the font makes it', ({ text, measured }) => {
  expect(Math.abs(textWidth(text, 1000) / measured - 1)).toBeLessThan(0.04);
});
