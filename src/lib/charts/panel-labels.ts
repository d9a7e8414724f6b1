import type { DoubtShape, RegionShape, Trace } from './panel-shapes';
import { flagRows, FLAG_GAP, type FlagRow } from './flag-rows';
import { lineSpots, outlineSpots, rangeSpots, regionSpots, type Size } from './label-spots';
import type { Screen } from './path';
import type { LabelRequest } from './place-labels';
import type { Box, Flag, Range, Tone } from './plot-types';
import { LABEL_PX, TICK_PX, textWidth } from './text-width';

/** How a label is written: in the ink of its line, as a note in italics, or as what is within limits. */
export type Manner = Tone | 'note' | 'within';

export interface PlotLabel extends LabelRequest {
  readonly text: string;
  readonly manner: Manner;
}

/** Height of a label's box: its letters, without the leading. */
const LABEL_H = 14;

export interface Labelled {
  readonly traces: readonly Trace[];
  readonly doubts: readonly DoubtShape[];
  readonly regions: readonly RegionShape[];
  readonly ranges: readonly Range[];
  readonly flags: readonly Flag[];
}

type Words = { readonly label?: string; readonly shortLabel?: string };
export const words = ({ label, shortLabel }: Words, narrow: boolean): string | undefined =>
  narrow ? (shortLabel ?? label) : label;

/** Every label with its spots, in the order in which they choose: lines first, what has most freedom last. */
export function labelRequests(
  { traces, doubts, regions, ranges, flags }: Labelled,
  screen: Screen,
  narrow: boolean
): PlotLabel[] {
  const panel = panelBox(screen);
  const near = (at: number | undefined) => (at === undefined ? undefined : screen.x(at));
  const flagged = new Set(flags.map(({ id }) => id));
  const out: PlotLabel[] = [];
  const add = (id: string, of: Words, manner: Manner, spots: (size: Size) => LabelRequest['spots']) => {
    const text = words(of, narrow);
    if (!text) return;
    const size = { w: textWidth(text, manner === 'note' ? TICK_PX : LABEL_PX), h: LABEL_H };
    out.push({ id, text, manner, ...size, spots: spots(size) });
  };
  for (const { of, pixels } of traces) {
    // A flag with the curve's own id names it already.
    if (flagged.has(of.id)) continue;
    add(`line ${of.id}`, of, of.tone, (size) =>
      lineSpots(pixels, panel, size, { near: near(of.near), side: of.side })
    );
  }
  for (const range of ranges) {
    const box = rangeBox(range, screen);
    if (box.w > 0) add(`range ${range.id}`, range, 'within', (size) => rangeSpots(box, panel, size));
  }
  for (const { of, high } of doubts) {
    add(`doubt ${of.id}`, of, 'note', (size) =>
      lineSpots(high, panel, size, { near: near(of.near), side: of.side })
    );
  }
  for (const { of, room } of regions) {
    add(`region ${of.id}`, of, 'note', (size) =>
      'from' in room ? regionSpots(room, panel, size) : outlineSpots(room, panel, size)
    );
  }
  return out;
}

export const panelBox = ({ left, right, top, bottom }: Screen): Box => ({
  x: left,
  y: top,
  w: right - left,
  h: bottom - top
});

/** A range on the screen, kept within the frame. */
export function rangeBox({ from, to, above }: Range, screen: Screen): Box {
  const within = (px: number, low: number, high: number) => Math.min(high, Math.max(low, px));
  const left = within(screen.x(from), screen.left, screen.right);
  const right = within(screen.x(to), screen.left, screen.right);
  const bottom = above === undefined ? screen.bottom : within(screen.y(above), screen.top, screen.bottom);
  return { x: left, y: screen.top, w: right - left, h: bottom - screen.top };
}

/** A flag on the screen: the hairline rises from `foot` to `head`, the label's box beside its head. */
export interface PlacedFlag {
  readonly of: Flag;
  readonly text: string;
  readonly x: number;
  readonly head: number;
  readonly side: FlagRow['side'];
  readonly box: Box;
}

const FLAG_ROW = 23;

/** Flags whose x lies on the axis, in rows from the top of the frame. */
export function placeFlags(flags: readonly Flag[], screen: Screen, narrow: boolean): PlacedFlag[] {
  const shown = flags.flatMap((of) => {
    const x = screen.x(of.x);
    const text = words(of, narrow) ?? of.label;
    return x >= screen.left && x <= screen.right ? [{ of, id: of.id, x, text, width: textWidth(text) }] : [];
  });
  const rows = flagRows(shown, screen.left + 2, screen.right - 2);
  return rows.flatMap(({ id, side, row }) => {
    const flag = shown.find((one) => one.id === id);
    if (!flag) return [];
    const { of, x, text, width } = flag;
    const head = screen.top + 8 + row * FLAG_ROW;
    const left = side === 'right' ? x + FLAG_GAP : x - FLAG_GAP - width;
    return [{ of, text, x, head, side, box: { x: left, y: head - 2, w: width, h: LABEL_H } }];
  });
}
