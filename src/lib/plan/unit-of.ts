/** The unit a key's name ends with, as a person writes it; null for a key without unit. */
const UNITS: readonly (readonly [string, string])[] = [
  ['_mm_per_N', 'mm/N'],
  ['_kg_per_s', 'kg/s'],
  ['_cm2', 'cm²'],
  ['_kPa', 'kPa'],
  ['_ohm', 'ohm'],
  ['_Hz', 'Hz'],
  ['_dB', 'dB'],
  ['_mH', 'mH'],
  ['_mm', 'mm'],
  ['_ms', 'ms'],
  ['_Tm', 'T·m'],
  ['_C', '°C'],
  ['_K', 'K'],
  ['_L', 'L'],
  ['_W', 'W'],
  ['_g', 'g'],
  ['_m', 'm']
];

export const unitOf = (key: string): string | null => UNITS.find(([end]) => key.endsWith(end))?.[1] ?? null;
