/** Net and effective volume of the box, m³. */
import type { Box } from '../chain';

/** Inner less drivers and bracing, or net as given. May be zero or less: the plan file refuses that. */
export const netVolume = (box: Box, displacement: number): number =>
  box.net ?? (box.inner as number) - displacement - box.bracing;

/** What the air in the box acts like with its fill: L. L. Beranek, "Acoustics", 1954 (isothermal limit γ). */
export const effectiveVolume = (box: Box, net: number): number => net * box.fillGain;
