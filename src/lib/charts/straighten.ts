import type { Pixels } from './path';

/** A point this near to the straight line between its neighbours, in px, cannot be seen to be missing. */
const UNSEEN = 0.1;

/** A line without the points that it does not need: the smooth curves drawn here keep about one in ten. */
export function straighten(line: Pixels): Pixels {
  return line.ascending ? pick(line, needed(line)) : line;
}

/** Two lines over the same x, kept over the same x. */
export function straightenPair(a: Pixels, b: Pixels): [Pixels, Pixels] {
  if (!a.ascending || !b.ascending) return [a, b];
  const keep = needed(a);
  const other = needed(b);
  for (let i = 0; i < keep.length; i++) keep[i] |= other[i];
  return [pick(a, keep), pick(b, keep)];
}

/**
 * Marks the points to keep. From the last kept point a sleeve of directions stays open in which a straight line passes
 * all points since; the first point outside it makes the one before it kept.
 */
function needed({ x, y }: Pixels): Uint8Array {
  const n = x.length;
  const keep = new Uint8Array(n);
  let from = -1;
  let low = 0;
  let high = 0;
  const begin = (i: number) => {
    keep[i] = 1;
    from = i;
    low = -Infinity;
    high = Infinity;
  };
  for (let i = 0; i < n; i++) {
    const gap = !Number.isFinite(y[i]);
    if (gap || from < 0) {
      if (i > 0) keep[i - 1] = 1;
      begin(i);
      if (gap) from = -1;
      continue;
    }
    const dx = x[i] - x[from];
    // Two points over one another (a crossing, a step) are both needed.
    if (!(dx > 0)) {
      begin(i);
      continue;
    }
    const slope = (y[i] - y[from]) / dx;
    if (slope < low || slope > high) begin(i - 1);
    const reach = x[i] - x[from];
    if (!(reach > 0)) {
      begin(i);
      continue;
    }
    const rise = y[i] - y[from];
    low = Math.max(low, (rise - UNSEEN) / reach);
    high = Math.min(high, (rise + UNSEEN) / reach);
  }
  if (n > 0) keep[n - 1] = 1;
  return keep;
}

function pick({ x, y, ascending }: Pixels, keep: Uint8Array): Pixels {
  const kept = (_: number, i: number) => keep[i] === 1;
  return { x: x.filter(kept), y: y.filter(kept), ascending };
}
