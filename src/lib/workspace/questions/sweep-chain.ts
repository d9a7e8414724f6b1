/** What a sweep depends on: the chain without the swept value. Two chains that differ in nothing else have the same sweep. */
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';
import { sweptBlock, trialBlock } from './swept-block';

export function sweepBasis(chain: Chain, over: SweepOver): string {
  return JSON.stringify(without(chain, over));
}

function without(chain: Chain, over: SweepOver): Chain {
  switch (over) {
    case 'volume':
      return { ...chain, box: { ...chain.box, net: null, inner: null } };
    case 'level':
      return { ...chain, goal: { ...chain.goal, level: 0 } };
    case 'boost': {
      const { kind, index } = sweptBlock(chain);
      if (kind === 'none') return { ...chain, shaping: [...chain.shaping, trialBlock(0)] };
      const shaping = chain.shaping.map((block, i) => {
        if (i !== index) return block;
        if (block.kind === 'linkwitz-transform') return { ...block, to: 0 };
        return block.kind === 'low-shelf' ? { ...block, gain: 0 } : block;
      });
      return { ...chain, shaping };
    }
  }
}
