import { estimatedDisplacement } from '$lib/engine/driver/equivalent';
import type { Plan } from '$lib/plan/schema';

/** Litres all drivers take from the box. */
export const displaced = (d: Plan['driver']): number =>
  (d.count ?? 1) * (d.displacement_L ?? estimatedDisplacement(d.sd_cm2 / 1e4) * 1000);
