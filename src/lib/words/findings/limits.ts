/** Findings about limits: over, thin, not judged, or turned by room, heat or deep programme. */
import type { LimitName } from '$lib/engine/budget/budget';
import { capital, isPlural, limitName, listed } from '../limit-names';
import { limitNeed } from '../limit-need';
import { marginSize, marginText } from '../margin-text';
import { aboutHertzText, dbText, hertzText, levelText, safeLevelText } from '../quantities';
import type { Circumstance, FactsOf, Said } from './said';

const OVER_MEANS: { readonly [L in LimitName]: string } = {
  'amplifier-voltage': 'It clips there.',
  'amplifier-current': 'It clips there, or its protection cuts in.',
  'cone-travel': 'Past Xmax the motor loses its grip on the cone and distortion rises fast.',
  'mechanical-stop': 'A cone that meets its stop breaks.',
  'coil-heat': 'A coil that takes this for long burns out.'
};

/** " at 21 Hz", or nothing where no frequency is known. */
const place = (at: number | null): string => (at === null ? '' : ` at ${aboutHertzText(at)}`);

export function limitOver(
  limit: LimitName,
  facts: FactsOf<`limit-${LimitName}`>,
  { at }: Circumstance
): Said {
  const where = at === null ? '' : `At ${aboutHertzText(at)} `;
  return {
    fact: capital(`${where}${limitNeed(limit, facts.demanded, facts.allowed)}: ${marginText(facts.margin)}.`),
    meaning: `${OVER_MEANS[limit]} Within this limit up to ${safeLevelText(facts.maxLevel)}; ${levelText(facts.level)} is wanted.`
  };
}

const RATING_KEYS: {
  readonly [K in FactsOf<'not-judged'>['missing'][number]]: { limit: LimitName; key: string };
} = {
  xmax: { limit: 'cone-travel', key: 'xmax_mm' },
  xmech: { limit: 'mechanical-stop', key: 'xmech_mm' },
  power: { limit: 'coil-heat', key: 'power_W' }
};

export function notJudged({ missing }: FactsOf<'not-judged'>): Said {
  const rows = missing.map((rating) => RATING_KEYS[rating]);
  return {
    fact: `Not judged: ${listed(rows.map(({ limit, key }) => `${limitName(limit)} (${key} is missing)`))}.`,
    meaning: `The verdict says nothing about ${rows.length > 1 ? 'them' : 'it'}: take the ${rows.length > 1 ? 'values' : 'value'} from the data sheet or the maker.`
  };
}

export function marginThin({ limit, margin }: FactsOf<'margin-thin'>, { at }: Circumstance): Said {
  return {
    fact: `${capital(limitName(limit))} ${isPlural(limit) ? 'have' : 'has'} ${marginText(margin)}${place(at)}.`,
    meaning: "Less than 3 dB is thin: a data sheet's own tolerance can use it up."
  };
}

export function infrasonic({ limit, margin, from }: FactsOf<'infrasonic'>, { at }: Circumstance): Said {
  return {
    fact: `With programme down to ${hertzText(from)}, ${limitName(limit)} would be ${marginText(margin)}${place(at)}.`,
    meaning: 'Film effects and organ pedals go that deep; a high-pass keeps them out.'
  };
}

export function hotCoil({ limit, margin, levelLoss, rise }: FactsOf<'hot-coil'>, { at }: Circumstance): Said {
  return {
    fact: `With the coil ${Math.round(rise)} K hotter the level drops by ${dbText(levelLoss)}, and holding it leaves ${limitName(limit)} ${marginText(margin)}${place(at)}.`,
    meaning: 'Cold it holds; after a long loud passage it does not.'
  };
}

export function roomDoubt({ holds, doubt, turnsAt }: FactsOf<'room-doubt'>): Said {
  const turns = marginSize(turnsAt);
  return {
    fact: holds
      ? `Limits hold unless the room gives ${turns} dB less than estimated.`
      : `Limits would hold if the room gave ${turns} dB more than estimated.`,
    meaning: `The room is an estimate, good to about ${levelText(doubt)} either way: measure it before you buy on it.`
  };
}
