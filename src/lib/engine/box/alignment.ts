/**
 * Closed-box alignment: what box, losses and source resistance make of the driver.
 * Units: SI; Q and α dimensionless. Includes source resistance and box losses, not the coil's inductance.
 * Sources: R. H. Small, "Closed-Box Loudspeaker Systems, Part I: Analysis", JAES 20(10), 1972 (fc, Qtc, f3, peak);
 * "Vented-Box Loudspeaker Systems, Part I", JAES 21(5), 1973 (absorption and leakage Q).
 */
import type { Air, Box } from '../chain';
import type { EquivalentDriver } from '../driver/equivalent';
import { requirePositive } from '../error';
import { GAMMA } from '../quantity/air';
import { effectiveVolume, netVolume } from './volume';

export interface Alignment {
  readonly net: number;
  readonly effective: number;
  /** Acoustic compliance of the box, m³/Pa. */
  readonly cab: number;
  readonly alpha: number;
  readonly fc: number;
  readonly qec: number;
  readonly qmc: number;
  readonly qtc: number;
  readonly f3: number;
  /** dB above the passband; 0 when there is no peak, and then `peakAt` is null. */
  readonly peak: number;
  readonly peakAt: number | null;
}

/** f3/fc of a second-order high-pass of this Q. Depends on Q alone. */
export function f3Ratio(q: number): number {
  const a = 1 / (q * q) - 2;
  return Math.sqrt((a + Math.sqrt(a * a + 4)) / 2);
}

/** Response peak of a second-order high-pass of this Q: dB, and its frequency over fc (null without a peak). */
export function responsePeak(q: number): { db: number; ratio: number | null } {
  if (!(q > Math.SQRT1_2)) return { db: 0, ratio: null };
  const q2 = q * q;
  return { db: 20 * Math.log10(q2 / Math.sqrt(q2 - 0.25)), ratio: 1 / Math.sqrt(1 - 1 / (2 * q2)) };
}

export function alignBox(driver: EquivalentDriver, box: Box, air: Air, sourceResistance: number): Alignment {
  const net = requirePositive(netVolume(box, driver.displacement), 'net box volume (m³)');
  const effective = effectiveVolume(box, net);
  const cab = effective / (GAMMA * air.pressure);
  const alpha = (driver.cms * driver.sd * driver.sd) / cab;
  const rise = Math.sqrt(1 + alpha);
  const fc = driver.fs * rise;
  const re = driver.coil.re;
  const qec = driver.qes * ((re + sourceResistance) / re) * rise;
  const boxLoss =
    (box.qAbsorption === null ? 0 : 1 / box.qAbsorption) + (box.qLeakage === null ? 0 : 1 / box.qLeakage);
  const qmc = 1 / (1 / (driver.qms * rise) + (alpha / (1 + alpha)) * boxLoss);
  const qtc = (qec * qmc) / (qec + qmc);
  const peak = responsePeak(qtc);
  return {
    net,
    effective,
    cab,
    alpha,
    fc,
    qec,
    qmc,
    qtc,
    f3: fc * f3Ratio(qtc),
    peak: peak.db,
    peakAt: peak.ratio === null ? null : fc * peak.ratio
  };
}
