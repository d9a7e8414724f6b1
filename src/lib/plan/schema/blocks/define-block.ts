/** What every shaping block of the file has in common, and how one kind is entered. */
import { z } from 'zod';
import type { Block } from '$lib/engine/shaping/block';
import type { Problem } from '../../problem';
import { DEFAULTS } from '../../defaults';
import { optional, quantity } from '../keys';

/** Keys any block may carry. */
export const commonKeys = {
  id: optional(z.string(), 'A mark other parts of the plan refer to.'),
  label: optional(z.string(), 'A name of your own for the block.'),
  bypass: optional(
    z.boolean(),
    'True leaves the block out of the signal path and keeps it in the plan.',
    false
  ),
  fixed: optional(
    z.boolean(),
    'True when the block is built into the amplifier: ways out leave it alone.',
    false
  )
};

export const frequency = () => quantity(1, 2000);
export const blockQ = () => quantity(0.1, 30);
export const optionalQ = optional(blockQ(), 'Q of a second-order block; left out, 0.707.', DEFAULTS.block_q);

interface Common {
  bypass?: boolean | null;
  fixed?: boolean | null;
}

/** The engine's share of the common keys. */
export const commonOf = (b: Common) => ({ bypass: b.bypass ?? false, fixed: b.fixed ?? false });

/** One kind of block: its keys, its engine block, and the rules across its keys (`path` is the block's own pointer). */
export interface BlockEntry<S extends z.ZodType> {
  readonly schema: S;
  readonly toEngine: (block: z.input<S>) => Block;
  readonly problems?: (block: z.input<S>, path: string) => Problem[];
}

export const defineBlock = <S extends z.ZodType>(entry: BlockEntry<S>): BlockEntry<S> => entry;
