/** Every kind of shaping block the file knows. A new kind is one file beside this one and its entry in both lists. */
import { z } from 'zod';
import type { Block } from '$lib/engine/shaping/block';
import type { Problem } from '../../problem';
import { allPass } from './all-pass';
import { delay } from './delay';
import { gain } from './gain';
import { linkwitzTransform } from './linkwitz-transform';
import { lowShelf } from './low-shelf';
import { highPass, lowPass } from './pass';
import { peak } from './peak';
import { polarity } from './polarity';
import { section } from './section';

export const blockSchema = z.discriminatedUnion('kind', [
  lowPass.schema,
  highPass.schema,
  linkwitzTransform.schema,
  lowShelf.schema,
  peak.schema,
  gain.schema,
  polarity.schema,
  delay.schema,
  allPass.schema,
  section.schema
]);

/** More blocks than this in one plan are refused. */
export const MOST_BLOCKS = 64;

/** A shaping block as the file has it. */
export type PlanBlock = z.input<typeof blockSchema>;

interface Entry<B> {
  readonly toEngine: (block: B) => Block;
  readonly problems?: (block: B, path: string) => Problem[];
}

const BLOCKS: { [K in PlanBlock['kind']]: Entry<Extract<PlanBlock, { kind: K }>> } = {
  'low-pass': lowPass,
  'high-pass': highPass,
  'linkwitz-transform': linkwitzTransform,
  'low-shelf': lowShelf,
  peak,
  gain,
  polarity,
  delay,
  'all-pass': allPass,
  section
};

/** The file's block as the engine's: Hz, dB, seconds. */
export const toEngineBlock = (block: PlanBlock): Block =>
  (BLOCKS[block.kind] as Entry<PlanBlock>).toEngine(block);

/** Rules across the keys of one block; `path` is the block's JSON pointer. */
export const blockProblems = (block: PlanBlock, path: string): Problem[] =>
  (BLOCKS[block.kind] as Entry<PlanBlock>).problems?.(block, path) ?? [];
