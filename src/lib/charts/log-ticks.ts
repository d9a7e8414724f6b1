/**
 * Nominal one-third-octave frequencies of a decade: the R10 series of preferred numbers.
 * Source: ISO 266:1997, "Acoustics: preferred frequencies".
 */
const THIRD_OCTAVES = [1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8];

/** Marks of a decade from sparse to dense; each is a round number that a builder would say. */
const LADDER: readonly (readonly number[])[] = [
  [1],
  [1, 3],
  [1, 2, 5],
  [1, 1.5, 2, 3, 5, 8],
  [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8],
  [1, 1.25, 1.5, 1.75, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 9]
];

/** Sparser than all of them and still third-octaves. */
const SPARSE = [[1], [1, 2, 5]];

/** Every nominal third-octave within a range of Hz. */
export const thirdOctaves = (low: number, high: number): number[] => decades(low, high, THIRD_OCTAVES);

/** Third-octaves to label where `room` labels fit: all of them, else 1, 2 and 5 of each decade. */
export function thirdOctaveTicks(low: number, high: number, room: number): number[] {
  const all = thirdOctaves(low, high);
  return all.length <= room ? all : logTicks(low, high, room, SPARSE);
}

/** Round values to mark on a log scale: the densest set of which no more than `room` fall within the range. */
export function logTicks(low: number, high: number, room: number, ladder = LADDER): number[] {
  let best = decades(low, high, ladder[0]);
  for (const steps of ladder) {
    const ticks = decades(low, high, steps);
    if (ticks.length <= Math.max(2, room)) best = ticks;
  }
  return best;
}

function decades(low: number, high: number, steps: readonly number[]): number[] {
  if (!(low > 0) || !(high >= low)) return [];
  const out: number[] = [];
  const last = Math.floor(Math.log10(high) + 1e-9);
  for (let decade = Math.floor(Math.log10(low) + 1e-9); decade <= last; decade++) {
    for (const step of steps) {
      // Through text, so that 3.15 × 10 is 31.5 and not its neighbour.
      const value = Number(`${step}e${decade}`);
      if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) out.push(value);
    }
  }
  return out;
}
