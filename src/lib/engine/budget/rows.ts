/** Everything at one frequency, with the master drive: the stuff of ledger rows and curves. */
import { solveCircuit, type CircuitPoint } from '../box/circuit';
import { pressureLevel } from '../quantity/decibel';
import { roomGain } from '../room/room';
import { cascadePower } from '../shaping/cascade';
import type { LimitName } from './budget';
import { marginDb } from './limit-margins';
import { LIMITS } from './limits/all-limits';
import type { Workings } from './workings';

export interface Row {
  readonly driverBox: number;
  readonly shaping: number;
  readonly roomGain: number;
  readonly room: number;
  readonly delivered: number;
  readonly driveV: number;
  /** V², drive squared. */
  readonly drive2: number;
}

/** Levels and drive at f. `point` is left holding the circuit at f. delivered is the sum of the other columns, exactly. */
export function rowAt(w: Workings, f: number, point: CircuitPoint): Row {
  solveCircuit(w.circuit, f, point);
  const shaped = cascadePower(w.cascade, f);
  const driverBox = pressureLevel(Math.sqrt(point.pRe * point.pRe + point.pIm * point.pIm));
  const shaping = 10 * Math.log10(shaped);
  const gain = roomGain(w.room, f);
  const room = w.room.distance + gain;
  const drive2 = w.masterDrive * w.masterDrive * shaped;
  return {
    driverBox,
    shaping,
    roomGain: gain,
    room,
    delivered: driverBox + shaping + room + w.copies + w.masterDriveDb,
    driveV: Math.sqrt(drive2),
    drive2
  };
}

/** Smallest margin over all judged limits at one frequency (`point` as left by `rowAt`), dB. */
export function marginAt(
  w: Workings,
  point: CircuitPoint,
  drive2: number
): { margin: number; limit: LimitName } {
  let margin = Infinity;
  let limit: LimitName = LIMITS[0].name;
  for (const l of LIMITS) {
    const allowed = l.allowed(w);
    if (allowed === null) continue;
    const m = marginDb(allowed, drive2 * l.quantity(point));
    if (m < margin) {
      margin = m;
      limit = l.name;
    }
  }
  return { margin, limit };
}
