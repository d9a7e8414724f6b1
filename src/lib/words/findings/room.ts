/** Findings about the room and the ears in it. */
import { fixed, significant } from '../format-number';
import { hertzText } from '../quantities';
import type { Circumstance, FactsOf, Said } from './said';

export function boundaryDip({ depth }: FactsOf<'boundary-dip'>, { at }: Circumstance): Said {
  const where = at === null ? '' : ` at ${hertzText(at)}`;
  return {
    fact: `The near walls and floor take ${fixed(Math.abs(depth), 1)} dB away${where}.`,
    meaning: 'Reflections cancel there: stand the box closer to the corner, or at three different distances.'
  };
}

export function exposure({ peakC, action }: FactsOf<'exposure'>, { at }: Circumstance): Said {
  const where = at === null ? '' : `, near ${hertzText(at)}`;
  return {
    fact: `Peaks reach ${fixed(peakC, 1)} dB(C) at the seat${where}; the lower action value of Directive 2003/10/EC is ${significant(action, 4)} dB(C).`,
    meaning:
      'Measure the whole system before anyone sits there for long; this tool cannot tell hearing safety.'
  };
}
