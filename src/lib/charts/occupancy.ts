import type { Pixels } from './path';
import type { Box } from './plot-types';

const CELL_W = 4;
const CELL_H = 2;

/** How many cells of a box are crossed by lines; the box as numbers, since thousands are asked for. */
export type Crossings = (x: number, y: number, w: number, h: number) => number;

/**
 * Where in a panel lines run: a coarse raster, summed so that asking about a box costs the same at any size
 * (F. C. Crow, "Summed-area tables for texture mapping", SIGGRAPH 1984).
 */
export function occupancy(panel: Box, lines: readonly Pixels[]): Crossings {
  const cols = Math.max(1, Math.ceil(panel.w / CELL_W));
  const rows = Math.max(1, Math.ceil(panel.h / CELL_H));
  const stride = cols + 1;
  // Entry r, c is for the cell above and left of corner r, c; the first row and column stay nothing.
  const sums = new Int32Array(stride * (rows + 1));
  for (const line of lines) mark(line, panel, sums, cols, rows);
  for (let r = 1; r <= rows; r++) {
    let row = 0;
    for (let c = 1; c <= cols; c++) {
      const at = r * stride + c;
      row += sums[at];
      sums[at] = sums[at - stride] + row;
    }
  }
  return (x, y, w, h) => {
    const c0 = clamp(Math.floor((x - panel.x) / CELL_W), cols);
    const c1 = clamp(Math.ceil((x + w - panel.x) / CELL_W), cols);
    const r0 = clamp(Math.floor((y - panel.y) / CELL_H), rows) * stride;
    const r1 = clamp(Math.ceil((y + h - panel.y) / CELL_H), rows) * stride;
    return sums[r1 + c1] - sums[r0 + c1] - sums[r1 + c0] + sums[r0 + c0];
  };
}

const clamp = (v: number, most: number): number => Math.min(most, Math.max(0, v));

/** Each line marks a cell once for every time it passes through. */
function mark({ x, y }: Pixels, panel: Box, cells: Int32Array, cols: number, rows: number): void {
  let last = -1;
  for (let i = 1; i < x.length; i++) {
    const dx = x[i] - x[i - 1];
    const dy = y[i] - y[i - 1];
    if (!Number.isFinite(dx + dy)) continue;
    const steps = Math.max(1, Math.ceil(Math.max(Math.abs(dx) / CELL_W, Math.abs(dy) / CELL_H)));
    for (let s = i === 1 ? 0 : 1; s <= steps; s++) {
      const c = Math.floor((x[i - 1] + (dx * s) / steps - panel.x) / CELL_W);
      const r = Math.floor((y[i - 1] + (dy * s) / steps - panel.y) / CELL_H);
      if (c < 0 || c >= cols || r < 0 || r >= rows) continue;
      const cell = (r + 1) * (cols + 1) + c + 1;
      if (cell !== last) cells[cell]++;
      last = cell;
    }
  }
}
