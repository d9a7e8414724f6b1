import type { Plan } from '$lib/plan/schema';

/** A plan with every key of the file in it, all data invented; each call makes a new one. */
export const fullPlan = (): Plan => ({
  format: 'sealwright-plan',
  version: 1,
  title: 'Loft corner',
  notes: 'Under the roof.',
  air: { temperature_C: 18, pressure_kPa: 100 },
  goal: { level_dB: 100, from_Hz: 20, to_Hz: 80, pivot_Hz: 50, tolerance_dB: 3 },
  programme: { lowest_Hz: 10, crest_factor_dB: 9 },
  copies: 2,
  shaping: [
    {
      kind: 'low-pass',
      family: 'linkwitz-riley',
      order: 4,
      corner_Hz: 80,
      id: 'lp',
      label: 'Crossover',
      bypass: false,
      fixed: true
    },
    { kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 15 },
    { kind: 'linkwitz-transform', from_Hz: 'box', from_q: 'box', to_Hz: 24, to_q: 0.6 },
    { kind: 'low-shelf', order: 2, corner_Hz: 40, gain_dB: 3, q: 0.7 },
    { kind: 'peak', centre_Hz: 32, q: 4, gain_dB: -5 },
    { kind: 'gain', gain_dB: 6 },
    { kind: 'polarity' },
    { kind: 'delay', delay_ms: 1.5 },
    { kind: 'all-pass', order: 2, corner_Hz: 60, q: 0.7 },
    { kind: 'section', b: [0, 0, 1], a: [0, 0, 1] }
  ],
  amplifier: {
    label: 'Rack',
    ratings: [
      { power_W: 500, load_ohm: 4 },
      { power_W: 280, load_ohm: 8 }
    ],
    gain_dB: 29,
    output_ohm: 0.02,
    minimum_load_ohm: 2,
    efficiency: 0.85
  },
  cable: { resistance_ohm: 0.05 },
  driver: {
    label: 'Fifteen',
    count: 2,
    coils: 2,
    coil_wiring: 'series',
    driver_wiring: 'parallel',
    fs_Hz: 21,
    qms: 5.2,
    qes: 0.49,
    qts: 0.448,
    vas_L: 220,
    re_ohm: 1.7,
    le_mH: 0.9,
    l2_mH: 1.2,
    r2_ohm: 4,
    sd_cm2: 810,
    nominal_ohm: 2,
    mms_g: 243,
    cms_mm_per_N: 0.236,
    bl_Tm: 7.5,
    rms_kg_per_s: 6.2,
    xmax_mm: 16,
    xmech_mm: 27,
    facing: 'side',
    coil_rise_K: 150,
    power_W: 600,
    displacement_L: 4.5
  },
  box: { inner_L: 180, bracing_L: 5, fill_gain: 1.1, q_absorption: 8, q_leakage: 20 },
  room: {
    kind: 'pressure-gain',
    length_m: 6.2,
    width_m: 4.4,
    height_m: 2.5,
    airtightness: 'typical',
    cap_dB: 12,
    boundary_distances_m: [0.4, 0.5, 0.3],
    distance_loss_dB: 3,
    doubt_dB: 4
  },
  seat: { distance_m: 3 }
});

/** A copy with the value at a JSON pointer set; undefined takes the key out. */
export function withValue(plan: Plan, pointer: string, value: unknown): unknown {
  const copy: unknown = structuredClone(plan);
  const keys = pointer.split('/').slice(1);
  let at = copy as Record<string, unknown>;
  for (const key of keys.slice(0, -1)) at = at[key] as Record<string, unknown>;
  const last = keys[keys.length - 1];
  if (value === undefined) delete at[last];
  else at[last] = value;
  return copy;
}
