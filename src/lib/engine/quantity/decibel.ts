/** Decibels. Levels are re 20 µPa RMS. */

/** Pa RMS at 0 dB SPL (ISO 1683, from memory). */
export const REFERENCE_PRESSURE = 20e-6;
/** 20·log10(√2): a sine's peak over its RMS, dB. */
export const SINE_CREST = 20 * Math.log10(Math.SQRT2);

/** dB of a ratio of amplitudes. */
export const toDb = (ratio: number): number => 20 * Math.log10(ratio);
/** Ratio of amplitudes of so many dB. */
export const fromDb = (db: number): number => Math.pow(10, db / 20);
/** Ratio of powers of so many dB. */
export const powerFromDb = (db: number): number => Math.pow(10, db / 10);
/** dB SPL of an RMS pressure in Pa. */
export const pressureLevel = (pascal: number): number => 20 * Math.log10(pascal / REFERENCE_PRESSURE);
