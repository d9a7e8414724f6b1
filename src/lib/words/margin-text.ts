/**
 * Margins in words. Never rounded across zero, nor across the 3 dB that parts thin from comfortable (common practice, no source).
 */
import { fixed } from './format-number';

/** Below this many dB a margin is thin (common practice, no source). */
export const COMFORTABLE = 3;

export type MarginReading = 'over' | 'thin' | 'in hand';

/** How a margin in dB reads. */
export function marginReading(margin: number): MarginReading {
  return margin < 0 ? 'over' : margin < COMFORTABLE ? 'thin' : 'in hand';
}

/** The size of a margin in dB, sign left out: "2.1", "under 0.1", "0.0" only for nothing at all. */
export function marginSize(margin: number): string {
  const size = Math.abs(margin);
  if (size === 0) return '0.0';
  if (size < 0.1) return 'under 0.1';
  const text = fixed(size, 1);
  if (margin > 0 && margin < COMFORTABLE && Number(text) >= COMFORTABLE) return fixed(COMFORTABLE - 0.1, 1);
  return text;
}

/** "2.1 dB in hand", "nothing in hand", "under 0.1 dB over". */
export function marginText(margin: number): string {
  if (margin === 0) return 'nothing in hand';
  return `${marginSize(margin)} dB ${margin < 0 ? 'over' : 'in hand'}`;
}
