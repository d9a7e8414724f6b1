/** What people type and paste, and the number the plan file then keeps. Factors: see the unit tables' own sources. */
import { expect, test } from 'vitest';
import { parseQuantity } from '$lib/words/units/parse-quantity';
import type { Quantity } from '$lib/words/units/quantity';

/** Exact: these are compared with `toBe`. */
const TAKEN: [text: string, quantity: Quantity, stored: number][] = [
  // plain, and with either decimal mark
  ['21', 'frequency', 21],
  ['0,5', 'ratio', 0.5],
  ['0.5', 'ratio', 0.5],
  ['12,5', 'length-small', 12.5],
  ['1,23', 'inductance', 1.23],
  ['.707', 'ratio', 0.707],
  [',707', 'ratio', 0.707],
  ['21.', 'frequency', 21],
  ['0.448', 'ratio', 0.448],
  ['0,448', 'ratio', 0.448],
  ['1.2345', 'ratio', 1.2345],
  ['1234,567', 'power', 1234.567],
  ['1.8e-3 H', 'inductance', 1.8],
  ['1e3', 'power', 1000],
  // thousands
  ['1 234', 'power', 1234],
  ['1 234 W', 'power', 1234],
  ['12 345,6', 'power', 12345.6],
  ['1,234,567', 'power', 1234567],
  ['1.234,5', 'power', 1234.5],
  ['1,234.5', 'power', 1234.5],
  // signs
  ['-6', 'level', -6],
  ['−6 dB', 'level', -6],
  ['–6', 'level', -6],
  ['+6dB', 'level', 6],
  ['±16 mm', 'length-small', 16],
  ['-0', 'level', 0],
  // fractions
  ['8 1/4 in', 'length-small', 209.55],
  ['8-1/4"', 'length-small', 209.55],
  ['8¼ in', 'length-small', 209.55],
  ['½', 'ratio', 0.5],
  ['3/4 in', 'length-small', 19.05],
  // feet and inches
  [`2'6"`, 'length-large', 0.762],
  ['2′ 6″', 'length-large', 0.762],
  [`2'6`, 'length-large', 0.762],
  ['2 ft 6 in', 'length-large', 0.762],
  ['2ft6in', 'length-large', 0.762],
  ['2ft3in', 'length-large', 0.6858],
  [`2'6 1/2"`, 'length-small', 774.7],
  ['1 m 20 cm', 'length-large', 1.2],
  ['5 lb 3 oz', 'mass-large', 2.35301041937],
  // units
  ['14 cu ft', 'volume', 396.435852288],
  ['14 cu. ft.', 'volume', 396.435852288],
  ['14 ft3', 'volume', 396.435852288],
  ['14 ft^3', 'volume', 396.435852288],
  ['14 cubic feet', 'volume', 396.435852288],
  ['85 litres', 'volume', 85],
  ['85 l', 'volume', 85],
  ['0.085 m³', 'volume', 85],
  ['8.3 in', 'length-small', 210.82],
  ['8.3"', 'length-small', 210.82],
  ['8.3 inches', 'length-small', 210.82],
  ['0.016 m', 'length-small', 16],
  ['4 Ω', 'resistance', 4],
  ['4 Ω', 'resistance', 4],
  ['4 ohms', 'resistance', 4],
  ['4Ohm', 'resistance', 4],
  ['20 mΩ', 'resistance', 0.02],
  ['1.8 mH', 'inductance', 1.8],
  ['0.0018 H', 'inductance', 1.8],
  ['1800 µH', 'inductance', 1.8],
  ['1800 uH', 'inductance', 1.8],
  ['600 watts', 'power', 600],
  ['0.6 kW', 'power', 600],
  ['21Hz', 'frequency', 21],
  ['21 HZ', 'frequency', 21],
  ['0.1 kHz', 'frequency', 100],
  ['810 cm2', 'area', 810],
  ['810 cm²', 'area', 810],
  ['0.081 m²', 'area', 810],
  ['125 sq in', 'area', 806.45],
  ['255 g', 'mass-small', 255],
  ['0.255 kg', 'mass-small', 255],
  ['9 oz', 'mass-small', 255.145708125],
  ['22 lb', 'mass-large', 9.97903214],
  ['15.5 N/A', 'force-factor', 15.5],
  ['15.5 Tm', 'force-factor', 15.5],
  ['15.5 T·m', 'force-factor', 15.5],
  ['0.00022 m/N', 'compliance', 0.22],
  ['220 µm/N', 'compliance', 0.22],
  ['4.1 N·s/m', 'mechanical-resistance', 4.1],
  ['1.5 ms', 'time', 1.5],
  ['0.0015 s', 'time', 1.5],
  ['68 °F', 'temperature', 20],
  ['-40 F', 'temperature', -40],
  ['293.15 K', 'temperature', 20],
  ['270 °F', 'temperature-rise', 150],
  ['1013.25 hPa', 'pressure', 101.325],
  ['1 atm', 'pressure', 101.325],
  ['85 %', 'share', 0.85],
  ['85', 'share', 0.85],
  ['110 %', 'ratio', 1.1],
  ['2.5 mm²', 'cross-section', 2.5],
  ['2.5 mm2', 'cross-section', 2.5]
];

