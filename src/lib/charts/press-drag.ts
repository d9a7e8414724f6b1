/** What a press needs to know of a pointer event. */
export interface Press {
  readonly pointerId: number;
  readonly pointerType: string;
  readonly button: number;
  readonly clientX: number;
  readonly clientY: number;
}

export interface PressActs {
  readonly start: () => void;
  /** Sideways place of the pointer, in px of the window. */
  readonly move: (clientX: number) => void;
  readonly end: () => void;
}

/** A finger may tremble this much, in px, and still be pressing. */
const TREMBLE = 4;

type State =
  | { readonly is: 'idle' }
  | { readonly is: 'waiting'; readonly id: number; readonly x: number; readonly y: number; readonly tap: Tap }
  | { readonly is: 'dragging'; readonly id: number };
/** What a press that never becomes a drag does when it is let go. */
type Tap = (() => void) | null;

/**
 * Tells a drag from a scroll. A mouse drags from the first press. A finger waits until it has moved sideways; moved
 * up or down it scrolls the page, and a tap counts when it is lifted. So a swipe past a plot changes nothing.
 */
export class PressDrag {
  readonly #acts: PressActs;
  #state: State = { is: 'idle' };

  constructor(acts: PressActs) {
    this.#acts = acts;
  }

  /** True if the press is taken. With `tap` it waits in any case, and a press let go in place does that instead. */
  down(press: Press, tap?: () => void): boolean {
    const { pointerId: id, clientX: x, clientY: y } = press;
    if (this.#state.is !== 'idle' || press.button !== 0) return false;
    if (tap || press.pointerType === 'touch') {
      this.#state = { is: 'waiting', id, x, y, tap: tap ?? (() => this.#whole(x)) };
    } else {
      this.#begin(id, x);
    }
    return true;
  }

  move(press: Press): void {
    const state = this.#state;
    if (state.is === 'idle' || state.id !== press.pointerId) return;
    if (state.is === 'dragging') this.#acts.move(press.clientX);
    else {
      const across = Math.abs(press.clientX - state.x);
      const along = Math.abs(press.clientY - state.y);
      if (across >= TREMBLE && across > along) this.#begin(state.id, press.clientX);
      else if (along >= TREMBLE && along > across) this.#state = { ...state, tap: null };
    }
  }

  up(press: Press): void {
    const state = this.#state;
    if (state.is === 'idle' || state.id !== press.pointerId) return;
    this.#state = { is: 'idle' };
    if (state.is === 'dragging') this.#acts.end();
    else state.tap?.();
  }

  /** The browser took the pointer to scroll, or it is gone. */
  cancel(press?: Press): void {
    const state = this.#state;
    if (state.is === 'idle' || (press && state.id !== press.pointerId)) return;
    this.#state = { is: 'idle' };
    if (state.is === 'dragging') this.#acts.end();
  }

  #begin(id: number, x: number): void {
    this.#state = { is: 'dragging', id };
    this.#acts.start();
    this.#acts.move(x);
  }

  #whole(x: number): void {
    this.#acts.start();
    this.#acts.move(x);
    this.#acts.end();
  }
}
