/** The kinds of shaping block: what each is called, what it does in a line, and as what a new one begins. */
import { DEFAULTS } from '$lib/plan/defaults';
import type { Plan } from '$lib/plan/schema';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';

export type BlockKind = PlanBlock['kind'];
export type BlockOf<K extends BlockKind> = Extract<PlanBlock, { kind: K }>;

interface KindEntry<K extends BlockKind> {
  readonly name: string;
  readonly does: string;
  /** Sensible for this plan; its owner goes on from there. Values: common practice, no source. */
  readonly begins: (plan: Plan) => BlockOf<K>;
}

const pivot = ({ goal }: Plan): number =>
  goal.pivot_Hz ?? Math.min(Math.max(DEFAULTS.pivot_Hz, goal.from_Hz), goal.to_Hz);

const KINDS: { readonly [K in BlockKind]: KindEntry<K> } = {
  'high-pass': {
    name: 'High-pass',
    does: 'Takes away what lies below its corner, and spares the cone there.',
    begins: ({ goal }) => ({
      kind: 'high-pass',
      family: 'butterworth',
      order: 2,
      corner_Hz: Math.max(5, Math.round(0.7 * goal.from_Hz))
    })
  },
  'low-pass': {
    name: 'Low-pass',
    does: 'Takes away what lies above its corner and belongs to the other speakers.',
    begins: ({ goal }) => ({
      kind: 'low-pass',
      family: 'linkwitz-riley',
      order: 4,
      corner_Hz: goal.to_Hz
    })
  },
  'linkwitz-transform': {
    name: 'Linkwitz transform',
    does: 'Puts another corner and another Q in place of the box’s own.',
    begins: ({ goal }) => ({
      kind: 'linkwitz-transform',
      from_Hz: 'box',
      from_q: 'box',
      to_Hz: goal.from_Hz,
      to_q: 0.707
    })
  },
  'low-shelf': {
    name: 'Low shelf',
    does: 'Lifts or lowers everything below its corner.',
    begins: () => ({ kind: 'low-shelf', order: 1, corner_Hz: 40, gain_dB: 3 })
  },
  peak: {
    name: 'Peak or dip',
    does: 'Lifts or lowers a band about its centre, as against a resonance of the room.',
    begins: (plan) => ({ kind: 'peak', centre_Hz: pivot(plan), q: 4, gain_dB: -5 })
  },
  gain: {
    name: 'Gain',
    does: 'Raises or lowers the whole signal.',
    begins: () => ({ kind: 'gain', gain_dB: 0 })
  },
  delay: {
    name: 'Delay',
    does: 'Holds the whole signal back.',
    begins: () => ({ kind: 'delay', delay_ms: 1 })
  },
  polarity: {
    name: 'Polarity',
    does: 'Turns the signal over: plus for minus.',
    begins: () => ({ kind: 'polarity' })
  },
  'all-pass': {
    name: 'All-pass',
    does: 'Turns the phase about its corner and leaves the level alone.',
    begins: (plan) => ({ kind: 'all-pass', order: 1, corner_Hz: pivot(plan) })
  },
  section: {
    name: 'Section',
    does: 'A second-order filter by its six coefficients. It begins as one that changes nothing.',
    begins: () => ({ kind: 'section', b: [0, 0, 1], a: [0, 0, 1] })
  }
};

/** In the order they are offered: the most used first. */
export const BLOCK_KINDS = Object.keys(KINDS) as readonly BlockKind[];

export const kindName = (kind: BlockKind): string => KINDS[kind].name;
export const kindDoes = (kind: BlockKind): string => KINDS[kind].does;
export const beginBlock = (kind: BlockKind, plan: Plan): PlanBlock => KINDS[kind].begins(plan);

/** The owner's name for it, else that of its kind. */
export const nameOf = (block: PlanBlock): string => block.label ?? KINDS[block.kind].name;

const LIKE_A_NAME = 'Linkwitz';

/** Inside a sentence: "Move high-pass earlier"; an owner's own name stays as written. */
export function nameInside(block: PlanBlock): string {
  const name = nameOf(block);
  if (block.label != null || name.startsWith(LIKE_A_NAME)) return name;
  return name.charAt(0).toLowerCase() + name.slice(1);
}
