import type { LedgerRow } from '$lib/engine/budget/budget';
import { finite } from './report-number';

/** One row of the ledger under its fixed names. */
export function reportLedger(row: LedgerRow) {
  return {
    nominal_Hz: finite(row.nominal),
    f_Hz: finite(row.f),
    wanted_dB: finite(row.wanted),
    delivered_dB: finite(row.delivered),
    driver_box_dB: finite(row.driverBox),
    shaping_dB: finite(row.shaping),
    room_dB: finite(row.room),
    distance_dB: finite(row.distance),
    room_gain_dB: finite(row.roomGain),
    copies_dB: finite(row.copies),
    drive_V: finite(row.driveV),
    current_A: finite(row.currentA),
    real_W: finite(row.realW),
    travel_mm: finite(row.travel, 1000),
    margin_dB: finite(row.margin),
    limit: row.limit
  };
}
