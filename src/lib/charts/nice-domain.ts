import { extent, tickStep, ticks } from 'd3';
import { logTicks } from './log-ticks';
import type { Domain, ScaleKind, Series } from './plot-types';

export interface NiceDomain {
  readonly kind: ScaleKind;
  readonly domain: Domain;
  readonly ticks: readonly number[];
}

interface Wish {
  /** About how many steps the axis should have. */
  readonly steps?: number;
  /** The axis holds these values in any case. */
  readonly include?: readonly number[];
}

/** A linear axis that holds every finite value given and begins and ends on a round step (1, 2 or 5 of a decade). */
export function niceDomain(values: Iterable<number>, { steps = 5, include = [] }: Wish = {}): NiceDomain {
  let [low, high] = bounds(values, include, () => true) ?? [0, 1];
  if (low === high) [low, high] = [low - 1, high + 1];
  const step = tickStep(low, high, steps);
  // Counted in whole steps: 12.000000000000002 / 2 must not open a seventh.
  const domain: Domain = [Math.floor(low / step + 1e-9) * step, Math.ceil(high / step - 1e-9) * step];
  return { kind: 'linear', domain, ticks: ticks(domain[0], domain[1], (domain[1] - domain[0]) / step) };
}

/** A log axis likewise; what is not above zero has no place on it. It ends on 1, 1.5, 2, 3, 5 or 8 of a decade. */
export function niceLogDomain(values: Iterable<number>, { steps = 5, include = [] }: Wish = {}): NiceDomain {
  const [low, high] = bounds(values, include, (v) => v > 0) ?? [1, 10];
  const fine = logTicks(low / 10, high * 10, Infinity, [[1, 1.5, 2, 3, 5, 8]]);
  const domain: Domain = [
    Math.max(...fine.filter((v) => v <= low * (1 + 1e-9))),
    Math.min(...fine.filter((v) => v >= high * (1 - 1e-9) && v > low))
  ];
  return { kind: 'log', domain, ticks: logTicks(domain[0], domain[1], steps + 1) };
}

function bounds(values: Iterable<number>, include: Series, fits: (v: number) => boolean): Domain | null {
  const usable = [...values, ...include].filter((v) => Number.isFinite(v) && fits(v));
  const [low, high] = extent(usable);
  return low === undefined ? null : [low, high];
}
