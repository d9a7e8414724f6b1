/** The bytes of a plan: a path, or `-` for standard input. At most 1 MiB is ever held. */
import { closeSync, fstatSync, openSync, readSync } from 'node:fs';
import { InputError } from './input-error';
import { plainText } from './plain-text';

/** Bytes a plan may have: the plan file's own limit. */
export const LIMIT_BYTES = 1024 * 1024;
const TOO_LARGE = 'larger than the 1 MiB a plan may have';

export async function readInput(path: string): Promise<Uint8Array> {
  return path === '-' ? readStandardInput() : readFile(path);
}

function readFile(path: string): Uint8Array {
  let handle: number | undefined;
  try {
    handle = openSync(path, 'r');
    const stat = fstatSync(handle);
    if (stat.isDirectory()) throw refusal(path, 'is a directory, not a plan');
    if (stat.size > LIMIT_BYTES) throw refusal(path, TOO_LARGE);
    // A pipe or a device has no size to trust: reading stops one byte past the limit.
    const buffer = new Uint8Array((stat.isFile() ? stat.size : LIMIT_BYTES) + 1);
    let length = 0;
    for (;;) {
      const count = readSync(handle, buffer, length, buffer.length - length, null);
      length += count;
      if (length > LIMIT_BYTES) throw refusal(path, TOO_LARGE);
      if (count === 0 || length === buffer.length) return buffer.subarray(0, length);
    }
  } catch (error) {
    throw asRefusal(path, error);
  } finally {
    if (handle !== undefined) closeSync(handle);
  }
}

async function readStandardInput(): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  let length = 0;
  try {
    for await (const chunk of process.stdin as AsyncIterable<Buffer>) {
      length += chunk.length;
      if (length > LIMIT_BYTES) throw refusal('-', TOO_LARGE);
      chunks.push(chunk);
    }
  } catch (error) {
    throw asRefusal('-', error);
  }
  return Buffer.concat(chunks);
}

const REASONS: { readonly [code: string]: string } = {
  ENOENT: 'no such file',
  ENOTDIR: 'no such file',
  EACCES: 'may not be read (permission denied)',
  EPERM: 'may not be read (permission denied)',
  EISDIR: 'is a directory, not a plan',
  ELOOP: 'too many links lead to it',
  ENAMETOOLONG: 'the name is too long',
  ERR_INVALID_ARG_VALUE: 'no such file'
};

function asRefusal(path: string, error: unknown): unknown {
  if (error instanceof InputError || !(error instanceof Error)) return error;
  const code = 'code' in error && typeof error.code === 'string' ? error.code : null;
  return code === null ? error : refusal(path, REASONS[code] ?? `cannot be read (${code})`);
}

const refusal = (path: string, what: string): InputError => new InputError([`${fileLabel(path)}: ${what}`]);

/** What a file is called in messages: control characters made harmless. */
export const fileLabel = (path: string): string => (path === '-' ? 'standard input' : plainText(path));
