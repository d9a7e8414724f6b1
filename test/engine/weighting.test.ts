/**
 * The C-weighting, behind the peak level that ears should know of (the A-weighting is numbers 71–73 of the published checks).
 * Source: IEC 61672-1, "Sound level meters – Part 1", 2013, table of frequency weightings at 10^(k/10) Hz (from memory).
 */
import { expect, test } from 'vitest';
import { weightingCPower } from '$lib/engine/quantity/weighting';
import { absolute, used } from '../tolerance';

const TABLE: [k: number, db: number][] = [
  [10, -14.3],
  [11, -11.2],
  [12, -8.5],
  [13, -6.2],
  [14, -4.4],
  [15, -3.0],
  [16, -2.0],
  [17, -1.3],
  [18, -0.8],
  [19, -0.5],
  [20, -0.3],
  [21, -0.2],
  [22, -0.1],
  [23, 0],
  [30, 0]
];

// The table gives tenths.
test.for(TABLE)('at 10^(%i/10) Hz it is %f dB', ([k, db]) => {
  expect(used(10 * Math.log10(weightingCPower(10 ** (k / 10))), db, absolute(0.0501))).toBeLessThanOrEqual(1);
});
