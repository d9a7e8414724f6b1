/**
 * N identical drivers sharing one box, as wired, as one equivalent driver without source resistance:
 * N·Mms, Cms/N, N·Rms, N·Sd, Re and Bl as wired. Its cone moves as each cone does.
 * Source: R. H. Small, "Direct-Radiator Loudspeaker System Analysis", JAES 20(5), 1972.
 */
import type { Air, DriverSheet } from '../chain';
import { density, soundSpeed } from '../quantity/air';
import { pressureLevel } from '../quantity/decibel';
import type { CoilImpedance } from './coil';
import { deriveDriver, type DriverParameters } from './derive';
import { coilFactor, driverFactor, nominalLoad } from './wiring';

export interface EquivalentDriver {
  readonly count: number;
  readonly fs: number;
  readonly qms: number;
  readonly qes: number;
  readonly qts: number;
  /** N·Vas, m³. */
  readonly vas: number;
  readonly cms: number;
  readonly mms: number;
  readonly rms: number;
  readonly bl: number;
  readonly coil: CoilImpedance;
  /** N·Sd, m². */
  readonly sd: number;
  readonly nominal: number;
  /** W continuous, all drivers as wired; null when not given. */
  readonly power: number | null;
  readonly xmax: number | null;
  readonly xmech: number | null;
  /** m³ taken from the box by all drivers, and whether it is an estimate. */
  readonly displacement: number;
  readonly displacementEstimated: boolean;
  /** Half space, dimensionless (1 = 100 %). */
  readonly efficiency: number;
  /** dB at 1 m in half space from 1 W into Re; from √8 V into Re as wired. */
  readonly level1W: number;
  readonly level2V83: number;
  /** The single driver it is made of. */
  readonly each: DriverParameters;
}

/** Volume a driver takes from its box when the sheet does not say: 0.2·Sd^1.5 m³ (common practice, ±40 %). */
export const estimatedDisplacement = (sd: number): number => 0.2 * Math.pow(sd, 1.5);

export function equivalentDriver(sheet: DriverSheet, air: Air): EquivalentDriver {
  const one = deriveDriver(sheet);
  const n = sheet.count;
  const k = sheet.coils;
  const single = sheet.coilWiring === 'single';
  const qes = single ? one.qes * k : one.qes;
  const coilR = coilFactor(sheet.coilWiring, k);
  const driversR = driverFactor(sheet.driverWiring, n);
  const coilL = sheet.coilWiring === 'series' ? k * k : 1;
  const re = sheet.re * coilR * driversR;
  const bl = one.bl * (sheet.coilWiring === 'series' ? k : 1) * (sheet.driverWiring === 'series' ? n : 1);
  const hasLossy = sheet.l2 !== null && sheet.r2 !== null && sheet.l2 > 0;
  const rho = density(air);
  const c = soundSpeed(air);
  const mms = n * one.mms;
  const sd = n * sheet.sd;
  // η₀ = ρ·Bl²·Sd²/(2π·c·Re·Mms²), the same as (4π²/c³)·fs³·Vas/Qes in any air.
  const efficiency = (rho * bl * bl * sd * sd) / (2 * Math.PI * c * re * mms * mms);
  const level1W = pressureLevel(Math.sqrt((efficiency * rho * c) / (2 * Math.PI)));
  return {
    count: n,
    fs: one.fs,
    qms: one.qms,
    qes,
    qts: (one.qms * qes) / (one.qms + qes),
    vas: n * one.vas,
    cms: one.cms / n,
    mms,
    rms: n * one.rms,
    bl,
    coil: {
      re,
      le: sheet.le * coilL * driversR,
      l2: hasLossy ? (sheet.l2 as number) * coilL * driversR : 0,
      r2: hasLossy ? (sheet.r2 as number) * coilL * driversR : 0
    },
    sd,
    nominal: nominalLoad(sheet, sheet.coilWiring, sheet.driverWiring),
    power: sheet.power === null ? null : (n * sheet.power) / (single ? k : 1),
    xmax: sheet.xmax,
    xmech: sheet.xmech,
    displacement: n * (sheet.displacement ?? estimatedDisplacement(sheet.sd)),
    displacementEstimated: sheet.displacement === null,
    efficiency,
    level1W,
    level2V83: level1W + 10 * Math.log10(8 / re),
    each: one
  };
}
