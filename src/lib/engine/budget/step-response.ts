/**
 * Step response of the whole chain, from a step at its input to the pressure at the seat, relative to the response at the pivot.
 * s(t) = (2/π)·∫ Re H(ω)·sin(ωt)/ω dω for a causal system without response at 0 Hz (A. Papoulis, "The Fourier Integral and its Applications", 1962).
 * The integral runs to 1 kHz and is faded out over its upper half: what is faster than that is not a subwoofer's.
 */
import { circuitPoint, solveCircuit } from '../box/circuit';
import type { Chain } from '../chain';
import { roomPhase, roomPower } from '../room/room';
import { cascadePhase, cascadePower } from '../shaping/cascade';
import { workOut } from './workings';

const TOP_HZ = 1000;
const FADE_FROM_HZ = 500;

export interface StepResponse {
  /** s. */
  readonly t: Float64Array;
  /** Relative: 1 is a step passed on as at the pivot. */
  readonly y: Float64Array;
}

/** `points` moments from 0 to `span` seconds. */
export function stepResponse(chain: Chain, span: number, points: number): StepResponse {
  const w = workOut(chain);
  const point = circuitPoint();
  /** Real and imaginary part of the chain at f; imaginary is not needed but the magnitude at the pivot is. */
  const respond = (f: number) => {
    solveCircuit(w.circuit, f, point);
    const power = (point.pRe ** 2 + point.pIm ** 2) * cascadePower(w.cascade, f) * roomPower(w.room, f);
    const phase = Math.atan2(point.pIm, point.pRe) + cascadePhase(w.cascade, f) + roomPhase(w.room, f);
    return { size: Math.sqrt(power), phase };
  };
  // Fine enough that the longest moment sees no copy of itself: a period of four spans.
  const df = 1 / (4 * span);
  const count = Math.floor(TOP_HZ / df);
  const real = new Float64Array(count + 1);
  for (let k = 1; k <= count; k++) {
    const f = k * df;
    const { size, phase } = respond(f);
    const fade =
      f <= FADE_FROM_HZ ? 1 : Math.cos((Math.PI / 2) * ((f - FADE_FROM_HZ) / (TOP_HZ - FADE_FROM_HZ))) ** 2;
    real[k] = (size * Math.cos(phase) * fade) / k;
  }
  const reference = respond(chain.goal.pivot).size;
  const t = new Float64Array(points);
  const y = new Float64Array(points);
  for (let i = 0; i < points; i++) {
    t[i] = (span * i) / (points - 1);
    const angle = 2 * Math.PI * df * t[i];
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    let [re, im, sum] = [1, 0, 0];
    for (let k = 1; k <= count; k++) {
      [re, im] = [re * c - im * s, re * s + im * c];
      sum += real[k] * im;
    }
    y[i] = (2 / Math.PI) * (sum / reference);
  }
  return { t, y };
}
