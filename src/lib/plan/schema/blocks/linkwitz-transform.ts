import { z } from 'zod';
import { quantity, required } from '../keys';
import { blockQ, commonKeys, commonOf, defineBlock, frequency } from './define-block';

const box = z.literal('box');

export const linkwitzTransform = defineBlock({
  schema: z
    .strictObject({
      kind: required(
        z.literal('linkwitz-transform'),
        'Linkwitz transform: moves the box to another corner and Q.'
      ),
      from_Hz: required(
        z.union([quantity(1, 2000), box]),
        'Resonance of the driver in its box, Hz; "box" takes the computed one.'
      ),
      from_q: required(
        z.union([quantity(0.1, 30), box]),
        'Q of the driver in its box; "box" takes the computed one.'
      ),
      to_Hz: required(frequency(), 'Corner wanted, Hz.'),
      to_q: required(blockQ(), 'Q wanted; 0.707 is flattest.'),
      ...commonKeys
    })
    .meta({ description: 'Linkwitz transform.' }),
  toEngine: (b) => ({
    kind: 'linkwitz-transform',
    from: b.from_Hz,
    fromQ: b.from_q,
    to: b.to_Hz,
    toQ: b.to_q,
    ...commonOf(b)
  })
});
