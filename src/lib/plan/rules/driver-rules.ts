import { driverGaps, type DriverGap } from '$lib/engine/driver/derive';
import { problem, type Problem } from '../problem';
import type { Plan } from '../schema';
import { driverSheet } from '../to-chain';
import type { Rule } from './rule';

type Driver = Plan['driver'];

/** Wiring, travel, the two halves of a lossy inductance, and whether the sheet suffices. */
export const driverRule: Rule = {
  needs: ['/driver'],
  check: ({ driver }) => [...wiring(driver), ...stop(driver), ...lossy(driver), ...gaps(driver)]
};

function wiring(d: Driver): Problem[] {
  const found: Problem[] = [];
  const lacking = (key: string, allowed: string, why: string) =>
    found.push(
      problem({
        path: `/driver/${key}`,
        found: 'nothing',
        allowed,
        message: `missing: with ${why} it is ${allowed}.`
      })
    );
  if ((d.coils ?? 1) > 1 && d.coil_wiring == null)
    lacking('coil_wiring', '"single", "series" or "parallel"', `${d.coils} coils`);
  if ((d.count ?? 1) > 1 && d.driver_wiring == null)
    lacking('driver_wiring', '"series" or "parallel"', `${d.count} drivers`);
  return found;
}

function stop({ xmax_mm: xmax, xmech_mm: xmech }: Driver): Problem[] {
  if (xmax == null || xmech == null || xmech >= xmax) return [];
  return [
    problem({
      path: '/driver/xmech_mm',
      found: String(xmech),
      allowed: `${xmax} (xmax_mm) to 200 mm`,
      message: `${xmech} mm is below xmax_mm, ${xmax} mm: the cone would meet its stop inside its linear travel.`,
      hint: 'Is xmax_mm a peak-to-peak figure?'
    })
  ];
}

function lossy({ l2_mH: l2, r2_ohm: r2 }: Driver): Problem[] {
  if ((l2 == null) === (r2 == null)) return [];
  const [lacks, has] = l2 == null ? ['l2_mH', 'r2_ohm'] : ['r2_ohm', 'l2_mH'];
  return [
    problem({
      path: `/driver/${lacks}`,
      found: 'nothing',
      allowed: 'l2_mH and r2_ohm together, or neither',
      message: `missing: ${has} is given, and the two belong together.`
    })
  ];
}

const NEEDED: Record<Exclude<DriverGap, 'qts-too-high'>, readonly [string, string]> = {
  resonance: ['the resonance', 'fs_Hz, or mms_g beside vas_L or cms_mm_per_N'],
  compliance: ['the compliance', 'vas_L, or mms_g, or cms_mm_per_N'],
  'mechanical-damping': ['the mechanical damping', 'qms, or rms_kg_per_s, or qts beside qes or bl_Tm'],
  'electrical-damping': ['the electrical damping', 'qes, or bl_Tm, or qts beside qms or rms_kg_per_s']
};

function gaps(d: Driver): Problem[] {
  return driverGaps(driverSheet(d)).map((gap) => {
    if (gap === 'qts-too-high')
      return problem({
        path: '/driver/qts',
        found: String(d.qts),
        allowed: 'below the other Q given',
        message: `${d.qts} is not below the other Q given: the total Q is always the smallest of the three.`
      });
    const [what, needed] = NEEDED[gap];
    return problem({
      path: '/driver',
      found: 'nothing',
      allowed: needed,
      message: `nothing gives ${what}: needs ${needed}.`
    });
  });
}
