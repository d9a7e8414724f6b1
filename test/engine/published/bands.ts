/** Bands: numbers 88 and 89 of the published checks (90, band edges, is of no use to the engine). */
import { THIRD_OCTAVES } from '$lib/engine/quantity/grid';
import { absolute, EXACT, share } from '../../tolerance';
import type { CheckRow } from './check-row';

const CENTRES = [
  10, 12.5893, 15.8489, 19.9526, 25.1189, 31.6228, 39.8107, 50.1187, 63.0957, 79.4328, 100, 125.893
];
const NOMINAL = [10, 12.5, 16, 20, 25, 31.5, 40, 50, 63, 80, 100, 125];

export const bands: readonly CheckRow[] = [
  ...CENTRES.map((value, i): CheckRow => {
    return {
      number: 88,
      what: `one-third octave k = ${i + 10}, Hz`,
      value,
      // The page prints six figures.
      tolerance: share(4e-6),
      source:
        'IEC 61260-1, Octave-band and fractional-octave-band filters – Part 1, 2014, base ten G = 10^0.3',
      actual: () => THIRD_OCTAVES[i].f
    };
  }),
  ...CENTRES.slice(1).map((_, i): CheckRow => {
    return {
      number: 88,
      what: `one-third octave k = ${i + 11} over the one below`,
      value: 10 ** 0.1,
      tolerance: share(1e-12),
      source: 'IEC 61260-1, 2014, base ten',
      actual: () => THIRD_OCTAVES[i + 1].f / THIRD_OCTAVES[i].f
    };
  }),
  ...NOMINAL.map((value, i): CheckRow => {
    return {
      number: 89,
      what: `nominal name of k = ${i + 10}, Hz`,
      value,
      tolerance: EXACT,
      source: 'ISO 266, Preferred frequencies, 1997 (from memory)',
      actual: () => THIRD_OCTAVES[i].nominal
    };
  }),
  {
    number: 89,
    what: 'rows of the ledger',
    value: 12,
    tolerance: absolute(0),
    source: 'ISO 266, Preferred frequencies, 1997 (from memory): 10 to 125 Hz',
    actual: () => THIRD_OCTAVES.length
  }
];
