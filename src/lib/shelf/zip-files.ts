import type { ExportedFile } from './export-plans';

/**
 * Files as one .zip, so that every plan leaves the page in a single download. `at` in ms since 1970.
 * The library is fetched when the first archive is made: no page waits for it.
 */
export async function zipFiles(files: readonly ExportedFile[], at: number): Promise<Uint8Array<ArrayBuffer>> {
  const { strToU8, zipSync } = await import('fflate');
  return zipSync(Object.fromEntries(files.map(({ name, text }) => [name, strToU8(text)])), { mtime: at });
}
