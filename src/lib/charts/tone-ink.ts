import type { Tone } from './plot-types';

/** How a tone is drawn: colour and dash are names of tokens, the width is in px. */
export interface Ink {
  readonly colour: string;
  readonly dash: string | null;
  readonly width: number;
}

const INKS: { readonly [T in Tone]: Ink } = {
  played: { colour: 'var(--ink)', dash: null, width: 2.4 },
  wanted: { colour: 'var(--ink)', dash: null, width: 1.25 },
  volts: { colour: 'var(--c-volts)', dash: 'var(--d-volts)', width: 1.6 },
  amps: { colour: 'var(--c-amps)', dash: 'var(--d-amps)', width: 1.6 },
  travel: { colour: 'var(--c-travel)', dash: 'var(--d-travel)', width: 1.6 },
  // The cone's two limits share a colour; the stop is the hard one, so its line is unbroken.
  stop: { colour: 'var(--c-travel)', dash: null, width: 1 },
  // Dots are lighter than dashes of the same width.
  heat: { colour: 'var(--c-heat)', dash: 'var(--d-heat)', width: 2.2 },
  ghost: { colour: 'var(--ink-3)', dash: null, width: 1.2 },
  plain: { colour: 'var(--ink)', dash: null, width: 1.6 }
};

export const toneInk = (tone: Tone): Ink => INKS[tone];
