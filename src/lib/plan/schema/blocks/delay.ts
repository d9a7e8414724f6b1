import { z } from 'zod';
import { quantity, required } from '../keys';
import { commonKeys, commonOf, defineBlock } from './define-block';

export const delay = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('delay'), 'Delay: the same at every frequency.'),
      delay_ms: required(quantity(0, 1000), 'Delay, ms.'),
      ...commonKeys
    })
    .meta({ description: 'Delay.' }),
  toEngine: (b) => ({ kind: 'delay', delay: b.delay_ms / 1000, ...commonOf(b) })
});
