/** Stored numbers as they are shown: in the system's unit, without noise, and never rounded where they can be shown whole. */
import { MINUS, significant } from '../format-number';
import { shownUnit, type Quantity } from './quantity';
import type { System } from './unit';

/** Digits of a converted value that no short number stands for. */
const DIGITS = 4;
const MOST_DIGITS = 10;

/**
 * The number alone, for a field. In the stored unit every digit typed is shown; in another unit the shortest number that is stored as
 * the same, so that what was typed comes back as typed, else four digits.
 */
export function quantityNumber(stored: number, quantity: Quantity, system: System): string {
  const unit = shownUnit(quantity, system);
  if (unit.stored) return significant(stored, MOST_DIGITS);
  const value = unit.fromStored(stored);
  for (let digits = 1; digits <= 6; digits++) {
    const short = Number(value.toPrecision(digits));
    if (unit.toStored(short) === stored) return significant(short, Math.max(digits, 1));
  }
  return significant(value, DIGITS);
}

/** With its unit, for a sentence or a note: "255 g". */
export const quantityText = (stored: number, quantity: Quantity, system: System): string =>
  withUnit(quantityNumber(stored, quantity, system), quantity, system);

/** A computed value, with so many digits at most: "derived 255 g". */
export const roundedText = (stored: number, quantity: Quantity, system: System, digits = 3): string =>
  withUnit(significant(shownUnit(quantity, system).fromStored(stored), digits), quantity, system);

const withUnit = (number: string, quantity: Quantity, system: System): string => {
  const { symbol } = shownUnit(quantity, system);
  return symbol === '' ? number : `${number} ${symbol}`;
};

/** "5 to 60 Hz"; in a converted unit rounded to the inside, so that both ends are allowed as written. */
export function rangeText(min: number, max: number, quantity: Quantity, system: System): string {
  const unit = shownUnit(quantity, system);
  if (unit.stored)
    return withUnit(`${significant(min, MOST_DIGITS)} to ${significant(max, MOST_DIGITS)}`, quantity, system);
  const ends = [unit.fromStored(min), unit.fromStored(max)].sort((a, b) => a - b);
  return withUnit(`${inward(ends[0], Math.ceil)} to ${inward(ends[1], Math.floor)}`, quantity, system);
}

function inward(value: number, round: (x: number) => number): string {
  if (value === 0) return '0';
  const place = 10 ** (DIGITS - 1 - Math.floor(Math.log10(Math.abs(value))));
  // Noise of the conversion is not to push a whole end over the next step.
  const rounded = round(Number((value * place).toPrecision(10))) / place;
  return significant(rounded, DIGITS).replace('-', MINUS);
}
