import { netVolume } from '$lib/engine/box/volume';
import { equivalentDriver } from '$lib/engine/driver/equivalent';
import { problem } from '../problem';
import { airInSi, boxInSi, driverSheet } from '../to-chain';
import type { Rule } from './rule';

/** One volume, not two and not none. */
export const volumeRule: Rule = {
  needs: ['/box'],
  check: ({ box: { net_L: net, inner_L: inner } }) => {
    if ((net == null) !== (inner == null)) return [];
    const both = net != null;
    return [
      problem({
        path: '/box',
        found: both ? 'net_L and inner_L' : 'neither net_L nor inner_L',
        allowed: 'net_L, or inner_L',
        message: both
          ? 'net_L and inner_L are both given: keep one of them.'
          : 'neither net_L nor inner_L is given: one of them is needed.'
      })
    ];
  }
};

/** m³: what subtraction leaves of nothing. */
const DUST = 1e-9;

/** Some air is left. Asked only of a plan whose driver and box are right otherwise. */
export const netVolumeRule: Rule = {
  needs: ['/driver', '/box', '/air'],
  check: (plan) => {
    const box = boxInSi(plan.box);
    const { count, displacement } = equivalentDriver(driverSheet(plan.driver), airInSi(plan.air));
    const net = netVolume(box, displacement);
    if (net > DUST) return [];
    const litres = (x: number) => `${Number((x * 1000).toPrecision(4))} L`;
    const drivers = `${litres(displacement)} of ${count === 1 ? 'driver' : 'drivers'}`;
    return [
      problem({
        path: '/box',
        found: litres(net),
        allowed: 'a net volume above 0',
        message: `no air is left: ${plan.box.inner_L} L inner, less ${drivers} and ${litres(box.bracing)} of bracing, is ${litres(net)}.`
      })
    ];
  }
};
