/** What someone typed into a field, as the number the plan file keeps. */
import { significant } from '../format-number';
import { findUnit, quantityWithUnit } from './find-unit';
import { kindOf, shownUnit, type Quantity } from './quantity';
import { readNumber } from './read-number';
import { splitQuantity, type Part, type Split } from './split-quantity';
import { clean, type System, type Unit } from './unit';

export interface Reading {
  /** "1.234 L". */
  readonly label: string;
  readonly stored: number;
}

export type Parsed =
  | {
      readonly kind: 'value';
      readonly stored: number;
      readonly typed: { readonly value: number; readonly unit: string };
      /** No unit was typed: the shown one was taken. */
      readonly bare: boolean;
    }
  /** It can be read in more than one way, and only the person knows. */
  | { readonly kind: 'ask'; readonly readings: readonly Reading[] }
  | { readonly kind: 'refused'; readonly sentence: string };

const LONGEST = 24;
const quoted = (text: string): string =>
  `“${text.trim().length > LONGEST ? `${text.trim().slice(0, LONGEST)}…` : text.trim()}”`;

/** Any unit of the quantity is understood; without one the number is in the unit shown. */
export function parseQuantity(text: string, quantity: Quantity, system: System): Parsed {
  const split = splitQuantity(text);
  if (split === null || (split.eitherWay && quantity !== 'length-small')) return notANumber(text);
  return split.parts.length === 1 ? parseOne(split, text, quantity, system) : parseSum(split, text, quantity);
}

function parseOne(
  { negative, parts: [part] }: Split,
  text: string,
  quantity: Quantity,
  system: System
): Parsed {
  const unit = part.unit === '' ? shownUnit(quantity, system) : findUnit(part.unit, quantity);
  const number = readNumber(part.number);
  if (number.is === 'none') return notANumber(text);
  if (unit === null) return wrongUnit(part, quantity, system);
  const signed = (value: number) => (negative && value !== 0 ? -value : value);
  if (number.is === 'either')
    return {
      kind: 'ask',
      readings: [number.decimal, number.thousands].map((value) => ({
        label: withSymbol(significant(signed(value), 7), unit.symbol),
        stored: unit.toStored(signed(value))
      }))
    };
  const value = signed(number.value);
  return {
    kind: 'value',
    stored: unit.toStored(value),
    typed: { value, unit: unit.symbol },
    bare: part.unit === ''
  };
}

/** "2 ft 6 in", "5 lb 3 oz", "2'6": each unit smaller than the one before, and less of it than makes one of that. */
function parseSum({ negative, parts }: Split, text: string, quantity: Quantity): Parsed {
  let total = 0;
  let before: Unit | null = null;
  let first: Unit | null = null;
  for (const part of parts) {
    const last = part === parts[parts.length - 1];
    const name: string = part.unit === '' && last && before?.symbol === 'ft' ? 'in' : part.unit;
    const unit = findUnit(name, quantity);
    if (unit === null && name !== '') return wrongUnit(part, quantity, 'imperial');
    const number = readNumber(part.number);
    if (unit === null || number.is !== 'plain') return notANumber(text);
    const stored = unit.toStored(number.value);
    if (before !== null && !(stored < before.toStored(1) && unit.toStored(1) < before.toStored(1)))
      return notANumber(text);
    total += stored;
    before = unit;
    first ??= unit;
  }
  if (first === null) return notANumber(text);
  const stored = clean(negative ? -total : total);
  return {
    kind: 'value',
    stored,
    typed: { value: first.fromStored(stored), unit: first.symbol },
    bare: false
  };
}

const withSymbol = (number: string, symbol: string): string =>
  symbol === '' ? number : `${number} ${symbol}`;

const notANumber = (text: string): Parsed => ({
  kind: 'refused',
  sentence: `${quoted(text)} does not read as one number.`
});

function wrongUnit(part: Part, quantity: Quantity, system: System): Parsed {
  const { noun, shown } = kindOf(quantity);
  const symbol = shown[system].symbol;
  const asked = symbol === '' ? `This is ${noun}, without a unit.` : `This is ${noun}, in ${symbol}.`;
  const other = quantityWithUnit(part.unit);
  const sentence =
    other === null
      ? `${quoted(part.unit)} is not a unit known here. ${asked}`
      : `${withSymbol(part.number, part.unit)} is ${kindOf(other).noun}. ${asked}`;
  return { kind: 'refused', sentence };
}
