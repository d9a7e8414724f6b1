/** Which block of the shaping the boost question is about. The same choice as the engine's sweep makes. */
import type { Chain } from '$lib/engine/chain';
import type { Block } from '$lib/engine/shaping/block';

export type SweptBlock =
  | { readonly kind: 'transform' | 'shelf'; readonly index: number; readonly value: number }
  /** No block is there yet: a transform is tried, put last. */
  | { readonly kind: 'none'; readonly index: number };

/** Flattest target of a transform, as the sweep tries it. */
export const TRIAL_Q = 0.707;

/** The first transform that is not bypassed (Hz), else the first such low shelf (dB). */
export function sweptBlock({ shaping }: Pick<Chain, 'shaping'>): SweptBlock {
  const first = (kind: Block['kind']) => shaping.findIndex((b) => b.kind === kind && !b.bypass);
  const transform = shaping[first('linkwitz-transform')];
  if (transform?.kind === 'linkwitz-transform')
    return { kind: 'transform', index: shaping.indexOf(transform), value: transform.to };
  const shelf = shaping[first('low-shelf')];
  if (shelf?.kind === 'low-shelf') return { kind: 'shelf', index: shaping.indexOf(shelf), value: shelf.gain };
  return { kind: 'none', index: shaping.length };
}

/** The transform that is tried where there is none, as the engine has it. */
export const trialBlock = (to: number): Block => ({
  kind: 'linkwitz-transform',
  from: 'box',
  fromQ: 'box',
  to,
  toQ: TRIAL_Q,
  bypass: false,
  fixed: false
});
