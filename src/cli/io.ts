import type { Ink } from './colour';

/** What a command may touch: where text goes, and how it may look. */
export interface Io {
  /** Standard output. */
  readonly out: (text: string) => void;
  /** One line on standard error. */
  readonly err: (line: string) => void;
  readonly ink: Ink;
  /** Columns to fold text to. */
  readonly width: number;
}

/** 0 holds or done; 1 does not hold; 2 unreadable, invalid or misused. */
export type ExitStatus = 0 | 1 | 2;

/** Runs on the arguments after its name. */
export type Command = (args: readonly string[], io: Io) => Promise<ExitStatus>;
