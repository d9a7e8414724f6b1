/** What a number out of its range, or a text in place of a number, was probably meant to be. */
import type { Range } from './allowed';
import { unitOf } from './unit-of';

interface Slip {
  readonly unit: string;
  readonly convert: (x: number) => number;
  /** Offered only where nothing likelier fits. */
  readonly weak?: boolean;
}

const times = (unit: string, factor: number, weak = false): Slip => ({
  unit,
  convert: (x) => x * factor,
  weak
});

/** By the unit that belongs: the units people type instead, likeliest first. */
const SLIPS: Record<string, readonly Slip[]> = {
  'cm²': [times('m²', 1e4), times('mm²', 0.01), times('in²', 6.4516, true)],
  mm: [times('m', 1000), times('cm', 10), times('µm', 0.001), times('in', 25.4, true)],
  m: [times('mm', 0.001), times('cm', 0.01), times('ft', 0.3048, true)],
  L: [times('m³', 1000), times('cm³', 0.001), times('ft³', 28.3168466, true)],
  mH: [times('H', 1000), times('µH', 0.001)],
  g: [times('kg', 1000), times('mg', 0.001)],
  'mm/N': [times('m/N', 1000), times('µm/N', 0.001)],
  'kg/s': [times('g/s', 0.001)],
  Hz: [times('kHz', 1000)],
  ms: [times('µs', 0.001), times('s', 1000)],
  W: [times('kW', 1000), times('mW', 0.001)],
  ohm: [times('mohm', 0.001), times('kohm', 1000, true)],
  kPa: [times('bar', 100), times('hPa', 0.1), times('Pa', 0.001), times('atm', 101.325, true)],
  '°C': [
    { unit: 'K', convert: (x) => x - 273.15 },
    { unit: '°F', convert: (x) => ((x - 32) * 5) / 9, weak: true }
  ]
};

/** Keys that are a fraction, or a factor near 1. */
const FRACTIONS: Record<string, readonly Slip[]> = {
  efficiency: [times('percent', 0.01)],
  fill_gain: [times('percent', 0.01)]
};

const clean = (x: number): number => Number(x.toPrecision(6));

/** "0.081 looks like m²: 810 cm²?" — null where no usual slip leads into the range. */
export function unitSlip(value: number, key: string, range: Range): string | null {
  const unit = unitOf(key);
  const slips = unit === null ? (FRACTIONS[key] ?? []) : (SLIPS[unit] ?? []);
  const fits = (x: number) => x >= range.min && x <= range.max && x !== 0;
  for (const weak of [false, true])
    for (const slip of slips) {
      const meant = clean(slip.convert(value));
      if ((slip.weak ?? false) === weak && fits(meant))
        return `${value} looks like ${slip.unit}: ${meant}${unit === null ? '' : ` ${unit}`}?`;
    }
  return value < 0 && fits(-value) ? `Without the minus sign: ${-value}?` : null;
}

/** What number a text holds: "21", "21,5", "21 Hz", "85 %"; null where it holds none. */
export function textSlip(text: string, key: string): string | null {
  const parts = /^\s*([-+−]?\d+(?:[.,]\d+)?)\s*([\p{L}%Ωµ°²³·/]{0,8})\s*$/u.exec(text.slice(0, 40));
  if (parts === null) return null;
  const value = Number(parts[1].replace(',', '.').replace('−', '-'));
  const asked: string[] = ['without the quotation marks'];
  if (parts[1].includes(',')) asked.push('with a decimal point');
  if (parts[2] !== '')
    asked.push(unitOf(key) === null ? 'without a unit' : `the unit, ${unitOf(key)}, is in the key`);
  return `The number ${value}, ${asked.join(', ')}?`;
}
