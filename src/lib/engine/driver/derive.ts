/**
 * One driver's full small-signal set from any sufficient subset of its data sheet.
 * Units: SI. Qes is with all coils driven; `bl` is per coil.
 * Vas belongs to 20 °C and 101.325 kPa: from it the compliance once; moving mass, compliance, resistance and Bl then stay in any air.
 * Source: R. H. Small, "Direct-Radiator Loudspeaker System Analysis", JAES 20(5), 1972.
 */
import type { DriverSheet } from '../chain';
import { EngineError } from '../error';
import { GAMMA, STANDARD_PRESSURE } from '../quantity/air';

export interface DriverParameters {
  readonly fs: number;
  readonly qms: number;
  readonly qes: number;
  readonly qts: number;
  readonly vas: number;
  readonly cms: number;
  readonly mms: number;
  readonly rms: number;
  /** Per coil. */
  readonly bl: number;
}

/** What a data sheet still lacks; each with the alternatives that would do. */
export type DriverGap =
  'resonance' | 'compliance' | 'mechanical-damping' | 'electrical-damping' | 'qts-too-high';

const stiffnessVolume = (sd: number): number => GAMMA * STANDARD_PRESSURE * sd * sd;

/** What is missing; empty when `deriveDriver` will succeed. */
export function driverGaps(s: DriverSheet): DriverGap[] {
  const gaps: DriverGap[] = [];
  const compliance = s.vas ?? s.cms;
  if (s.fs === null && (s.mms === null || compliance === null)) gaps.push('resonance');
  else if (compliance === null && s.mms === null) gaps.push('compliance');
  const qmsKnown = s.qms !== null || s.rms !== null;
  const qesKnown = s.qes !== null || s.bl !== null;
  if (!qmsKnown && !(s.qts !== null && qesKnown)) gaps.push('mechanical-damping');
  if (!qesKnown && !(s.qts !== null && qmsKnown)) gaps.push('electrical-damping');
  if (gaps.length === 0 && qmsKnown !== qesKnown && s.qts !== null) {
    const { mms, fs } = moving(s);
    const other = qmsKnown ? (s.qms ?? qmsFromRms(s, mms, fs)) : (s.qes ?? qesFromBl(s, mms, fs));
    if (!(s.qts < other)) gaps.push('qts-too-high');
  }
  return gaps;
}

function moving(s: DriverSheet): { fs: number; cms: number; mms: number } {
  const fromVas = s.vas === null ? null : s.vas / stiffnessVolume(s.sd);
  if (s.fs === null) {
    const cms = (fromVas ?? s.cms) as number;
    const mms = s.mms as number;
    return { fs: 1 / (2 * Math.PI * Math.sqrt(mms * cms)), cms, mms };
  }
  const w2 = (2 * Math.PI * s.fs) ** 2;
  const cms = fromVas ?? (s.mms !== null ? 1 / (w2 * s.mms) : (s.cms as number));
  return { fs: s.fs, cms, mms: 1 / (w2 * cms) };
}

const qmsFromRms = (s: DriverSheet, mms: number, fs: number): number =>
  (2 * Math.PI * fs * mms) / (s.rms as number);
const qesFromBl = (s: DriverSheet, mms: number, fs: number): number =>
  (2 * Math.PI * fs * mms * s.re) / (s.coils * (s.bl as number) ** 2);

/** Full parameters of one driver. Throws `EngineError` where `driverGaps` is not empty. */
export function deriveDriver(s: DriverSheet): DriverParameters {
  const gaps = driverGaps(s);
  if (gaps.length > 0) throw new EngineError(`driver data must suffice (missing: ${gaps.join(', ')})`);
  const { fs, cms, mms } = moving(s);
  const w = 2 * Math.PI * fs;
  let qms = s.qms ?? (s.rms !== null ? qmsFromRms(s, mms, fs) : null);
  let qes = s.qes ?? (s.bl !== null ? qesFromBl(s, mms, fs) : null);
  const qts = s.qts as number;
  qes ??= 1 / (1 / qts - 1 / (qms as number));
  qms ??= 1 / (1 / qts - 1 / qes);
  return {
    fs,
    qms,
    qes,
    qts: (qms * qes) / (qms + qes),
    vas: cms * stiffnessVolume(s.sd),
    cms,
    mms,
    rms: (w * mms) / qms,
    bl: Math.sqrt((w * mms * s.re) / (s.coils * qes))
  };
}
