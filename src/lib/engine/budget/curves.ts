/** The curves of a chain over any frequencies: one pass, typed arrays, SI. */
import { circuitPoint, solveCircuit } from '../box/circuit';
import type { Chain } from '../chain';
import { roomDelay, roomPhase } from '../room/room';
import { cascadeGroupDelay, cascadePhase } from '../shaping/cascade';
import type { Curves, LimitName } from './budget';
import { toDb } from '../quantity/decibel';
import { LIMITED } from './limit-margins';
import { LIMITS } from './limits/all-limits';
import { rowAt } from './rows';
import { workOut, type Workings } from './workings';

const DEGREES = 180 / Math.PI;

/** An angle in radians as degrees in (−180, 180]. */
export function wrapDegrees(radians: number): number {
  const turns = (radians * DEGREES) / 360;
  const wrapped = (turns - Math.ceil(turns - 0.5)) * 360;
  return wrapped === 0 ? 0 : wrapped;
}

/** Relative step of the two-sided difference that gives the circuit's group delay. */
const STEP = 1e-5;

export const curves = (chain: Chain, frequencies: Float64Array): Curves =>
  curvesOf(workOut(chain), frequencies);

export function curvesOf(w: Workings, frequencies: Float64Array): Curves {
  const n = frequencies.length;
  const array = () => new Float64Array(n);
  const { goal } = w.chain;
  const demanded = new Float64Array(LIMITED.length);
  const judged = LIMITS.flatMap(({ name, quantity, allowed }) => {
    const most = allowed(w);
    return most === null
      ? []
      : [{ name, quantity: LIMITED.indexOf(quantity), allowedDb: toDb(most), ceiling: array() }];
  });
  const out = {
    f: frequencies,
    delivered: array(),
    wanted: array(),
    phase: array(),
    groupDelay: array(),
    shaping: array(),
    driverBox: array(),
    room: array(),
    copies: w.copies,
    driveV: array(),
    currentA: array(),
    realW: array(),
    apparentVA: array(),
    impedance: array(),
    impedancePhase: array(),
    travel: array()
  };
  const point = circuitPoint();
  const near = circuitPoint();
  for (let i = 0; i < n; i++) {
    const f = frequencies[i];
    const row = rowAt(w, f, point);
    const current2 = row.drive2 / point.total2;
    const z = Math.sqrt(point.z2);
    out.delivered[i] = row.delivered;
    out.wanted[i] = f >= goal.from && f <= goal.to ? goal.level : NaN;
    out.shaping[i] = row.shaping;
    out.driverBox[i] = row.driverBox;
    out.room[i] = row.room;
    out.driveV[i] = row.driveV;
    out.currentA[i] = Math.sqrt(current2);
    out.realW[i] = current2 * point.zRe;
    out.apparentVA[i] = current2 * z;
    out.impedance[i] = z;
    out.impedancePhase[i] = Math.atan2(point.zIm, point.zRe) * DEGREES;
    out.travel[i] = Math.sqrt(row.drive2 * point.travel2);
    out.phase[i] = wrapDegrees(
      Math.atan2(point.pIm, point.pRe) + cascadePhase(w.cascade, f) + roomPhase(w.room, f)
    );
    solveCircuit(w.circuit, f * (1 + STEP), near);
    const aboveRe = near.pRe;
    const aboveIm = near.pIm;
    solveCircuit(w.circuit, f * (1 - STEP), near);
    // Angle between the two by their quotient: no wrap to undo, and so small that it is its own tangent.
    const turn = (aboveIm * near.pRe - aboveRe * near.pIm) / (aboveRe * near.pRe + aboveIm * near.pIm);
    out.groupDelay[i] =
      -turn / (2 * Math.PI * f * 2 * STEP) + cascadeGroupDelay(w.cascade, f) + roomDelay(w.room, f);
    for (let k = 0; k < LIMITED.length; k++) demanded[k] = 10 * Math.log10(row.drive2 * LIMITED[k](point));
    for (const l of judged) l.ceiling[i] = row.delivered + l.allowedDb - demanded[l.quantity];
  }
  const ceilings = Object.fromEntries(
    LIMITS.map(({ name }) => [name, judged.find((l) => l.name === name)?.ceiling ?? null])
  ) as { [L in LimitName]: Float64Array | null };
  return { ...out, ceilings };
}
