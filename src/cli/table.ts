/** Aligned tables: numbers to the right, names to the left. */
import { fold, padEnd, padStart, textWidth } from './text-width';

export type Align = 'left' | 'right';

export interface TableOptions {
  readonly align: readonly Align[];
  readonly indent?: string;
  readonly gap?: string;
}

/** Lines of a table; every row has one text a column. Nothing trails at a line's end. */
export function tableLines(
  rows: readonly (readonly string[])[],
  { align, indent = '', gap = '  ' }: TableOptions
): string[] {
  const widths = align.map((_, column) => Math.max(...rows.map((row) => textWidth(row[column]))));
  return rows.map((row) =>
    (
      indent +
      row
        .map((cell, i) => (align[i] === 'left' ? padEnd(cell, widths[i]) : padStart(cell, widths[i])))
        .join(gap)
    ).trimEnd()
  );
}

/** Names and what is said of them, folded to `width`. */
export function pairLines(
  pairs: readonly (readonly [string, string])[],
  width: number,
  indent = '  '
): string[] {
  const column = Math.max(...pairs.map(([name]) => textWidth(name))) + 2;
  return pairs.flatMap(([name, text]) =>
    fold(text, width, indent + padEnd(name, column), indent + ' '.repeat(column))
  );
}

/** Two blocks of lines beside each other. */
export function beside(left: readonly string[], right: readonly string[], column: number): string[] {
  return Array.from({ length: Math.max(left.length, right.length) }, (_, i) =>
    (padEnd(left[i] ?? '', column) + (right[i] ?? '')).trimEnd()
  );
}
