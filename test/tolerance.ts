/** How far a number may lie from a reference, and by how much of that it does. */

export type Tolerance =
  /** The same number, or the same word. */
  | { readonly kind: 'exact' }
  /** In the number's own unit. */
  | { readonly kind: 'absolute'; readonly by: number }
  /** A share of the reference: 0.01 is 1 %. */
  | { readonly kind: 'share'; readonly by: number }
  /** A share of the reference, or so much in its own unit where the reference is near zero. */
  | { readonly kind: 'share-or-absolute'; readonly share: number; readonly by: number }
  /** Degrees round the circle: 179 and −179 lie 2 apart. */
  | { readonly kind: 'angle'; readonly by: number }
  /** Anywhere from `low` to `high`. */
  | { readonly kind: 'range'; readonly low: number; readonly high: number };

export type Value = number | string | boolean | null;

export const EXACT: Tolerance = { kind: 'exact' };
export const absolute = (by: number): Tolerance => ({ kind: 'absolute', by });
export const share = (by: number): Tolerance => ({ kind: 'share', by });
export const percent = (by: number): Tolerance => share(by / 100);
export const shareOrAbsolute = (ofIt: number, by: number): Tolerance => ({
  kind: 'share-or-absolute',
  share: ofIt,
  by
});
export const angle = (by: number): Tolerance => ({ kind: 'angle', by });
export const range = (low: number, high: number): Tolerance => ({ kind: 'range', low, high });

/** Degrees between two angles, 0 to 180. */
export function angleBetween(a: number, b: number): number {
  const turn = (((a - b) % 360) + 360) % 360;
  return Math.min(turn, 360 - turn);
}

/** How much of the tolerance is used: 0 is the same, 1 just within, above 1 a miss. A missing or non-finite number is Infinity. */
export function used(actual: Value | undefined, expected: Value, tolerance: Tolerance): number {
  if (actual === expected && tolerance.kind !== 'range') return 0;
  if (typeof actual !== 'number' || typeof expected !== 'number') return Infinity;
  if (!Number.isFinite(actual) || !Number.isFinite(expected)) return Infinity;
  const apart = Math.abs(actual - expected);
  switch (tolerance.kind) {
    case 'exact':
      return Infinity;
    case 'absolute':
      return apart / tolerance.by;
    case 'share':
      return expected === 0 ? Infinity : apart / (tolerance.by * Math.abs(expected));
    case 'share-or-absolute':
      return apart / Math.max(tolerance.share * Math.abs(expected), tolerance.by);
    case 'angle':
      return angleBetween(actual, expected) / tolerance.by;
    case 'range':
      return actual >= tolerance.low && actual <= tolerance.high ? 0 : Infinity;
  }
}

/** Compares many values and keeps what missed and what came nearest to missing. */
export class Comparison {
  readonly misses: string[] = [];
  count = 0;
  private worst = { share: 0, label: 'nothing' };

  check(label: string, actual: Value | undefined, expected: Value, tolerance: Tolerance): void {
    this.count++;
    const part = used(actual, expected, tolerance);
    if (part > this.worst.share) this.worst = { share: part, label };
    if (!(part <= 1))
      this.misses.push(
        `${label}: ${String(actual)} where ${String(expected)} is due (${JSON.stringify(tolerance)})`
      );
  }

  /** The value that used most of its tolerance. */
  get nearest(): string {
    return `${this.worst.label} used ${(100 * this.worst.share).toPrecision(3)} % of its tolerance`;
  }
}
