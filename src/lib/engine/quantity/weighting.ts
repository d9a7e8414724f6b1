/**
 * Frequency weightings A and C in dB, 0 dB at 1 kHz.
 * Source: IEC 61672-1, "Sound level meters – Part 1", 2013 (pole frequencies 20.599, 107.653, 737.862, 12194.217 Hz).
 */
const F1 = 20.598997;
const F2 = 107.65265;
const F3 = 737.86223;
const F4 = 12194.217;

function rawC(f: number): number {
  const f2 = f * f;
  return (F4 * F4 * f2) / ((f2 + F1 * F1) * (f2 + F4 * F4));
}

function rawA(f: number): number {
  const f2 = f * f;
  return (rawC(f) * f2) / Math.sqrt((f2 + F2 * F2) * (f2 + F3 * F3));
}

const A_1000 = rawA(1000);
const C_1000 = rawC(1000);

export const weightingA = (f: number): number => 20 * Math.log10(rawA(f) / A_1000);
/** Power ratio of the C-weighting at f. */
export const weightingCPower = (f: number): number => (rawC(f) / C_1000) ** 2;
export const weightingC = (f: number): number => 20 * Math.log10(rawC(f) / C_1000);
