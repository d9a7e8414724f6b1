import type { Report } from '$lib/words/report';

/** Figures invented for the screen's tests, every one different, so that one in another's place shows. */
export function sampleReport(over: Partial<Report> = {}): Report {
  return {
    title: 'Attic shelf',
    holds: true,
    sentence:
      'Holds. 101 dB at the seat down to 18.2 Hz with 3.4 dB in hand. Cone travel runs out first, at 19 Hz.',
    driver: {
      qts: 0.41,
      cms_mm_per_N: 0.31,
      mms_g: 162,
      rms_kg_per_s: 4.1,
      bl_Tm: 12.4,
      re_ohm: 3.2,
      efficiency_pct: 0.21,
      spl_1W_dB: 85.3,
      spl_2V83_dB: 89.1,
      nominal_ohm: 4
    },
    alignment: {
      net_L: 57.25,
      effective_L: 62.7,
      alpha: 1.834,
      fc_Hz: 35.35,
      qtc: 0.728,
      f3_Hz: 34.36,
      peak_dB: 0.014,
      peak_Hz: 147.9
    },
    system: {
      f3_Hz: 18.24,
      f10_Hz: 11.14,
      shaping_boost_dB: 5.01,
      shaping_boost_Hz: 18.47,
      boost_power_ratio: 3.17
    },
    limits: [
      { limit: 'amplifier-voltage', worst_Hz: 18.5, margin_dB: 7.65, demanded_V: 19.6, allowed_V: 47.3 },
      { limit: 'amplifier-current', worst_Hz: 15.3, margin_dB: -0.04, demanded_A: 4.42, allowed_A: 4.4 },
      { limit: 'cone-travel', worst_Hz: 17.6, margin_dB: 2.26, demanded_mm: 11.6, allowed_mm: 15 },
      { limit: 'coil-heat', worst_Hz: 15.2, margin_dB: 17.9, demanded_A: 4.43, allowed_A: 34.6 }
    ],
    not_judged: ['mechanical-stop'],
    max_level_dB: 104.39,
    max_level_limit: 'cone-travel',
    max_level_Hz: 17.6,
    master_drive_V: 10,
    demand: {
      peak_V: 27.7,
      peak_A: 6.25,
      real_W: 69.5,
      apparent_VA: 84.04,
      rated_W_nominal: 96.1,
      cone_travel_mm: 11.56,
      cone_travel_Hz: 17.64,
      mains_average_W: 10.3
    },
    goal_short: { short_dB: 0.5, at_Hz: 20, beyond_tolerance: false },
    goal_note: '101 dB is a steady tone.',
    findings: [
      {
        code: 'no-high-pass',
        severity: 'note',
        at_Hz: null,
        text: 'Nothing stops infrasonics.',
        ways_out: []
      },
      {
        code: 'limit-cone-travel',
        severity: 'blocking',
        at_Hz: 17.6,
        text: 'The cone would need 19 mm of its 15 mm.',
        ways_out: [
          {
            text: 'Listen 2 dB lower: nothing in hand.',
            act: 'Listen 2 dB lower: nothing in hand.',
            outcome: 'Then it holds.',
            change: []
          },
          {
            text: 'Raise the high-pass to 18 Hz: 0.2 dB in hand.',
            act: 'Raise the high-pass to 18 Hz: 0.2 dB in hand.',
            outcome: 'Then it holds.',
            change: []
          }
        ]
      },
      {
        code: 'margin-thin',
        severity: 'caution',
        at_Hz: 17.6,
        text: 'Little is left.',
        ways_out: [
          { text: 'Listen 1 dB lower.', act: 'Listen 1 dB lower.', outcome: 'Then it holds.', change: [] }
        ]
      }
    ],
    exposure: { level_dBA: 65.7, hours: 690, peak_dBC: 104, peak_dBC_Hz: 50 },
    limiter: { terminal_V: 47.3, input_dBV: 4.5 },
    room_doubt: { doubt_dB: 4, worst_margin_dB: -1.7, best_margin_dB: 6.3 },
    hot: {
      rise_K: 150,
      re_ohm: 5.1,
      qtc: 0.88,
      level_loss_dB: 2.8,
      holds: true,
      margin_dB: 2.1,
      limit: 'cone-travel',
      worst_Hz: 17.9
    },
    ledger: [
      row({ nominal_Hz: 12.5, f_Hz: 12.589, wanted_dB: null, margin_dB: -0.02, limit: 'amplifier-current' }),
      row({ nominal_Hz: 20, f_Hz: 19.953, wanted_dB: 101, margin_dB: 2.46, limit: 'cone-travel' }),
      row({ nominal_Hz: 25, f_Hz: 25.119, wanted_dB: 101, margin_dB: null, limit: null })
    ],
    cautions: ['Hearing: measure the whole system.', 'Lifting: a loaded box is heavy.'],
    ...over
  };
}

type Row = Report['ledger'][number];

/** A row whose steps add up to its level: 20 dB of drive (10 V), shaping, driver and box, room. */
function row(over: Partial<Row>): Row {
  return {
    nominal_Hz: 20,
    f_Hz: 19.953,
    wanted_dB: 101,
    delivered_dB: 100.6,
    driver_box_dB: 69.6,
    shaping_dB: 4.3,
    room_dB: 6.7,
    distance_dB: -9.5,
    room_gain_dB: 16.2,
    copies_dB: 0,
    drive_V: 16.4,
    current_A: 3.71,
    real_W: 54.4,
    travel_mm: 11.3,
    margin_dB: 2.46,
    limit: 'cone-travel',
    ...over
  };
}
