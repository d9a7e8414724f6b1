import { shapingRangeProblem } from '$lib/engine/shaping/range';
import type { Chain } from '$lib/engine/chain';
import { problem, type Problem } from '../problem';
import type { Plan } from '../schema';
import { blockProblems, MOST_BLOCKS } from '../schema/blocks/blocks';
import type { Rule } from './rule';

/** Rules inside each block. */
export const blocksRule = ({ shaping }: Plan): Rule[] =>
  // A longer list is refused for its length; Array.from, since a value from elsewhere may have holes.
  Array.isArray(shaping) && shaping.length <= MOST_BLOCKS
    ? Array.from(shaping, (block, i) => ({
        needs: [`/shaping/${i}`],
        check: () => blockProblems(block, `/shaping/${i}`)
      }))
    : [];

/** Whether the blocks together leave something to plan with. Asked only of a chain that is right otherwise. */
export function shapingTogether(chain: Chain): Problem[] {
  const range = shapingRangeProblem(chain);
  if (range === null) return [];
  const less = range.kind === 'too-little';
  const size = Number.isFinite(range.db) ? `${grouped(Math.abs(range.db))} dB` : 'more than can be computed';
  return [
    problem({
      path: '/shaping',
      found: size,
      allowed: 'less than 400 dB either way',
      message: less
        ? `together these blocks take ${size} away at the pivot: nothing is left to plan with.`
        : `together these blocks add ${size}: no amplifier follows.`
    })
  ];
}

/** 26000 → "26 000". */
const grouped = (x: number): string =>
  Math.round(x)
    .toFixed(0)
    .replace(/\B(?=(\d{3})+$)/g, ' ');
