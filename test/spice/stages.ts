/**
 * Electrical circuits that do what shaping blocks should do, as stages that follow one another: passive ladders and resonators, ideal
 * amplifiers (a gain of 1e9), transmission lines, and integrator loops (an analogue computer) where no passive network is at hand.
 * Each stage reads one node and drives the next from a buffer, so that none loads another.
 */
import { num } from './run-ac';

export type Stage = (input: string, output: string, tag: string) => string[];

/** Impedance level, Ω: of no consequence to what the stages do. */
const R = 1000;
const OPEN_LOOP = 1e9;

const r = (name: string, a: string, b: string, ohm: number): string => `r${name} ${a} ${b} ${num(ohm)}`;
const c = (name: string, a: string, b: string, farad: number): string => `c${name} ${a} ${b} ${num(farad)}`;
const l = (name: string, a: string, b: string, henry: number): string => `l${name} ${a} ${b} ${num(henry)}`;
/** A source of `gain` times the voltage between two nodes. */
const e = (name: string, out: string, plus: string, minus: string, gain: number): string =>
  `e${name} ${out} 0 ${plus} ${minus} ${num(gain)}`;
const omega = (f: number): number => 2 * Math.PI * f;

/** The netlist of stages in a row, driven by 1 V; the last drives `out`. */
export function stagesInRow(stages: readonly Stage[], output = 'out', input = 'in', tag = 's'): string[] {
  return stages.flatMap((stage, i) =>
    stage(i === 0 ? input : `${tag}${i}`, i === stages.length - 1 ? output : `${tag}${i + 1}`, `${tag}${i}`)
  );
}

export const drive = (node = 'in'): string => `vdrive ${node} 0 dc 0 ac 1`;

/**
 * Element values of the Butterworth low-pass between equal resistors, 1 Ω and 1 rad/s, orders 1 to 8.
 * Source: published tables, as in A. I. Zverev, "Handbook of Filter Synthesis", 1967 (from memory).
 */
const BUTTERWORTH_LADDER: { readonly [order: number]: readonly number[] } = {
  1: [2],
  2: [1.4142, 1.4142],
  3: [1, 2, 1],
  4: [0.7654, 1.8478, 1.8478, 0.7654],
  5: [0.618, 1.618, 2, 1.618, 0.618],
  6: [0.5176, 1.4142, 1.9319, 1.9319, 1.4142, 0.5176],
  7: [0.445, 1.247, 1.8019, 2, 1.8019, 1.247, 0.445],
  8: [0.3902, 1.1111, 1.6629, 1.9616, 1.9616, 1.6629, 1.1111, 0.3902]
};

/** A ladder between equal resistors, its half of the voltage made up: shunt capacitors and series coils, or the other way round. */
export function butterworthLadder(kind: 'low-pass' | 'high-pass', order: number, corner: number): Stage {
  const w = omega(corner);
  return (input, output, tag) => {
    const lines = [r(`${tag}s`, input, `${tag}n0`, R)];
    let node = `${tag}n0`;
    BUTTERWORTH_LADDER[order].forEach((g, i) => {
      const name = `${tag}g${i}`;
      const next = `${tag}n${i + 1}`;
      if (kind === 'low-pass') {
        if (i % 2 === 0) lines.push(c(name, node, '0', g / (w * R)));
        else lines.push(l(name, node, next, (g * R) / w));
      } else if (i % 2 === 0) lines.push(l(name, node, '0', R / (g * w)));
      else lines.push(c(name, node, next, 1 / (g * w * R)));
      if (i % 2 === 1) node = next;
    });
    return [...lines, r(`${tag}t`, node, '0', R), e(tag, output, node, '0', 2)];
  };
}

