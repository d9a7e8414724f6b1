/** Findings about the driver's data sheet and the way it is mounted. */
import type { RedundantKey, Slip, Suspicion } from '$lib/engine/driver/sheet-check';
import { apart, significant } from '../format-number';
import { millimetresText, percentText } from '../quantities';
import type { FactsOf, Said } from './said';

/** The plan file's own keys, and what one SI unit is of theirs. */
const KEYS: {
  readonly [K in RedundantKey]: { readonly key: string; readonly unit: string; readonly factor: number };
} = {
  qts: { key: 'qts', unit: '', factor: 1 },
  mms: { key: 'mms_g', unit: ' g', factor: 1000 },
  cms: { key: 'cms_mm_per_N', unit: ' mm/N', factor: 1000 },
  bl: { key: 'bl_Tm', unit: ' Tm', factor: 1 },
  rms: { key: 'rms_kg_per_s', unit: ' kg/s', factor: 1 }
};

const SLIPS: { readonly [S in Slip]: string } = {
  coils: 'It looks like the value of all coils where that of one belongs, or the other way round.',
  'peak-to-peak': 'It looks like a peak-to-peak figure: one-way peak, half of it, belongs here.',
  'diameter-for-area': 'It looks like a diameter where an area belongs, or an area in another unit.',
  'factor-two': 'A factor of two: both coils for one, peak-to-peak for peak, or two drivers for one?',
  'factor-four': 'A factor of four: coils in series against parallel, or a diameter for a radius?',
  'unit-thousand': 'A factor of a thousand: a slip of unit?'
};

export function driverContradiction({
  key,
  given,
  derived,
  ratio,
  slip
}: FactsOf<'driver-contradiction'>): Said {
  const { key: name, unit, factor } = KEYS[key];
  const [typed, computed] = apart(given * factor, derived * factor);
  const away =
    ratio >= 1.5 || ratio <= 1 / 1.5
      ? `${significant(ratio > 1 ? ratio : 1 / ratio, 3)} times ${ratio > 1 ? 'as much' : 'less'}`
      : `${percentText(Math.abs(ratio - 1))} ${ratio > 1 ? 'more' : 'less'}`;
  return {
    fact: `${name} is given as ${typed}${unit}, but the rest of the data sheet makes it ${computed}${unit}: ${away}.`,
    meaning: `${slip === null ? 'One of them is off: check the sheet.' : SLIPS[slip]} The plan goes by ${computed}${unit}.`
  };
}

type Odd = { readonly name: string; readonly show: (value: number) => string };

const percent = (value: number): string => percentText(value);
const plain = (value: number): string => significant(value, 3);

/** What looks odd, and how its value reads in the file's own units. */
const ODD: { readonly [W in Suspicion['what']]: Odd } = {
  // Sd over Vas in SI is 1/m; ten times that is cm² for a litre.
  'area-size': { name: 'sd_cm2 over vas_L is', show: (v) => `${plain(v * 10)} cm²/L` },
  'xmax-large': { name: 'xmax_mm is', show: millimetresText },
  'xmech-close': { name: 'xmech_mm over xmax_mm is', show: (v) => plain(v) },
  'mass-area': {
    name: 'The moving mass over the cone area (mms_g, sd_cm2) is',
    show: (v) => `${plain(v)} kg/m²`
  },
  'nominal-re': { name: 're_ohm over nominal_ohm is', show: plain },
  'qts-range': { name: 'Qts is', show: plain },
  'inductance-large': {
    name: 'le_mH over the nominal load is',
    show: (v) => `${plain(v * 1000)} mH per ohm`
  },
  'efficiency-range': { name: 'Efficiency (from fs_Hz, vas_L and qes) is', show: percent }
};

/** What would be usual: "up to 12 mm", "from 0.6 to 1.05". */
function usual({ show }: Odd, low: number, high: number): string {
  return low === 0 ? `up to ${show(high)}` : `${show(low)} to ${show(high)}`;
}

export function driverSuspicious({ what, value, low, high, slip }: FactsOf<'driver-suspicious'>): Said {
  const odd = ODD[what];
  return {
    fact: `${odd.name} ${odd.show(value)}; usual is ${usual(odd, low, high)}.`,
    meaning: slip === null ? 'Check it against the data sheet.' : SLIPS[slip]
  };
}

export function sag({ sag: rest, withCreep, share, facing }: FactsOf<'sag'>): Said {
  return {
    fact: `Facing ${facing}, the cone sags ${millimetresText(rest)} at rest and ${millimetresText(withCreep)} with years of creep, ${percentText(share)} of Xmax.`,
    meaning: 'It then runs out of travel sooner on one side. Mount it sideways, or turn it over now and then.'
  };
}
