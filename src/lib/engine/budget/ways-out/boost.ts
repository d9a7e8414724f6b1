import type { Block } from '../../shaping/block';
import { linearGrid, logGrid } from '../../quantity/grid';
import type { WayOut } from '../budget';
import { deliveredLevel, withShaping, type Workings } from '../workings';
import { cures, firstPassing, offer, settle, type Cure } from './cure';

/** Less boost, just so much that the cure is met: a transform's target higher, or a shelf's gain lower. */
export function boostWayOut(w: Workings, cure: Cure): WayOut | null {
  const { shaping, goal } = w.chain;
  const index = shaping.findIndex(
    (b) =>
      !b.bypass && !b.fixed && (b.kind === 'linkwitz-transform' || (b.kind === 'low-shelf' && b.gain > 0))
  );
  if (index < 0) return null;
  const block = shaping[index];
  const at = (edited: Block) =>
    withShaping(
      w,
      shaping.map((b, i) => (i === index ? edited : b))
    );
  const givesUp = (edited: Block) =>
    Math.max(0, deliveredLevel(w, goal.from) - deliveredLevel(at(edited), goal.from));
  if (block.kind === 'linkwitz-transform') {
    const to = (value: number): Block => ({ ...block, to: value });
    const most = Math.min(200, 3 * w.alignment.fc);
    if (!(most > block.to)) return null;
    const passes = (value: number) => cures(at(to(value)), cure, true);
    const first = firstPassing(Array.from(logGrid(block.to, most, 24)), passes, 0.05);
    const value = first === null ? null : settle(first, 0.5, 'up', (v) => cures(at(to(v)), cure));
    if (value === null) return null;
    return offer(w, 'transform', [{ set: 'block-to', block: index, value }], {
      value,
      before: block.to,
      givesUp: givesUp(to(value))
    });
  }
  if (block.kind !== 'low-shelf') return null;
  const gain = (value: number): Block => ({ ...block, gain: value });
  const downward = Array.from(linearGrid(0, block.gain, 20)).reverse();
  const first = firstPassing(downward, (v) => cures(at(gain(v)), cure, true), 0.02);
  const value = first === null ? null : settle(first, 0.1, 'down', (v) => cures(at(gain(v)), cure));
  if (value === null || value < -1e-9) return null;
  return offer(w, 'shelf', [{ set: 'block-gain', block: index, value }], {
    value,
    before: block.gain,
    givesUp: givesUp(gain(value))
  });
}
