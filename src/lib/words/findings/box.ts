/** Findings about the box: alignment, losses, air and volume. */
import type { Severity } from '$lib/engine/budget/budget';
import { listed } from '../limit-names';
import { aboutHertzText, dbText, hertzText, litresText, percentText, qText } from '../quantities';
import type { Circumstance, FactsOf, Said } from './said';

const QTC_HIGH: { readonly [S in Severity]: string } = {
  note: 'A touch of fullness near fc; between 0.6 and 0.8 is usual.',
  caution: 'Bass sounds heavy and stops late; a larger box or more fill lowers it.',
  blocking: 'Bass sounds heavy and stops late; a larger box or more fill lowers it.'
};
const QTC_LOW: { readonly [S in Severity]: string } = {
  note: 'Bass falls away early but gently; between 0.6 and 0.8 is usual.',
  caution: 'Bass falls away early; a smaller box or shaping brings it back.',
  blocking: 'Bass falls away early; a smaller box or shaping brings it back.'
};

const WELL_ALIGNED = 0.8;
const HOT_ONLY = 'Well aligned cold; after a long loud passage the bass swells near fc.';

export function qtc(high: boolean, facts: FactsOf<'qtc-high' | 'qtc-low'>, { severity }: Circumstance): Said {
  const peak =
    facts.peakAt !== null && facts.peak > 0.05
      ? `, so the box alone peaks by ${dbText(facts.peak)} at ${aboutHertzText(facts.peakAt)}`
      : '';
  const meaning = high && facts.qtc <= WELL_ALIGNED ? HOT_ONLY : (high ? QTC_HIGH : QTC_LOW)[severity];
  return {
    fact: `Qtc is ${qText(facts.qtc)}${peak}; with the coil hot it is ${qText(facts.hotQtc)}.`,
    meaning
  };
}

export function airSpring({ share, secondHarmonic }: FactsOf<'air-spring'>): Said {
  return {
    fact: `At the level wanted the cone displaces ${percentText(share)} of the box's air, one way.`,
    meaning: `The air spring stiffens as it is squeezed: about ${percentText(secondHarmonic)} second harmonic from the box's share. A larger box bends less.`
  };
}

export function lossesMissing({ qtc: value, fill, absorption, leakage }: FactsOf<'losses-missing'>): Said {
  const missing = [
    ...(absorption ? ['absorption (q_absorption)'] : []),
    ...(leakage ? ['leakage (q_leakage)'] : [])
  ];
  return {
    fact: `Box losses are left out: ${listed(missing)}. Qtc ${qText(value)} is an upper bound.`,
    // Small, "Closed-Box Loudspeaker Systems, Part I", JAES 20(10), 1972, from memory.
    meaning: fill
      ? 'Usual for a well filled box: Q 2 to 5, and a fill gain of 1.10 to 1.20, at best 1.25.'
      : 'Usual for an unfilled box: Q 5 to 10.'
  };
}

export function netSmall({ net, displacement, estimated }: FactsOf<'net-small'>): Said {
  return {
    fact: `The box's net volume of ${litresText(net)} is less than the ${litresText(displacement)} the drivers themselves take up${estimated ? ' (an estimate)' : ''}.`,
    meaning: 'Check the volume: was litres meant, and is it the inside of the whole box?'
  };
}

export function displacementEstimated({ each, total }: FactsOf<'displacement-estimated'>): Said {
  const all = total > each * 1.001 ? `, ${litresText(total)} in all` : '';
  return {
    fact: `displacement_L is not given: the driver is taken to fill ${litresText(each)}${all}.`,
    meaning:
      'An estimate from its cone area, good to about 40 %: the data sheet or a bucket of sand tells better.'
  };
}

export function alignmentDiffers({ alignmentF3, circuitF3 }: FactsOf<'alignment-differs'>): Said {
  return {
    fact:
      circuitF3 === null
        ? `The textbook −3 dB point of driver and box is ${hertzText(alignmentF3)}; with coil inductance and leaks there is none.`
        : `The textbook −3 dB point of driver and box is ${hertzText(alignmentF3)}; with coil inductance and leaks it is ${hertzText(circuitF3)}.`,
    meaning: 'Levels and margins follow the second.'
  };
}
