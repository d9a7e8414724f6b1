/**
 * Resistance of a copper cable, both conductors, from its length and cross-section.
 * R = 0.0175 Ω·mm²/m · 2 · length / area: common practice for copper at room temperature (annealed copper is 0.01724 at 20 °C, IEC 60028, 1925).
 */
export const COPPER_OHM_MM2_PER_M = 0.0175;

/** Ohm, to four digits. `length` in m, one way; `area` in mm². */
export const cableResistance = (length: number, area: number): number =>
  Number(((COPPER_OHM_MM2_PER_M * 2 * length) / area).toPrecision(4));
