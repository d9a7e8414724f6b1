/**
 * A plan's amplifier output, cable, drivers and box as a netlist, written from the data sheet's own values and apart from the engine:
 * every coil and every cone is a branch of its own, nothing is lumped.
 *
 * - Each coil: Re, then Le, then L2 with R2 across it, then a source of Bl·v. The coils of one driver sit on one pole piece: their Le are
 *   coupled with k = 1, their L2 likewise, and since coupled L2 all carry one voltage the driver's one R2 stands across the first of them.
 *   A coil that is not driven stays in the circuit, open (10 GΩ).
 * - Each cone in the impedance analogy (force = volt, velocity = ampere): sources of Bl·i, then Rms as resistor, Mms as inductor, Cms as
 *   capacitor, then a source of Sd·p. Outward is positive.
 * - The box in the acoustic impedance analogy (pressure = volt, volume velocity = ampere), one node that every cone feeds Sd·v:
 *   compliance with absorption in series, leakage across both.
 *
 * Sources: R. H. Small, "Direct-Radiator Loudspeaker System Analysis", JAES 20(5), 1972; "Closed-Box Loudspeaker Systems, Part I", JAES
 * 20(10), 1972; "Vented-Box Loudspeaker Systems, Part I", JAES 21(5), 1973 (box losses; the leak radiates against the cone).
 */
import type { Plan } from '$lib/plan/schema';
import { modulus, num, quotient, degreesOf, type AcResult, type Complex } from './run-ac';

/** Standard air of a data sheet's Vas, Pa; ratio of specific heats; gas constant of dry air, J/(kg·K). */
const SHEET_PRESSURE = 101_325;
const GAMMA = 1.4;
const GAS = 287.05;
const OPEN = 1e10;

interface Physical {
  readonly sd: number;
  readonly mms: number;
  readonly cms: number;
  readonly rms: number;
  /** Of one coil. */
  readonly bl: number;
  readonly re: number;
  readonly le: number;
  readonly l2: number;
  readonly r2: number;
  readonly coils: number;
  readonly count: number;
}

/** What a plan must say for its circuit to be drawn. */
function needed<T>(value: T | null | undefined, what: string): T {
  if (value == null) throw new Error(`the witness needs ${what}`);
  return value;
}

/** One driver's parts from its data sheet: Vas before Mms before Cms, Q before Rms and Bl, as a plan file promises. */
function partsOf({ driver: d }: Plan): Physical {
  const sd = d.sd_cm2 * 1e-4;
  const coils = d.coils ?? 1;
  const sheetMms = d.mms_g == null ? null : d.mms_g * 1e-3;
  const sheetCms = d.cms_mm_per_N == null ? null : d.cms_mm_per_N * 1e-3;
  const vasCms = d.vas_L == null ? null : (d.vas_L * 1e-3) / (GAMMA * SHEET_PRESSURE * sd * sd);
  const w =
    d.fs_Hz != null
      ? 2 * Math.PI * d.fs_Hz
      : 1 / Math.sqrt(needed(sheetMms, 'fs or Mms') * needed(vasCms ?? sheetCms, 'Vas or Cms'));
  const mms = vasCms !== null ? 1 / (w * w * vasCms) : (sheetMms ?? 1 / (w * w * needed(sheetCms, 'Cms')));
  const cms = 1 / (w * w * mms);
  const givenQms = d.qms ?? (d.rms_kg_per_s == null ? null : (w * mms) / d.rms_kg_per_s);
  // Qes is with every coil driven: Qes = ω·Mms·Re/(coils·Bl²).
  const givenQes = d.qes ?? (d.bl_Tm == null ? null : (w * mms * d.re_ohm) / (coils * d.bl_Tm ** 2));
  const other = (known: number | null): number =>
    1 / (1 / needed(d.qts, 'Qts') - 1 / needed(known, 'Qms or Qes'));
  const qms = givenQms ?? other(givenQes);
  const qes = givenQes ?? other(givenQms);
  return {
    sd,
    mms,
    cms,
    rms: (w * mms) / qms,
    bl: Math.sqrt((w * mms * d.re_ohm) / (coils * qes)),
    re: d.re_ohm,
    le: (d.le_mH ?? 0) * 1e-3,
    l2: (d.l2_mH ?? 0) * 1e-3,
    r2: d.r2_ohm ?? 0,
    coils,
    count: d.count ?? 1
  };
}

