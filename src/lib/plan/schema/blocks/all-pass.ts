import { z } from 'zod';
import { DEFAULTS } from '../../defaults';
import { required } from '../keys';
import { commonKeys, commonOf, defineBlock, frequency, optionalQ } from './define-block';

export const allPass = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('all-pass'), 'All-pass: turns the phase, leaves the level alone.'),
      order: required(z.union([z.literal(1), z.literal(2)]), 'Order, 1 or 2.'),
      corner_Hz: required(frequency(), 'Frequency where the phase is half way round, Hz.'),
      q: optionalQ,
      ...commonKeys
    })
    .meta({ description: 'All-pass.' }),
  toEngine: (b) => ({
    kind: 'all-pass',
    order: b.order,
    corner: b.corner_Hz,
    q: b.q ?? DEFAULTS.block_q,
    ...commonOf(b)
  })
});
