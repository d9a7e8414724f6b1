/** Responses of shaping blocks as the checks read them. */
import type { Block, Family, PassBlock } from '$lib/engine/shaping/block';
import { cascadePhase, cascadePower, compileCascade } from '$lib/engine/shaping/cascade';

export const PLAIN = { bypass: false, fixed: false } as const;
const NO_BOX = { fc: NaN, qtc: NaN };

export const passBlock = (
  kind: PassBlock['kind'],
  family: Family,
  order: number,
  corner: number
): PassBlock => ({ kind, family, order, corner, ...PLAIN });

export const cascade = (...blocks: Block[]) => compileCascade(blocks, NO_BOX);
/** dB, and degrees as the sections add them up. */
export const db = (f: number, ...blocks: Block[]): number =>
  10 * Math.log10(cascadePower(cascade(...blocks), f));
export const degrees = (f: number, ...blocks: Block[]): number =>
  (cascadePhase(cascade(...blocks), f) * 180) / Math.PI;

export const KINDS = ['low-pass', 'high-pass'] as const;
/** As good as 0 Hz. */
export const ZERO_HZ = 1e-6;
