/**
 * The worked example of the published checks as a chain: fs 25 Hz, Qms 5, Qes 0.5, Vas 120 L, Re 6 Ω, no Le, Sd 500 cm², Xmax 10 mm, one coil;
 * box 60 L net, empty, no losses; no source resistance; half space at 1 m.
 */
import { circuitPoint, solveCircuit, type CircuitPoint } from '$lib/engine/box/circuit';
import { workOut, type Workings } from '$lib/engine/budget/workings';
import type { Air, Box, Chain, DriverSheet } from '$lib/engine/chain';

export const ROOM_AIR: Air = { temperature: 293.15, pressure: 101_325 };

export interface Variant {
  readonly driver?: Partial<DriverSheet>;
  readonly box?: Partial<Box>;
  readonly cable?: number;
  readonly chain?: Partial<Chain>;
}

export function workedChain({ driver, box, cable = 0, chain }: Variant = {}): Chain {
  return {
    air: ROOM_AIR,
    goal: { level: 90, from: 20, to: 100, pivot: 50, tolerance: 3 },
    programme: { lowest: 10, crest: 9 },
    copies: 1,
    shaping: [],
    amplifier: {
      ratings: [{ power: 100, load: 8 }],
      gain: null,
      outputResistance: 0,
      minimumLoad: 0,
      efficiency: 0.85
    },
    cableResistance: cable,
    driver: {
      count: 1,
      coils: 1,
      coilWiring: 'single',
      driverWiring: 'parallel',
      fs: 25,
      qms: 5,
      qes: 0.5,
      qts: null,
      vas: 0.12,
      re: 6,
      le: 0,
      l2: null,
      r2: null,
      sd: 0.05,
      nominal: null,
      mms: null,
      cms: null,
      bl: null,
      rms: null,
      xmax: 0.01,
      xmech: null,
      facing: null,
      coilRise: 150,
      power: null,
      displacement: null,
      ...driver
    },
    box: { net: 0.06, inner: null, bracing: 0, fillGain: 1, qAbsorption: null, qLeakage: null, ...box },
    room: { kind: 'open-air', doubt: 0 },
    seatDistance: 1,
    ...chain
  };
}

export const worked = (variant?: Variant): Workings => workOut(workedChain(variant));

/** The circuit of a chain at one frequency. */
export function pointAt(w: Workings, f: number): CircuitPoint {
  const point = circuitPoint();
  solveCircuit(w.circuit, f, point);
  return point;
}

/** Ω; degrees; m one-way peak per volt RMS; Pa at 1 m per volt RMS. */
export const impedanceAt = (w: Workings, f: number): number => Math.sqrt(pointAt(w, f).z2);
export function impedanceAngleAt(w: Workings, f: number): number {
  const { zRe, zIm } = pointAt(w, f);
  return (Math.atan2(zIm, zRe) * 180) / Math.PI;
}
export const travelAt = (w: Workings, f: number): number => Math.sqrt(pointAt(w, f).travel2);
export function pressureAt(w: Workings, f: number): number {
  const { pRe, pIm } = pointAt(w, f);
  return Math.hypot(pRe, pIm);
}
