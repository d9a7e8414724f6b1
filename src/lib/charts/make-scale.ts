import { scaleLinear, scaleLog } from 'd3';
import type { Domain, ScaleKind } from './plot-types';

/** Data to pixels and back. A value that has no place (NaN, or nothing and less on a log scale) gives no finite pixel. */
export interface Scale {
  (value: number): number;
  invert(px: number): number;
  ticks(count?: number): number[];
}

export function makeScale(kind: ScaleKind, domain: Domain, range: Domain): Scale {
  const scale = kind === 'log' ? scaleLog(domain, range) : scaleLinear(domain, range);
  const bend = kind === 'log' ? Math.log : (value: number) => value;
  const low = bend(domain[0]);
  const slope = (range[1] - range[0]) / (bend(domain[1]) - low);
  // A drag places tens of thousands of points, so the two kinds there are go without d3's general way.
  return Object.assign((value: number) => range[0] + (bend(value) - low) * slope, {
    invert: (px: number) => scale.invert(px),
    ticks: (count?: number) => scale.ticks(count)
  });
}
