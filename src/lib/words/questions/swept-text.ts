/** A swept value as it is spoken of: litres or cubic feet, hertz, decibels. Values are in the file's own unit. */
import type { Sweep } from '$lib/engine/budget/sweep-types';
import { fixed, significant } from '../format-number';
import { shownUnit } from '../units/quantity';
import { roundedText } from '../units/quantity-text';
import { clean, type System } from '../units/unit';

export type Column = Sweep['column'];

/** "85 L", "3.02 cu ft", "24.5 Hz", "6.0 dB", "105 dB". */
export function sweptText(column: Column, value: number, system: System): string {
  switch (column) {
    case 'net_L':
      return roundedText(value, 'volume', system);
    case 'boost_to_Hz':
      return `${significant(value, 3)} Hz`;
    case 'boost_gain_dB':
      return `${fixed(value, 1)} dB`;
    case 'level_dB':
      return `${significant(value, 4)} dB`;
  }
}

/** A value on a whole step, moved to the inside of a range, still in the file's unit: 62 for 61.3 L as its lower end. */
export function edgeValue(column: Column, value: number, end: 'lower' | 'upper', system: System): number {
  const unit = column === 'net_L' ? shownUnit('volume', system) : null;
  const shown = unit === null ? value : unit.fromStored(value);
  const step = edgeStep(column, shown, system);
  const steps = Number((shown / step).toPrecision(10));
  const whole = clean((end === 'lower' ? Math.ceil(steps) : Math.floor(steps)) * step);
  return unit === null ? whole : unit.toStored(whole);
}

export const edgeText = (column: Column, value: number, end: 'lower' | 'upper', system: System): string =>
  sweptText(column, edgeValue(column, value, end, system), system);

/** In the unit shown: a litre, a twentieth of a cubic foot, half a hertz, a tenth of a decibel; finer for very small boxes. */
function edgeStep(column: Column, shown: number, system: System): number {
  if (column === 'boost_to_Hz') return 0.5;
  if (column !== 'net_L') return 0.1;
  if (system === 'imperial') return shown < 0.4 ? 0.01 : 0.05;
  return shown < 4 ? 0.1 : 1;
}
