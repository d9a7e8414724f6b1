/**
 * All shaping blocks in signal order as one flat cascade, evaluated frequency by frequency without allocation.
 * Magnitudes are powers |H|², floored at 1e-200 (−2000 dB) so that nothing downstream divides by zero.
 */
import type { Block } from './block';
import { blockResponse } from './block-response';
import type { BoxPole } from './linkwitz-transform';
import type { BlockResponse } from './section';

const STRIDE = 7;
const FLOOR = 1e-200;

export interface Cascade {
  /** Per section: b0, b1, b2, a0, a1, a2, 1/f0. */
  readonly coefficients: Float64Array;
  /** Flat gain as a power ratio, polarity (±1), delay (s). */
  readonly gainPower: number;
  readonly sign: 1 | -1;
  readonly delay: number;
}

export function joinResponses(parts: readonly BlockResponse[]): Cascade {
  const sections = parts.flatMap((p) => p.sections);
  const coefficients = new Float64Array(sections.length * STRIDE);
  sections.forEach((s, i) => coefficients.set([...s.b, ...s.a, 1 / s.f0], i * STRIDE));
  const gain = parts.reduce((sum, p) => sum + p.gain, 0);
  const inversions = parts.filter((p) => p.inverts).length;
  return {
    coefficients,
    gainPower: Math.pow(10, gain / 10),
    sign: inversions % 2 === 0 ? 1 : -1,
    delay: parts.reduce((sum, p) => sum + p.delay, 0)
  };
}

/** The cascade of the blocks that are not bypassed; `"box"` binds to `box`. */
export const compileCascade = (blocks: readonly Block[], box: BoxPole): Cascade =>
  joinResponses(blocks.filter((b) => !b.bypass).map((b) => blockResponse(b, box)));

/** Hz of every resonant pole pair (Q above 1.5): where a response can peak more narrowly than a grid is fine. */
export function resonances(c: Cascade): number[] {
  const k = c.coefficients;
  const found: number[] = [];
  for (let i = 0; i < k.length; i += STRIDE) {
    const [a0, a1, a2] = [k[i + 3], k[i + 4], k[i + 5]];
    if (a0 * a2 > 0 && Math.sqrt(a0 * a2) > 1.5 * Math.abs(a1)) found.push(Math.sqrt(a2 / a0) / k[i + 6]);
  }
  return found;
}

/** |H|² at f (Hz). */
export function cascadePower(c: Cascade, f: number): number {
  const k = c.coefficients;
  let power = c.gainPower;
  for (let i = 0; i < k.length; i += STRIDE) {
    const u = f * k[i + 6];
    const u2 = u * u;
    const nr = k[i + 2] - k[i] * u2;
    const ni = k[i + 1] * u;
    const dr = k[i + 5] - k[i + 3] * u2;
    const di = k[i + 4] * u;
    power *= (nr * nr + ni * ni) / (dr * dr + di * di);
    if (power < FLOOR) power = FLOOR;
  }
  return power;
}

/** Phase of H at f, radians, delay included; wrapped. Sections are multiplied as directions, scaled as they go, so that one angle is taken in all. */
export function cascadePhase(c: Cascade, f: number): number {
  const k = c.coefficients;
  let re: number = c.sign;
  let im = 0;
  for (let i = 0; i < k.length; i += STRIDE) {
    const u = f * k[i + 6];
    const u2 = u * u;
    const nr = k[i + 2] - k[i] * u2;
    const ni = k[i + 1] * u;
    const dr = k[i + 5] - k[i + 3] * u2;
    const di = k[i + 4] * u;
    const qr = nr * dr + ni * di;
    const qi = ni * dr - nr * di;
    const r = re * qr - im * qi;
    const m = re * qi + im * qr;
    // A zero exactly on f has no direction: it is passed over.
    const scale = Math.abs(r) + Math.abs(m);
    if (scale === 0) continue;
    re = r / scale;
    im = m / scale;
  }
  return Math.atan2(im, re) - 2 * Math.PI * f * c.delay;
}

/** Group delay −dφ/dω at f, s, by the derivative of each section. */
export function cascadeGroupDelay(c: Cascade, f: number): number {
  const k = c.coefficients;
  let delay = c.delay;
  for (let i = 0; i < k.length; i += STRIDE) {
    const u = f * k[i + 6];
    const scale = k[i + 6] / (2 * Math.PI);
    delay += scale * (angleSlope(k[i + 3], k[i + 4], k[i + 5], u) - angleSlope(k[i], k[i + 1], k[i + 2], u));
  }
  return delay;
}

/** d/du of the angle of c2 − c0·u² + j·c1·u. A zero on the axis turns the angle in a jump, which has no slope: 0 there. */
function angleSlope(c0: number, c1: number, c2: number, u: number): number {
  const re = c2 - c0 * u * u;
  const im = c1 * u;
  const size = re * re + im * im;
  return size === 0 ? 0 : (c1 * re + 2 * c0 * u * im) / size;
}
