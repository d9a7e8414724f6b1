/** The same box given the other way: its net volume, or the inner one that drivers and bracing are taken from. */
import { equivalentDriver } from '$lib/engine/driver/equivalent';
import { EngineError } from '$lib/engine/error';
import type { Plan } from '$lib/plan/schema';
import { airInSi, driverSheet } from '$lib/plan/to-chain';
import type { KeyEdit } from './edit-key';

export type VolumeGiven = 'net' | 'inner';

/** Litres to 0.01: finer than any saw. */
const tidy = (litres: number): number => Number(litres.toFixed(2));

/** Keeps the air in the box as it is, to 0.01 L. `bracing` in litres goes into an inner volume that had none. */
export function switchVolume(plan: Plan, to: VolumeGiven, bracing: number): KeyEdit[] {
  const { net_L: net, inner_L: inner, bracing_L: braced } = plan.box;
  const drivers = driversLitres(plan);
  if (to === 'net')
    return [
      [['box', 'inner_L'], null],
      [['box', 'bracing_L'], null],
      [['box', 'net_L'], tidy((inner ?? 0) - drivers - (braced ?? 0))]
    ];
  const inside = braced ?? bracing;
  return [
    [['box', 'net_L'], null],
    [['box', 'inner_L'], tidy((net ?? 0) + drivers + inside)],
    [['box', 'bracing_L'], inside === 0 ? null : inside]
  ];
}

/** Litres all drivers take up, estimated where the sheet does not say; 0 where the sheet cannot be worked through. */
export function driversLitres(plan: Plan): number {
  try {
    return equivalentDriver(driverSheet(plan.driver), airInSi(plan.air)).displacement * 1000;
  } catch (trouble) {
    if (!(trouble instanceof EngineError)) throw trouble;
    return 0;
  }
}
