/**
 * Blocked impedance of a voice coil: Re + jωLe, or with a lossy part L2 ∥ R2 in series (two-inductor model, common practice).
 * Units: Ω, H, rad/s.
 */
export interface CoilImpedance {
  readonly re: number;
  readonly le: number;
  /** 0 and 0 when the lossy part is not given. */
  readonly l2: number;
  readonly r2: number;
}

/** Real part at ω. */
export function coilResistance(c: CoilImpedance, w: number): number {
  if (c.l2 === 0) return c.re;
  const x = w * c.l2;
  return c.re + (c.r2 * x * x) / (c.r2 * c.r2 + x * x);
}

/** Imaginary part at ω. */
export function coilReactance(c: CoilImpedance, w: number): number {
  if (c.l2 === 0) return w * c.le;
  const x = w * c.l2;
  return w * c.le + (c.r2 * c.r2 * x) / (c.r2 * c.r2 + x * x);
}
