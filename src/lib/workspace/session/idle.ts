/** ms after which work is done even where the page is never at rest. */
const AT_LATEST = 2000;

/** Resolves when the page has time to spare. */
export const idle = (): Promise<void> =>
  new Promise((resolve) => {
    // Not every browser tells when it is idle.
    if (typeof requestIdleCallback === 'function')
      requestIdleCallback(() => resolve(), { timeout: AT_LATEST });
    else setTimeout(resolve, 200);
  });
