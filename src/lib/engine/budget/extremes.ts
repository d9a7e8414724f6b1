/**
 * The largest value of each quantity over a band: at least 400 log-spaced points in one pass, ends included, then each maximum refined
 * between the neighbours of its best point (golden section, to 1e-5 of the frequency): a peak of Q 11 would else be missed by 0.05 dB.
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
  const ratio = Math.pow(to / from, 1 / (points - 1));
  const grid = new Float64Array(points);
  let f = from;
  for (let i = 0; i < points; i++) {
    if (i === points - 1) f = to;
    grid[i] = f;
    solveCircuit(w.circuit, f, point);
    const shaped = cascadePower(w.cascade, f);
    for (let k = 0; k < n; k++) {
      const value = shaped * quantities[k](point);
      if (value > best[k]) {
        best[k] = value;
        bestIndex[k] = i;
      }
    }
    f *= ratio;
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
      grid[Math.min(points - 1, i + 1)]
    );
    return fine.value > best[k] ? { f: fine.x, value: fine.value * drive2 } : coarse;
  });
}
