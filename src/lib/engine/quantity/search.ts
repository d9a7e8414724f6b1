/** One-dimensional searches on a frequency or a setting. */

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Largest value of a function with one peak between `low` and `high` (both > 0, searched in log x), by golden section
 * (J. Kiefer, "Sequential minimax search for a maximum", Proc. AMS 4(3), 1953), to `relative` of x.
 * The ends count too: a peak at an end is found there.
 */
export function goldenMaximum(
  value: (x: number) => number,
  low: number,
  high: number,
  relative = 1e-5
): { x: number; value: number } {
  let a = Math.log(low);
  let b = Math.log(high);
  let x1 = b - GOLDEN * (b - a);
  let x2 = a + GOLDEN * (b - a);
  let v1 = value(Math.exp(x1));
  let v2 = value(Math.exp(x2));
  while (b - a > relative) {
    if (v1 >= v2) {
      b = x2;
      x2 = x1;
      v2 = v1;
      x1 = b - GOLDEN * (b - a);
      v1 = value(Math.exp(x1));
    } else {
      a = x1;
      x1 = x2;
      v1 = v2;
      x2 = a + GOLDEN * (b - a);
      v2 = value(Math.exp(x2));
    }
  }
  return v1 >= v2 ? { x: Math.exp(x1), value: v1 } : { x: Math.exp(x2), value: v2 };
}

/** Where a test turns between `no` (fails) and `yes` (passes); returns the passing side, within `tolerance`. */
export function bisect(passes: (x: number) => boolean, no: number, yes: number, tolerance: number): number {
  let steps = 0;
  while (Math.abs(yes - no) > tolerance && steps++ < 80) {
    const middle = (no + yes) / 2;
    if (passes(middle)) yes = middle;
    else no = middle;
  }
  return yes;
}
