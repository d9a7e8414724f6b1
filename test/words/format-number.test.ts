import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { apart, figures, fixed, floorTo, significant } from '$lib/words/format-number';

describe('significant', () => {
  test.for([
    { value: 16, digits: 3, text: '16' },
    { value: 17.34, digits: 3, text: '17.3' },
    { value: 99.96, digits: 3, text: '100' },
    { value: 9.996, digits: 3, text: '10' },
    { value: 0.0336, digits: 2, text: '0.034' },
    { value: 1234.5, digits: 3, text: '1235' },
    { value: -6.04, digits: 2, text: '−6' },
    { value: 0, digits: 3, text: '0' },
    { value: NaN, digits: 3, text: '0' }
  ])('$value at $digits digits is $text', ({ value, digits, text }) => {
    expect(significant(value, digits)).toBe(text);
  });

  test('stays within half a unit of its last digit', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-4, max: 1e6, noNaN: true }), (value) => {
        expect(Math.abs(Number(significant(value, 3)) / value - 1)).toBeLessThanOrEqual(0.00501);
      })
    );
  });
});

test('figures keep trailing zeros for columns', () => {
  expect(figures(12, 3)).toBe('12.0');
  expect(figures(99.96, 3)).toBe('100');
});

test('fixed shows a true minus sign, and no sign on zero', () => {
  expect(fixed(-6.25, 1)).toBe('−6.3');
  expect(fixed(-0.01, 1)).toBe('0.0');
});

test('floorTo never says more than there is, but forgives the last bit', () => {
  expect(floorTo(103.29, 1)).toBe(103.2);
  expect(floorTo(102.7, 1)).toBe(102.7);
  expect(floorTo(0.1 + 0.2, 1)).toBe(0.3);
  expect(floorTo(-0.01, 1)).toBe(-0.1);
});

test('apart gives as many digits as it takes to tell two values apart', () => {
  expect(apart(19.4, 16)).toEqual(['19.4', '16']);
  expect(apart(16.01, 16)).toEqual(['16.01', '16']);
  expect(apart(16, 16)).toEqual(['16', '16']);
});
