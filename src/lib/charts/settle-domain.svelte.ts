/**
 * Axes never rescale during a drag: while `dragging` the domain (or whatever belongs to it, such as ticks) stays as it was,
 * and settles on what is wanted when the drag is over. Inside and outside a drag the same object is kept until it changes.
 */
export function settleDomain<T>(wanted: () => T, dragging: () => boolean): { readonly current: T } {
  let held: { readonly value: T } | null = null;
  const current = $derived.by(() => {
    if (held === null || !dragging()) held = { value: wanted() };
    return held.value;
  });
  return {
    get current() {
      return current;
    }
  };
}