test.for(TAKEN)('"%s" as %s is %d', ([text, quantity, stored]) => {
  const parsed = parseQuantity(text, quantity, 'metric');
  expect(parsed).toMatchObject({ kind: 'value' });
  expect(parsed.kind === 'value' && parsed.stored).toBe(stored);
});

test('without a unit the number is in the unit shown', () => {
  expect(parseQuantity('3', 'volume', 'metric')).toMatchObject({
    stored: 3,
    bare: true,
    typed: { value: 3, unit: 'L' }
  });
  expect(parseQuantity('3', 'volume', 'imperial')).toMatchObject({
    stored: 84.950539776,
    typed: { unit: 'cu ft' }
  });
  expect(parseQuantity('85 L', 'volume', 'imperial')).toMatchObject({
    stored: 85,
    bare: false,
    typed: { unit: 'L' }
  });
});

// ASTM B258 gives AWG 12 as 3.31 mm² and AWG 14 as 2.08 mm², three digits.
test.for([
  ['12 AWG', 3.31],
  ['14 awg', 2.08],
  ['24 ga', 0.205]
] as const)('wire: "%s" is %d mm²', ([text, area]) => {
  const parsed = parseQuantity(text, 'cross-section', 'metric');
  expect(parsed.kind === 'value' && Number(parsed.stored.toPrecision(3))).toBe(area);
});

test.for([
  ['1,234', 1.234, 1234],
  ['1.234', 1.234, 1234],
  ['12.345', 12.345, 12345],
  ['123,456', 123.456, 123456],
  ['-1,234', -1.234, -1234]
] as const)('"%s" can be either, and both are offered', ([text, decimal, thousands]) => {
  const parsed = parseQuantity(text, 'power', 'metric');
  expect(parsed.kind === 'ask' && parsed.readings.map(({ stored }) => stored)).toEqual([decimal, thousands]);
});

test('readings are named with the unit typed', () => {
  expect(parseQuantity('1,234 cu ft', 'volume', 'metric')).toEqual({
    kind: 'ask',
    readings: [
      { label: '1.234 cu ft', stored: 34.9429886945 },
      { label: '1234 cu ft', stored: 34942.9886945 }
    ]
  });
});

test.for<[string, Quantity, RegExp]>([
  ['12 Hz', 'volume', /^12 Hz is a frequency\. This is a volume, in L\.$/],
  ['85 L', 'frequency', /^85 L is a volume\. This is a frequency, in Hz\.$/],
  ['6 ft3', 'length-large', /^6 ft3 is a volume\. This is a length, in m\.$/],
  ['21 Hz', 'ratio', /^21 Hz is a frequency\. This is a plain number, without a unit\.$/],
  ['3 furlongs', 'length-large', /^“furlongs” is not a unit known here\. This is a length, in m\.$/],
  ['500 MW', 'power', /“MW” is not a unit/],
  ['4 Mohm', 'resistance', /“Mohm” is not a unit/],
  ['abc', 'volume', /^“abc” does not read as one number\.$/],
  ['', 'volume', /does not read/],
  ['-', 'volume', /does not read/],
  ['5 to 10', 'volume', /does not read|not a unit/],
  ['1 2', 'volume', /does not read/],
  ['1,23,456', 'power', /does not read/],
  ['1.2.3', 'power', /does not read/],
  ['1/0', 'ratio', /does not read/],
  ['6 in 2 ft', 'length-large', /does not read/],
  ['2 ft 15 in', 'length-large', /does not read/],
  ['±6', 'level', /does not read/],
  ['NaN', 'level', /does not read/],
  ['Infinity', 'level', /does not read/],
  ['9'.repeat(400), 'level', /does not read/]
])('"%s" as %s is refused in a sentence', ([text, quantity, sentence]) => {
  const parsed = parseQuantity(text, quantity, 'metric');
  expect(parsed.kind).toBe('refused');
  expect(parsed.kind === 'refused' && parsed.sentence).toMatch(sentence);
});