/** A resonator of R, L and C for a pole pair, or R and C for a real pole (Q null). */
export function polePair(kind: 'low-pass' | 'high-pass', frequency: number, q: number | null): Stage {
  const w = omega(frequency);
  return (input, output, tag) => {
    const mid = `${tag}m`;
    const end = `${tag}e`;
    const out = e(tag, output, end, '0', 1);
    if (q === null) {
      const across = c(tag, kind === 'low-pass' ? end : input, kind === 'low-pass' ? '0' : end, 1 / (w * R));
      const along = kind === 'low-pass' ? r(tag, input, end, R) : r(tag, end, '0', R);
      return [across, along, out];
    }
    const coil = (q * R) / w;
    const capacitor = 1 / (q * R * w);
    return kind === 'low-pass'
      ? [r(tag, input, mid, R), l(tag, mid, end, coil), c(tag, end, '0', capacitor), out]
      : [r(tag, input, mid, R), c(tag, mid, end, capacitor), l(tag, end, '0', coil), out];
  };
}

/**
 * An integrator loop: (b0 + b1·S + … )/(a0 + a1·S + … ), ascending powers of S = s/(2π·unit), by as many integrators as the denominator has powers.
 * Currents are summed in resistors of 1 Ω.
 */
export function integratorLoop(b: readonly number[], a: readonly number[], unit: number): Stage {
  const n = a.length - 1;
  const w = omega(unit);
  return (input, output, tag) => {
    const state = (k: number): string => `${tag}x${k}`;
    const sum = (name: string, into: string, from: string, factor: number): string =>
      `g${name} 0 ${into} ${from} 0 ${num(factor)}`;
    const lines = [r(`${tag}top`, state(n), '0', 1), sum(`${tag}u`, state(n), input, 1 / a[n])];
    for (let k = 0; k < n; k++) {
      lines.push(sum(`${tag}a${k}`, state(n), state(k), -a[k] / a[n]));
      // One farad, charged by w times the state above; the resistor only keeps the node from hanging in the air.
      lines.push(sum(`${tag}i${k}`, state(k), state(k + 1), w), c(`${tag}c${k}`, state(k), '0', 1));
      lines.push(r(`${tag}r${k}`, state(k), '0', 1e12));
    }
    b.forEach((factor, k) => {
      if (factor !== 0) lines.push(sum(`${tag}b${k}`, `${tag}y`, state(k), factor));
    });
    return [...lines, r(`${tag}y`, `${tag}y`, '0', 1), e(tag, output, `${tag}y`, '0', 1)];
  };
}

/**
 * The transform's own circuit, one amplifier with a bridged T before and another behind it, then an inverter. Possible where f0/fp > Q0/Qp > fp/f0.
 * Source: S. Linkwitz, "Loudspeaker System Design", Wireless World, 1978 (component formulas from memory).
 */
export function linkwitzCircuit(f0: number, q0: number, fp: number, qp: number): Stage {
  const k = (f0 / fp - q0 / qp) / (q0 / qp - fp / f0);
  if (!(k > 0)) throw new Error('no such circuit for these poles');
  const c2 = 100e-9;
  const step = 2 * q0 * (1 + k);
  const r1 = 1 / (omega(f0) * c2 * step);
  const r2 = 2 * k * r1;
  const c1 = c2 * step * step;
  const c3 = c1 * (fp / f0) ** 2;
  const r3 = r1 * (f0 / fp) ** 2;
  return (input, output, tag) => {
    const minus = `${tag}v`;
    const turned = `${tag}o`;
    const bridge = (name: string, from: string, to: string, arm: number, leg: number): string[] => [
      r(`${name}a`, from, `${name}t`, arm),
      r(`${name}b`, `${name}t`, to, arm),
      c(`${name}t`, `${name}t`, '0', leg),
      r(`${name}c`, from, `${name}u`, r2),
      c(`${name}u`, `${name}u`, to, c2)
    ];
    return [
      ...bridge(`${tag}i`, input, minus, r1, c1),
      ...bridge(`${tag}f`, minus, turned, r3, c3),
      e(`${tag}amp`, turned, '0', minus, OPEN_LOOP),
      e(tag, output, '0', turned, 1)
    ];
  };
}

/** A network of `from`, `middle` and ground that takes away, as it is; put behind an amplifier's output it gives instead. */
type Divider = (from: string, middle: string, tag: string) => string[];

