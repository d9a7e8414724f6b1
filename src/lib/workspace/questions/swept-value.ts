/** The value a question turns on: what it is called, where it stands, its steps and how it is shown. */
import type { Budget } from '$lib/engine/budget/budget';
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import type { Chain } from '$lib/engine/chain';
import { rangeOf, type Range } from '$lib/plan/allowed';
import { linkwitzTransform } from '$lib/plan/schema/blocks/linkwitz-transform';
import { lowShelf } from '$lib/plan/schema/blocks/low-shelf';
import { boxSchema } from '$lib/plan/schema/box';
import { goalSchema } from '$lib/plan/schema/goal';
import { scaled } from '$lib/words/quantities';
import { sweptText, type Column } from '$lib/words/questions/swept-text';
import { shownUnit, type Quantity, type Steps } from '$lib/words/units/quantity';
import type { System } from '$lib/words/units/unit';
import { sweptBlock } from './swept-block';

export interface SweptValue {
  readonly column: Column;
  readonly quantity: Quantity;
  /** "Net volume": on the stepper, and what undo calls the change. */
  readonly label: string;
  /** In the file's own unit: litres net, Hz, dB. */
  readonly value: number;
  /** The value on the stepper: "85 L"; and on the handle: "85 L net". */
  readonly text: string;
  readonly tag: string;
  /** What the plan file allows, in its own unit. */
  readonly range: Range | null;
  /** Of keys and buttons, in the unit shown. */
  readonly steps: Steps;
  /** What a drag snaps to, in the unit shown. */
  readonly snap: number;
}

const RANGES = {
  volume: rangeOf(boxSchema.shape.net_L),
  level: rangeOf(goalSchema.shape.level_dB),
  gain: rangeOf(lowShelf.schema.shape.gain_dB),
  to: rangeOf(linkwitzTransform.schema.shape.to_Hz)
};

export function sweptOf(over: SweepOver, chain: Chain, budget: Budget, system: System): SweptValue {
  if (over === 'volume') return volume(scaled(budget.alignment.net, 1000), system);
  if (over === 'level') {
    const level = sweptText('level_dB', chain.goal.level, system);
    return {
      column: 'level_dB',
      quantity: 'level',
      label: 'Level at the seat',
      value: chain.goal.level,
      text: level,
      tag: `${level} wanted`,
      range: RANGES.level,
      steps: { small: 0.1, large: 2 },
      snap: 0.5
    };
  }
  const block = sweptBlock(chain);
  if (block.kind === 'shelf') {
    const gain = sweptText('boost_gain_dB', block.value, system);
    return {
      column: 'boost_gain_dB',
      quantity: 'level',
      label: 'Shelf gain',
      value: block.value,
      text: gain,
      tag: `shelf ${gain}`,
      range: RANGES.gain,
      steps: { small: 0.5, large: 2 },
      snap: 0.5
    };
  }
  // Without a transform the box's own corner stands for it: from there down is boost.
  const none = block.kind === 'none';
  const value = none ? budget.alignment.fc : block.value;
  const text = sweptText('boost_to_Hz', value, system);
  return {
    column: 'boost_to_Hz',
    quantity: 'frequency',
    label: 'Boost down to',
    value,
    text: none ? 'none yet' : text,
    tag: none ? 'no boost yet' : `boost to ${text}`,
    range: RANGES.to,
    steps: { small: 0.5, large: 2 },
    snap: 0.5
  };
}

/** Whole litres or tenths of a cubic foot; a tenth of that where the box is too small to have many of them. */
function volume(litres: number, system: System): SweptValue {
  const shown = shownUnit('volume', system).fromStored(litres);
  const text = sweptText('net_L', litres, system);
  const metric = system === 'metric';
  const unit = (shown < (metric ? 4 : 0.4) ? 0.1 : 1) * (metric ? 1 : 0.1);
  const step = Number(unit.toPrecision(3));
  return {
    column: 'net_L',
    quantity: 'volume',
    label: 'Net volume',
    value: litres,
    text,
    tag: `${text} net`,
    range: RANGES.volume,
    steps: { small: step, large: 5 * step },
    snap: step
  };
}
