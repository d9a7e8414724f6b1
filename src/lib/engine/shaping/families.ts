/**
 * Pole families of low-pass prototypes: each pole pair as its frequency over the corner and its Q; a real pole has q null.
 * Butterworth and Bessel are 3.01 dB down at the corner, Linkwitz–Riley 6.02 dB.
 * Sources: S. Butterworth, "On the Theory of Filter Amplifiers", Experimental Wireless 7, 1930;
 * W. E. Thomson, "Delay networks having maximally flat frequency characteristics", Proc. IEE 96(3), 1949;
 * S. Linkwitz, "Active Crossover Networks for Noncoincident Drivers", JAES 24(1), 1976.
 */
import { EngineError } from '../error';
import { bisect } from '../quantity/search';
import type { Family } from './block';

export interface Pole {
  /** Frequency over the corner. */
  readonly ratio: number;
  /** Q of the pair; null for a single real pole. */
  readonly q: number | null;
}

export function butterworth(order: number): Pole[] {
  const poles: Pole[] = order % 2 === 1 ? [{ ratio: 1, q: null }] : [];
  for (let k = 1; k <= order >> 1; k++)
    poles.push({ ratio: 1, q: 1 / (2 * Math.sin(((2 * k - 1) * Math.PI) / (2 * order))) });
  return poles;
}

/** Coefficients of the reverse Bessel polynomial, ascending powers. */
function reverseBessel(order: number): number[] {
  let previous = [1];
  let current = [1, 1];
  for (let n = 2; n <= order; n++) {
    const next = new Array<number>(n + 1).fill(0);
    for (let i = 0; i < current.length; i++) next[i] += (2 * n - 1) * current[i];
    for (let i = 0; i < previous.length; i++) next[i + 2] += previous[i];
    previous = current;
    current = next;
  }
  return current;
}

/** Roots of a real polynomial (ascending, leading coefficient 1) by the Durand–Kerner iteration (I. Durand 1960; I. Kerner 1966). */
function roots(coefficients: readonly number[]): { re: number; im: number }[] {
  const n = coefficients.length - 1;
  const radius = Math.pow(coefficients[0], 1 / n);
  const found = Array.from({ length: n }, (_, i) => ({
    re: radius * Math.cos((2 * Math.PI * i) / n + 0.4),
    im: radius * Math.sin((2 * Math.PI * i) / n + 0.4)
  }));
  for (let step = 0; step < 200; step++) {
    let moved = 0;
    for (let i = 0; i < n; i++) {
      const z = found[i];
      let re = 1;
      let im = 0;
      for (let k = n - 1; k >= 0; k--) {
        [re, im] = [re * z.re - im * z.im + coefficients[k], re * z.im + im * z.re];
      }
      let dre = 1;
      let dim = 0;
      for (let j = 0; j < n; j++) {
        if (j === i) continue;
        const x = z.re - found[j].re;
        const y = z.im - found[j].im;
        [dre, dim] = [dre * x - dim * y, dre * y + dim * x];
      }
      const size = dre * dre + dim * dim;
      const sre = (re * dre + im * dim) / size;
      const sim = (im * dre - re * dim) / size;
      z.re -= sre;
      z.im -= sim;
      moved = Math.max(moved, Math.hypot(sre, sim));
    }
    if (moved < 1e-15 * radius) break;
  }
  return found;
}

function computeBessel(order: number): Pole[] {
  const all = roots(reverseBessel(order)).filter((z) => z.im > -1e-9);
  const raw: Pole[] = all.map((z) =>
    Math.abs(z.im) < 1e-9
      ? { ratio: -z.re, q: null }
      : { ratio: Math.hypot(z.re, z.im), q: Math.hypot(z.re, z.im) / (-2 * z.re) }
  );
  // The delay-normalised form has no fixed corner: find where it is 3.01 dB down and count from there.
  const corner = bisect((x) => polesPower(raw, x) <= 0.5, 0.1, 10, 1e-15);
  return raw.map((p) => ({ ratio: p.ratio / corner, q: p.q })).sort((a, b) => (a.q ?? 0) - (b.q ?? 0));
}

/** |H|² of the low-pass with these poles at x = f/corner. */
export function polesPower(poles: readonly Pole[], x: number): number {
  let power = 1;
  for (const { ratio, q } of poles) {
    const u = x / ratio;
    power /= q === null ? 1 + u * u : (1 - u * u) ** 2 + (u / q) ** 2;
  }
  return power;
}

const besselTable = new Map<number, Pole[]>();

export function bessel(order: number): Pole[] {
  let poles = besselTable.get(order);
  if (!poles) besselTable.set(order, (poles = computeBessel(order)));
  return poles;
}

/** Poles of a family and order (Butterworth, Bessel 1–8; Linkwitz–Riley 2, 4, 6, 8). Throws `EngineError` otherwise. */
export function familyPoles(family: Family, order: number): Pole[] {
  if (!Number.isInteger(order) || order < 1 || order > 8)
    throw new EngineError(`filter order must be 1 to 8 (got ${order})`);
  if (family === 'linkwitz-riley') {
    if (order % 2 === 1) throw new EngineError(`Linkwitz–Riley order must be even (got ${order})`);
    const half = butterworth(order / 2);
    return [...half, ...half];
  }
  return family === 'bessel' ? bessel(order) : butterworth(order);
}
