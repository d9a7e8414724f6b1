/**
 * Power gain of a source near up to three perpendicular, rigid boundaries, re half space.
 * 10·log10(1 + Σ sin(kd_i)/(kd_i)) − 3.01 dB over the 2^n − 1 images, d_i = 2·√(Σ squares of the distances in the subset).
 * Source: R. V. Waterhouse, "Output of a Sound Source in a Reverberation Chamber and Other Reflecting Environments", JASA 30(1), 1958.
 */

/** dB of half space re free field: one wall at no distance. */
export const HALF_SPACE_RE_FREE_DB = 10 * Math.log10(2);

/** Distances (m) to the images of the source. */
export function imageDistances(boundaries: readonly number[]): number[] {
  const images: number[] = [];
  for (let subset = 1; subset < 1 << boundaries.length; subset++) {
    let sum = 0;
    for (let i = 0; i < boundaries.length; i++) if (subset & (1 << i)) sum += boundaries[i] ** 2;
    images.push(2 * Math.sqrt(sum));
  }
  return images;
}

/** Power ratio re half space at f (Hz); 1 without boundaries. c in m/s. */
export function boundaryPower(images: readonly number[], f: number, c: number): number {
  if (images.length === 0) return 1;
  const k = (2 * Math.PI * f) / c;
  let sum = 1;
  for (const d of images) sum += d === 0 ? 1 : Math.sin(k * d) / (k * d);
  return Math.max(sum, 1e-6) / 2;
}

/** The same in dB. */
export const boundaryGain = (images: readonly number[], f: number, c: number): number =>
  10 * Math.log10(boundaryPower(images, f, c));
