/** Low-pass and high-pass of every family and order. High-pass: s/ω → ω/s of the low-pass so normalised. */
import type { PassBlock } from './block';
import { familyPoles } from './families';
import { response, type BlockResponse, type Section } from './section';

export function pass(block: PassBlock): BlockResponse {
  const low = block.kind === 'low-pass';
  const sections = familyPoles(block.family, block.order).map(({ ratio, q }): Section => {
    const f0 = block.corner;
    if (q === null) {
      return low ? { f0, b: [0, 0, 1], a: [0, 1 / ratio, 1] } : { f0, b: [0, 1, 0], a: [0, 1, 1 / ratio] };
    }
    const square = 1 / (ratio * ratio);
    const damping = 1 / (ratio * q);
    return low
      ? { f0, b: [0, 0, 1], a: [square, damping, 1] }
      : { f0, b: [1, 0, 0], a: [1, damping, square] };
  });
  return response({ sections });
}
