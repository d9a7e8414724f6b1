const COPY = /^(.*?) \(copy(?: \d+)?\)$/s;

/** "Loft corner (copy)", "Loft corner (copy 2)" …: the first that is not taken. A copy of a copy counts on. */
export function copyTitle(title: string, taken: readonly string[]): string {
  const original = COPY.exec(title)?.[1] ?? title;
  for (let n = 1; ; n++) {
    const copy = n === 1 ? `${original} (copy)` : `${original} (copy ${n})`;
    if (!taken.includes(copy)) return copy;
  }
}
