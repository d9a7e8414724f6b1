import { z } from 'zod';
import { quantity, required } from '../keys';
import { commonKeys, commonOf, defineBlock } from './define-block';

export const gain = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('gain'), 'Gain: the same at every frequency.'),
      gain_dB: required(quantity(-60, 60), 'Gain, dB.'),
      ...commonKeys
    })
    .meta({ description: 'Gain.' }),
  toEngine: (b) => ({ kind: 'gain', gain: b.gain_dB, ...commonOf(b) })
});
