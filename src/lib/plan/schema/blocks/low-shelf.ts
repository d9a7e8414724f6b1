import { z } from 'zod';
import { DEFAULTS } from '../../defaults';
import { quantity, required } from '../keys';
import { commonKeys, commonOf, defineBlock, frequency, optionalQ } from './define-block';

export const lowShelf = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('low-shelf'), 'Low shelf: lifts or lowers everything below the corner.'),
      order: required(z.union([z.literal(1), z.literal(2)]), 'Order, 1 or 2.'),
      corner_Hz: required(frequency(), 'Frequency where half the gain is reached, Hz.'),
      gain_dB: required(quantity(-40, 40), 'Gain at the lowest notes, dB.'),
      q: optionalQ,
      ...commonKeys
    })
    .meta({ description: 'Low shelf.' }),
  toEngine: (b) => ({
    kind: 'low-shelf',
    order: b.order,
    corner: b.corner_Hz,
    gain: b.gain_dB,
    q: b.q ?? DEFAULTS.block_q,
    ...commonOf(b)
  })
});
