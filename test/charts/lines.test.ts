import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { between } from '$lib/charts/between';
import { heightAt } from '$lib/charts/height-at';
import { makeScale } from '$lib/charts/make-scale';
import {
  bandPath,
  endTicks,
  levelPixels,
  linePath,
  outlinePath,
  toPixels,
  type Pixels,
  type Screen
} from '$lib/charts/path';
import { straighten, straightenPair } from '$lib/charts/straighten';

/** x: 10…1000 over 0…200 px, log; y: 0…10 over 100…0 px. */
const screen: Screen = {
  x: makeScale('log', [10, 1000], [0, 200]),
  y: makeScale('linear', [0, 10], [100, 0]),
  left: 0,
  right: 200,
  top: 0,
  bottom: 100
};

const line = (x: number[], y: number[]): Pixels => ({
  x: Float64Array.from(x),
  y: Float64Array.from(y),
  ascending: true
});

describe('lines', () => {
  test('points go where the scales put them', () => {
    expect(linePath(toPixels([10, 100, 1000], [0, 5, 10], screen))).toBe('M0,100L100,50L200,0');
  });

  test('what is not finite is a gap, never a zero', () => {
    const pixels = toPixels([10, 20, 50, 100, 1000], [1, 2, Number.NaN, Infinity, 4], screen);
    const path = linePath(pixels);
    expect(path.match(/M/g)).toHaveLength(2);
    expect(path).not.toMatch(/NaN|Infinity/);
  });

  test('what has no place on a log axis is dropped', () => {
    const { x } = toPixels([0, -1, 10, 1000], [1, 1, 1, 1], screen);
    expect([...x]).toEqual([0, 200]);
  });

  test('a line far outside is cut beyond the frame, one within is not moved', () => {
    const { y } = toPixels([10, 100], [1e9, 11], screen);
    expect(y[0]).toBe(-400);
    expect(y[1]).toBeCloseTo(-10, 9);
  });

  test('the arguments stay as they were', () => {
    const [x, y] = [Float64Array.of(0, 10, 100), Float64Array.of(Number.NaN, 1e9, 2)];
    const before = structuredClone([x, y]);
    toPixels(x, y, screen);
    expect([x, y]).toEqual(before);
  });

  test('the goal has its ends marked where it begins and stops', () => {
    expect(endTicks(line([0, 10, 20, 30], [Number.NaN, 5, 6, Number.NaN]))).toBe('M10,5v7M20,6v7');
    expect(endTicks(line([0], [1]))).toBe('');
  });

  test('a closed outline needs three points', () => {
    expect(outlinePath(line([0, 10, 10], [0, 0, 10]))).toBe('M0,0L10,0L10,10Z');
    expect(outlinePath(line([0, 10], [0, 0]))).toBe('');
  });
});

describe('height at the cursor', () => {
  const pixels = toPixels([10, 100, 1000], [0, 5, 10], screen);

  test('lies on the line as drawn, on its points and between them', () => {
    expect(heightAt(pixels, 0)).toBe(100);
    expect(heightAt(pixels, 100)).toBeCloseTo(50, 9);
    expect(heightAt(pixels, 25)).toBeCloseTo(87.5, 9);
    expect(heightAt(pixels, 200)).toBe(0);
  });

  test('is nothing past the ends, in a gap, and where the line turns back', () => {
    expect(heightAt(pixels, -3)).toBeNull();
    expect(heightAt(pixels, 203)).toBeNull();
    expect(heightAt(line([0, 10, 20], [1, Number.NaN, 3]), 5)).toBeNull();
    expect(heightAt(line([0, 10, 20], [1, Number.NaN, 3]), 20)).toBe(3);
    expect(heightAt(toPixels([10, 100, 50], [1, 2, 3], screen), 50)).toBeNull();
    expect(heightAt(line([], []), 5)).toBeNull();
  });
});

