/** One second-order section of a prototype: (b0·S² + b1·S + b2)/(a0·S² + a1·S + a2), S = jf/f0. A first-order section has b0 = a0 = 0. */
export interface Section {
  /** Hz. */
  readonly f0: number;
  readonly b: readonly [number, number, number];
  readonly a: readonly [number, number, number];
}

/** What a block amounts to: sections in cascade, a flat gain (dB), a polarity and a delay (s). */
export interface BlockResponse {
  readonly sections: readonly Section[];
  readonly gain: number;
  readonly inverts: boolean;
  readonly delay: number;
}

export const response = (part: Partial<BlockResponse>): BlockResponse => ({
  sections: [],
  gain: 0,
  inverts: false,
  delay: 0,
  ...part
});
