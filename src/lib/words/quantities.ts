/** Quantities in words, with their units: SI in, the trade's units out. */
import { fixed, floorTo, significant } from './format-number';

/** Litres of a volume in m³ without the noise of the conversion: 0.0571 → 57.1. */
export const scaled = (value: number, factor: number): number => Number((value * factor).toPrecision(14));

/** A level or a tolerance as typed: "105 dB", "102.7 dB", "3 dB". */
export const levelText = (db: number): string => `${significant(db, 4)} dB`;
/** The highest level that holds, rounded down so that it does hold: "103.2 dB". */
export const safeLevelText = (db: number): string => `${fixed(floorTo(db, 1), 1)} dB`;
/** A difference of levels, one decimal: "6.0 dB". */
export const dbText = (db: number): string => `${fixed(db, 1)} dB`;
/** A frequency to three digits: "17.3 Hz". */
export const hertzText = (f: number): string => `${significant(f, 3)} Hz`;
/** The place of a flat extreme: whole hertz from 10 up, "21 Hz". */
export const aboutHertzText = (f: number): string => `${f < 9.95 ? significant(f, 2) : fixed(f, 0)} Hz`;
export const millimetresText = (m: number): string => `${significant(m * 1000, 3)} mm`;
export const litresText = (m3: number): string => `${significant(m3 * 1000, 3)} L`;
export const ohmText = (ohm: number): string => `${significant(ohm, 3)} ohm`;
export const wattsText = (w: number): string => `${significant(w, 3)} W`;
export const voltsText = (v: number): string => `${significant(v, 3)} V`;
export const ampsText = (a: number): string => `${significant(a, 3)} A`;
/** A fraction as a percentage, two digits: 0.072 → "7.2 %". */
export const percentText = (fraction: number): string => `${significant(fraction * 100, 2)} %`;
/** Q to two decimals, the way alignments are spoken of. */
export const qText = (q: number): string => fixed(q, 2);
