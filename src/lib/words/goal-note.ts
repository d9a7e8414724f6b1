/**
 * What a level means, said beside the goal.
 * Reference: 105 dB peaks from a main channel, 115 dB from the effects channel (SMPTE RP 200 practice, from memory).
 */
import { levelText } from './quantities';

export function goalNote(level: number): string {
  return (
    `${levelText(level)} is a steady tone's RMS level; its true peak is 3 dB higher. For comparison, film reference is 105 dB peaks ` +
    'from a main channel and 115 dB from the effects channel.'
  );
}
