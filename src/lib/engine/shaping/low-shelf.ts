/**
 * Low shelf. First order H = (s + ω√g)/(s + ω/√g), g = 10^(G/20): G dB at 0 Hz, G/2 at the corner, 0 far above (derived form).
 * Second order: A·(S² + S√A/Q + A)/(A·S² + S√A/Q + 1), A = 10^(G/40):
 * "Audio EQ Cookbook", W3C Working Group Note, 2021, analogue prototype.
 */
import type { LowShelfBlock } from './block';
import { response, type BlockResponse } from './section';

export function lowShelf(block: LowShelfBlock): BlockResponse {
  const f0 = block.corner;
  if (block.order === 1) {
    const root = Math.pow(10, block.gain / 40);
    return response({ sections: [{ f0, b: [0, 1, root], a: [0, 1, 1 / root] }] });
  }
  const a = Math.pow(10, block.gain / 40);
  const middle = Math.sqrt(a) / block.q;
  return response({ sections: [{ f0, b: [a, a * middle, a * a], a: [a, middle, 1] }] });
}
