/** The known name nearest to one that is not known. */

/** Longer names are compared by their beginning. */
const LONGEST = 40;

/** The nearest of `known`; null where nothing is known. Letter case counts little, a shared word before the unit counts for it. */
export function nearestKey(name: string, known: readonly string[]): string | null {
  let best: string | null = null;
  let least = Infinity;
  for (const key of known) {
    const d = distance(name.slice(0, LONGEST), key);
    if (d < least) {
      least = d;
      best = key;
    }
  }
  return best;
}

const stem = (key: string): string => key.split('_')[0];

function distance(a: string, b: string): number {
  if (a === b) return 0;
  const la = a.toLowerCase();
  const lb = b.toLowerCase();
  if (la === lb) return 0.5;
  return stem(la) === stem(lb) ? Math.min(1.5, edits(la, lb)) : edits(la, lb);
}

/** Letters to put in, take out or change: V. I. Levenshtein, "Binary codes capable of correcting deletions, insertions, and reversals", 1966. */
function edits(a: string, b: string): number {
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++)
      next.push(Math.min(row[j] + 1, next[j - 1] + 1, row[j - 1] + (a[i - 1] === b[j - 1] ? 0 : 1)));
    row = next;
  }
  return row[b.length];
}
