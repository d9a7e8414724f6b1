/**
 * The lift of a closed room below its first lengthwise mode, as a shelf ((s + ω_g)/(s + ω_l))², f_g = c/(2·longest side), f_l = f_g·10^(−G/40).
 * The project's own simple form; caps G are common practice, no source. An estimate.
 */
import type { Airtightness } from '../chain';

/** dB at 0 Hz by how tight the room is (common practice): masonry with doors shut; usual; timber frame or open plan. */
const CAPS: { readonly [A in Airtightness]: number } = { tight: 18, typical: 12, leaky: 6 };

export interface PressureZone {
  /** Hz. */
  readonly upper: number;
  readonly lower: number;
}

export function pressureZone(
  longest: number,
  airtightness: Airtightness,
  cap: number | null,
  c: number
): PressureZone {
  const upper = c / (2 * longest);
  return { upper, lower: upper * Math.pow(10, -(cap ?? CAPS[airtightness]) / 40) };
}

/** Pressure ratio at f. */
export const pressureZoneRatio = (z: PressureZone, f: number): number =>
  (f * f + z.upper * z.upper) / (f * f + z.lower * z.lower);

/** Phase at f, radians. */
export const pressureZonePhase = (z: PressureZone, f: number): number =>
  2 * (Math.atan2(f, z.upper) - Math.atan2(f, z.lower));

/** Group delay at f, s: −dφ/dω of the phase. */
export function pressureZoneDelay(z: PressureZone, f: number): number {
  const slope = (corner: number) => corner / (corner * corner + f * f);
  return (-2 * (slope(z.upper) - slope(z.lower))) / (2 * Math.PI);
}
