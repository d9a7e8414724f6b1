/**
 * Marks the figures kept beside a stored plan (verdict and curve) with the engine that worked them out.
 * Raise it by one whenever the engine or the words give another verdict, sentence or curve for any plan, and whenever the plan file
 * gains a key or a version (plans it could not read may be readable now); figures with a lower number are worked out again in idle time. A higher number comes from a newer Sealwright in another tab and is left alone.
 */
export const ENGINE_VERSION = '1';

/** True where the figures are older than this engine. */
export const isStale = (version: string): boolean => !(Number(version) >= Number(ENGINE_VERSION));
