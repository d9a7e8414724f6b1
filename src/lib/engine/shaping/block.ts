/** The shaping blocks as the engine knows them: continuous-time prototypes, Hz, dB, seconds. */

export type Family = 'butterworth' | 'linkwitz-riley' | 'bessel';

interface Common {
  /** Left out of the signal path, kept in the plan. */
  readonly bypass: boolean;
  /** Built into the amplifier: ways out leave it alone. */
  readonly fixed: boolean;
}

export interface PassBlock extends Common {
  readonly kind: 'low-pass' | 'high-pass';
  readonly family: Family;
  readonly order: number;
  readonly corner: number;
}

export interface LinkwitzTransformBlock extends Common {
  readonly kind: 'linkwitz-transform';
  /** Hz and Q of what is there; "box" binds to the computed alignment. */
  readonly from: number | 'box';
  readonly fromQ: number | 'box';
  readonly to: number;
  readonly toQ: number;
}

export interface LowShelfBlock extends Common {
  readonly kind: 'low-shelf';
  readonly order: 1 | 2;
  readonly corner: number;
  readonly gain: number;
  /** Second order only. */
  readonly q: number;
}

export interface PeakBlock extends Common {
  readonly kind: 'peak';
  readonly centre: number;
  readonly q: number;
  readonly gain: number;
}

export interface GainBlock extends Common {
  readonly kind: 'gain';
  readonly gain: number;
}

export interface PolarityBlock extends Common {
  readonly kind: 'polarity';
}

export interface DelayBlock extends Common {
  readonly kind: 'delay';
  /** Seconds. */
  readonly delay: number;
}

export interface AllPassBlock extends Common {
  readonly kind: 'all-pass';
  readonly order: 1 | 2;
  readonly corner: number;
  readonly q: number;
}

export interface SectionBlock extends Common {
  readonly kind: 'section';
  /** Descending powers of S = jf/(1 Hz). */
  readonly b: readonly [number, number, number];
  readonly a: readonly [number, number, number];
}

export type Block =
  | PassBlock
  | LinkwitzTransformBlock
  | LowShelfBlock
  | PeakBlock
  | GainBlock
  | PolarityBlock
  | DelayBlock
  | AllPassBlock
  | SectionBlock;

export type BlockKind = Block['kind'];
