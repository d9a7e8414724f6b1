/** A section by its coefficients, S = jf/(1 Hz). */
import type { SectionBlock } from './block';
import { response, type BlockResponse } from './section';

export const rawSection = (block: SectionBlock): BlockResponse =>
  response({ sections: [{ f0: 1, b: block.b, a: block.a }] });

/**
 * Whether a section's output would grow or ring without end: a pole with a positive real part, a pair on the axis away from 0 Hz,
 * or no denominator at all. A pole at 0 Hz (an integrator) is left be: it is finite wherever there is sound.
 */
export function isUnstable(a: readonly [number, number, number]): boolean {
  const [a0, a1, a2] = a;
  if (a0 === 0 && a1 === 0) return a2 === 0;
  if (a0 === 0) return a2 / a1 < 0;
  const sum = a1 / a0;
  const product = a2 / a0;
  return sum < 0 || product < 0 || (sum === 0 && product > 0);
}
