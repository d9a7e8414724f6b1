/** Boundaries that cancel, and peaks that ears should know of. */
import { boundaryGain, HALF_SPACE_RE_FREE_DB } from '../../room/boundary';
import { logGrid } from '../../quantity/grid';
import type { Finding } from '../budget';
import { PEAK_ACTION_DBC } from '../exposure';
import { finding, type Context } from './context';

/** dB below free field from which a hole counts (R. F. Allison, JAES 22(5), 1974, describes it; the threshold is common practice). */
const DIP_DB = 3;

/** Deepest hole of the boundaries inside the goal's band, re free field. */
export function boundaryDip({ w }: Context): Finding[] {
  const { images, c } = w.room;
  if (images.length === 0) return [];
  let depth = 0;
  let at = 0;
  for (const f of logGrid(w.chain.goal.from, w.chain.goal.to, 120)) {
    const gain = boundaryGain(images, f, c) + HALF_SPACE_RE_FREE_DB;
    if (-gain > depth) {
      depth = -gain;
      at = f;
    }
  }
  return depth >= DIP_DB ? [finding({ code: 'boundary-dip', facts: { depth } }, 'caution', at)] : [];
}

export function loudPeaks({ figures }: Context): Finding[] {
  const { peakC, peakCAt } = figures.exposure;
  return peakC > PEAK_ACTION_DBC
    ? [finding({ code: 'exposure', facts: { peakC, action: PEAK_ACTION_DBC } }, 'caution', peakCAt)]
    : [];
}
