import { z } from 'zod';
import { problem } from '../../problem';
import { required, whole } from '../keys';
import { commonKeys, commonOf, defineBlock, frequency } from './define-block';

const pass = <K extends 'low-pass' | 'high-pass'>(kind: K, what: string) =>
  defineBlock({
    schema: z
      .strictObject({
        kind: required(z.literal(kind), what),
        family: required(
          z.enum(['butterworth', 'linkwitz-riley', 'bessel']),
          'Shape of the filter: butterworth and bessel are 3 dB down at the corner, linkwitz-riley 6 dB.'
        ),
        order: required(whole(1, 8), 'Order, 6 dB an octave each; linkwitz-riley has 2, 4, 6 or 8.'),
        corner_Hz: required(frequency(), 'Corner frequency, Hz.'),
        ...commonKeys
      })
      .meta({ description: what }),
    toEngine: (b) => ({ kind, family: b.family, order: b.order, corner: b.corner_Hz, ...commonOf(b) }),
    problems: (b, path) =>
      b.family === 'linkwitz-riley' && b.order % 2 !== 0
        ? [
            problem({
              path: `${path}/order`,
              found: String(b.order),
              allowed: '2, 4, 6 or 8 with linkwitz-riley',
              message: `${b.order} is odd: linkwitz-riley has order 2, 4, 6 or 8.`
            })
          ]
        : []
  });

export const lowPass = pass('low-pass', 'Low-pass: takes away what lies above the corner.');
export const highPass = pass('high-pass', 'High-pass: takes away what lies below the corner.');
