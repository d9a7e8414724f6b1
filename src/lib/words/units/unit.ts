/** A unit a quantity may be typed in, and how it becomes the plan file's own. */
export type System = 'metric' | 'imperial';

export interface Unit {
  /** As it is shown: "cu ft". */
  readonly symbol: string;
  /** Everything it may be called besides its symbol; upper and lower case are the same unless that would be another unit. */
  readonly names: readonly string[];
  readonly system: System;
  /** The plan file's own unit: a number typed in it is stored as typed, to the last bit. */
  readonly stored: boolean;
  readonly toStored: (value: number) => number;
  readonly fromStored: (stored: number) => number;
}

/** Twelve digits: far below what anyone measures, and free of the last bits of a conversion (0.081 m² is 810 cm²). */
export const clean = (value: number): number => Number(value.toPrecision(12));

const same = (value: number): number => value;

/** The unit the plan file keeps this quantity in. */
export const own = (symbol: string, names: readonly string[] = [], system: System = 'metric'): Unit => ({
  symbol,
  names,
  system,
  stored: true,
  toStored: same,
  fromStored: same
});

const times =
  (system: System) =>
  (symbol: string, factor: number, names: readonly string[] = []): Unit => ({
    symbol,
    names,
    system,
    stored: false,
    toStored: (value) => clean(value * factor),
    fromStored: (stored) => clean(stored / factor)
  });

/** A unit that is `factor` of the stored one. */
export const metric = times('metric');
export const imperial = times('imperial');

/** A unit that takes more than a factor. */
export const curved = (
  symbol: string,
  names: readonly string[],
  system: System,
  toStored: (value: number) => number,
  fromStored: (stored: number) => number
): Unit => ({
  symbol,
  names,
  system,
  stored: false,
  toStored: (value) => clean(toStored(value)),
  fromStored: (stored) => clean(fromStored(stored))
});
