/**
 * A limit: a quantity of the circuit at one frequency, and how much of it is allowed.
 * Quantities are squared and per volt of drive squared, so that the hot loop takes no roots.
 */
import type { CircuitPoint } from '../../box/circuit';
import type { LimitName } from '../budget';
import type { Workings } from '../workings';

export type Quantity = (point: CircuitPoint) => number;

/** RMS volts at the terminals. */
export const terminalVolts: Quantity = (p) => p.z2 / p.total2;
/** RMS amps at the terminals. */
export const current: Quantity = (p) => 1 / p.total2;
/** One-way peak travel, m. */
export const travel: Quantity = (p) => p.travel2;

export interface Limit {
  readonly name: LimitName;
  readonly quantity: Quantity;
  /** What is allowed, in the quantity's unit; null when the rating is missing and the limit is not judged. */
  readonly allowed: (w: Workings) => number | null;
}
