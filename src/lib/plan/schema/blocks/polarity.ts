import { z } from 'zod';
import { required } from '../keys';
import { commonKeys, commonOf, defineBlock } from './define-block';

export const polarity = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('polarity'), 'Polarity: turns the signal over.'),
      ...commonKeys
    })
    .meta({ description: 'Polarity turned over.' }),
  toEngine: (b) => ({ kind: 'polarity', ...commonOf(b) })
});
