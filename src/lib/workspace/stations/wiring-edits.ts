/** More than one coil or driver has to be wired: the wiring goes into the plan and out of it with their number. */
import type { CoilWiring, DriverWiring } from '$lib/engine/chain';
import { loadChoices } from '$lib/engine/driver/wiring';
import { DEFAULTS } from '$lib/plan/defaults';
import type { Plan } from '$lib/plan/schema';
import { driverSheet } from '$lib/plan/to-chain';
import type { KeyEdit } from './edit-key';

export type LoadChoice = ReturnType<typeof loadChoices>[number];

/** Every load of the plan's coils and drivers, or of other numbers of them; lowest first. */
export function loadsOf(plan: Plan, numbers: { readonly count?: number; readonly coils?: number } = {}) {
  const sheet = { ...driverSheet(plan.driver), ...numbers };
  return loadChoices(sheet, plan.amplifier.minimum_load_ohm ?? DEFAULTS.minimum_load_ohm);
}

/** The lowest load the amplifier allows; where it allows none, the highest. */
const best = (choices: readonly LoadChoice[]): LoadChoice =>
  choices.find((choice) => !choice.belowMinimum) ?? choices[choices.length - 1];

/** `remembered`: the wiring that stood there when there was last more than one. */
export function countEdits(plan: Plan, count: number | null, remembered: DriverWiring | null): KeyEdit[] {
  const number = count ?? DEFAULTS.count;
  const { coilWiring } = driverSheet(plan.driver);
  const choices = loadsOf(plan, { count: number }).filter((choice) => choice.coilWiring === coilWiring);
  const wiring = plan.driver.driver_wiring ?? remembered ?? best(choices).driverWiring;
  return [
    [['driver', 'count'], count],
    [['driver', 'driver_wiring'], number > 1 ? wiring : null]
  ];
}

export function coilEdits(plan: Plan, coils: number | null, remembered: CoilWiring | null): KeyEdit[] {
  const number = coils ?? DEFAULTS.coils;
  const { driverWiring } = driverSheet(plan.driver);
  const choices = loadsOf(plan, { coils: number }).filter(
    (choice) => choice.driverWiring === driverWiring && (number === 1 || choice.coilWiring !== 'single')
  );
  const wiring = plan.driver.coil_wiring ?? remembered ?? best(choices).coilWiring;
  return [
    [['driver', 'coils'], coils],
    [['driver', 'coil_wiring'], number > 1 ? wiring : null]
  ];
}
