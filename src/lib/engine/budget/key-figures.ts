/** What every answer rests on, from one scan: limits, the tightest of them, demand, the shaped system, and whether the plan holds. */
import type { Demand, LimitMargin, System, Verdict } from './budget';
import { DEMANDED, demandFrom } from './demand';
import { maxima } from './extremes';
import { LIMITED, marginsFrom, tightest } from './limit-margins';
import type { Quantity } from './limits/limit';
import { shapingOnly, systemFrom } from './system';
import { loadTooLow, type Workings } from './workings';

const SCANNED: readonly Quantity[] = [...LIMITED, ...DEMANDED, shapingOnly];

export interface KeyFigures {
  readonly limits: readonly LimitMargin[];
  readonly verdict: Verdict;
  readonly demand: Demand;
  readonly system: System;
}

export function keyFigures(w: Workings): KeyFigures {
  const peaks = maxima(w, SCANNED, { from: w.chain.programme.lowest });
  const peakOf = (quantity: Quantity) => peaks[SCANNED.indexOf(quantity)];
  const limits = marginsFrom(w, peaks);
  const { margin, limit, worst } = tightest(limits);
  return {
    limits,
    verdict: { holds: margin >= 0 && !loadTooLow(w), margin, limit, worst },
    demand: demandFrom(w, peakOf),
    system: systemFrom(w, peakOf)
  };
}
