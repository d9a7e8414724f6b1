/**
 * A data sheet against itself: a redundant value beside the one derived from the values that win, and values that look like a slip of unit or convention.
 * Thresholds (5 % note, 10 % caution; near ×2 or ×4 the likely slip): common practice, no source.
 */
import type { DriverSheet } from '../chain';
import { GAMMA, STANDARD_PRESSURE } from '../quantity/air';
import { deriveDriver } from './derive';
import { coilNominal } from './wiring';

export type RedundantKey = 'qts' | 'mms' | 'cms' | 'bl' | 'rms';

export type Slip =
  /** Of all coils where one coil's belongs, or the other way round. */
  | 'coils'
  | 'peak-to-peak'
  | 'diameter-for-area'
  /** Twice or half, four times or a quarter, without a named cause. */
  | 'factor-two'
  | 'factor-four'
  | 'unit-thousand';

export interface Contradiction {
  readonly key: RedundantKey;
  /** SI. */
  readonly given: number;
  readonly derived: number;
  /** given / derived. */
  readonly ratio: number;
  readonly slip: Slip | null;
}

export interface Suspicion {
  readonly what:
    | 'area-size'
    | 'xmax-large'
    | 'xmech-close'
    | 'mass-area'
    | 'nominal-re'
    | 'qts-range'
    | 'inductance-large'
    | 'efficiency-range';
  /** The value that looks odd and what would be usual (low, high), SI or dimensionless. */
  readonly value: number;
  readonly low: number;
  readonly high: number;
  readonly slip: Slip | null;
}

const NOTE = 0.05;

const near = (ratio: number, of: number): boolean => Math.abs(Math.log(ratio / of)) < Math.log(1.08);

function slipOf(key: RedundantKey, ratio: number, coils: number): Slip | null {
  if (coils > 1 && key === 'bl' && (near(ratio, coils) || near(ratio, 1 / coils))) return 'coils';
  if (near(ratio, 2) || near(ratio, 0.5)) return 'factor-two';
  if (near(ratio, 4) || near(ratio, 0.25)) return 'factor-four';
  if (near(ratio, 1000) || near(ratio, 0.001)) return 'unit-thousand';
  return null;
}

/** Redundant values that differ from the derived ones by more than 5 %. The winning values are never averaged with them. */
export function contradictions(s: DriverSheet): Contradiction[] {
  const d = deriveDriver(s);
  // Only what did not take part in the derivation can contradict it.
  const massUsed = s.fs === null || s.vas === null;
  const complianceUsed = s.vas === null && (s.fs === null || s.mms === null);
  const qmsKnown = s.qms !== null || s.rms !== null;
  const qesKnown = s.qes !== null || s.bl !== null;
  const rows: [RedundantKey, number | null, number][] = [
    ['qts', qmsKnown && qesKnown ? s.qts : null, d.qts],
    ['mms', massUsed ? null : s.mms, d.mms],
    ['cms', complianceUsed ? null : s.cms, d.cms],
    ['bl', s.qes === null ? null : s.bl, d.bl],
    ['rms', s.qms === null ? null : s.rms, d.rms]
  ];
  const found: Contradiction[] = [];
  for (const [key, given, derived] of rows) {
    if (given === null) continue;
    const ratio = given / derived;
    if (Math.abs(ratio - 1) > NOTE)
      found.push({ key, given, derived, ratio, slip: slipOf(key, ratio, s.coils) });
  }
  return found;
}

/** Values that no usual driver has. Ranges: common practice, no source. */
export function suspicions(s: DriverSheet): Suspicion[] {
  const d = deriveDriver(s);
  const found: Suspicion[] = [];
  const check = (
    what: Suspicion['what'],
    value: number | null,
    low: number,
    high: number,
    slip: Slip | null = null
  ) => {
    if (value !== null && (value < low || value > high)) found.push({ what, value, low, high, slip });
  };
  const radius = Math.sqrt(s.sd / Math.PI);
  // A cone seldom travels more than a third of its radius one way; twice that is a peak-to-peak figure.
  check('xmax-large', s.xmax, 0, 0.3 * radius, 'peak-to-peak');
  if (s.xmax !== null && s.xmech !== null) check('xmech-close', s.xmech / s.xmax, 1.05, 6);
  // Cone, coil and air load: 0.2 to 15 kg for a square metre of cone.
  check('mass-area', d.mms / s.sd, 0.2, 15);
  if (s.nominal !== null) check('nominal-re', s.re / s.nominal, 0.6, 1.05, s.coils > 1 ? 'coils' : null);
  check('qts-range', d.qts, 0.12, 1.5);
  check('inductance-large', s.le / coilNominal(s.re, s.nominal), 0, 2.5e-3);
  const efficiency = (4 * Math.PI ** 2 * d.fs ** 3 * d.vas) / (343.2 ** 3 * d.qes);
  check('efficiency-range', efficiency, 2e-5, 0.08);
  // Sd from Vas, Mms: a diameter typed for an area makes stiffness absurd.
  const stiffness = 1 / (d.cms * GAMMA * STANDARD_PRESSURE * s.sd);
  check('area-size', stiffness, 0.03, 60, 'diameter-for-area');
  return found;
}
