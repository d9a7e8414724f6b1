/** One step up or down from a stored value, in the unit shown: onto the next round number, inside the range. */
import { kindOf, shownUnit, type Quantity, type Stepping } from './quantity';
import { clean, type System } from './unit';

export interface StepOptions {
  readonly quantity: Quantity;
  readonly system: System;
  readonly up: boolean;
  readonly large: boolean;
  readonly range: { readonly min: number; readonly max: number } | null;
  /** In place of the quantity's own. */
  readonly stepping?: Stepping;
}

export function stepQuantity(stored: number, options: StepOptions): number {
  const { quantity, system, up, large, range } = options;
  const unit = shownUnit(quantity, system);
  const value = unit.fromStored(stored);
  const stepping = options.stepping ?? kindOf(quantity).stepping[system];
  const step = stepping === 'scaled' ? scaledStep(value, up, large) : large ? stepping.large : stepping.small;
  // A whole number of steps, so that repeated steps stay round and never collect noise.
  const steps = clean(value / step);
  const next = clean((up ? Math.floor(steps) + 1 : Math.ceil(steps) - 1) * step);
  const moved = unit.toStored(next);
  return range === null ? moved : Math.min(range.max, Math.max(range.min, moved));
}

/** A tenth of the leading digit's place, or the place itself; from 10 downward the steps are those below 10. */
function scaledStep(value: number, up: boolean, large: boolean): number {
  const size = Math.abs(value);
  if (size === 0) return large ? 0.1 : 0.01;
  const exponent = Math.floor(Math.log10(size) + 1e-12);
  const towardZero = up === value < 0;
  const edge = towardZero && clean(size / 10 ** exponent) === 1;
  return clean(10 ** (exponent - (large ? 0 : 1) - (edge ? 1 : 0)));
}
