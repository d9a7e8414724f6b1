/**
 * Labels sit on their curves; there is no legend. Each label has spots where it may stand; the one that overlaps
 * least with lines and other labels is taken, and among equals the one nearest to where it would rather be.
 */
import type { Size, Spots } from './label-spots';
import type { Crossings } from './occupancy';
import type { Box } from './plot-types';

export interface LabelRequest extends Size {
  readonly id: string;
  readonly spots: Spots;
}

export interface PlacedLabel extends Box {
  readonly id: string;
}

/** What overlaps cost: on a label or flag, on the cursor, and on each cell that a line crosses. */
const ON_LABEL = 400;
const ON_CURSOR = 30;
const ON_LINE = 3;
/** Another line between a label and its own, for each cell: it would seem to name that one. */
const CUT_OFF = 10;
/** Half a stroke, with what a raster adds to it, in px. */
const STROKE = 3;
/** Clear of the cursor, each side, in px. */
const CURSOR_ROOM = 4;

/** One after the other, in the order given; a label without any spot is left out. `taken` are boxes of other text. */
export function placeLabels(
  requests: readonly LabelRequest[],
  crossings: Crossings,
  taken: readonly Box[] = []
): PlacedLabel[] {
  const placed: PlacedLabel[] = [];
  const others: Box[] = [...taken];
  for (const request of requests) {
    const label = cheapest(request, crossings, others);
    if (!label) continue;
    placed.push(label);
    others.push(label);
  }
  return placed;
}

/**
 * The labels as placed, but one that the cursor runs through steps aside if there is a better spot for it.
 * The others stay where they are, so that nothing jumps about while the cursor is dragged.
 */
export function dodgeCursor(
  placed: readonly PlacedLabel[],
  requests: readonly LabelRequest[],
  crossings: Crossings,
  taken: readonly Box[],
  cursor: number
): PlacedLabel[] {
  return placed.map((label) => {
    if (!under(label, cursor)) return label;
    const request = requests.find(({ id }) => id === label.id);
    const others = [...taken, ...placed.filter((other) => other !== label)];
    return (request && cheapest(request, crossings, others, cursor)) ?? label;
  });
}

export const under = ({ x, w }: Pick<Box, 'x' | 'w'>, cursor: number): boolean => runsUnder(x, w, cursor);

/** Without a cursor it is NaN, which is over nothing. */
const runsUnder = (x: number, w: number, cursor: number): boolean =>
  x < cursor + CURSOR_ROOM && x + w > cursor - CURSOR_ROOM;

function cheapest(
  { id, w, h, spots }: LabelRequest,
  crossings: Crossings,
  others: readonly Box[],
  cursor = Number.NaN
): PlacedLabel | null {
  let least = Infinity;
  let bestX = 0;
  let bestY = 0;
  spots((x, y, own, lineX, lineY) => {
    // Costs only add up: a spot that is dearer by its place alone cannot win.
    if (own >= least) return;
    let cost = own + crossings(x - 3, y, w + 6, h) * ON_LINE;
    if (runsUnder(x, w, cursor)) cost += ON_CURSOR;
    if (lineX !== undefined && lineY !== undefined) cost += between(y, h, lineX, lineY, crossings) * CUT_OFF;
    for (const other of others) if (meets(x, y, w, h, other)) cost += ON_LABEL;
    if (cost < least) {
      least = cost;
      bestX = x;
      bestY = y;
    }
  });
  return least < Infinity ? { id, x: bestX, y: bestY, w, h } : null;
}

/** Crossings on the short way from a label to its line, whose own stroke is left out. */
function between(y: number, h: number, lineX: number, lineY: number, crossings: Crossings): number {
  const above = y < lineY;
  const top = above ? y + h : lineY + STROKE;
  const height = (above ? lineY - STROKE : y) - top;
  // Under a pixel there is no way between, only the raster of the own stroke.
  return height > 1 ? crossings(lineX - 2, top, 4, height) : 0;
}

const meets = (x: number, y: number, w: number, h: number, b: Box): boolean =>
  x < b.x + b.w + 5 && x + w > b.x - 5 && y < b.y + b.h + 2 && y + h > b.y - 2;
