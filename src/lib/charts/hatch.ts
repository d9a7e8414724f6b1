import type { RegionTone } from './plot-types';

/** Parallel lines: `gap` px apart, at an angle from upright, in a colour mixed from the tokens. */
export interface Hatch {
  readonly gap: number;
  readonly angle: number;
  readonly width: number;
  readonly colour: string;
}

/** The two lean opposite ways and differ in density, so that they are told apart without colour. */
export const HATCHES: { readonly [T in RegionTone]: Hatch } = {
  out: { gap: 7, angle: 45, width: 1.5, colour: 'color-mix(in srgb, var(--ink-3) 27%, transparent)' },
  over: { gap: 5, angle: -45, width: 2.4, colour: 'color-mix(in srgb, var(--debit) 36%, transparent)' }
};

/** A pattern is named within the whole page: `owner` is the panel's own id. */
export const hatchId = (owner: string, tone: RegionTone): string => `${owner}-hatch-${tone}`;
export const hatchFill = (owner: string, tone: RegionTone): string => `url(#${hatchId(owner, tone)})`;
