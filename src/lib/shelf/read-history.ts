/** A history as it comes out of a store: checked, and walked through from end to end, before anybody relies on it. */
import { z } from 'zod';
import type { Plan } from '$lib/plan/schema';
import { PatchError, patched } from './apply-patch';
import { EMPTY_HISTORY, type History } from './history';

const operation = z.discriminatedUnion('op', [
  z.object({ op: z.enum(['add', 'replace']), path: z.string(), value: z.unknown() }),
  z.object({ op: z.literal('remove'), path: z.string() })
]);

const stored = z.object({
  entries: z.array(
    z.object({
      label: z.string(),
      forward: z.array(operation),
      back: z.array(operation),
      at: z.number(),
      key: z.string().nullable()
    })
  ),
  position: z.int().min(0)
});

/** The history that belongs to the plan; an empty one where it is damaged or belongs to another. A group left open is closed. */
export function readHistory(value: unknown, plan: Plan): History {
  const read = stored.safeParse(value);
  if (!read.success || read.data.position > read.data.entries.length) return EMPTY_HISTORY;
  const history: History = { ...read.data, group: null };
  return fits(history, plan) ? history : EMPTY_HISTORY;
}

/** Every step can be taken, back to the first and on to the last. */
function fits({ entries, position }: History, plan: Plan): boolean {
  try {
    entries.slice(0, position).reduceRight((at, { back }) => patched(at, back), plan);
    entries.slice(position).reduce((at, { forward }) => patched(at, forward), plan);
    return true;
  } catch (error) {
    if (error instanceof PatchError) return false;
    throw error;
  }
}
