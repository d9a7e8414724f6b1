/**
 * Numbers as people read them, in sentences and on screen: a true minus sign, no thousands mark, no trailing noise.
 * What a program reads (JSON, CSV, tables that are piped) never passes through here.
 */

/** U+2212: as wide as a figure, and never broken from its number. */
export const MINUS = '−';

const signed = (text: string): string => {
  const zero = Number(text) === 0;
  return text.startsWith('-') ? (zero ? text.slice(1) : MINUS + text.slice(1)) : text;
};

/** So many decimals, kept: 6 → "6.0". */
export function fixed(value: number, decimals: number): string {
  return signed(value.toFixed(decimals));
}

/** So many significant digits, whole digits never cut, trailing zeros dropped: 16.000 → "16", 1234.5 → "1235", 0.03300 → "0.033". */
export function significant(value: number, digits: number): string {
  const text = figures(value, digits);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** The same with trailing zeros kept, for columns: 12 at three digits is "12.0". */
export function figures(value: number, digits: number): string {
  if (value === 0 || !Number.isFinite(value)) return '0';
  // The rounded value decides the decimals: 99.96 at three digits is 100, not 100.0.
  const rounded = Number(value.toPrecision(digits));
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(rounded))));
  return signed(value.toFixed(Math.min(decimals, 12)));
}

/** Down to the next step of `10^-decimals`, so that what is said still holds; noise of the last bits is forgiven. */
export function floorTo(value: number, decimals: number): number {
  const scale = Math.pow(10, decimals);
  return Math.floor(value * scale + 1e-6) / scale;
}

/** A value and the bound it is over or under, with as many digits as it takes to tell them apart (three at least, six at most). */
export function apart(value: number, bound: number): [string, string] {
  let digits = 3;
  while (digits < 6 && significant(value, digits) === significant(bound, digits)) digits++;
  return [significant(value, digits), significant(bound, digits)];
}
