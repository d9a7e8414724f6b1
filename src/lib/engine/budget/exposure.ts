/**
 * What the subwoofer alone says about hearing: long-term A-weighted level and the C-weighted peak.
 * Sources: IEC 61672-1, 2013 (weightings); NIOSH, "Criteria for a Recommended Standard: Occupational Noise Exposure", 98-126, 1998
 * (8 h at 85 dB(A), 3 dB exchange); Directive 2003/10/EC (lower action value of the peak, from memory).
 */
import { goldenMaximum } from '../quantity/search';
import { SINE_CREST } from '../quantity/decibel';
import { logGrid } from '../quantity/grid';
import { weightingA, weightingCPower } from '../quantity/weighting';
import type { Exposure, LedgerRow } from './budget';
import { HIGHEST_HZ } from './extremes';
import { flatLevel, shapedPower, type Workings } from './workings';

/** dB(C) peak: lower exposure action value of Directive 2003/10/EC (from memory). */
export const PEAK_ACTION_DBC = 135;

const POINTS = 60;

export function exposure(w: Workings, rows: readonly LedgerRow[]): Exposure {
  let levelA: number | null = null;
  for (const row of rows) {
    if (row.wanted === null) continue;
    const a = row.delivered + weightingA(row.f) - (w.chain.programme.crest - SINE_CREST);
    if (levelA === null || a > levelA) levelA = a;
  }
  const powerAt = (f: number) => shapedPower(w, f) * weightingCPower(f);
  const grid = logGrid(w.chain.programme.lowest, HIGHEST_HZ, POINTS);
  let best = 0;
  let most = -Infinity;
  grid.forEach((f, i) => {
    const power = powerAt(f);
    if (power > most) {
      most = power;
      best = i;
    }
  });
  const fine = goldenMaximum(
    powerAt,
    grid[Math.max(0, best - 1)],
    grid[Math.min(POINTS - 1, best + 1)],
    1e-4
  );
  const peak = fine.value > most ? fine : { x: grid[best], value: most };
  return {
    levelA,
    hours: levelA === null ? null : 8 * Math.pow(2, (85 - levelA) / 3),
    peakC: 10 * Math.log10(peak.value) + flatLevel(w) + SINE_CREST,
    peakCAt: peak.x
  };
}
