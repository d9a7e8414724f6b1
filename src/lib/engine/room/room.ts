/** What the room and the distance do to the half-space level at 1 m: an estimate, and its doubt goes with it. */
import type { Room } from '../chain';
import { boundaryPower, imageDistances } from './boundary';
import {
  pressureZone,
  pressureZoneDelay,
  pressureZoneRatio,
  pressureZonePhase,
  type PressureZone
} from './pressure-zone';

export interface RoomResponse {
  /** dB, flat: what the distance takes (negative beyond 1 m). */
  readonly distance: number;
  readonly images: readonly number[];
  readonly zone: PressureZone | null;
  readonly c: number;
}

export function roomResponse(room: Room, distance: number, c: number): RoomResponse {
  if (room.kind === 'open-air') return { distance: -20 * Math.log10(distance), images: [], zone: null, c };
  const longest = Math.max(room.length, room.width, room.height);
  return {
    distance: -room.distanceLoss * Math.log2(distance),
    images: imageDistances(room.boundaries),
    zone: pressureZone(longest, room.airtightness, room.cap, c),
    c
  };
}

/** Power ratio of boundaries and pressure zone at f, distance not included. */
export function roomPower(r: RoomResponse, f: number): number {
  const lift = r.zone === null ? 1 : pressureZoneRatio(r.zone, f);
  return boundaryPower(r.images, f, r.c) * lift * lift;
}

/** The same in dB. */
export const roomGain = (r: RoomResponse, f: number): number => 10 * Math.log10(roomPower(r, f));

/** Boundaries and loss carry no phase; the pressure zone does. Radians. */
export const roomPhase = (r: RoomResponse, f: number): number =>
  r.zone === null ? 0 : pressureZonePhase(r.zone, f);

export const roomDelay = (r: RoomResponse, f: number): number =>
  r.zone === null ? 0 : pressureZoneDelay(r.zone, f);