/** Net litres: as given, or inner less bracing and drivers (0.2·Sd^1.5 each where the sheet is silent). */
function netLitres({ box, driver }: Plan): number {
  if (box.net_L != null) return box.net_L;
  const each = driver.displacement_L ?? 200 * (driver.sd_cm2 * 1e-4) ** 1.5;
  return (box.inner_L ?? NaN) - (box.bracing_L ?? 0) - each * (driver.count ?? 1);
}

/** Pairs of 1…n, each once. */
const pairs = (n: number): [number, number][] =>
  Array.from({ length: n }, (_, i) => i + 1).flatMap((a) =>
    Array.from({ length: n - a }, (_, i): [number, number] => [a, a + 1 + i])
  );

/** One coil between two nodes: its parts and the voltage its motion makes. */
function coilLines(p: Physical, tag: string, from: string, to: string, velocity: string): string[] {
  const lines = [`vi${tag} ${from} ${tag}a dc 0`, `rre${tag} ${tag}a ${tag}b ${num(p.re)}`];
  let node = `${tag}b`;
  if (p.le > 0) {
    lines.push(`lle${tag} ${node} ${tag}c ${num(p.le)}`);
    node = `${tag}c`;
  }
  if (p.l2 > 0) {
    lines.push(`ll2${tag} ${node} ${tag}d ${num(p.l2)}`);
    if (tag.endsWith('_1')) lines.push(`rr2${tag} ${node} ${tag}d ${num(p.r2)}`);
    node = `${tag}d`;
  }
  return [...lines, `hemf${tag} ${node} ${to} ${velocity} ${num(p.bl)}`];
}

/** One driver between two nodes: its coils as wired, and its cone. */
function driverLines(plan: Plan, p: Physical, n: number, from: string, to: string): string[] {
  const wiring = p.coils === 1 ? 'single' : plan.driver.coil_wiring;
  const tags = Array.from({ length: p.coils }, (_, i) => `d${n}_${i + 1}`);
  const velocity = `vcone${n}`;
  const lines = tags.flatMap((tag, i) => {
    if (wiring === 'parallel') return coilLines(p, tag, from, to, velocity);
    if (wiring === 'series') {
      const start = i === 0 ? from : `d${n}s${i}`;
      const end = i === p.coils - 1 ? to : `d${n}s${i + 1}`;
      return coilLines(p, tag, start, end, velocity);
    }
    if (i === 0) return coilLines(p, tag, from, to, velocity);
    return [...coilLines(p, tag, `${tag}x`, to, velocity), `ropen${tag} ${tag}x ${to} ${num(OPEN)}`];
  });
  for (const [a, b] of pairs(p.coils)) {
    if (p.le > 0) lines.push(`kle${n}_${a}_${b} lle${tags[a - 1]} lle${tags[b - 1]} 1`);
    if (p.l2 > 0) lines.push(`kl2${n}_${a}_${b} ll2${tags[a - 1]} ll2${tags[b - 1]} 1`);
  }
  // The cone's loop: force sources of every coil in a row, then its mass, loss and spring, then the pressure behind it.
  tags.forEach((tag, i) => {
    lines.push(`hforce${tag} m${n}_${i + 1} ${i === 0 ? '0' : `m${n}_${i}`} vi${tag} ${num(p.bl)}`);
  });
  return [
    ...lines,
    `${velocity} m${n}_${p.coils} m${n}r dc 0`,
    `rrms${n} m${n}r m${n}l ${num(p.rms)}`,
    `lmms${n} m${n}l m${n}c ${num(p.mms)}`,
    `ccms${n} m${n}c m${n}p ${num(p.cms)}`,
    `epress${n} m${n}p 0 box 0 ${num(p.sd)}`,
    `fflow${n} 0 box ${velocity} ${num(p.sd)}`
  ];
}

