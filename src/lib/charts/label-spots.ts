import { polygonContains } from 'd3';
import type { Between } from './between';
import type { Pixels } from './path';
import type { Box } from './plot-types';
import { heightAt } from './height-at';

/**
 * Called with a place where a label may stand (its top left corner, px) and what it costs beside the overlaps; for a line
 * also with the point of it that the label stands by.
 */
export type VisitSpot = (x: number, y: number, cost: number, lineX?: number, lineY?: number) => void;
/** Goes through a label's places. There are thousands, and the pictures are drawn while a finger drags: none is kept. */
export type Spots = (visit: VisitSpot) => void;

export interface Size {
  readonly w: number;
  readonly h: number;
}

/** From one place that is tried to the next, in px. */
const STRIDE = 8;
/** Cost of standing a whole panel width away from where the label would rather be. */
const FAR = 26;
/** Clear of the frame, sideways and upright. */
const SIDE = 6;
const END = 3;

const inside = (panel: Box, x: number, y: number, { w, h }: Size): boolean =>
  x >= panel.x + SIDE &&
  x + w <= panel.x + panel.w - SIDE &&
  y >= panel.y + END &&
  y + h <= panel.y + panel.h - END;

/** From the line to a label's top edge: close above, close below, and one step further off. */
const lifts = (h: number) => [
  { dy: -h - 3, below: false, far: 0 },
  { dy: 5, below: true, far: 0 },
  { dy: -h - 8, below: false, far: 1.5 },
  { dy: 10, below: true, far: 1.5 }
];
const ANCHORS = [0.5, 0, 1];

/** Along a line: above and below it, centred on its points or beginning or ending there. */
export function lineSpots(
  { x, y }: Pixels,
  panel: Box,
  size: Size,
  { near = panel.x + panel.w / 2, side = 'above' }: { near?: number; side?: 'above' | 'below' } = {}
): Spots {
  const places = lifts(size.h).map(({ dy, below, far }) => ({
    dy,
    extra: far + (below === (side === 'below') ? 0 : 1)
  }));
  return (visit) => {
    const at = (px: number, py: number) => {
      if (!(py > panel.y + 2 && py < panel.y + panel.h - 2)) return;
      const off = (Math.abs(px - near) / panel.w) * FAR;
      for (const { dy, extra } of places) {
        for (const anchor of ANCHORS) {
          const left = px - anchor * size.w;
          if (inside(panel, left, py + dy, size)) visit(left, py + dy, off + extra, px, py);
        }
      }
    };
    let walked = STRIDE;
    for (let i = 1; i < x.length; i++) {
      const dx = x[i] - x[i - 1];
      const dy = y[i] - y[i - 1];
      const length = Math.hypot(dx, dy);
      if (!Number.isFinite(length)) continue;
      for (; walked <= length; walked += STRIDE) {
        at(x[i - 1] + (dx * walked) / length, y[i - 1] + (dy * walked) / length);
      }
      walked -= length;
    }
  };
}

/** Within what is hatched: as far left as it fits, close under the upper edge or close over the lower one. */
export function regionSpots({ from, to }: Between, panel: Box, size: Size): Spots {
  return (visit) => {
    for (let x = panel.x + 10; x + size.w <= panel.x + panel.w - SIDE; x += STRIDE) {
      let top = panel.y;
      let bottom = panel.y + panel.h;
      for (let px = x - 3; px <= x + size.w + 3; px += STRIDE) {
        top = Math.max(top, heightAt(to, px) ?? Number.NaN);
        bottom = Math.min(bottom, heightAt(from, px) ?? Number.NaN);
      }
      // A gap gives NaN, which fits nothing.
      if (!(bottom - top >= size.h + 8)) continue;
      const cost = ((x - panel.x) / panel.w) * FAR;
      visit(x, top + 5, cost);
      visit(x, bottom - size.h - 5, cost + 2);
    }
  };
}

/** Within a closed outline: as far right and as low as it fits, out of the way of what happens at its edge. */
export function outlineSpots({ x, y }: Pixels, panel: Box, size: Size): Spots {
  const outline = [...x.keys()]
    .filter((i) => Number.isFinite(y[i]))
    .map((i): [number, number] => [x[i], y[i]]);
  return (visit) => {
    for (let left = panel.x + panel.w - size.w - 10; left > panel.x + SIDE; left -= 4 * STRIDE) {
      for (let top = panel.y + panel.h - size.h - 6; top > panel.y + END; top -= 4 * STRIDE) {
        const corners: [number, number][] = [
          [left - 4, top - 3],
          [left + size.w + 4, top - 3],
          [left - 4, top + size.h + 3],
          [left + size.w + 4, top + size.h + 3]
        ];
        if (!corners.every((corner) => polygonContains(outline, corner))) continue;
        const off = (panel.x + panel.w - left) / panel.w + (panel.y + panel.h - top) / panel.h;
        visit(left, top, off * FAR);
      }
    }
  };
}

/** Beside or within a tinted range: inside it if it fits, else just left or right of it; high up, or lower down. */
export function rangeSpots(range: Box, panel: Box, size: Size): Spots {
  const places = [
    { x: range.x + 10, cost: 0, fits: size.w + 16 <= range.w },
    { x: range.x - size.w - 8, cost: 4, fits: true },
    { x: range.x + range.w + 8, cost: 4, fits: true }
  ].filter(({ fits }) => fits);
  return (visit) => {
    for (let y = range.y + 5; y <= range.y + range.h - size.h - 6; y += STRIDE) {
      const low = ((y - range.y) / range.h) * 10;
      for (const { x, cost } of places) if (inside(panel, x, y, size)) visit(x, y, cost + low);
    }
  };
}
