/** A sweep as a table under fixed names, in the trade's units. */
import type { Sweep, SweepRow } from '$lib/engine/budget/sweep-types';
import type { Table } from './curve-columns';
import { finite } from './report-number';
import { sweptValue } from './sweep-answer';

type Cell = number | string | boolean | null;
type Column = readonly [name: string, of: (row: SweepRow) => Cell];

const COLUMNS: readonly Column[] = [
  ['qtc', (r) => finite(r.qtc)],
  ['fc_Hz', (r) => finite(r.fc)],
  ['alignment_f3_Hz', (r) => finite(r.alignmentF3)],
  ['system_f3_Hz', (r) => finite(r.systemF3)],
  ['shaping_boost_dB', (r) => finite(r.shapingBoost)],
  ['rated_W_nominal', (r) => finite(r.ratedW)],
  ['peak_V', (r) => finite(r.peakV)],
  ['peak_A', (r) => finite(r.peakA)],
  ['cone_travel_mm', (r) => finite(r.travel, 1000)],
  ['margin_voltage_dB', (r) => finite(r.margins['amplifier-voltage'])],
  ['margin_current_dB', (r) => finite(r.margins['amplifier-current'])],
  ['margin_travel_dB', (r) => finite(r.margins['cone-travel'])],
  ['margin_stop_dB', (r) => finite(r.margins['mechanical-stop'])],
  ['margin_heat_dB', (r) => finite(r.margins['coil-heat'])],
  ['limit', (r) => r.limit],
  ['worst_Hz', (r) => finite(r.worst)],
  ['holds', (r) => r.holds]
];

/** One row a value, the swept value first. */
export function sweepTable(sweep: Sweep): Table {
  return {
    columns: [sweep.column, ...COLUMNS.map(([name]) => name)],
    rows: sweep.rows.map((row) => [finite(sweptValue(sweep, row.value)), ...COLUMNS.map(([, of]) => of(row))])
  };
}
