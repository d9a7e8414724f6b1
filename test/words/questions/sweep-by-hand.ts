/** Sweeps and reports made by hand: round margins, so that every edge can be worked out on paper. */
import type { LimitName } from '$lib/engine/budget/budget';
import type { Sweep, SweepRow } from '$lib/engine/budget/sweep-types';
import { report } from '$lib/words/report';
import { budget, chain, plan } from '../specimen';

export type Margins = SweepRow['margins'];

/** 20 dB in hand of everything, but for what is given. */
export const margins = (some: Partial<Margins>): Margins => ({
  'amplifier-voltage': 20,
  'amplifier-current': 20,
  'cone-travel': 20,
  'mechanical-stop': 20,
  'coil-heat': null,
  ...some
});

export const row = (value: number, some: Partial<Margins>): SweepRow => {
  const all = margins(some);
  const known = (Object.entries(all) as [LimitName, number | null][]).filter(([, m]) => m !== null);
  const [limit, least] = known.reduce((a, b) => ((b[1] as number) < (a[1] as number) ? b : a));
  return {
    value,
    qtc: 0.8,
    fc: 40,
    alignmentF3: 36.5,
    systemF3: 17.25,
    shapingBoost: 6,
    ratedW: 961,
    peakV: 100,
    peakA: 25,
    travel: 0.0277,
    margins: all,
    limit,
    worst: 18,
    holds: (least as number) >= 0
  };
};

const OVER = { net_L: 'volume', boost_to_Hz: 'boost', boost_gain_dB: 'boost', level_dB: 'level' } as const;

/** `values` in SI; `of` gives the margins that matter at each. */
export function sweepOf(
  column: Sweep['column'],
  values: readonly number[],
  of: (value: number) => Partial<Margins>,
  answers: Partial<Pick<Sweep, 'answer' | 'amplifierAnswer'>> = {}
): Sweep {
  const rows = values.map((value) => row(value, of(value)));
  return { over: OVER[column], column, block: null, rows, answer: null, amplifierAnswer: null, ...answers };
}

export const reportOf = (over: Parameters<typeof budget>[0] = {}) => report(plan, chain, budget(over));
