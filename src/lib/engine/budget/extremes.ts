/**
 * The largest value of each quantity over a band: at least 400 log-spaced points in one pass, ends included, then each maximum refined
 * between the neighbours of its best point (golden section, to 1e-5 of the frequency): a peak of Q 11 would else be missed by 0.05 dB.
 * The resonances of box and shaping are points of their own.
 */
import { circuitPoint, solveCircuit } from '../box/circuit';
import { goldenMaximum } from '../quantity/search';
import { cascadePower } from '../shaping/cascade';
import type { Quantity } from './limits/limit';
import type { Workings } from './workings';

export const HIGHEST_HZ = 500;
export const EXTREME_POINTS = 400;

export interface Peak {
  /** Hz. */
  readonly f: number;
  /** The quantity (squared, or a power) with the master drive and shaping. */
  readonly value: number;
}

export interface ScanOptions {
  readonly from: number;
  readonly to?: number;
  readonly points?: number;
  /** Without refinement the result is a quick look, good for searching, not for reporting. */
  readonly refine?: boolean;
}

export function maxima(w: Workings, quantities: readonly Quantity[], options: ScanOptions): Peak[] {
  const { from, to = HIGHEST_HZ, points = EXTREME_POINTS, refine = true } = options;
  const point = circuitPoint();
  const n = quantities.length;
  const best = new Float64Array(n).fill(-Infinity);
  const bestIndex = new Int32Array(n);
  const grid = gridWith(w.landmarks, from, to, points);
  for (let i = 0; i < grid.length; i++) {
    const f = grid[i];
    solveCircuit(w.circuit, f, point);
    const shaped = cascadePower(w.cascade, f);
    for (let k = 0; k < n; k++) {
      const value = shaped * quantities[k](point);
      if (value > best[k]) {
        best[k] = value;
        bestIndex[k] = i;
      }
    }
  }
  const drive2 = w.masterDrive * w.masterDrive;
  return quantities.map((quantity, k) => {
    const i = bestIndex[k];
    const coarse = { f: grid[i], value: best[k] * drive2 };
    if (!refine) return coarse;
    const fine = goldenMaximum(
      (x) => {
        solveCircuit(w.circuit, x, point);
        return cascadePower(w.cascade, x) * quantity(point);
      },
      grid[Math.max(0, i - 1)],
      grid[Math.min(grid.length - 1, i + 1)]
    );
    return fine.value > best[k] ? { f: fine.x, value: fine.value * drive2 } : coarse;
  });
}

/** A logarithmic grid from `from` to `to` with the landmarks (ascending, Hz) between its points: a narrow peak cannot slip through. */
function gridWith(landmarks: readonly number[], from: number, to: number, points: number): Float64Array {
  const inside = landmarks.filter((f) => f > from && f < to);
  const grid = new Float64Array(points + inside.length);
  const ratio = Math.pow(to / from, 1 / (points - 1));
  let f = from;
  let next = 0;
  let filled = 0;
  for (let i = 0; i < points; i++) {
    if (i === points - 1) f = to;
    while (next < inside.length && inside[next] < f) grid[filled++] = inside[next++];
    grid[filled++] = f;
    f *= ratio;
  }
  return grid;
}
