/** The measures of the laws can fail. */
import { expect, test } from 'vitest';
import { alike, close, closeAll, near, nearAll } from './law';

test('a number within the tolerance passes, one beyond it does not, and NaN never does', () => {
  expect(() => close(1.0009, 1, 1e-3, 'x')).not.toThrow();
  expect(() => close(1.0011, 1, 1e-3, 'x')).toThrow('x: 1.0011');
  expect(() => close(NaN, 1, 1e9, 'x')).toThrow();
  expect(() => near(100.09, 100, 1e-3, 'x')).not.toThrow();
  expect(() => near(100.11, 100, 1e-3, 'x')).toThrow();
  expect(() => near(-100, 100, 1e-3, 'x')).toThrow();
  expect(() => near(1e-300, 0, 1e-3, 'x')).toThrow();
});

test('one entry beyond the tolerance fails the whole array', () => {
  const wanted = new Float64Array([1, 2, 3]);
  const actual = new Float64Array([2, 4, 6.1]);
  const twice = (x: number) => 2 * x;
  expect(() => nearAll(new Float64Array([2, 4, 6]), wanted, twice, 1e-9, 'x')).not.toThrow();
  expect(() => nearAll(actual, wanted, twice, 1e-3, 'x')).toThrow('x at point 2');
  expect(() => closeAll(actual, wanted, twice, 0.09, 'x')).toThrow('x at point 2');
  expect(() => closeAll(new Float64Array([2, 4]), wanted, twice, 1, 'x')).toThrow();
});

test('structures are alike with the same keys, and numbers that are near', () => {
  expect(() => alike({ a: [1, null, 'b'] }, { a: [1 + 1e-12, null, 'b'] }, 1e-9)).not.toThrow();
  expect(() => alike({ a: [1, 2] }, { a: [1, 2.1] }, 1e-9)).toThrow('value.a.1');
  expect(() => alike({ a: 1 }, { a: 1, b: 2 }, 1e-9)).toThrow();
  expect(() => alike({ a: 'x' }, { a: 'y' }, 1e-9)).toThrow();
  expect(() => alike({ a: 1 }, { a: null }, 1e-9)).toThrow();
});
