import { z } from 'zod';
import { DEFAULTS } from '../../defaults';
import { quantity, required } from '../keys';
import { commonKeys, commonOf, defineBlock, frequency, optionalQ } from './define-block';

export const peak = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('peak'), 'Peak or dip: lifts or lowers a band about its centre.'),
      centre_Hz: required(frequency(), 'Centre frequency, Hz.'),
      q: optionalQ,
      gain_dB: required(quantity(-40, 40), 'Gain at the centre, dB.'),
      ...commonKeys
    })
    .meta({ description: 'Peak or dip.' }),
  toEngine: (b) => ({
    kind: 'peak',
    centre: b.centre_Hz,
    q: b.q ?? DEFAULTS.block_q,
    gain: b.gain_dB,
    ...commonOf(b)
  })
});
