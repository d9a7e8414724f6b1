/** What is wrong with a file, where, and what would be right. */
export interface Problem {
  /** JSON pointer (RFC 6901); empty for the file as a whole. */
  readonly path: string;
  readonly found: string;
  readonly allowed: string;
  /** The likely slip, where there is one. */
  readonly hint: string | null;
  /** A sentence that says it all but the path and the hint. */
  readonly message: string;
}

export const problem = (p: Omit<Problem, 'hint'> & { readonly hint?: string | null }): Problem => ({
  ...p,
  hint: p.hint ?? null
});

const LONGEST_PATH = 160;

/** One line for a person. Control characters are written out, so that a file cannot steer a terminal. */
export function formatProblem(p: Problem): string {
  const path = p.path.length > LONGEST_PATH ? `${p.path.slice(0, LONGEST_PATH)}…` : p.path;
  const text = p.hint === null ? p.message : `${p.message} ${p.hint}`;
  return printable(path === '' ? text : `${path}: ${text}`);
}

/** The text with control and direction-changing characters written as \uXXXX. */
export const printable = (text: string): string =>
  text.replace(
    /[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/gu,
    (c) => `\\u${c.codePointAt(0)!.toString(16).padStart(4, '0')}`
  );
