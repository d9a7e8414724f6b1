/** Every limit, in the order of reports. A new limit adds its file and its line here (and its name in budget.ts). */
import { amplifierCurrent } from './amplifier-current';
import { amplifierVoltage } from './amplifier-voltage';
import { coilHeat } from './coil-heat';
import { coneTravel } from './cone-travel';
import type { Limit } from './limit';
import { mechanicalStop } from './mechanical-stop';

export const LIMITS: readonly Limit[] = [
  amplifierVoltage,
  amplifierCurrent,
  coneTravel,
  mechanicalStop,
  coilHeat
];
