/** Which quantity a key of the plan file holds, by the unit its name ends with. */
import { unitOf } from '$lib/plan/unit-of';
import type { Quantity } from './quantity';

const BY_UNIT: Record<string, Quantity> = {
  'mm/N': 'compliance',
  'kg/s': 'mechanical-resistance',
  'cm²': 'area',
  kPa: 'pressure',
  ohm: 'resistance',
  Hz: 'frequency',
  dB: 'level',
  mH: 'inductance',
  mm: 'length-small',
  ms: 'time',
  'T·m': 'force-factor',
  '°C': 'temperature',
  K: 'temperature-rise',
  L: 'volume',
  W: 'power',
  g: 'mass-small',
  m: 'length-large'
};

const BY_KEY: Record<string, Quantity> = {
  efficiency: 'share',
  boundary_distances_m: 'length-large',
  copies: 'count',
  count: 'count',
  coils: 'count',
  order: 'count'
};

export function quantityOfKey(key: string): Quantity {
  const unit = unitOf(key);
  return BY_KEY[key] ?? (unit === null ? 'ratio' : BY_UNIT[unit]);
}
