/** ANSI colour, only where a person looks at it. Whatever colour says, words say too. */

export interface Ink {
  readonly bold: (text: string) => string;
  readonly dim: (text: string) => string;
  /** Over. */
  readonly red: (text: string) => string;
  /** Thin. */
  readonly amber: (text: string) => string;
  /** Holds. */
  readonly green: (text: string) => string;
}

const code = (on: number, off: number) => (text: string) => `\u001b[${on}m${text}\u001b[${off}m`;
const plain = (text: string): string => text;

const COLOUR: Ink = {
  bold: code(1, 22),
  dim: code(2, 22),
  red: code(31, 39),
  amber: code(33, 39),
  green: code(32, 39)
};
const PLAIN: Ink = { bold: plain, dim: plain, red: plain, amber: plain, green: plain };

/** Colour only on a terminal that can, and not where NO_COLOR is set to anything (an informal convention, no-color). */
export function inkFor(isTerminal: boolean, env: { readonly [name: string]: string | undefined }): Ink {
  return isTerminal && !env.NO_COLOR && env.TERM !== 'dumb' ? COLOUR : PLAIN;
}
