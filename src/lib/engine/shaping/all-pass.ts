/** All-pass (ω0 − s)/(ω0 + s), or (s² − sω0/Q + ω0²)/(s² + sω0/Q + ω0²): 0 dB everywhere, −90° or −180° at the corner (circuit theory). */
import type { AllPassBlock } from './block';
import { response, type BlockResponse } from './section';

export function allPass(block: AllPassBlock): BlockResponse {
  const f0 = block.corner;
  if (block.order === 1) return response({ sections: [{ f0, b: [0, -1, 1], a: [0, 1, 1] }] });
  return response({ sections: [{ f0, b: [1, -1 / block.q, 1], a: [1, 1 / block.q, 1] }] });
}
