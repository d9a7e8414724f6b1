import type { Plan } from '$lib/plan/schema';
import { editKeys, type KeyEdit } from './edit-key';
import { refusal, type OnEdit } from './station';

/** Sets or clears keys of the plan. Null when taken, or when there was nothing to change; else a sentence that says why not. */
export function commitKeys(
  { plan, onedit }: { plan: Plan; onedit: OnEdit },
  label: string,
  edits: readonly KeyEdit[],
  merge?: string
): string | null {
  const patch = editKeys(plan, edits);
  if (patch.length === 0) return null;
  return refusal(merge === undefined ? onedit(label, patch) : onedit(label, patch, { merge }));
}
