/** A law: a property that every plan must keep. Fixed seed, so that a run is repeatable. */
import fc from 'fast-check';
import { expect, test } from 'vitest';

const SEED = 20_251;

/** Tests `check` on `numRuns` values. A failing one is printed as it is, not shrunk: each trial is a whole plan worked out, and shrinking takes thousands. */
export function law<T>(
  name: string,
  values: fc.Arbitrary<T>,
  numRuns: number,
  check: (value: T) => void
): void {
  test(name, () => fc.assert(fc.property(values, check), { seed: SEED, numRuns, endOnFailure: true }));
}

/** Throws unless `actual` lies within `tolerance` of `wanted` (NaN fails, two equal infinities too). */
export function close(actual: number, wanted: number, tolerance: number, what: string): void {
  if (!(Math.abs(actual - wanted) <= tolerance))
    throw new Error(`${what}: ${actual}, wanted ${wanted} within ${tolerance}`);
}

/** The same with a tolerance that grows with the wanted size; zero must be met exactly. */
export const near = (actual: number, wanted: number, relative: number, what: string): void =>
  close(actual, wanted, relative * Math.abs(wanted), what);

/** Two arrays of numbers, entry by entry; `map` turns the second into what is wanted of the first. */
export function nearAll(
  actual: Float64Array,
  given: Float64Array,
  map: (x: number) => number,
  relative: number,
  what: string
): void {
  expect(actual.length).toBe(given.length);
  for (let i = 0; i < actual.length; i++) near(actual[i], map(given[i]), relative, `${what} at point ${i}`);
}

/** The same with an absolute tolerance. */
export function closeAll(
  actual: Float64Array,
  given: Float64Array,
  map: (x: number) => number,
  tolerance: number,
  what: string
): void {
  expect(actual.length).toBe(given.length);
  for (let i = 0; i < actual.length; i++) close(actual[i], map(given[i]), tolerance, `${what} at point ${i}`);
}

/** The same structure, its numbers within a relative tolerance. */
export function alike(actual: unknown, wanted: unknown, relative: number, path = 'value'): void {
  if (typeof actual === 'number' && typeof wanted === 'number') near(actual, wanted, relative, path);
  else if (typeof actual !== 'object' || typeof wanted !== 'object' || actual === null || wanted === null)
    expect(actual, path).toBe(wanted);
  else {
    expect(Object.keys(actual).sort(), path).toEqual(Object.keys(wanted).sort());
    for (const [key, value] of Object.entries(actual))
      alike(value, (wanted as Record<string, unknown>)[key], relative, `${path}.${key}`);
  }
}
