/** One shaping block in a few words: "15 Hz, Butterworth 12 dB/oct". */
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import { quantityText } from '$lib/words/units/quantity-text';

export const FAMILIES = {
  butterworth: 'Butterworth',
  'linkwitz-riley': 'Linkwitz-Riley',
  bessel: 'Bessel'
} as const;

/** 6 dB an octave for each order. */
export const SLOPE_DB = 6;

// Frequencies, levels and times are the same in both systems.
const hertz = (f: number): string => quantityText(f, 'frequency', 'metric');
const decibels = (db: number): string => `${db > 0 ? '+' : ''}${quantityText(db, 'level', 'metric')}`;

export function blockSummary(block: PlanBlock): string {
  switch (block.kind) {
    case 'low-pass':
    case 'high-pass':
      return `${hertz(block.corner_Hz)}, ${FAMILIES[block.family]} ${SLOPE_DB * block.order} dB/oct`;
    case 'linkwitz-transform':
      return `to ${hertz(block.to_Hz)}, Q ${quantityText(block.to_q, 'ratio', 'metric')}`;
    case 'low-shelf':
      return `${decibels(block.gain_dB)} below ${hertz(block.corner_Hz)}`;
    case 'peak':
      return `${decibels(block.gain_dB)} at ${hertz(block.centre_Hz)}`;
    case 'gain':
      return decibels(block.gain_dB);
    case 'polarity':
      return 'turned over';
    case 'delay':
      return quantityText(block.delay_ms, 'time', 'metric');
    case 'all-pass':
      return `${hertz(block.corner_Hz)}, order ${block.order}`;
    case 'section':
      return 'by coefficients';
  }
}
