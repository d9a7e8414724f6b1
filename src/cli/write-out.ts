/**
 * Writes to standard output (1) or standard error (2) at once. Node's own streams would be loaded for it, a twentieth of a short run.
 * A reader that closes the pipe early (`| head -1`) has what it wants: the program ends quietly, whatever was left to say.
 */
import { writeSync } from 'node:fs';
import { InputError } from './input-error';

type Handle = 1 | 2;

/** Those that had to fall back to node's streams; they stay there, so that nothing overtakes what is queued. */
const streaming = new Set<Handle>();

export function writeOut(handle: Handle, text: string): void {
  const bytes = Buffer.from(text);
  let done = 0;
  while (done < bytes.length && !streaming.has(handle)) {
    try {
      done += writeSync(handle, bytes, done);
    } catch (error) {
      giveWay(handle, error);
    }
  }
  if (done < bytes.length) streamOf(handle).write(bytes.subarray(done));
}

/** Returns where the stream can take over; else ends, or throws one line. */
function giveWay(handle: Handle, error: unknown): void {
  const code = error instanceof Error && 'code' in error ? String(error.code) : null;
  if (code === null) throw error;
  // A reader that left; or no one to tell that nobody can be told.
  if (code === 'EPIPE' || code === 'EOF' || (code !== 'EAGAIN' && handle === 2)) process.exit();
  if (code !== 'EAGAIN') throw new InputError([`standard output: cannot be written (${code})`]);
  // A pipe that somebody made non-blocking, and that is full: the stream waits for it.
  streaming.add(handle);
  streamOf(handle).on('error', () => process.exit());
}

const streamOf = (handle: Handle): NodeJS.WriteStream => (handle === 1 ? process.stdout : process.stderr);
