import { createContext } from 'svelte';
import { makeScale, type Scale } from './make-scale';
import { plainNumber } from './plain-number';
import type { ScaleKind, XAxis } from './plot-types';

/** From the frame's edge to the edge of its drawing: half a line of ticks stands out above and below. */
export const PAD = 7;

/** Widths left and right of the frame, in px: wide and narrow. */
const LEFT = [46, 36];
const RIGHT = [14, 10];
const RIGHT_WITH_SECOND_AXIS = [48, 40];

export interface FrameSource {
  readonly x: () => XAxis;
  readonly width: () => number;
  readonly narrow: () => boolean;
  readonly secondAxis: () => boolean;
  readonly value: () => number | undefined;
  readonly handle: () => boolean;
}

/** What all panels of a stack share: width, the x scale and the cursor. Keep the object; its getters change. */
export class PlotFrame {
  readonly #source: FrameSource;
  // Compared as numbers: an owner that writes its axis in place must not have every path drawn again.
  readonly #kind: ScaleKind = $derived.by(() => this.#source.x().kind);
  readonly #low: number = $derived.by(() => this.#source.x().domain[0]);
  readonly #high: number = $derived.by(() => this.#source.x().domain[1]);
  readonly left: number = $derived.by(() => LEFT[this.narrow ? 1 : 0]);
  readonly right: number = $derived.by(() => {
    const margins = this.#source.secondAxis() ? RIGHT_WITH_SECOND_AXIS : RIGHT;
    return Math.max(this.left + 40, this.width - margins[this.narrow ? 1 : 0]);
  });
  readonly x: Scale = $derived.by(() =>
    makeScale(this.#kind, [this.#low, this.#high], [this.left, this.right])
  );
  readonly ticks: readonly number[] = $derived.by(() => {
    const { ticks } = this.#source.x();
    const room = Math.max(2, Math.floor((this.right - this.left) / TICK_ROOM));
    if (ticks === undefined) return atMost(room, (count) => this.x.ticks(count));
    return typeof ticks === 'function' ? ticks(room) : ticks;
  });
  readonly grid: readonly number[] = $derived.by(() => this.#source.x().grid ?? this.ticks);
  /** Where the cursor stands, in px; null without one or when its value is off the axis. */
  readonly cursor: number | null = $derived.by(() => {
    const value = this.#source.value();
    if (value === undefined || !(value >= this.#low && value <= this.#high)) return null;
    return this.x(value);
  });

  constructor(source: FrameSource) {
    this.#source = source;
  }

  get width(): number {
    return this.#source.width();
  }

  get narrow(): boolean {
    return this.#source.narrow();
  }

  /** The cursor is a handle: it moves the plan, not only the view. */
  get handle(): boolean {
    return this.#source.handle();
  }

  tickText(value: number): string {
    const { format } = this.#source.x();
    return format ? format(value) : plainNumber(value);
  }

  get unit(): string | undefined {
    return this.#source.x().unit;
  }
}

/** px that a label and the air beside it take. */
const TICK_ROOM = 46;

/** A scale takes the number of ticks as a hint; this keeps to it. */
function atMost(room: number, ticks: (count: number) => number[]): number[] {
  for (let count = room; count > 2; count--) {
    const found = ticks(count);
    if (found.length <= room) return found;
  }
  return ticks(2);
}

export const [getPlotFrame, setPlotFrame] = createContext<PlotFrame>();
