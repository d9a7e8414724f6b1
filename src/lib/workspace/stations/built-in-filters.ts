/** Filters an amplifier may carry inside, as shaping blocks that ways out leave alone: what each begins as, and what it is called. */
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';

export interface BuiltInFilter {
  readonly kind: string;
  readonly label: string;
  /** Where it begins; its owner then sets it to what stands on the amplifier. Common practice, no source. */
  readonly begins: PlanBlock;
}

export const BUILT_IN_FILTERS: readonly BuiltInFilter[] = [
  {
    kind: 'high-pass',
    label: 'High-pass',
    begins: { kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 20, fixed: true }
  },
  {
    kind: 'low-pass',
    label: 'Low-pass',
    begins: { kind: 'low-pass', family: 'butterworth', order: 2, corner_Hz: 120, fixed: true }
  },
  {
    kind: 'low-shelf',
    label: 'Low shelf',
    begins: { kind: 'low-shelf', order: 1, corner_Hz: 40, gain_dB: 6, fixed: true }
  },
  {
    kind: 'peak',
    label: 'Peak or dip',
    begins: { kind: 'peak', centre_Hz: 35, q: 1, gain_dB: 3, fixed: true }
  },
  { kind: 'delay', label: 'Delay', begins: { kind: 'delay', delay_ms: 1, fixed: true } }
];

/** The numbers of a block worth setting here, by key; everything else is set among filters and EQ. */
export const BLOCK_NUMBERS: readonly (readonly [key: string, label: string])[] = [
  ['corner_Hz', 'Corner'],
  ['centre_Hz', 'Centre'],
  ['order', 'Order'],
  ['q', 'Q'],
  ['gain_dB', 'Gain'],
  ['delay_ms', 'Delay']
];

const NAMES: { readonly [K in PlanBlock['kind']]: string } = {
  'low-pass': 'Low-pass',
  'high-pass': 'High-pass',
  'linkwitz-transform': 'Linkwitz transform',
  'low-shelf': 'Low shelf',
  peak: 'Peak or dip',
  gain: 'Gain',
  polarity: 'Polarity turned over',
  delay: 'Delay',
  'all-pass': 'All-pass',
  section: 'Section'
};

export const blockName = (block: PlanBlock): string => block.label ?? NAMES[block.kind];
