import { EngineError } from '../error';

/** `points` frequencies (Hz) evenly spaced in log f from `from` to `to`, ends exact. */
export function logGrid(from: number, to: number, points: number): Float64Array {
  if (!(from > 0 && to > from)) throw new EngineError(`grid needs 0 < from < to (got ${from} to ${to})`);
  if (!(points >= 2)) throw new EngineError(`grid needs at least 2 points (got ${points})`);
  const grid = new Float64Array(points);
  const step = Math.log(to / from) / (points - 1);
  for (let i = 0; i < points; i++) grid[i] = from * Math.exp(step * i);
  grid[0] = from;
  grid[points - 1] = to;
  return grid;
}

/** `points` values evenly spaced from `from` to `to`, ends exact. */
export function linearGrid(from: number, to: number, points: number): Float64Array {
  if (!(to > from)) throw new EngineError(`range needs from < to (got ${from} to ${to})`);
  if (!(points >= 2)) throw new EngineError(`range needs at least 2 points (got ${points})`);
  const grid = new Float64Array(points);
  for (let i = 0; i < points; i++) grid[i] = from + ((to - from) * i) / (points - 1);
  grid[points - 1] = to;
  return grid;
}

export interface ThirdOctave {
  /** ISO 266 nominal frequency, Hz. */
  readonly nominal: number;
  /** 10^(k/10) Hz exactly. */
  readonly f: number;
}

/**
 * One-third-octave centres k = 10…21, base ten.
 * Source: IEC 61260-1, "Octave-band and fractional-octave-band filters – Part 1", 2014; names: ISO 266, "Preferred frequencies", 1997.
 */
export const THIRD_OCTAVES: readonly ThirdOctave[] = [
  10, 12.5, 16, 20, 25, 31.5, 40, 50, 63, 80, 100, 125
].map((nominal, i) => ({ nominal, f: Math.pow(10, (10 + i) / 10) }));
