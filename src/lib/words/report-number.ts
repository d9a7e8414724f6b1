import { scaled } from './quantities';

/** A number for the report, times `factor` (free of the conversion's last-bit noise); null for what does not exist. */
export function finite(value: number | null, factor = 1): number | null {
  if (value === null || !Number.isFinite(value)) return null;
  return factor === 1 ? value : scaled(value, factor);
}
