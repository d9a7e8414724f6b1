/** Every quantity a form asks for: its units, what it is called, and how far the arrow keys move it. */
import * as electrical from './electrical-units';
import * as mechanical from './mechanical-units';
import type { System, Unit } from './unit';

export interface Steps {
  /** In the unit shown. */
  readonly small: number;
  readonly large: number;
}

/** How steps are taken: the same everywhere, or a tenth of the leading digit's place (3.3 → 3.4, 500 → 510). */
export type Stepping = Steps | 'scaled';

export interface QuantityKind {
  /** With its article: "a volume". */
  readonly noun: string;
  readonly units: readonly Unit[];
  readonly shown: { readonly [S in System]: Unit };
  readonly stepping: { readonly [S in System]: Stepping };
}

/** The unit shown is the first one listed, and the first imperial one where there is one. */
function kind(noun: string, units: readonly Unit[], steps: Stepping, imperialSteps = steps): QuantityKind {
  const imperial = units.find((unit) => unit.system === 'imperial') ?? units[0];
  return {
    noun,
    units,
    shown: { metric: units[0], imperial },
    stepping: { metric: steps, imperial: imperialSteps }
  };
}

const by = (small: number, large: number): Steps => ({ small, large });

export const QUANTITIES = {
  'length-small': kind('a length', mechanical.LENGTH_SMALL, by(1, 10), by(0.05, 0.5)),
  'length-large': kind('a length', mechanical.LENGTH_LARGE, by(0.1, 1), by(0.5, 2)),
  volume: kind('a volume', mechanical.VOLUME, by(1, 5), by(0.05, 0.25)),
  area: kind('an area', mechanical.AREA, by(5, 50), by(1, 10)),
  'mass-small': kind('a mass', mechanical.MASS_SMALL, 'scaled'),
  'mass-large': kind('a mass', mechanical.MASS_LARGE, 'scaled'),
  frequency: kind('a frequency', electrical.FREQUENCY, by(1, 5)),
  level: kind('a level', electrical.LEVEL, by(0.5, 3)),
  power: kind('a power', electrical.POWER, 'scaled'),
  resistance: kind('a resistance', electrical.RESISTANCE, 'scaled'),
  inductance: kind('an inductance', electrical.INDUCTANCE, 'scaled'),
  compliance: kind('a compliance', mechanical.COMPLIANCE, 'scaled'),
  'force-factor': kind('a force factor', mechanical.FORCE_FACTOR, by(0.1, 1)),
  'mechanical-resistance': kind('a mechanical resistance', mechanical.MECHANICAL_RESISTANCE, 'scaled'),
  voltage: kind('a voltage', electrical.VOLTAGE, 'scaled'),
  current: kind('a current', electrical.CURRENT, 'scaled'),
  time: kind('a time', electrical.TIME, by(0.1, 1)),
  temperature: kind('a temperature', electrical.TEMPERATURE, by(1, 5)),
  'temperature-rise': kind('a rise in temperature', electrical.TEMPERATURE_RISE, by(10, 50), by(20, 100)),
  pressure: kind('a pressure', electrical.PRESSURE, by(0.5, 2), by(0.1, 0.5)),
  ratio: kind('a plain number', electrical.RATIO, by(0.01, 0.1)),
  share: kind('a share in percent', electrical.SHARE, by(1, 5)),
  count: kind('a count', [electrical.RATIO[0]], by(1, 5)),
  'cross-section': kind('a cross-section', electrical.CROSS_SECTION, by(0.5, 2), by(2, 4))
} satisfies Record<string, QuantityKind>;

export type Quantity = keyof typeof QUANTITIES;

export const kindOf = (quantity: Quantity): QuantityKind => QUANTITIES[quantity];

/** The unit a quantity is shown in, and taken to be typed in when no unit is typed. */
export const shownUnit = (quantity: Quantity, system: System): Unit => QUANTITIES[quantity].shown[system];
