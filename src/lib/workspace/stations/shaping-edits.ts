/** Edits to the list of shaping blocks, as JSON Patch (RFC 6902). */
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Plan } from '$lib/plan/schema';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';

/** Where a new block goes: at the end of what stands before the amplifier, its built-in filters last. */
export function newPlace(blocks: readonly PlanBlock[]): number {
  return blocks.findLastIndex((block) => block.fixed !== true) + 1;
}

export function addBlock(plan: Plan, block: PlanBlock): JsonPatch {
  const { shaping } = plan;
  if (shaping != null) return [{ op: 'add', path: `/shaping/${newPlace(shaping)}`, value: block }];
  return [{ op: Object.hasOwn(plan, 'shaping') ? 'replace' : 'add', path: '/shaping', value: [block] }];
}

export const removeBlock = (place: number): JsonPatch => [{ op: 'remove', path: `/shaping/${place}` }];

/**
 * From one place in the list to another, counted without the block itself: taken out and put back in, which is what RFC 6902
 * section 4.4 says "move" amounts to; plans are patched with add, remove and replace alone.
 */
export const moveBlock = (blocks: readonly PlanBlock[], from: number, to: number): JsonPatch => [
  { op: 'remove', path: `/shaping/${from}` },
  { op: 'add', path: `/shaping/${to}`, value: JSON.parse(JSON.stringify(blocks[from])) as unknown }
];

const COMMON = ['id', 'label', 'bypass', 'fixed'] as const;

/** A block of another kind in the place of this one: what any block may carry is taken along from it. */
export function inPlaceOf(block: PlanBlock, next: PlanBlock): PlanBlock {
  const placed = { ...next };
  for (const key of COMMON) {
    delete placed[key];
    if (Object.hasOwn(block, key)) Object.assign(placed, { [key]: block[key] });
  }
  return placed;
}
