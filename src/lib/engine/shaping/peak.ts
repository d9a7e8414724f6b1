/**
 * Peak (or dip): (S² + S·A/Q + 1)/(S² + S/(A·Q) + 1), A = 10^(G/40): G dB at the centre, 0 at 0 Hz and far above.
 * Source: "Audio EQ Cookbook", W3C Working Group Note, 2021, analogue prototype.
 */
import type { PeakBlock } from './block';
import { response, type BlockResponse } from './section';

export function peak(block: PeakBlock): BlockResponse {
  const a = Math.pow(10, block.gain / 40);
  return response({ sections: [{ f0: block.centre, b: [1, a / block.q, 1], a: [1, 1 / (a * block.q), 1] }] });
}
