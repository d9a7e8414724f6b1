/** A file that cannot be read, or written to, or is no plan: one line a problem, each opening with the file's name. */
export class InputError extends Error {
  override readonly name = 'InputError';
  constructor(readonly lines: readonly string[]) {
    super(lines.join('\n'));
  }
}
