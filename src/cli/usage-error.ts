/** Bad usage: one line, and which help to read. */
export class UsageError extends Error {
  override readonly name = 'UsageError';
  constructor(
    message: string,
    readonly command: string | null = null
  ) {
    super(message);
  }
}
