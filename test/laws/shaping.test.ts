/** Blocks that do nothing, undo each other, or stand in another order. */
import fc from 'fast-check';
import { describe, expect } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import type { Block } from '$lib/engine/shaping/block';
import { toEngineBlock } from '$lib/plan/schema/blocks/blocks';
import { plausibleChain } from './chain-arbitrary';
import { close, closeAll, law } from './law';
import { validBlock } from './valid-plan';

const GRID = logGrid(1, 1000, 120);
const plain = { bypass: false, fixed: false };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const hz = between(1, 2000);
const q = between(0.1, 30);
const order = fc.constantFrom<1 | 2>(1, 2);

/** Blocks that lift or cut by `gain`, at the same place and with the same Q. */
const lifting = fc.oneof(
  fc
    .record({ order, corner: hz, q })
    .map((b) => (gain: number): Block => ({ ...plain, kind: 'low-shelf', ...b, gain })),
  fc.record({ centre: hz, q }).map((b) => (gain: number): Block => ({ ...plain, kind: 'peak', ...b, gain })),
  fc.constant((gain: number): Block => ({ ...plain, kind: 'gain', gain }))
);

const transform = (from: number, fromQ: number, to: number, toQ: number): Block => ({
  ...plain,
  ...{ kind: 'linkwitz-transform', from, fromQ, to, toQ }
});

const transparent = fc.oneof(
  lifting.map((block) => block(0)),
  fc.tuple(hz, q).map(([f, at]) => transform(f, at, f, at)),
  fc
    .tuple(between(0.1, 100), between(0.1, 100), between(0.1, 1e4))
    .map((c): Block => ({ ...plain, kind: 'section', b: c, a: c })),
  fc.constant<Block>({ ...plain, kind: 'delay', delay: 0 })
);

const withShaping = (chain: Chain, shaping: readonly Block[]): Chain => ({ ...chain, shaping });

/** Everything that leaves the chain is the same. */
function same(a: Chain, b: Chain): void {
  const [x, y] = [curves(a, GRID), curves(b, GRID)];
  closeAll(x.shaping, y.shaping, (v) => v, 1e-9, 'shaping');
  closeAll(x.delivered, y.delivered, (v) => v, 1e-9, 'delivered');
  for (let i = 0; i < GRID.length; i++) {
    const turn = ((x.phase[i] - y.phase[i] + 540) % 360) - 180;
    close(turn, 0, 1e-6, `phase at ${GRID[i]} Hz`);
    close(x.groupDelay[i], y.groupDelay[i], 1e-9, `group delay at ${GRID[i]} Hz`);
  }
  const [p, r] = [evaluate(a, { waysOut: false }), evaluate(b, { waysOut: false })];
  p.limits.forEach((l, i) => close(l.margin, r.limits[i].margin, 1e-6, l.limit));
}

describe('shaping', () => {
  law(
    'every block at 0 dB is transparent, and so is a transform to where it already is',
    transparent,
    150,
    (block) => {
      const chain = fc.sample(plausibleChain, { seed: 5, numRuns: 1 })[0];
      closeAll(
        curves(withShaping(chain, [block]), GRID).shaping,
        new Float64Array(GRID.length),
        (v) => v,
        1e-9,
        'dB'
      );
      same(withShaping(chain, [...chain.shaping, block]), chain);
    }
  );

  law('a transform from the box to the box is transparent', plausibleChain, 40, (chain) => {
    const { fc: to, qtc: toQ } = evaluate(chain, { waysOut: false }).alignment;
    const block: Block = { ...plain, kind: 'linkwitz-transform', from: 'box', fromQ: 'box', to, toQ };
    same(withShaping(chain, [...chain.shaping, block]), chain);
  });

  law(
    'cut is the inverse of boost',
    fc.tuple(plausibleChain, lifting, between(0.01, 40)),
    150,
    ([chain, block, gain]) => same(withShaping(chain, [block(gain), ...chain.shaping, block(-gain)]), chain)
  );

  law(
    'a transform there and back is the inverse of itself',
    fc.tuple(plausibleChain, hz, q, hz, q),
    100,
    (t) => {
      const [chain, f0, q0, fp, qp] = t;
      same(
        withShaping(chain, [transform(f0, q0, fp, qp), transform(fp, qp, f0, q0)]),
        withShaping(chain, [])
      );
    }
  );

  const blocks = fc
    .array(validBlock.map(toEngineBlock), { minLength: 2, maxLength: 6 })
    .chain((list) => fc.tuple(fc.constant(list), fc.shuffledSubarray(list, { minLength: list.length })));

  law(
    'the order of blocks does not matter',
    fc.tuple(plausibleChain, blocks),
    150,
    ([chain, [given, shuffled]]) => {
      const [x, y] = [curves(withShaping(chain, given), GRID), curves(withShaping(chain, shuffled), GRID)];
      GRID.forEach((f, i) => {
        // Under −1000 dB numbers end; nothing is left to be equal.
        if (x.shaping[i] < -1000) return;
        close(x.shaping[i], y.shaping[i], 1e-9, `shaping at ${f} Hz`);
        const turn = ((x.phase[i] - y.phase[i] + 540) % 360) - 180;
        close(turn, 0, 1e-6, `phase at ${f} Hz`);
      });
    }
  );

  law(
    'a bypassed block is as good as absent',
    fc.tuple(plausibleChain, validBlock.map(toEngineBlock)),
    60,
    (t) => {
      const [chain, block] = t;
      const bypassed = { ...block, bypass: true };
      // At the end, so that no other block's place in the list moves.
      const kept = withShaping(chain, [...chain.shaping, bypassed]);
      expect(evaluate(kept)).toEqual(evaluate(chain));
      expect(curves(kept, GRID)).toEqual(curves(chain, GRID));
      expect(curves(withShaping(chain, [bypassed, ...chain.shaping]), GRID)).toEqual(curves(chain, GRID));
    }
  );
});
