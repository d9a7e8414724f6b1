/** Invented curves of the right shape for looking at plots. Nothing here is physics that anyone should rely on. */
import type { Curve, Flag, Tone } from '$lib/charts/plot-types';

const db = (ratio: number) => 20 * Math.log10(ratio);

export interface SpecimenData {
  readonly f: Float64Array;
  readonly played: Float64Array;
  readonly wanted: Float64Array;
  readonly ceilings: { readonly [T in 'volts' | 'amps' | 'travel' | 'stop' | 'heat']: Float64Array };
  readonly lowest: Float64Array;
  readonly travel: Float64Array;
  readonly volts: Float64Array;
}

export const XMAX = 16;
export const RATED_V = 44.7;

/** A plan at so many decibels, over `n` frequencies from 10 to 200 Hz. */
export function specimenData(level: number, n = 400): SpecimenData {
  const f = Float64Array.from({ length: n }, (_, i) => 10 * 20 ** (i / (n - 1)));
  const over = (of: (hz: number) => number) => f.map(of);
  const played = over((hz) => level - db(Math.hypot(1, (13 / hz) ** 3)) - db(1 + (hz / 95) ** 4));
  const room = (hz: number) => db(Math.hypot(1, 26 / hz));
  const travelCeiling = over((hz) => 97.2 + 2 * db(hz / 20) + room(hz));
  const voltsCeiling = over(
    (hz) => 108 - db(Math.hypot(1, (27 / hz) ** 2)) + room(hz) - db(1 + (hz / 420) ** 2)
  );
  const peak = (hz: number) => 9 / Math.hypot(1, (Math.log2(hz / 40) * 7) ** 2);
  const amps = voltsCeiling.map((v, i) => v + 1.4 + 2.4 * peak(f[i]));
  const heat = voltsCeiling.map((v, i) => v + 0.6 + 2.2 * peak(f[i]));
  const ceilings = {
    volts: voltsCeiling,
    amps,
    travel: travelCeiling,
    stop: travelCeiling.map((v) => v + 4.6),
    heat
  };
  const lowest = f.map((_, i) => Math.min(...Object.values(ceilings).map((ceiling) => ceiling[i])));
  return {
    f,
    played,
    wanted: f.map((hz) => (hz >= 20 && hz <= 80 ? level : Number.NaN)),
    ceilings,
    lowest,
    travel: played.map((v, i) => XMAX * 10 ** ((v - travelCeiling[i]) / 20)),
    volts: played.map((v, i) => RATED_V * 10 ** ((v - voltsCeiling[i]) / 20))
  };
}

const CEILINGS: readonly (Omit<Curve, 'x' | 'y' | 'tone'> & {
  readonly tone: keyof SpecimenData['ceilings'];
})[] = [
  { id: 'volts', tone: 'volts', label: 'amplifier volts', shortLabel: 'volts', near: 150, side: 'below' },
  { id: 'amps', tone: 'amps', label: 'amplifier amps', shortLabel: 'amps', near: 110 },
  { id: 'travel', tone: 'travel', label: 'cone travel', shortLabel: 'travel', near: 13, side: 'below' },
  { id: 'stop', tone: 'stop', label: 'cone stop', shortLabel: 'stop', near: 60 },
  { id: 'heat', tone: 'heat', label: 'coil heat', shortLabel: 'heat', near: 29 }
];

export const levelCurves = ({ f, played, wanted, ceilings }: SpecimenData, level: number): Curve[] => [
  ...CEILINGS.map((curve) => ({ ...curve, x: f, y: ceilings[curve.tone] })),
  { id: 'wanted', tone: 'wanted', label: `wanted ${level}`, near: 80, x: f, y: wanted },
  { id: 'played', tone: 'played', label: 'played', near: 120, side: 'below', x: f, y: played }
];

/** Decibels in hand of each limit against the level wanted, for the level decision. */
export const RUNS_OUT: readonly {
  readonly tone: Tone;
  readonly name: string;
  readonly short: string;
  readonly at: number;
}[] = [
  { tone: 'travel', name: 'cone travel', short: 'travel', at: 100.2 },
  { tone: 'volts', name: 'amplifier volts', short: 'volts', at: 102.2 },
  { tone: 'heat', name: 'coil heat', short: 'heat', at: 103.9 },
  { tone: 'amps', name: 'amplifier amps', short: 'amps', at: 105.1 }
];

export const marginCurves = (low: number, high: number): Curve[] =>
  RUNS_OUT.map(({ tone, name, short, at }) => ({
    id: tone,
    tone,
    label: name,
    shortLabel: short,
    x: [low, high],
    y: [at - low, at - high]
  }));

export const marginFlags: Flag[] = RUNS_OUT.map(({ tone, name, short, at }) => ({
  id: tone,
  tone,
  x: at,
  label: `${name} ${at} dB`,
  shortLabel: `${short} ${at}`
}));

/** Where a limit runs out first, level against frequency: it turns back on itself. */
export function runsOut(): { level: number[]; f: number[] } {
  const f = Array.from({ length: 61 }, (_, i) => 10 * 10 ** (i / 60));
  const level = f.map((hz) => 100.2 + 9 * Math.abs(Math.log10(hz / 18)) ** 1.6);
  return { level, f };
}

/** Qtc, watts and travel against litres. */
export function volumeSweep(n = 81) {
  const litres = Float64Array.from({ length: n }, (_, i) => 30 * (250 / 30) ** (i / (n - 1)));
  return {
    litres,
    qtc: litres.map((v) => 0.45 * Math.sqrt(1 + 200 / v)),
    watts: litres.map((v) => 330 + 52000 / v),
    travel: litres.map((v) => 26.4 + 90 / v)
  };
}
