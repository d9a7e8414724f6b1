import { area, line } from 'd3';
import type { Scale } from './make-scale';
import type { Series } from './plot-types';

/** The scales of a panel and the height of its frame, whose top edge is at `top`. */
export interface Screen {
  readonly x: Scale;
  readonly y: Scale;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** A line on the screen. A gap has NaN for y; `ascending` says that every x stands right of the one before it. */
export interface Pixels {
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly ascending: boolean;
}

/** Drawing far outside the frame costs and shows nothing: lines are cut at this many heights beyond it. */
const BEYOND = 4;

/** Points without a place in x are dropped; without a place in y they are gaps. */
export function toPixels(xs: Series, ys: Series, screen: Screen): Pixels {
  const n = Math.min(xs.length, ys.length);
  const x = new Float64Array(n);
  const y = new Float64Array(n);
  const beyond = (screen.bottom - screen.top) * BEYOND;
  let kept = 0;
  let ascending = true;
  for (let i = 0; i < n; i++) {
    const px = screen.x(xs[i]);
    if (!Number.isFinite(px)) continue;
    if (kept > 0 && !(px > x[kept - 1])) ascending = false;
    x[kept] = px;
    y[kept] = within(screen.y(ys[i]), screen.top - beyond, screen.bottom + beyond);
    kept++;
  }
  return { x: x.subarray(0, kept), y: y.subarray(0, kept), ascending };
}

const within = (px: number, low: number, high: number): number =>
  Number.isFinite(px) ? Math.min(high, Math.max(low, px)) : Number.NaN;

/** A level line from edge to edge. */
export const levelPixels = (at: number, screen: Screen): Pixels => ({
  x: Float64Array.of(screen.left, screen.right),
  y: Float64Array.of(screen.y(at), screen.y(at)),
  ascending: true
});

/** The stroke of a line, broken at its gaps. */
export function linePath({ x, y }: Pixels): string {
  const stroke = line<number>(
    (px) => px,
    (_, i) => y[i]
  )
    .digits(1)
    .defined((_, i) => Number.isFinite(y[i]));
  return stroke(x) ?? '';
}

/** The outline of a closed shape; gaps are left out. */
export function outlinePath({ x, y }: Pixels): string {
  const points = [...x.keys()].filter((i) => Number.isFinite(y[i]));
  const stroke = line<number>(
    (i) => x[i],
    (i) => y[i]
  ).digits(1);
  return points.length > 2 ? `${stroke(points)}Z` : '';
}

/** The fill between two lines over the same x, broken where either has a gap. */
export function bandPath({ x, y }: Pixels, other: Pixels): string {
  const fill = area<number>(
    (px) => px,
    (_, i) => other.y[i],
    (_, i) => y[i]
  )
    .digits(1)
    .defined((_, i) => Number.isFinite(y[i]) && Number.isFinite(other.y[i]));
  return fill(x) ?? '';
}

/** Short ticks down at both ends of a line: the wanted level spans this and no more. */
export function endTicks({ x, y }: Pixels, length = 7): string {
  const solid = [...x.keys()].filter((i) => Number.isFinite(y[i]));
  if (solid.length < 2) return '';
  return [solid[0], solid[solid.length - 1]].map((i) => `M${round(x[i])},${round(y[i])}v${length}`).join('');
}

const round = (px: number): number => Math.round(px * 10) / 10;