function divided(divider: Divider, boost: boolean): Stage {
  return (input, output, tag) => {
    const mid = `${tag}d`;
    return boost
      ? [...divider(output, mid, tag), e(tag, output, input, mid, OPEN_LOOP)]
      : [...divider(input, mid, tag), e(tag, output, mid, '0', 1)];
  };
}

/** First-order low shelf: R and C side by side into a resistor. */
export function shelfCircuit(corner: number, gain: number): Stage {
  const g = Math.pow(10, Math.abs(gain) / 20);
  const along = R * (g - 1);
  // The zero of the cut lies at corner/√g.
  const capacitor = Math.sqrt(g) / (omega(corner) * along);
  return divided(
    (from, mid, tag) => [
      r(`${tag}p`, from, mid, along),
      c(`${tag}p`, from, mid, capacitor),
      r(`${tag}q`, mid, '0', R)
    ],
    gain > 0
  );
}

/**
 * Peak or dip: a resistor into R, L, C in series. The cut's numerator has the width 1/(Q·√g) and its denominator √g/Q, g the gain as a ratio above 1:
 * "Audio EQ Cookbook", W3C Working Group Note, 2021 (from memory).
 */
export function peakCircuit(centre: number, q: number, gain: number): Stage {
  const root = Math.pow(10, Math.abs(gain) / 40);
  const w = omega(centre);
  const small = R / (root * root - 1);
  const coil = (small * q * root) / w;
  return divided(
    (from, mid, tag) => [
      r(`${tag}p`, from, mid, R),
      r(`${tag}q`, mid, `${tag}q`, small),
      l(`${tag}q`, `${tag}q`, `${tag}r`, coil),
      c(`${tag}q`, `${tag}r`, '0', 1 / (w * w * coil))
    ],
    gain > 0
  );
}

/** All-pass: twice a low-pass of R and C less the input; or the input less twice the voltage over R of R, L, C in series. */
export function allPassCircuit(order: 1 | 2, corner: number, q: number): Stage {
  const w = omega(corner);
  return (input, output, tag) => {
    const mid = `${tag}m`;
    const subtract = (sign: 1 | -1): string[] => [
      `g${tag}p 0 ${tag}y ${mid} 0 ${num(2 * sign)}`,
      `g${tag}q 0 ${tag}y ${input} 0 ${num(-sign)}`,
      r(`${tag}y`, `${tag}y`, '0', 1),
      e(tag, output, `${tag}y`, '0', 1)
    ];
    if (order === 1) return [r(tag, input, mid, R), c(tag, mid, '0', 1 / (w * R)), ...subtract(1)];
    return [
      l(tag, input, `${tag}l`, (q * R) / w),
      c(tag, `${tag}l`, mid, 1 / (q * R * w)),
      r(tag, mid, '0', R),
      ...subtract(-1)
    ];
  };
}

/** A matched line; its half of the voltage made up. */
export const lineStage =
  (seconds: number): Stage =>
  (input, output, tag) => [
    r(`${tag}s`, input, `${tag}a`, R),
    `t${tag} ${tag}a 0 ${tag}b 0 z0=${num(R)} td=${num(seconds)}`,
    r(`${tag}t`, `${tag}b`, '0', R),
    e(tag, output, `${tag}b`, '0', 2)
  ];

/** An amplifier with two equal resistors: twice the voltage, or turned over. */
export const doubler: Stage = (input, output, tag) => [
  r(`${tag}a`, output, `${tag}v`, R),
  r(`${tag}b`, `${tag}v`, '0', R),
  e(tag, output, input, `${tag}v`, OPEN_LOOP)
];
export const inverter: Stage = (input, output, tag) => [
  r(`${tag}a`, input, `${tag}v`, R),
  r(`${tag}b`, `${tag}v`, output, R),
  e(tag, output, '0', `${tag}v`, OPEN_LOOP)
];

/** A capacitor into an input's resistance. */
export const inputCapacitor =
  (farad: number, ohm: number): Stage =>
  (input, output, tag) => [
    c(tag, input, `${tag}m`, farad),
    r(tag, `${tag}m`, '0', ohm),
    e(tag, output, `${tag}m`, '0', 1)
  ];