describe('between two lines', () => {
  test('the crossing is put in exactly', () => {
    // `to` falls from 10 px above the edge to 30 px below it: they cross a quarter of the way.
    const { from, to } = between(line([0, 100], [50, 50]), line([0, 100], [40, 80]));
    expect([...from.x]).toEqual([0, 25, 25]);
    expect([...to.y]).toEqual([40, 50, Number.NaN]);
    expect(bandPath(from, to)).toBe('M0,50L25,50L25,50L0,40Z');
  });

  test('nothing where `to` stays below, all where it stays above', () => {
    expect(bandPath(...pair(between(line([0, 9], [50, 50]), line([0, 9], [60, 70]))))).toBe('');
    expect(bandPath(...pair(between(line([0, 9], [50, 50]), line([0, 9], [10, 20]))))).toBe(
      'M0,50L9,50L9,20L0,10Z'
    );
  });

  test('never draws beyond either line, whatever they do', () => {
    const heights = fc.array(
      fc.oneof(fc.double({ min: 0, max: 100, noNaN: true }), fc.constant(Number.NaN)),
      {
        minLength: 6,
        maxLength: 6
      }
    );
    const xs = [0, 10, 20, 30, 40, 50];
    fc.assert(
      fc.property(heights, heights, (a, b) => {
        const [lower, upper] = [line(xs, a), line(xs, b)];
        const { from, to } = between(lower, upper);
        for (let i = 0; i < from.x.length; i++) {
          if (Number.isNaN(from.y[i])) continue;
          expect(from.y[i]).toBeGreaterThanOrEqual(to.y[i] - 1e-9);
          const there = heightAt(lower, from.x[i]);
          if (there !== null) expect(from.y[i]).toBeCloseTo(there, 6);
        }
      })
    );
  });

  const pair = ({ from, to }: { from: Pixels; to: Pixels }): [Pixels, Pixels] => [from, to];
});

describe('a line without the points it does not need', () => {
  const deviation = (of: Pixels, straight: Pixels) =>
    Math.max(
      ...[...of.x].flatMap((x, i) => {
        const there = heightAt(straight, x);
        return Number.isFinite(of.y[i]) && there !== null ? [Math.abs(there - of.y[i])] : [];
      })
    );

  test('keeps far fewer points of a smooth curve and cannot be told from it', () => {
    const x = Array.from({ length: 400 }, (_, i) => i * 2);
    const curve = line(
      x,
      x.map((px) => 100 + 60 * Math.sin(px / 90))
    );
    const straight = straighten(curve);
    expect(straight.x.length).toBeLessThan(120);
    expect(deviation(curve, straight)).toBeLessThanOrEqual(0.1 + 1e-9);
  });

  test('a straight line keeps its ends, a corner stays, a gap stays a gap', () => {
    expect([...straighten(line([0, 1, 2, 3], [0, 1, 2, 3])).x]).toEqual([0, 3]);
    expect([...straighten(line([0, 1, 2, 3, 4], [0, 0, 5, 0, 0])).x]).toEqual([0, 1, 2, 3, 4]);
    const gap = straighten(line([0, 1, 2, 3, 4, 5, 6], [0, 1, 2, Number.NaN, 4, 5, 6]));
    expect(linePath(gap)).toBe('M0,0L2,2M4,4L6,6');
    expect(straighten(line([], [])).x).toHaveLength(0);
  });

  test('never strays further than that, whatever the curve does', () => {
    const height = fc.oneof(
      { weight: 9, arbitrary: fc.double({ min: -50, max: 150, noNaN: true }) },
      { weight: 1, arbitrary: fc.constant(Number.NaN) }
    );
    fc.assert(
      fc.property(fc.array(height, { minLength: 1, maxLength: 40 }), (y) => {
        const of = line(
          [...y.keys()],
          y.map((v) => v / 100)
        );
        expect(deviation(of, straighten(of))).toBeLessThanOrEqual(0.1 + 1e-9);
        const solid = [...of.y].filter((v, i) => Number.isFinite(v) && heightAt(straighten(of), i) === null);
        expect(solid).toEqual([]);
      })
    );
  });

  test('two lines stay over the same x', () => {
    const [a, b] = straightenPair(line([0, 1, 2, 3], [0, 5, 0, 0]), line([0, 1, 2, 3], [0, 0, 5, 0]));
    expect([...a.x]).toEqual([...b.x]);
  });
});

test('a level line runs from edge to edge', () => {
  expect(linePath(levelPixels(4, screen))).toBe('M0,60L200,60');
});
