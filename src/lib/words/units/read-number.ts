/** A number as people write it, in any of the usual ways. */
export type NumberReading =
  | { readonly is: 'plain'; readonly value: number }
  /** "1,234": a decimal comma or a mark between thousands; both are in use. */
  | { readonly is: 'either'; readonly decimal: number; readonly thousands: number }
  | { readonly is: 'none' };

const NONE: NumberReading = { is: 'none' };

const plain = (value: number): NumberReading => (Number.isFinite(value) ? { is: 'plain', value } : NONE);

/**
 * Unsigned: "21", "0,5", "1 234.5", "1,234.5", "8 1/4", "1.8e-3". Each separator alone before exactly three digits, after one to
 * three that do not begin with 0, can be either; everything else has one meaning or none.
 */
export function readNumber(written: string): NumberReading {
  const text = written.trim();
  if (/\//.test(text)) return readFraction(text);
  const power = /^(\d*[.,]?\d+)[eE]([+-]?\d{1,3})$/.exec(text);
  if (power !== null) return plain(Number(`${point(power[1])}e${power[2]}`));
  if (/\s/.test(text))
    return /^\d{1,3}(\s\d{3})+([.,]\d*)?$/.test(text) ? plain(Number(point(text.replace(/\s/g, '')))) : NONE;
  if (!/\d/.test(text)) return NONE;
  if (/^[1-9]\d{0,2}[.,]\d{3}$/.test(text))
    return {
      is: 'either',
      decimal: Number(point(text)),
      thousands: Number(text.replace(/[.,]/, ''))
    };
  if (/^\d*[.,]?\d*$/.test(text)) return plain(Number(point(text)));
  for (const [mark, decimal] of [
    [',', '.'],
    ['.', ',']
  ])
    if (new RegExp(`^\\d{1,3}(\\${mark}\\d{3})+(\\${decimal}\\d*)?$`).test(text))
      return plain(Number(point(text.replaceAll(mark, ''))));
  return NONE;
}

const point = (text: string): string => text.replace(',', '.');

function readFraction(text: string): NumberReading {
  const parts = /^(?:(\d+)\s+)?(\d+)\s*\/\s*(\d+)$/.exec(text);
  if (parts === null) return NONE;
  return plain(Number(parts[1] ?? 0) + Number(parts[2]) / Number(parts[3]));
}
