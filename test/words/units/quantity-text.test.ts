import { expect, test } from 'vitest';
import type { Quantity } from '$lib/words/units/quantity';
import { quantityOfKey } from '$lib/words/units/quantity-of-key';
import { quantityText, rangeText, roundedText } from '$lib/words/units/quantity-text';
import { slipReadings } from '$lib/words/units/slip-readings';
import { stepQuantity } from '$lib/words/units/step-quantity';
import type { System } from '$lib/words/units/unit';

test.for<[number, Quantity, System, string]>([
  [85, 'volume', 'metric', '85 L'],
  [85, 'volume', 'imperial', '3.002 cu ft'],
  [210.82, 'length-small', 'imperial', '8.3 in'],
  [0.4480001, 'ratio', 'metric', '0.4480001'],
  [0.85, 'share', 'metric', '85 %'],
  [-6, 'level', 'metric', '−6 dB'],
  [-40, 'temperature', 'imperial', '−40 °F']
])('%d of %s in %s units reads "%s"', ([stored, quantity, system, text]) => {
  expect(quantityText(stored, quantity, system)).toBe(text);
});

test('a computed value is rounded to what matters', () => {
  expect(roundedText(254.7313, 'mass-small', 'metric')).toBe('255 g');
  expect(roundedText(254.7313, 'mass-small', 'imperial')).toBe('8.99 oz');
});

test('a range in converted units is rounded to the inside, and whole ends stay whole', () => {
  expect(rangeText(5, 60, 'frequency', 'metric')).toBe('5 to 60 Hz');
  // 1 m is 3.28084 ft and 60 m 196.8504 ft: 3.280 and 196.9 would both lie outside.
  expect(rangeText(1, 60, 'length-large', 'imperial')).toBe('3.281 to 196.8 ft');
  expect(rangeText(0.05, 1, 'share', 'metric')).toBe('5 to 100 %');
  expect(rangeText(-40, 60, 'temperature', 'imperial')).toBe('−40 to 140 °F');
});

test('a slip of the unit is offered as what it was meant to be', () => {
  const range = { min: 5, max: 5000 };
  expect(slipReadings(0.081, 'area', 'metric', range)).toEqual([
    { label: '0.081 m² = 810 cm²', stored: 810 }
  ]);
  expect(slipReadings(-3, 'area', 'metric', range)).toEqual([]);
  expect(slipReadings(0, 'area', 'metric', range)).toEqual([]);
});

test.for<[number, Quantity, System, boolean, boolean, number]>([
  [15, 'frequency', 'metric', true, false, 16],
  [15.4, 'frequency', 'metric', true, false, 16],
  [15.4, 'frequency', 'metric', false, false, 15],
  [92, 'volume', 'metric', true, true, 95],
  [3.3, 'resistance', 'metric', true, false, 3.4],
  [10, 'resistance', 'metric', false, false, 9.9],
  [9.9, 'resistance', 'metric', true, false, 10],
  [500, 'power', 'metric', true, false, 510],
  [500, 'power', 'metric', true, true, 600],
  [0, 'resistance', 'metric', true, false, 0.01],
  [0.1 + 0.2, 'ratio', 'metric', true, false, 0.31],
  [304.8, 'length-small', 'imperial', true, true, 317.5]
])('from %d of %s, %s: up %s, large %s, to %d', ([from, quantity, system, up, large, to]) => {
  expect(stepQuantity(from, { quantity, system, up, large, range: null })).toBe(to);
});

test.for<[string, Quantity]>([
  ['vas_L', 'volume'],
  ['sd_cm2', 'area'],
  ['cms_mm_per_N', 'compliance'],
  ['rms_kg_per_s', 'mechanical-resistance'],
  ['xmax_mm', 'length-small'],
  ['distance_m', 'length-large'],
  ['coil_rise_K', 'temperature-rise'],
  ['gain_dB', 'level'],
  ['qts', 'ratio'],
  ['efficiency', 'share'],
  ['count', 'count']
])('the key %s holds %s', ([key, quantity]) => {
  expect(quantityOfKey(key)).toBe(quantity);
});
