/** Leaves out what would stand closer than `gap` px to the one kept before it; the first always stays. */
export function thinTicks<T>(ticks: readonly T[], position: (tick: T) => number, gap: number): T[] {
  const kept: T[] = [];
  let last = Number.NaN;
  for (const tick of ticks) {
    const at = position(tick);
    if (!Number.isFinite(at) || Math.abs(at - last) < gap) continue;
    kept.push(tick);
    last = at;
  }
  return kept;
}
