/** What the plan page shows beside the account. */
export const VIEWS = [
  { id: 'plan', name: 'The whole plan', short: 'Plan' },
  { id: 'volume', name: 'How big a box?', short: 'Box' },
  { id: 'amplifier', name: 'How much amplifier?', short: 'Amplifier' },
  { id: 'level', name: 'How loud can it go?', short: 'Loudness' }
] as const;

export type View = (typeof VIEWS)[number]['id'];

export const viewOf = (text: string | null): View => VIEWS.find((v) => v.id === text)?.id ?? 'plan';
