/** dB from the top of the small curves to their foot: below, a level counts for nothing. */
const SPAN = 42;

/** One scale for all small curves of a page, so that louder plans stand higher. */
export function levelDomain(curves: readonly (readonly number[])[]): readonly [number, number] {
  const loudest = Math.max(...curves.flat().filter(Number.isFinite));
  const high = Number.isFinite(loudest) ? Math.ceil(loudest) + 1 : 120;
  return [high - SPAN, high];
}
