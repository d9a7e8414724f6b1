/**
 * Linkwitz transform H = (s² + s·ω0/Q0 + ω0²)/(s² + s·ωp/Qp + ωp²): 40·log10(f0/fp) dB at 0 Hz, 0 dB far above.
 * Source: S. Linkwitz, "Loudspeaker System Design", Wireless World, 1978.
 */
import type { LinkwitzTransformBlock } from './block';
import { response, type BlockResponse } from './section';

/** What `"box"` binds to: the computed closed box. */
export interface BoxPole {
  readonly fc: number;
  readonly qtc: number;
}

export function linkwitzTransform(block: LinkwitzTransformBlock, box: BoxPole): BlockResponse {
  const f0 = block.from === 'box' ? box.fc : block.from;
  const q0 = block.fromQ === 'box' ? box.qtc : block.fromQ;
  const x = f0 / block.to;
  return response({ sections: [{ f0: block.to, b: [1, x / q0, x * x], a: [1, 1 / block.toQ, 1] }] });
}

/** dB the transform lifts at 0 Hz. */
export const transformLift = (block: LinkwitzTransformBlock, box: BoxPole): number =>
  40 * Math.log10((block.from === 'box' ? box.fc : block.from) / block.to);
