/** What an empty plan begins with: everything but the driver, with typical losses and a middling goal. */
import { startingBox } from '$lib/engine/budget/starting-box';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';

/** Not a plan yet: its driver is missing. Typical losses, not none (Small 1972, from memory); the rest is common practice. */
export const UNFINISHED = {
  format: 'sealwright-plan',
  version: 1,
  title: 'Untitled plan',
  goal: { level_dB: 100, from_Hz: 25, to_Hz: 63 },
  shaping: [
    { kind: 'low-pass', family: 'linkwitz-riley', order: 4, corner_Hz: 80 },
    { kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 15 }
  ],
  amplifier: { ratings: [{ power_W: 300, load_ohm: 4 }] },
  driver: {},
  box: { net_L: 50, fill_gain: 1.1, q_absorption: 10, q_leakage: 20 },
  room: { kind: 'pressure-gain', length_m: 5, width_m: 4, height_m: 2.5 },
  seat: { distance_m: 3 }
} as unknown as Plan;

/** The plan once its driver is known, in a box of a sensible size in whole litres; null while data are still missing. */
export function begunPlan(draft: Plan): Plan | null {
  const checked = checkPlan(draft);
  if (!checked.ok) return null;
  const litres = startingBox(checked.chain) * 1000;
  const net_L = litres < 10 ? Math.ceil(litres * 10) / 10 : Math.ceil(litres);
  return { ...draft, box: { ...draft.box, net_L } };
}
