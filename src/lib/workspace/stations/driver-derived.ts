/** What follows from a data sheet, in the plan file's units, for the keys it leaves out. */
import { deriveDriver } from '$lib/engine/driver/derive';
import { estimatedDisplacement } from '$lib/engine/driver/equivalent';
import { coilNominal } from '$lib/engine/driver/wiring';
import { EngineError } from '$lib/engine/error';
import type { Plan } from '$lib/plan/schema';
import { driverSheet } from '$lib/plan/to-chain';
import type { DriverKey } from './driver-sheet';

/** One driver; Bl and nominal impedance of one coil. Empty where the sheet does not suffice. */
export function derivedDriver(plan: Plan): ReadonlyMap<DriverKey, number> {
  const sheet = driverSheet(plan.driver);
  try {
    const d = deriveDriver(sheet);
    const all: [DriverKey, number][] = [
      ['fs_Hz', d.fs],
      ['qms', d.qms],
      ['qes', d.qes],
      ['qts', d.qts],
      ['vas_L', d.vas * 1000],
      ['cms_mm_per_N', d.cms * 1000],
      ['mms_g', d.mms * 1000],
      ['rms_kg_per_s', d.rms],
      ['bl_Tm', d.bl],
      ['nominal_ohm', coilNominal(sheet.re, null)],
      ['displacement_L', estimatedDisplacement(sheet.sd) * 1000]
    ];
    return new Map(all.filter(([key]) => plan.driver[key] == null));
  } catch (trouble) {
    if (!(trouble instanceof EngineError)) throw trouble;
    return new Map();
  }
}
