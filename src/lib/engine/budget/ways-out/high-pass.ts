import type { Block } from '../../shaping/block';
import { logGrid } from '../../quantity/grid';
import type { Change, WayOut } from '../budget';
import { addedHighPass } from '../change';
import { deliveredLevel, withShaping, type Workings } from '../workings';
import { cures, firstPassing, offer, settle, type Cure } from './cure';

const STEP_HZ = 0.1;

interface Candidate {
  readonly change: (corner: number) => Change;
  readonly shaping: (corner: number) => Block[];
  readonly from: number;
  readonly before: number | null;
  readonly order: number;
}

/** The high-pass that is there, made steeper no more than it is; else a new one of second or fourth order. */
function candidates(w: Workings): Candidate[] {
  const { shaping } = w.chain;
  const index = shaping.findIndex((b) => b.kind === 'high-pass' && !b.bypass && !b.fixed);
  const existing = shaping[index];
  if (existing?.kind === 'high-pass')
    return [
      {
        change: (value) => ({ set: 'block-corner', block: index, value }),
        shaping: (corner) => shaping.map((b, i) => (i === index ? { ...existing, corner } : b)),
        from: existing.corner,
        before: existing.corner,
        order: existing.order
      }
    ];
  return [2, 4].map((order) => ({
    change: (value) => ({ set: 'add-high-pass', order, value }),
    shaping: (corner) => [...shaping, addedHighPass(order, corner)],
    from: 5,
    before: null,
    order
  }));
}

/** Of the candidates that meet the cure with their smallest corner, the one that gives up least at the bottom of the goal's band. */
export function highPassWayOut(w: Workings, cure: Cure): WayOut | null {
  const { pivot, from: bottom } = w.chain.goal;
  let best: { candidate: Candidate; corner: number; givesUp: number } | null = null;
  for (const candidate of candidates(w)) {
    const highest = 0.9 * pivot;
    if (!(highest > candidate.from * 1.001)) continue;
    const at = (corner: number) => withShaping(w, candidate.shaping(corner));
    const values = Array.from(logGrid(candidate.from, highest, 24));
    const corner = firstPassing(values, (f) => cures(at(f), cure, true), STEP_HZ / 8);
    if (corner === null) continue;
    const settled = settle(corner, STEP_HZ, 'up', (f) => cures(at(f), cure));
    if (settled === null || settled <= candidate.from) continue;
    const givesUp = deliveredLevel(w, bottom) - deliveredLevel(at(settled), bottom);
    if (best === null || givesUp < best.givesUp) best = { candidate, corner: settled, givesUp };
  }
  if (best === null) return null;
  const { candidate, corner, givesUp } = best;
  return offer(w, 'high-pass', [candidate.change(corner)], {
    value: corner,
    before: candidate.before,
    order: candidate.order,
    givesUp: Math.max(0, givesUp)
  });
}
