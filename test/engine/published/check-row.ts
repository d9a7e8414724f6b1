/**
 * A check value from outside the project, numbered as in `test/reference/published-checks.md`, and how the engine arrives at it.
 * `value` and `source` are typed from that page; `actual` asks the engine's own functions.
 */
import type { Tolerance } from '../../tolerance';

export interface CheckRow {
  readonly number: number;
  readonly what: string;
  readonly value: number;
  readonly tolerance: Tolerance;
  /** A published work, a definition, or "common practice". */
  readonly source: string;
  readonly actual: () => number;
}

export const one = (
  number: number,
  what: string,
  value: number,
  tolerance: Tolerance,
  source: string,
  actual: () => number
): CheckRow => ({ number, what, value, tolerance, source, actual });

/** Several values of one number: each with what it is at and how the engine gives it. */
export function rowsOf<T>(
  common: Pick<CheckRow, 'number' | 'what' | 'tolerance' | 'source'>,
  values: readonly (readonly [at: T, value: number])[],
  actual: (at: T) => number
): CheckRow[] {
  return values.map(([at, value]) => ({
    ...common,
    what: `${common.what}, ${String(at)}`,
    value,
    actual: () => actual(at)
  }));
}
