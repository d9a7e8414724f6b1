/**
 * Writes to standard output (1) or standard error (2) at once. Node's own streams would be loaded for it, a twentieth of a short run.
 * A reader that closes the pipe early (`| head -1`) has what it wants: the program ends quietly, whatever was left to say.
 */
import { writeSync } from 'node:fs';

export function writeOut(handle: 1 | 2, text: string): void {
  const bytes = Buffer.from(text);
  let done = 0;
  while (done < bytes.length) {
    try {
      done += writeSync(handle, bytes, done);
    } catch (error) {
      const code = error instanceof Error && 'code' in error ? error.code : null;
      if (code === 'EPIPE' || code === 'EOF') process.exit();
      // A pipe that somebody made non-blocking and that is full: the stream waits for it.
      if (code !== 'EAGAIN') throw error;
      stream(handle).on('error', () => process.exit());
      stream(handle).write(bytes.subarray(done));
      return;
    }
  }
}

const stream = (handle: 1 | 2): NodeJS.WriteStream => (handle === 1 ? process.stdout : process.stderr);
