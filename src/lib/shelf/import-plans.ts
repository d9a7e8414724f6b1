/** Plan files taken onto the shelf: each is stored, or what is wrong with it is said in the words of the command line. */
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';
import type { Shelf } from './shelf';
import { ShelfError } from './shelf-error';

export interface ImportedFile {
  readonly name: string;
  /** Text, or bytes that should be UTF-8. */
  readonly content: string | Uint8Array;
}

export type ImportResult =
  | { readonly ok: true; readonly name: string; readonly id: string; readonly title: string }
  | { readonly ok: false; readonly name: string; readonly problems: readonly string[] };

/** One result a file, in order. A file that cannot be read stores nothing, nor does one the shelf has no room for. */
export async function importPlans(
  shelf: Pick<Shelf, 'add'>,
  files: readonly ImportedFile[]
): Promise<ImportResult[]> {
  const results: ImportResult[] = [];
  for (const file of files) results.push(await importPlan(shelf, file));
  return results;
}

async function importPlan(shelf: Pick<Shelf, 'add'>, { name, content }: ImportedFile): Promise<ImportResult> {
  const read = readPlan(content);
  if (!read.ok) return { ok: false, name, problems: read.problems.map(formatProblem) };
  try {
    const { id, title } = await shelf.add(read.plan);
    return { ok: true, name, id, title };
  } catch (error) {
    if (error instanceof ShelfError) return { ok: false, name, problems: [error.message] };
    throw error;
  }
}
