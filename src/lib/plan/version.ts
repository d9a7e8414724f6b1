/** What a plan file says of itself. */
export const FORMAT = 'sealwright-plan';
export const VERSION = 1;

/** Top-level keys kept for later: a file that has one was written by a newer Sealwright. */
export const RESERVED_KEYS: readonly string[] = ['build', 'circuit', 'mains', 'rooms', 'measured'];
