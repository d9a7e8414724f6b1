/** The curves as a table under fixed names, in the trade's units. */
import type { Curves } from '$lib/engine/budget/budget';
import { finite } from './report-number';

export interface Table {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly (number | string | boolean | null)[])[];
}

type Column = readonly [name: string, at: (curves: Curves, i: number) => number | null];

const COLUMNS: readonly Column[] = [
  ['f_Hz', (c, i) => c.f[i]],
  ['delivered_dB', (c, i) => c.delivered[i]],
  ['wanted_dB', (c, i) => c.wanted[i]],
  ['phase_deg', (c, i) => c.phase[i]],
  ['group_delay_ms', (c, i) => finite(c.groupDelay[i], 1000)],
  ['shaping_dB', (c, i) => c.shaping[i]],
  ['driver_box_dB', (c, i) => c.driverBox[i]],
  ['room_dB', (c, i) => c.room[i]],
  ['copies_dB', (c) => c.copies],
  ['drive_V', (c, i) => c.driveV[i]],
  ['current_A', (c, i) => c.currentA[i]],
  ['real_W', (c, i) => c.realW[i]],
  ['apparent_VA', (c, i) => c.apparentVA[i]],
  ['impedance_ohm', (c, i) => c.impedance[i]],
  ['impedance_deg', (c, i) => c.impedancePhase[i]],
  ['travel_mm', (c, i) => finite(c.travel[i], 1000)],
  ['ceiling_voltage_dB', (c, i) => c.ceilings['amplifier-voltage']?.[i] ?? null],
  ['ceiling_current_dB', (c, i) => c.ceilings['amplifier-current']?.[i] ?? null],
  ['ceiling_travel_dB', (c, i) => c.ceilings['cone-travel']?.[i] ?? null],
  ['ceiling_heat_dB', (c, i) => c.ceilings['coil-heat']?.[i] ?? null],
  ['ceiling_stop_dB', (c, i) => c.ceilings['mechanical-stop']?.[i] ?? null]
];

/** One row a frequency; `copies_dB` only when several sets stand together. What does not exist is null. */
export function curveTable(curves: Curves): Table {
  const columns = COLUMNS.filter(([name]) => name !== 'copies_dB' || curves.copies !== 0);
  return {
    columns: columns.map(([name]) => name),
    rows: Array.from(curves.f, (_, i) => columns.map(([, at]) => finite(at(curves, i))))
  };
}
