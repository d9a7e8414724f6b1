/** The browser's small store, or null where there is none or the page may not use it: merely asking throws there. */
export function localStore(): Storage | null {
  try {
    return globalThis.localStorage ?? null;
  } catch {
    return null;
  }
}
