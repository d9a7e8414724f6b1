/** What the plan page shows beside the account: the whole plan, or one of the three questions. */
import type { SweepOver } from '$lib/engine/budget/sweep-types';

interface ViewNames {
  readonly id: 'plan' | 'volume' | 'amplifier' | 'level';
  readonly name: string;
  /** On a phone. */
  readonly short: string;
  readonly over: SweepOver | null;
}

export const VIEWS: readonly ViewNames[] = [
  { id: 'plan', name: 'The whole plan', short: 'Plan', over: null },
  { id: 'volume', name: 'How big a box?', short: 'Box', over: 'volume' },
  { id: 'amplifier', name: 'How much amplifier?', short: 'Amplifier', over: 'boost' },
  { id: 'level', name: 'How loud can it go?', short: 'Loudness', over: 'level' }
];

export type View = ViewNames['id'];

export const viewOf = (text: string | null): View => VIEWS.find((v) => v.id === text)?.id ?? 'plan';
