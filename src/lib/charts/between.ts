import type { Pixels } from './path';

/** The part of the screen where `to` stands above `from`: two lines over the same x, with the crossings put in. */
export interface Between {
  readonly from: Pixels;
  readonly to: Pixels;
}

/**
 * Keeps only what lies above `from` and below `to`; elsewhere is a gap.
 * Both lines run straight from point to point, so where they cross between two points is known exactly.
 */
export function between(from: Pixels, to: Pixels): Between {
  const x: number[] = [];
  const low: number[] = [];
  const high: number[] = [];
  const put = (px: number, a: number, b: number) => {
    x.push(px);
    low.push(a);
    high.push(b);
  };
  const height = (i: number) => from.y[i] - to.y[i];
  for (let i = 0; i < from.x.length; i++) {
    const here = height(i);
    const before = i > 0 ? height(i - 1) : Number.NaN;
    if (before * here < 0) {
      const t = before / (before - here);
      const px = mix(from.x[i - 1], from.x[i], t);
      const py = mix(from.y[i - 1], from.y[i], t);
      put(px, py, py);
      if (here < 0) put(px, Number.NaN, Number.NaN);
    }
    if (here >= 0) put(from.x[i], from.y[i], to.y[i]);
    else if (!(before * here < 0)) put(from.x[i], Number.NaN, Number.NaN);
  }
  const pixels = (y: number[]): Pixels => ({
    x: Float64Array.from(x),
    y: Float64Array.from(y),
    ascending: from.ascending
  });
  return { from: pixels(low), to: pixels(high) };
}

const mix = (a: number, b: number, t: number): number => a + (b - a) * t;
