/** Findings about shaping: what boost costs, what it lacks, and where the goal is missed. */
import { significant } from '../format-number';
import { isPlural, limitName } from '../limit-names';
import { aboutHertzText, dbText, levelText } from '../quantities';
import type { Circumstance, FactsOf, Said } from './said';

/** Power at 0 dB that the price of boost is told with, W. */
const EXAMPLE_POWER = 15;

export function boostHigh({ boost, power, strong }: FactsOf<'boost-high'>, { at }: Circumstance): Said {
  const where = at === null ? '' : ` at ${aboutHertzText(at)}`;
  return {
    fact: `Shaping boosts by up to ${dbText(boost)}${where}, which costs ${significant(power, 3)} times the power: ${EXAMPLE_POWER} W become ${significant(EXAMPLE_POWER * power, 3)} W.`,
    meaning: strong
      ? 'That is a great deal to ask of amplifier and cone: a larger box, more cone area or a higher −3 dB point comes cheaper.'
      : 'The margins already count it; a larger box needs less of it.'
  };
}

export function boostShort({ limit, boostHere, short }: FactsOf<'boost-short'>, { at }: Circumstance): Said {
  const where = at === null ? '' : ` at ${aboutHertzText(at)}`;
  const asks = `Shaping asks for ${dbText(boostHere)} of boost${where}`;
  const allow = `${limitName(limit)} ${isPlural(limit) ? 'allow' : 'allows'}`;
  if (short >= boostHere)
    return {
      fact: `${asks}, where ${allow} none.`,
      meaning: 'Even without the boost the limit would be reached.'
    };
  return {
    fact: `${asks}, ${dbText(short)} more than ${allow}.`,
    meaning: 'The boost is what breaks the limit: less of it, or a lower level, keeps within.'
  };
}

export function transformLarge({ lift, block }: FactsOf<'transform-large'>): Said {
  return {
    fact: `The Linkwitz transform at /shaping/${block} lifts by ${dbText(lift)} towards 0 Hz.`,
    meaning:
      'Above 15 dB, a small error in the fc or Q of the box becomes a large one in level; measure the built box before setting it.'
  };
}

export function noHighPass({ boost, boostAt }: FactsOf<'no-high-pass'>): Said {
  return {
    fact: `Shaping boosts by ${dbText(boost)} at ${aboutHertzText(boostAt)} and no high-pass stands below it.`,
    meaning:
      'Whatever lies under the lowest note moves the cone too: switch-on thumps, warped records, rumble.'
  };
}

export function goalShort(
  { short, level, tolerance, shapingHere }: FactsOf<'goal-short'>,
  { at }: Circumstance
): Said {
  const where = at === null ? '' : ` at ${aboutHertzText(at)}`;
  const cause =
    shapingHere < -0.5
      ? `Shaping alone takes ${dbText(-shapingHere)} there.`
      : 'Driver, box and room give no more there: boost it, or narrow the band.';
  return {
    fact: `The level falls ${dbText(short)} short of the ${levelText(level)} wanted${where}; ${levelText(tolerance)} is tolerated.`,
    meaning: cause
  };
}