/** The netlist of a plan, driven by 1 V behind the amplifier's output resistance. `heavier` scales the moving mass, to see a difference. */
export function planNetlist(plan: Plan, heavier = 1): string[] {
  const sheet = partsOf(plan);
  const p = { ...sheet, mms: sheet.mms * heavier };
  const series = p.count > 1 && plan.driver.driver_wiring === 'series';
  const drivers = Array.from({ length: p.count }, (_, i) => {
    const from = series && i > 0 ? `j${i}` : 'load';
    const to = series && i < p.count - 1 ? `j${i + 1}` : '0';
    return driverLines(plan, p, i + 1, from, to);
  }).flat();
  const pressure = (plan.air?.pressure_kPa ?? 101.325) * 1000;
  const cab = (netLitres(plan) * 1e-3 * (plan.box.fill_gain ?? 1)) / (GAMMA * pressure);
  // The box's losses are told as Q at the frequency where the cones' and the air's springs resonate with the cones' mass.
  const alpha = (p.count * p.cms * p.sd * p.sd) / cab;
  const wc = Math.sqrt((1 + alpha) / (sheet.mms * p.cms));
  const absorption = plan.box.q_absorption ?? null;
  const leakage = plan.box.q_leakage ?? null;
  const box = [
    `vbox box boxa dc 0`,
    absorption === null ? `vnoloss boxa boxc dc 0` : `rab boxa boxc ${num(1 / (wc * cab * absorption))}`,
    `ccab boxc 0 ${num(cab)}`,
    // Without a leak a node would hang on capacitors alone: a leak a thousand million times smaller than any real one.
    `rleak box 0 ${num(leakage === null ? 1e12 / (wc * cab) : leakage / (wc * cab))}`
  ];
  return [
    'vdrive src 0 dc 0 ac 1',
    `vout src srca dc 0`,
    resistor('out', 'srca', 'term', plan.amplifier.output_ohm ?? 0),
    resistor('cable', 'term', 'load', plan.cable?.resistance_ohm ?? 0),
    ...drivers,
    ...box
  ];
}

/** A resistor, or a plain wire where it is 0. */
const resistor = (name: string, a: string, b: string, ohm: number): string =>
  ohm === 0 ? `vw${name} ${a} ${b} dc 0` : `r${name} ${a} ${b} ${num(ohm)}`;

export interface Witnessed {
  readonly f: readonly number[];
  /** Load at the terminals: Ω and degrees. */
  readonly impedance: readonly number[];
  readonly impedancePhase: readonly number[];
  /** One-way peak, m per volt RMS, of each cone. */
  readonly travel: readonly (readonly number[])[];
  /** dB SPL at 1 m in half space per volt RMS, and the pressure's phase in degrees. */
  readonly level: readonly number[];
  readonly phase: readonly number[];
}

/** What the simulator says of a plan's circuit, in the engine's quantities. */
export function witnessed(plan: Plan, result: AcResult): Witnessed {
  const load = result.of('v(term)').map((v, i) => quotient(v, result.of('i(vout)')[i]));
  const omega = result.f.map((f) => 2 * Math.PI * f);
  const temperature = (plan.air?.temperature_C ?? 20) + 273.15;
  const rho = ((plan.air?.pressure_kPa ?? 101.325) * 1000) / (GAS * temperature);
  const travel = Array.from({ length: plan.driver.count ?? 1 }, (_, n) =>
    result.of(`i(vcone${n + 1})`).map((v, i) => (Math.SQRT2 * modulus(v)) / omega[i])
  );
  // p = jωρU/(2π) of what compresses the box.
  const pressure = result.of('i(vbox)').map((u, i): Complex => {
    const k = (omega[i] * rho) / (2 * Math.PI);
    return { re: -k * u.im, im: k * u.re };
  });
  return {
    f: result.f,
    impedance: load.map(modulus),
    impedancePhase: load.map(degreesOf),
    travel,
    level: pressure.map((p) => 20 * Math.log10(modulus(p) / 20e-6)),
    phase: pressure.map(degreesOf)
  };
}
