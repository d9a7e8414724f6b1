/** A figure in words, or a dash where there is none. */
export function orDash(value: number | null, text: (value: number) => string): string {
  return value === null ? '–' : text(value);
}
