/** Dragging one block of a list to another place in it. */
export interface Span {
  readonly top: number;
  readonly bottom: number;
}

/** Where the block at `from` lands when let go at `y`: so many of the others stand above that height. */
export const dropPlace = (y: number, from: number, spans: readonly Span[]): number =>
  spans.filter(({ top, bottom }, i) => i !== from && (top + bottom) / 2 < y).length;

export class BlockDrag {
  #at = $state.raw<{ readonly from: number; readonly to: number } | null>(null);

  /** The block being dragged; null while none is. */
  get from(): number | null {
    return this.#at?.from ?? null;
  }
  begin(from: number): void {
    this.#at = { from, to: from };
  }
  over(y: number, spans: readonly Span[]): void {
    if (this.#at !== null) this.#at = { from: this.#at.from, to: dropPlace(y, this.#at.from, spans) };
  }
  /** Ends it. Null where the block stays where it was. */
  drop(): { readonly from: number; readonly to: number } | null {
    const at = this.#at;
    this.#at = null;
    return at === null || at.from === at.to ? null : at;
  }
  /** On which side of the row at `i` the dragged block would land; null where it would not land beside it. */
  landing(i: number): 'above' | 'below' | null {
    if (this.#at === null || this.#at.from === this.#at.to || i !== this.#at.to) return null;
    return this.#at.to < this.#at.from ? 'above' : 'below';
  }
}
