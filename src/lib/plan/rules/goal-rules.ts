import { problem, type Problem } from '../problem';
import type { Rule } from './rule';

/** The band runs upward and holds its pivot. */
export const goalRule: Rule = {
  needs: ['/goal'],
  check: ({ goal: { from_Hz: from, to_Hz: to, pivot_Hz: pivot } }): Problem[] => {
    if (!(to > from))
      return [
        problem({
          path: '/goal/to_Hz',
          found: String(to),
          allowed: `above from_Hz, ${from} Hz`,
          message: `${to} Hz is not above from_Hz, ${from} Hz.`,
          hint: to < from ? 'The two swapped?' : null
        })
      ];
    if (pivot != null && (pivot < from || pivot > to))
      return [
        problem({
          path: '/goal/pivot_Hz',
          found: String(pivot),
          allowed: `in the band, ${from} to ${to} Hz`,
          message: `${pivot} Hz lies outside the band, ${from} to ${to} Hz.`
        })
      ];
    return [];
  }
};
