/** The ids `FieldFrame` gives the lines around a control, for the control's aria-describedby. */
export type FieldLine = 'unit' | 'derived' | 'note' | 'contradiction' | 'trouble' | 'help';

/** The lines that are there, in reading order; undefined where none is. */
export function describedBy(id: string, lines: Partial<Record<FieldLine, unknown>>): string | undefined {
  const order: readonly FieldLine[] = ['unit', 'derived', 'note', 'contradiction', 'trouble', 'help'];
  const there = order.filter((line) => lines[line]).map((line) => `${id}-${line}`);
  return there.length === 0 ? undefined : there.join(' ');
}
