/** The tolerances other tests rest on: each must let through what it should and stop what it should. */
import { expect, test } from 'vitest';
import {
  absolute,
  angle,
  angleBetween,
  Comparison,
  EXACT,
  percent,
  range,
  share,
  shareOrAbsolute,
  used,
  type Tolerance,
  type Value
} from '../tolerance';

const CASES: [string, Tolerance, Value, within: (Value | undefined)[], beyond: (Value | undefined)[]][] = [
  ['a number in its own unit', absolute(0.05), 100, [100, 100.0499, 99.9501], [100.0501, 99.9499]],
  ['a share', share(0.003), 40, [40, 40.119, 39.881], [40.121, 39.879]],
  ['a percentage', percent(1), -200, [-198.01, -201.99], [-197.9, -202.1, 200]],
  ['a share of nothing', share(0.01), 0, [0], [1e-300, -1]],
  ['a share or so much', shareOrAbsolute(0.01, 0.5), 10, [10.49, 9.51], [10.51, 9.49]],
  ['a share or so much, large', shareOrAbsolute(0.01, 0.5), 1000, [1009.9], [1010.1]],
  ['an angle', angle(0.5), 179.8, [179.8, -179.8, 179.4], [-179.6, 179.2, 0]],
  ['an angle the other way round', angle(0.5), -180, [180, 179.6, 540.4], [179.4, 0]],
  ['a range', range(40, 50), 99, [40, 45, 50], [39.99, 50.01, 99]],
  ['a word', EXACT, 'coil-heat', ['coil-heat'], ['cone-travel', null, 1]],
  ['a truth', EXACT, false, [false], [true, 0, null]],
  ['an exact number', EXACT, 12.5, [12.5], [12.500001]],
  ['nothing', absolute(1), null, [null], [0, NaN, undefined]]
];

test.for(CASES)('%s', ([, tolerance, expected, within, beyond]) => {
  for (const value of within) expect(used(value, expected, tolerance)).toBeLessThanOrEqual(1);
  for (const value of beyond) expect(used(value, expected, tolerance)).toBeGreaterThan(1);
});

test.for([
  absolute(1),
  share(0.5),
  percent(50),
  shareOrAbsolute(1, 1),
  angle(180),
  EXACT,
  range(-1e9, 1e9)
] satisfies Tolerance[])('what is no number is never within %o', (tolerance) => {
  for (const value of [NaN, Infinity, -Infinity, undefined, null, '3', true])
    expect(used(value, 3, tolerance)).toBe(Infinity);
});

test('the angle between two directions goes the short way', () => {
  expect(angleBetween(10, 350)).toBeCloseTo(20, 12);
  expect(angleBetween(-179, 179)).toBeCloseTo(2, 12);
  expect(angleBetween(0, 180)).toBe(180);
  expect(angleBetween(725, 5)).toBeCloseTo(0, 12);
});

test('a comparison counts, keeps every miss with its label, and tells the nearest', () => {
  const all = new Comparison();
  all.check('level', 100.01, 100, absolute(0.05));
  all.check('watts', 103, 100, percent(1));
  all.check('limit', 'coil-heat', 'cone-travel', EXACT);
  all.check('margin', undefined, 2, absolute(0.05));
  expect(all.count).toBe(4);
  expect(all.misses.map((miss) => miss.split(':')[0])).toEqual(['watts', 'limit', 'margin']);
  expect(all.nearest).toContain('limit');
});
