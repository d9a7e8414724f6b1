/** One of the three decisions as rows over a swept value. SI. */
import type { LimitName } from './budget';

export type SweepOver = 'volume' | 'boost' | 'level';

export interface SweepRequest {
  readonly over: SweepOver;
  /** m³ net; Hz (a transform's target) or dB (a shelf's gain); dB at the seat. */
  readonly from?: number;
  readonly to?: number;
  readonly points?: number;
}

export interface SweepRow {
  readonly value: number;
  readonly qtc: number;
  readonly fc: number;
  readonly alignmentF3: number;
  readonly systemF3: number | null;
  readonly shapingBoost: number;
  readonly ratedW: number;
  readonly peakV: number;
  readonly peakA: number;
  readonly travel: number;
  readonly margins: { readonly [L in LimitName]: number | null };
  readonly limit: LimitName;
  readonly worst: number;
  readonly holds: boolean;
}

export interface Sweep {
  readonly over: SweepOver;
  readonly column: 'net_L' | 'boost_to_Hz' | 'boost_gain_dB' | 'level_dB';
  /** Index of the block that is swept; null for a trial transform, and where no block is. */
  readonly block: number | null;
  readonly rows: readonly SweepRow[];
  /** The value that decides, within every limit; and within volts and amps alone. Null when nothing in range holds. */
  readonly answer: number | null;
  readonly amplifierAnswer: number | null;
}
