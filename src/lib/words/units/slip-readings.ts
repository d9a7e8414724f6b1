/** A number out of its range that another unit would bring into it: "0.081" for an area in cm² was surely 0.081 m². */
import { significant } from '../format-number';
import type { Reading } from './parse-quantity';
import { kindOf, shownUnit, type Quantity } from './quantity';
import { quantityText } from './quantity-text';
import type { System } from './unit';

const MOST = 2;

/** Units of the same system first; those of the other only where none of the own fits. Empty where nothing does. */
export function slipReadings(
  value: number,
  quantity: Quantity,
  system: System,
  range: { readonly min: number; readonly max: number }
): Reading[] {
  const shown = shownUnit(quantity, system);
  const fitting = kindOf(quantity).units.flatMap((unit) => {
    const stored = unit.toStored(value);
    if (unit === shown || stored === 0 || stored < range.min || stored > range.max) return [];
    const label = `${significant(value, 7)} ${unit.symbol} = ${quantityText(stored, quantity, system)}`;
    return [{ label, stored, own: unit.system === shown.system }];
  });
  const own = fitting.filter((reading) => reading.own);
  return (own.length > 0 ? own : fitting).slice(0, MOST).map(({ label, stored }) => ({ label, stored }));
}
