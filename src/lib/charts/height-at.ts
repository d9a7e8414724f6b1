import { bisectRight } from 'd3';
import type { Pixels } from './path';

/** Height of a drawn line at one x, in px; null in a gap, past its ends, or where it turns back on itself. */
export function heightAt({ x, y, ascending }: Pixels, px: number): number | null {
  const n = x.length;
  // Half a pixel of grace: the cursor at the end of the axis still meets a line that ends there.
  if (!ascending || n === 0 || px < x[0] - 0.5 || px > x[n - 1] + 0.5) return null;
  const right = Math.min(n - 1, bisectRight(x, px));
  const left = Math.max(0, right - 1);
  const span = x[right] - x[left];
  const t = span > 0 ? Math.min(1, Math.max(0, (px - x[left]) / span)) : 0;
  // On a point beside a gap the point itself is there.
  const height = t === 0 ? y[left] : t === 1 ? y[right] : y[left] + (y[right] - y[left]) * t;
  return Number.isFinite(height) ? height : null;
}
