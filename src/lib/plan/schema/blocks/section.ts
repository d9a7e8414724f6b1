import { z } from 'zod';
import { problem } from '../../problem';
import { required } from '../keys';
import { commonKeys, commonOf, defineBlock } from './define-block';

const three = () => z.tuple([z.number(), z.number(), z.number()]);

/** True where a root of a0·S² + a1·S + a2 has a positive real part; by signs, so that nothing overflows. */
function growsWithoutEnd([a0, a1, a2]: readonly [number, number, number]): boolean {
  const against = (x: number, y: number) => Math.sign(x) * Math.sign(y) < 0;
  return a0 === 0 ? against(a1, a2) : against(a0, a1) || against(a0, a2);
}

export const section = defineBlock({
  schema: z
    .strictObject({
      kind: required(z.literal('section'), 'Section: a second-order filter by its coefficients.'),
      b: required(
        three(),
        'Numerator, three coefficients in descending powers of S = jf/(1 Hz): S², S, 1. Not all zero.'
      ),
      a: required(
        three(),
        'Denominator, three coefficients in descending powers of S = jf/(1 Hz): S², S, 1. No pole to the right.'
      ),
      ...commonKeys
    })
    .meta({ description: 'Second-order section, continuous time.' }),
  toEngine: (block) => ({ kind: 'section', b: block.b, a: block.a, ...commonOf(block) }),
  problems: (block, path) => {
    const all = (key: 'a' | 'b') => `[${block[key].join(', ')}]`;
    const found = [];
    if (block.b.every((x) => x === 0))
      found.push(
        problem({
          path: `${path}/b`,
          found: all('b'),
          allowed: 'at least one number that is not 0',
          message: `${all('b')} lets nothing through: at least one of the three must not be 0.`
        })
      );
    if (block.a.every((x) => x === 0))
      found.push(
        problem({
          path: `${path}/a`,
          found: all('a'),
          allowed: 'at least one number that is not 0',
          message: `${all('a')} divides by nothing: at least one of the three must not be 0.`
        })
      );
    else if (growsWithoutEnd(block.a))
      found.push(
        problem({
          path: `${path}/a`,
          found: all('a'),
          allowed: 'coefficients without a pole to the right',
          message: `${all('a')} has a pole with a positive real part: its output would grow without end.`,
          hint: 'A sign wrong?'
        })
      );
    return found;
  }
});
