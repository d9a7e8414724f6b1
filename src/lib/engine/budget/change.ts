/** A chain with changes made to it. The mirror in the plan file's units is `plan/to-patch`. */
import type { Chain } from '../chain';
import { EngineError } from '../error';
import type { Block } from '../shaping/block';
import type { Change } from './budget';

function withBlock(chain: Chain, index: number, edit: (block: Block) => Block): Chain {
  if (chain.shaping[index] === undefined) throw new EngineError(`shaping block must exist (got ${index})`);
  return { ...chain, shaping: chain.shaping.map((b, i) => (i === index ? edit(b) : b)) };
}

/** A Butterworth high-pass as ways out add it. */
export const addedHighPass = (order: number, corner: number): Block => ({
  kind: 'high-pass',
  family: 'butterworth',
  order,
  corner,
  bypass: false,
  fixed: false
});

function applyChange(chain: Chain, change: Change): Chain {
  switch (change.set) {
    case 'level':
      return { ...chain, goal: { ...chain.goal, level: change.value } };
    case 'goal-from':
      return { ...chain, goal: { ...chain.goal, from: change.value } };
    case 'goal-to':
      return { ...chain, goal: { ...chain.goal, to: change.value } };
    case 'block-corner':
      return withBlock(chain, change.block, (b) => ('corner' in b ? { ...b, corner: change.value } : b));
    case 'block-to':
      return withBlock(chain, change.block, (b) =>
        b.kind === 'linkwitz-transform' ? { ...b, to: change.value } : b
      );
    case 'block-gain':
      return withBlock(chain, change.block, (b) => ('gain' in b ? { ...b, gain: change.value } : b));
    case 'add-high-pass':
      return { ...chain, shaping: [...chain.shaping, addedHighPass(change.order, change.value)] };
    case 'drivers':
      return { ...chain, driver: { ...chain.driver, count: change.count, driverWiring: change.wiring } };
    case 'wiring':
      return {
        ...chain,
        driver: { ...chain.driver, coilWiring: change.coilWiring, driverWiring: change.driverWiring }
      };
    case 'ratings':
      return {
        ...chain,
        amplifier: {
          ...chain.amplifier,
          ratings: chain.amplifier.ratings.map((r, i) => ({ ...r, power: change.powers[i] }))
        }
      };
    case 'net-volume':
      return { ...chain, box: { ...chain.box, net: change.value, inner: null } };
    case 'inner-volume':
      return { ...chain, box: { ...chain.box, inner: change.value, net: null } };
    case 'cable':
      return { ...chain, cableResistance: change.value };
  }
}

export const applyChanges = (chain: Chain, changes: readonly Change[]): Chain =>
  changes.reduce(applyChange, chain);
