/** A box to begin with: the net volume (m³) that brings this driver nearest to a maximally flat Qtc, between a fifth and three times its Vas. */
import { alignBox } from '../box/alignment';
import type { Chain } from '../chain';
import { equivalentDriver } from '../driver/equivalent';
import { bisect } from '../quantity/search';
import { LARGEST_BOX, SMALLEST_BOX } from './box-setting';

export function startingBox(chain: Chain): number {
  const driver = equivalentDriver(chain.driver, chain.air);
  const source = chain.cableResistance + chain.amplifier.outputResistance;
  const qtcAt = (net: number) => alignBox(driver, { ...chain.box, net, inner: null }, chain.air, source).qtc;
  const low = Math.max(SMALLEST_BOX, 0.2 * driver.vas);
  const high = Math.min(LARGEST_BOX, 3 * driver.vas);
  if (!(low < high) || qtcAt(low) <= Math.SQRT1_2) return Math.min(low, LARGEST_BOX);
  if (qtcAt(high) >= Math.SQRT1_2) return high;
  return bisect((net) => qtcAt(net) <= Math.SQRT1_2, low, high, 1e-5);
}
