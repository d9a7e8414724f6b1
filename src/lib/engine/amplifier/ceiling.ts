/** What the amplifier can give: RMS ceilings from its ratings. Ohm's law; a rating of P into R shows it reaches √(P·R) V and √(P/R) A. */
import type { Rating } from '../chain';

export interface AmplifierCeiling {
  readonly volts: number;
  readonly amps: number;
}

export function amplifierCeiling(ratings: readonly Rating[]): AmplifierCeiling {
  let volts = 0;
  let amps = 0;
  for (const { power, load } of ratings) {
    volts = Math.max(volts, Math.sqrt(power * load));
    amps = Math.max(amps, Math.sqrt(power / load));
  }
  return { volts, amps };
}
