/**
 * The box as the plan sets it: by its net volume, or by the inner one that drivers and bracing are taken from.
 * Ways out move and round what stands in the file, within what the file may hold.
 */
import type { Chain } from '../chain';
import type { Change } from './budget';

export interface BoxSetting {
  /** m³ as it stands in the plan. */
  readonly value: number;
  /** m³ that are not net: drivers and bracing, where the inner volume is given. */
  readonly taken: number;
  readonly change: (value: number) => Change;
}

/** Smallest and largest volume a plan file may hold, m³. */
export const SMALLEST_BOX = 0.2e-3;
export const LARGEST_BOX = 5;

/** `displacement` is of all drivers, m³. */
export function boxSetting(chain: Chain, displacement: number): BoxSetting {
  const { net, inner, bracing } = chain.box;
  if (net !== null) return { value: net, taken: 0, change: (value) => ({ set: 'net-volume', value }) };
  return {
    value: inner as number,
    taken: displacement + bracing,
    change: (value) => ({ set: 'inner-volume', value })
  };
}

/** The change that gives the box this net volume (m³). */
export function netVolumeChange(chain: Chain, net: number, displacement: number): Change {
  const setting = boxSetting(chain, displacement);
  return setting.change(net + setting.taken);
}
