/** Margins of every limit that can be judged. */
import type { LimitMargin, LimitName } from './budget';
import { maxima, type Peak, type ScanOptions } from './extremes';
import { LIMITS } from './limits/all-limits';
import { current, terminalVolts, travel, type Quantity } from './limits/limit';
import type { Workings } from './workings';

/** The quantities limits speak of; each is scanned once, however many limits share it. */
export const LIMITED: readonly Quantity[] = [
  ...new Set([terminalVolts, current, travel, ...LIMITS.map((l) => l.quantity)])
];

/** dB from demanded (squared) up to allowed. */
export const marginDb = (allowed: number, demanded2: number): number =>
  10 * Math.log10((allowed * allowed) / demanded2);

/** Margins from the peaks of `LIMITED`, in its order. */
export function marginsFrom(w: Workings, peaks: readonly Peak[]): LimitMargin[] {
  const margins: LimitMargin[] = [];
  for (const { name, quantity, allowed } of LIMITS) {
    const most = allowed(w);
    if (most === null) continue;
    const peak = peaks[LIMITED.indexOf(quantity)];
    margins.push({
      limit: name,
      worst: peak.f,
      margin: marginDb(most, peak.value),
      allowed: most,
      demanded: Math.sqrt(peak.value)
    });
  }
  return margins;
}

export const limitMargins = (w: Workings, options: ScanOptions): LimitMargin[] =>
  marginsFrom(w, maxima(w, LIMITED, options));

export const notJudged = (w: Workings): LimitName[] =>
  LIMITS.filter((l) => l.allowed(w) === null).map((l) => l.name);

/** The tightest limit. There is always one: an amplifier has at least one rating. */
export function tightest(margins: readonly LimitMargin[]): LimitMargin {
  let best = margins[0];
  for (const m of margins) if (m.margin < best.margin) best = m;
  return best;
}
