/** What was typed, taken apart: a sign, then numbers each with the unit behind it. */
export interface Part {
  readonly number: string;
  /** Empty where no unit follows. */
  readonly unit: string;
}

export interface Split {
  readonly negative: boolean;
  /** "±16 mm". */
  readonly eitherWay: boolean;
  readonly parts: readonly Part[];
}

const FRACTIONS: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8'
};

/** A run of digits, separators and slashes; an exponent only where nothing but digits follows. */
const NUMBER = /^[\d.,][\d.,\s/]*(?:(?<=\d)[eE][+-]?\d+)?/;
/** Anything but digits; a 2 or 3 right behind a letter belongs to it (cm2, ft^3) unless a number goes on ("2ft3in"). */
const UNIT = /^[^\d]*(?:(?<=[a-zA-Z^])[23](?![\d.,a-zA-Z"'/]))?/;

/** Null where the text does not begin with a number. */
export function splitQuantity(typed: string): Split | null {
  const text = typed
    .trim()
    .replace(/[½¼¾⅓⅔⅛⅜⅝⅞]/g, (mark) => ` ${FRACTIONS[mark]}`)
    .replace(/(\d)-(\d+\s*\/\s*\d)/g, '$1 $2')
    .replace(/(\d)\u2044(\d)/g, '$1/$2')
    .replace(/[′’‘]/g, "'")
    .replace(/[″”“]/g, '"');
  const sign = /^[-−–+±]?\s*/.exec(text)![0];
  let rest = text.slice(sign.length);
  const parts: Part[] = [];
  while (rest !== '') {
    const number = NUMBER.exec(rest)?.[0];
    if (number === undefined) return null;
    rest = rest.slice(number.length);
    const unit = UNIT.exec(rest)![0];
    rest = rest.slice(unit.length);
    parts.push({ number: number.trim(), unit: unit.trim() });
  }
  if (parts.length === 0) return null;
  return { negative: /[-−–]/.test(sign), eitherWay: sign.includes('±'), parts };
}
