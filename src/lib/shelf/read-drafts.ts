import { z } from 'zod';
import type { Drafts } from './plan-record';

const stored = z.record(z.string(), z.string());

/** Drafts as they come out of a store; null where there are none. */
export function readDrafts(value: unknown): Drafts | null {
  const read = stored.safeParse(value);
  return read.success ? read.data : null;
}
