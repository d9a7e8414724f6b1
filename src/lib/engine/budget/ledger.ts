/** The ledger: one row a third octave, decibels that add up exactly. A row is in the goal's band or in the programme by its nominal frequency. */
import { circuitPoint } from '../box/circuit';
import { THIRD_OCTAVES } from '../quantity/grid';
import type { LedgerRow } from './budget';
import { marginAt, rowAt } from './rows';
import type { Workings } from './workings';

export function ledger(w: Workings): LedgerRow[] {
  const { goal, programme } = w.chain;
  const point = circuitPoint();
  return THIRD_OCTAVES.map(({ nominal, f }) => {
    const row = rowAt(w, f, point);
    const judged = nominal >= programme.lowest ? marginAt(w, point, row.drive2) : null;
    return {
      nominal,
      f,
      wanted: nominal >= goal.from && nominal <= goal.to ? goal.level : null,
      delivered: row.delivered,
      driverBox: row.driverBox,
      shaping: row.shaping,
      room: row.room,
      distance: w.room.distance,
      roomGain: row.roomGain,
      copies: w.copies,
      driveV: row.driveV,
      currentA: Math.sqrt(row.drive2 / point.total2),
      realW: (row.drive2 * point.zRe) / point.total2,
      travel: Math.sqrt(row.drive2 * point.travel2),
      margin: judged?.margin ?? null,
      limit: judged?.limit ?? null
    };
  });
}
