/** Files picked or dropped, read into memory; those that cannot be plans are refused unread. */
import type { ImportedFile } from '$lib/shelf/import-plans';

/** Bytes a plan may have: the plan file's own limit. */
export const LARGEST_FILE = 1024 * 1024;

export type ReadFile =
  | { readonly ok: true; readonly file: ImportedFile }
  | { readonly ok: false; readonly name: string; readonly problems: readonly string[] };

/** One result a file, in order. */
export const readFiles = (files: readonly File[]): Promise<ReadFile[]> => Promise.all(files.map(readFile));

/** Bytes, not text: how the file is encoded is for the plan's reader to judge, as on the command line. */
async function readFile(file: File): Promise<ReadFile> {
  const refuse = (problem: string): ReadFile => ({ ok: false, name: file.name, problems: [problem] });
  if (file.size > LARGEST_FILE) return refuse('larger than the 1 MiB a plan may have');
  try {
    const content = new Uint8Array(await file.arrayBuffer());
    return { ok: true, file: { name: file.name, content } };
  } catch {
    return refuse('cannot be read: it was moved or changed, or it is a folder');
  }
}
