/** Usual values of the forms' numbers, in the plan file's units. Common practice, no source, where no source is named. */
export interface UsualValue {
  readonly name: string;
  readonly stored: number;
}

/**
 * The reference levels are peaks: 105 dB from a main channel, 115 dB from the effects channel (SMPTE RP 200 practice, from memory).
 * The others are common practice, no source.
 */
export const USUAL_LEVELS: readonly UsualValue[] = [
  { name: 'Music at home', stored: 95 },
  { name: 'Studio, near the ears', stored: 100 },
  { name: 'Film, main channel', stored: 105 },
  { name: 'Film, effects channel', stored: 115 }
];

/** A steady tone by definition; the rest common practice: organ and electronic music 6, film 9 to 12. */
export const USUAL_CRESTS: readonly UsualValue[] = [
  { name: 'Steady tone', stored: 3.01 },
  { name: 'Organ, electronic music', stored: 6 },
  { name: 'Film, dense', stored: 9 },
  { name: 'Film, open', stored: 12 }
];

export const USUAL_EFFICIENCIES: readonly UsualValue[] = [
  { name: 'Switching', stored: 0.85 },
  { name: 'Class AB', stored: 0.5 }
];

/** 1.25 is the best case in practice, 1.4 the isothermal limit of the theory (L. L. Beranek, "Acoustics", 1954). */
export const USUAL_FILL_GAINS: readonly UsualValue[] = [
  { name: 'Empty', stored: 1 },
  { name: 'Lightly filled', stored: 1.1 },
  { name: 'Well filled', stored: 1.2 },
  { name: 'At best', stored: 1.25 }
];

export interface Losses {
  readonly absorption: number;
  readonly leakage: number;
  /** How full such a box is: "lightly filled". */
  readonly of: string;
}

/**
 * The middle of the usual range. Absorption: box Q 5 to 10 unfilled, 2 to 5 well filled (R. H. Small, "Closed-Box Loudspeaker
 * Systems, Part I", JAES 20(10), 1972, from memory). Leakage, and what counts as filled: common practice, no source.
 */
export function typicalLosses(fillGain: number): Losses {
  const leakage = 20;
  if (fillGain < 1.05) return { absorption: 8, leakage, of: 'not filled' };
  return fillGain < 1.15
    ? { absorption: 6, leakage, of: 'lightly filled' }
    : { absorption: 4, leakage, of: 'well filled' };
}
