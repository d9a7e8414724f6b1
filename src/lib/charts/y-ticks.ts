import type { Screen } from './path';
import { plainNumber } from './plain-number';
import type { YAxis } from './plot-types';
import { thinTicks } from './thin-ticks';

export interface YTick {
  readonly value: number;
  readonly at: number;
  readonly text: string;
}

/** Height of a line of ticks, in px. */
export const TICK_LINE = 14;

/** The marks of a y axis that lie within the frame; labels that would touch are left out, their lines too. */
export function yTicks({ ticks, format = plainNumber }: YAxis, { y, top, bottom }: Screen): YTick[] {
  const values = ticks ?? y.ticks(Math.max(2, Math.round((bottom - top) / 28)));
  const marks = values.map((value) => ({ value, at: y(value), text: format(value) }));
  const shown = marks.filter(({ at }) => at >= top - 0.5 && at <= bottom + 0.5);
  return thinTicks(shown, ({ at }) => at, TICK_LINE);
}
