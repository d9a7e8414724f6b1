/** The plan file's units become the engine's SI here, once; what is left out takes its default. */
import type { Air, Amplifier, Box, Chain, DriverSheet, Goal, Programme, Room } from '$lib/engine/chain';
import { DEFAULTS } from './defaults';
import type { Plan } from './schema';
import { toEngineBlock } from './schema/blocks/blocks';

const ZERO_CELSIUS = 273.15;

/** Dividing by a power of ten rounds once: 85 L is exactly the number 0.085. */
const milli = (x: number): number => x / 1000;
const milliOrNull = (x: number | null | undefined): number | null => (x == null ? null : x / 1000);

/** The chain of a plan that has been read without problems. */
export function toChain(plan: Plan): Chain {
  return {
    air: airInSi(plan.air),
    goal: goal(plan),
    programme: programme(plan),
    copies: plan.copies ?? DEFAULTS.copies,
    shaping: (plan.shaping ?? []).map(toEngineBlock),
    amplifier: amplifier(plan),
    cableResistance: plan.cable?.resistance_ohm ?? DEFAULTS.resistance_ohm,
    driver: driverSheet(plan.driver),
    box: boxInSi(plan.box),
    room: room(plan.room),
    seatDistance: plan.seat.distance_m
  };
}

/** Kelvin and pascal. */
export const airInSi = (a: Plan['air']): Air => ({
  temperature: (a?.temperature_C ?? DEFAULTS.temperature_C) + ZERO_CELSIUS,
  pressure: (a?.pressure_kPa ?? DEFAULTS.pressure_kPa) * 1000
});

const goal = ({ goal: g }: Plan): Goal => ({
  level: g.level_dB,
  from: g.from_Hz,
  to: g.to_Hz,
  pivot: g.pivot_Hz ?? Math.min(Math.max(DEFAULTS.pivot_Hz, g.from_Hz), g.to_Hz),
  tolerance: g.tolerance_dB ?? DEFAULTS.tolerance_dB
});

const programme = ({ programme: p }: Plan): Programme => ({
  lowest: p?.lowest_Hz ?? DEFAULTS.lowest_Hz,
  crest: p?.crest_factor_dB ?? DEFAULTS.crest_factor_dB
});

const amplifier = ({ amplifier: a }: Plan): Amplifier => ({
  ratings: a.ratings.map((r) => ({ power: r.power_W, load: r.load_ohm })),
  gain: a.gain_dB ?? null,
  outputResistance: a.output_ohm ?? DEFAULTS.output_ohm,
  minimumLoad: a.minimum_load_ohm ?? DEFAULTS.minimum_load_ohm,
  efficiency: a.efficiency ?? DEFAULTS.efficiency
});

/** One driver's sheet in SI. */
export function driverSheet(d: Plan['driver']): DriverSheet {
  const count = d.count ?? DEFAULTS.count;
  const coils = d.coils ?? DEFAULTS.coils;
  return {
    count,
    coils,
    coilWiring: coils === 1 ? 'single' : (d.coil_wiring ?? 'single'),
    driverWiring: count === 1 ? 'parallel' : (d.driver_wiring ?? 'parallel'),
    fs: d.fs_Hz ?? null,
    qms: d.qms ?? null,
    qes: d.qes ?? null,
    qts: d.qts ?? null,
    vas: milliOrNull(d.vas_L),
    re: d.re_ohm,
    le: milli(d.le_mH ?? DEFAULTS.le_mH),
    l2: milliOrNull(d.l2_mH),
    r2: d.r2_ohm ?? null,
    sd: d.sd_cm2 / 1e4,
    nominal: d.nominal_ohm ?? null,
    mms: milliOrNull(d.mms_g),
    cms: milliOrNull(d.cms_mm_per_N),
    bl: d.bl_Tm ?? null,
    rms: d.rms_kg_per_s ?? null,
    xmax: milliOrNull(d.xmax_mm),
    xmech: milliOrNull(d.xmech_mm),
    facing: d.facing ?? null,
    coilRise: d.coil_rise_K ?? DEFAULTS.coil_rise_K,
    power: d.power_W ?? null,
    displacement: milliOrNull(d.displacement_L)
  };
}

/** Cubic metres. */
export const boxInSi = (b: Plan['box']): Box => ({
  net: milliOrNull(b.net_L),
  inner: milliOrNull(b.inner_L),
  bracing: milli(b.bracing_L ?? DEFAULTS.bracing_L),
  fillGain: b.fill_gain ?? DEFAULTS.fill_gain,
  qAbsorption: b.q_absorption ?? null,
  qLeakage: b.q_leakage ?? null
});

function room(r: Plan['room']): Room {
  if (r == null || r.kind === 'open-air')
    return { kind: 'open-air', doubt: r?.doubt_dB ?? DEFAULTS.doubt_outdoors_dB };
  return {
    kind: 'pressure-gain',
    length: r.length_m,
    width: r.width_m,
    height: r.height_m,
    airtightness: r.airtightness ?? DEFAULTS.airtightness,
    cap: r.cap_dB ?? null,
    boundaries: r.boundary_distances_m ?? [],
    distanceLoss: r.distance_loss_dB ?? DEFAULTS.distance_loss_dB,
    doubt: r.doubt_dB ?? DEFAULTS.doubt_indoors_dB
  };
}
