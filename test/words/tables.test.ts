import { expect, test } from 'vitest';
import type { Curves } from '$lib/engine/budget/budget';
import type { Sweep, SweepRow } from '$lib/engine/budget/sweep-types';
import { curveTable } from '$lib/words/curve-columns';
import { sweepAnswerText } from '$lib/words/sweep-answer';
import { sweepTable } from '$lib/words/sweep-columns';

const of = (...values: number[]) => Float64Array.from(values);

const curves = (over: Partial<Curves> = {}): Curves => ({
  f: of(10, 20),
  delivered: of(90, 100),
  wanted: of(NaN, 105),
  phase: of(10, -170),
  groupDelay: of(0.0437770168, 0.02),
  shaping: of(1, 2),
  driverBox: of(58, 69),
  room: of(10, 7),
  copies: 0,
  driveV: of(12, 19),
  currentA: of(4, 3),
  realW: of(36, 54),
  apparentVA: of(40, 60),
  impedance: of(3.4, 5),
  impedancePhase: of(10, 20),
  travel: of(0.00732, 0.0113),
  ceilings: {
    'amplifier-voltage': of(100, 110),
    'amplifier-current': of(101, 111),
    'cone-travel': of(102, 112),
    'mechanical-stop': null,
    'coil-heat': of(104, 114)
  },
  ...over
});

/** plan-format page, "curves columns". */
const COLUMNS =
  'f_Hz delivered_dB wanted_dB phase_deg group_delay_ms shaping_dB driver_box_dB room_dB drive_V current_A real_W apparent_VA impedance_ohm impedance_deg travel_mm ceiling_voltage_dB ceiling_current_dB ceiling_travel_dB ceiling_heat_dB ceiling_stop_dB';

test('curves: the fixed columns, in the units of the file, null where nothing is', () => {
  const { columns, rows } = curveTable(curves());
  expect(columns.join(' ')).toBe(COLUMNS);
  const row = Object.fromEntries(columns.map((name, i) => [name, rows[0][i]]));
  expect(row).toMatchObject({
    wanted_dB: null,
    group_delay_ms: 43.7770168,
    travel_mm: 7.32,
    ceiling_heat_dB: 104,
    ceiling_stop_dB: null
  });
  expect(rows[1][2]).toBe(105);
});

test('curves: several sets enter as a line of their own', () => {
  const { columns, rows } = curveTable(curves({ copies: 6.0206 }));
  expect(rows[1][columns.indexOf('copies_dB')]).toBe(6.0206);
});

const row = (value: number, holds: boolean): SweepRow => ({
  value,
  qtc: 0.71,
  fc: 35.3,
  alignmentF3: 34.3,
  systemF3: null,
  shapingBoost: 5,
  ratedW: 96,
  peakV: 27,
  peakA: 6,
  travel: 0.0115,
  margins: {
    'amplifier-voltage': 7,
    'amplifier-current': 8,
    'cone-travel': 2,
    'mechanical-stop': 6,
    'coil-heat': null
  },
  limit: 'cone-travel',
  worst: 17.6,
  holds
});

const sweep = (over: Partial<Sweep> = {}): Sweep => ({
  over: 'volume',
  column: 'net_L',
  block: null,
  rows: [row(0.0571, false), row(0.18, true)],
  answer: 0.062,
  amplifierAnswer: null,
  ...over
});

test('sweeps: the fixed columns, the swept value first', () => {
  const { columns, rows } = sweepTable(sweep());
  expect(columns.join(' ')).toBe(
    'net_L qtc fc_Hz alignment_f3_Hz system_f3_Hz shaping_boost_dB rated_W_nominal peak_V peak_A cone_travel_mm margin_voltage_dB margin_current_dB margin_travel_dB margin_stop_dB margin_heat_dB limit worst_Hz holds'
  );
  expect(rows[0]).toEqual([
    57.1,
    0.71,
    35.3,
    34.3,
    null,
    5,
    96,
    27,
    6,
    11.5,
    7,
    8,
    2,
    6,
    null,
    'cone-travel',
    17.6,
    false
  ]);
});

test.for([
  { over: sweep(), which: 'answer', text: 'smallest box that holds: 62 L' },
  {
    over: sweep(),
    which: 'amplifierAnswer',
    text: 'no box volume from 57.1 L to 180 L is carried by this amplifier'
  },
  {
    over: sweep({ over: 'level', column: 'level_dB', answer: 103.2, rows: [row(90, true)] }),
    which: 'answer',
    text: 'highest level within limits: 103.2 dB'
  },
  {
    over: sweep({ over: 'level', column: 'level_dB', answer: null, rows: [row(90, false), row(115, false)] }),
    which: 'answer',
    text: 'no level from 90.0 dB to 115.0 dB holds'
  },
  {
    over: sweep({ over: 'boost', column: 'boost_to_Hz', answer: 22.5 }),
    which: 'answer',
    text: 'most boost that holds: down to 22.5 Hz'
  },
  {
    over: sweep({ over: 'boost', column: 'boost_gain_dB', amplifierAnswer: 6.4 }),
    which: 'amplifierAnswer',
    text: 'most boost this amplifier carries: 6.4 dB (volts and amps alone)'
  }
] as const)('$text', ({ over, which, text }) => {
  expect(sweepAnswerText(over, which)).toBe(text);
});
