/** A panel of a question as data, and what several of them share. */
import type { ComponentProps } from 'svelte';
import type Panel from '$lib/charts/Panel.svelte';
import type { Range, ReadingPart, Region, Rule, Tone } from '$lib/charts/plot-types';
import type { LimitName } from '$lib/engine/budget/budget';

/** Everything but the figures at the handle, which change with every move while the curves stay. */
export type PanelData = Omit<ComponentProps<typeof Panel>, 'reading'>;

export const LIMIT_TONES: { readonly [L in LimitName]: Tone } = {
  'amplifier-voltage': 'volts',
  'amplifier-current': 'amps',
  'cone-travel': 'travel',
  'mechanical-stop': 'stop',
  'coil-heat': 'heat'
};

/** The same panel before there is anything to draw: as high as it will be. */
export const blank = ({ title, height }: Pick<PanelData, 'title' | 'height'>): PanelData => ({
  title,
  height,
  y: { kind: 'linear', domain: [0, 1], ticks: [] }
});

/** Out of bounds above a limit, and where `needed` goes beyond it. */
export const beyond = (x: readonly number[], limit: number, needed: readonly number[]): Region[] => [
  { id: 'out', tone: 'out', from: limit, to: 'top' },
  { id: 'over', tone: 'over', x, from: limit, to: needed }
];

export const reading = (text: string, over = false): ReadingPart => ({
  text,
  tone: over ? 'over' : 'normal'
});

/** The tint without its name, for the panels below the one that names it. */
export const unnamed = (ranges: readonly Range[]): Range[] =>
  ranges.map(({ id, from, to }) => ({ id, from, to }));

export type { Range, ReadingPart, Rule };
