/**
 * The equivalent circuit of amplifier output, cable, coil, cone and closed box, solved for 1 V RMS behind the output resistance.
 * Units: SI; time convention e^{+jωt}; outward motion positive; half space at 1 m, flight time left out.
 * Sources: R. H. Small, "Closed-Box Loudspeaker Systems, Part I", JAES 20(10), 1972 (circuit);
 * "Vented-Box Loudspeaker Systems, Part I", JAES 21(5), 1973 (absorption, leakage, and that a leak radiates against the cone).
 */
import type { Box } from '../chain';
import { coilReactance, coilResistance, type CoilImpedance } from '../driver/coil';
import type { EquivalentDriver } from '../driver/equivalent';
import type { Alignment } from './alignment';

export interface Circuit {
  readonly coil: CoilImpedance;
  readonly cable: number;
  readonly output: number;
  readonly bl: number;
  readonly sd: number;
  readonly mms: number;
  readonly cms: number;
  readonly rms: number;
  /** m³/Pa; the box's acoustic compliance. */
  readonly cab: number;
  /** Pa·s/m³ in series with it, 0 without absorption. */
  readonly rab: number;
  /** Pa·s/m³ across both; Infinity without leakage. */
  readonly ral: number;
  /** kg/m³. */
  readonly rho: number;
}

/** What the circuit does at one frequency for 1 V RMS of drive. Reused from frequency to frequency: no allocation in the hot loop. */
export interface CircuitPoint {
  /** Load at the terminals, cable included, output resistance not. Ω. */
  zRe: number;
  zIm: number;
  /** |Z|², Ω², and |Z + output resistance|², Ω². */
  z2: number;
  total2: number;
  /** One-way peak travel per volt, squared, m²/V². */
  travel2: number;
  /** Pressure at 1 m per volt, Pa. */
  pRe: number;
  pIm: number;
}

export const circuitPoint = (): CircuitPoint => ({
  zRe: 0,
  zIm: 0,
  z2: 0,
  total2: 0,
  travel2: 0,
  pRe: 0,
  pIm: 0
});

export function buildCircuit(
  driver: EquivalentDriver,
  alignment: Alignment,
  box: Box,
  rho: number,
  cable: number,
  output: number,
  re = driver.coil.re
): Circuit {
  const wc = 2 * Math.PI * alignment.fc;
  return {
    coil: { ...driver.coil, re },
    cable,
    output,
    bl: driver.bl,
    sd: driver.sd,
    mms: driver.mms,
    cms: driver.cms,
    rms: driver.rms,
    cab: alignment.cab,
    rab: box.qAbsorption === null ? 0 : 1 / (wc * alignment.cab * box.qAbsorption),
    ral: box.qLeakage === null ? Infinity : box.qLeakage / (wc * alignment.cab),
    rho
  };
}

/** The same driver without the box's air behind it (Z_box = 0): what the account calls the driver's own level. */
export const withoutBox = (c: Circuit): Circuit => ({ ...c, cab: Infinity, rab: 0, ral: Infinity });

/** Solves the circuit at f (Hz) into `out`. */
export function solveCircuit(c: Circuit, f: number, out: CircuitPoint): void {
  const w = 2 * Math.PI * f;
  // Box: absorption in series with the compliance, leakage across both.
  let boxRe = c.rab;
  let boxIm = -1 / (w * c.cab);
  let leakRe = 1;
  let leakIm = 0;
  if (c.ral !== Infinity) {
    const sumRe = c.ral + boxRe;
    const size = sumRe * sumRe + boxIm * boxIm;
    leakRe = (c.ral * sumRe) / size;
    leakIm = (-c.ral * boxIm) / size;
    const r = boxRe * leakRe - boxIm * leakIm;
    boxIm = boxRe * leakIm + boxIm * leakRe;
    boxRe = r;
  }
  const area2 = c.sd * c.sd;
  const mRe = c.rms + area2 * boxRe;
  const mIm = w * c.mms - 1 / (w * c.cms) + area2 * boxIm;
  const m2 = mRe * mRe + mIm * mIm;
  const bl2 = c.bl * c.bl;
  const zRe = c.cable + coilResistance(c.coil, w) + (bl2 * mRe) / m2;
  const zIm = coilReactance(c.coil, w) - (bl2 * mIm) / m2;
  const tRe = zRe + c.output;
  const total2 = tRe * tRe + zIm * zIm;
  out.zRe = zRe;
  out.zIm = zIm;
  out.z2 = zRe * zRe + zIm * zIm;
  out.total2 = total2;
  out.travel2 = (2 * bl2) / (w * w * total2 * m2);
  // Volume velocity that compresses the box: Sd·Bl/(Z_total·Z_m), less what leaks; pressure jωρ·U0/(2π).
  const dRe = tRe * mRe - zIm * mIm;
  const dIm = tRe * mIm + zIm * mRe;
  const k = (w * c.rho * c.sd * c.bl) / (2 * Math.PI * total2 * m2);
  const uRe = k * (dRe * leakRe + dIm * leakIm);
  const uIm = k * (dRe * leakIm - dIm * leakRe);
  out.pRe = -uIm;
  out.pIm = uRe;
}

/** Passband level reference, Pa at 1 m per volt, of the alignment: ρ·Bl·Sd/(2π·(Re + R_s)·Mms), inductance left out. */
export const passbandPressure = (c: Circuit): number =>
  (c.rho * c.bl * c.sd) / (2 * Math.PI * (c.coil.re + c.cable + c.output) * c.mms);
