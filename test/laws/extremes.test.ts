/** Margins are the true extremes: a scan of forty thousand frequencies finds nothing worse. */
import fc from 'fast-check';
import { describe } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import type { Block } from '$lib/engine/shaping/block';
import { plausibleChain } from './chain-arbitrary';
import { close, law } from './law';

const POINTS = 40_000;
/** dB that two honest searches may differ. */
const TOLERANCE = 0.002;

function matchesBruteForce(chain: Chain): void {
  const { limits } = evaluate(chain, { waysOut: false });
  const c = curves(chain, logGrid(chain.programme.lowest, 500, POINTS));
  for (const l of limits) {
    const ceiling = c.ceilings[l.limit] as Float64Array;
    let least = Infinity;
    let at = 0;
    for (let i = 0; i < POINTS; i++) {
      const margin = ceiling[i] - c.delivered[i];
      if (margin < least) {
        least = margin;
        at = c.f[i];
      }
    }
    close(l.margin, least, TOLERANCE, `${l.limit} at ${l.worst} Hz, by brute force at ${at} Hz`);
  }
}

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const peak = (gain: fc.Arbitrary<number>) =>
  fc
    .record({ centre: between(12, 400), q: between(5, 30), gain })
    .map((b): Block => ({ kind: 'peak', bypass: false, fixed: false, ...b }));

const withBlocks = (blocks: fc.Arbitrary<Block[]>): fc.Arbitrary<Chain> =>
  fc
    .tuple(plausibleChain, blocks)
    .map(([chain, more]) => ({ ...chain, shaping: [...chain.shaping, ...more] }));

const transform = fc.record({ to: between(12, 80), toQ: between(0.5, 30) }).map((b): Block => ({
  kind: 'linkwitz-transform',
  from: 'box',
  fromQ: 'box',
  bypass: false,
  fixed: false,
  ...b
}));

describe('the worst of each limit', () => {
  law('in the box alone', plausibleChain, 15, matchesBruteForce);
  law('under a narrow peak', withBlocks(fc.tuple(peak(between(1, 24)))), 40, matchesBruteForce);
  law(
    'between two narrow peaks',
    withBlocks(fc.tuple(peak(between(6, 24)), peak(between(6, 24)))),
    30,
    matchesBruteForce
  );
  law('under a transform to a high Q', withBlocks(fc.tuple(transform)), 25, matchesBruteForce);
});
