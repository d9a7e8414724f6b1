export interface FoundBrowser {
  readonly path: string;
  readonly origin: 'CHROMIUM_PATH' | 'playwright' | 'machine';
}

/** A Chromium or Chrome that exists on this machine, or null. Throws when CHROMIUM_PATH names none. */
export function findBrowser(): FoundBrowser | null;
