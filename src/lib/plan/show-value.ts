/** How a value from the file is shown in a problem. */
const LONGEST = 48;

const shorten = (text: string): string => (text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text);

/** A key or a name, without quotation marks, shortened. */
export const showKey = (key: string): string => shorten(key);

export function showValue(value: unknown): string {
  if (typeof value === 'string') return JSON.stringify(shorten(value));
  if (Array.isArray(value)) return value.length === 0 ? 'an empty list' : 'a list';
  if (typeof value === 'object' && value !== null) return 'an object';
  return shorten(String(value));
}

/** "a, b or c". */
export const orList = (items: readonly string[]): string =>
  items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} or ${items[items.length - 1]}`;
