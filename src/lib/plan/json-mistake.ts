import { showKey } from './show-value';

/** What people write in place of JSON, by how it begins. */
const MISTAKES: readonly (readonly [RegExp, string])[] = [
  [/^$/, 'the text ends half way'],
  [/^(\/\/|\/\*|#|<!--)/, 'comments are not allowed'],
  [/^['‘’“”„`]/, 'text stands in straight double quotation marks'],
  [/^\+/, 'a number starts with a digit or with a minus sign'],
  [/^-?0\d/, 'a number does not start with 0 before another digit'],
  [/^-?\.\d/, 'a number starts with a digit, as in 0.5']
];

/** The likely mistake where `rest`, the text from here on, is no JSON; null where it is none of the usual ones. */
export function likelyMistake(rest: string): string | null {
  const endless = /^[-+]?(?:NaN|Infinity)/.exec(rest)?.[0];
  if (endless !== undefined) return `${endless} is no number here`;
  for (const [pattern, words] of MISTAKES) if (pattern.test(rest)) return words;
  const word = /^-?[\p{L}_$][\p{L}\p{N}_$]*/u.exec(rest)?.[0];
  return word === undefined ? null : `${showKey(word)} stands without quotation marks`;
}
