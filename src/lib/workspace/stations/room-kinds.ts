/** Going from one kind of room to the other without losing what was typed for either. */
import type { Plan } from '$lib/plan/schema';

export type PlanRoom = NonNullable<Plan['room']>;
export type RoomKind = PlanRoom['kind'];
export type ClosedRoom = Extract<PlanRoom, { kind: 'pressure-gain' }>;

/** Sides typed so far for a closed room that has not all three; m. */
export interface BegunSides {
  readonly length_m: number | null;
  readonly width_m: number | null;
  readonly height_m: number | null;
}

export const NO_SIDES: BegunSides = { length_m: null, width_m: null, height_m: null };

/** The owner's memory of rooms out of use, by kind; it outlives the form. */
export type KeptRooms = Map<string, PlanRoom>;

export const roomKind = (plan: Plan): RoomKind => plan.room?.kind ?? 'open-air';

/** The room the plan would change to; null where nothing is known of it yet. */
export function roomOfKind(kind: RoomKind, kept: KeptRooms): PlanRoom | null {
  return kept.get(kind) ?? (kind === 'open-air' ? { kind } : null);
}

/** The closed room once all three sides are there. */
export function roomFromSides({ length_m, width_m, height_m }: BegunSides): ClosedRoom | null {
  if (length_m === null || width_m === null || height_m === null) return null;
  return { kind: 'pressure-gain', length_m, width_m, height_m };
}

/** dB at the lowest notes by how tight the room is, as the schema says it of `airtightness` (common practice, no source). */
export const MOST_GAIN_DB = { tight: 18, typical: 12, leaky: 6 } as const;
