/** A flag as it will stand: its row from the top, and on which side of its hairline the label is. */
export interface FlagRow {
  readonly id: string;
  readonly side: 'right' | 'left';
  readonly row: number;
}

interface FlagAt {
  readonly id: string;
  readonly x: number;
  readonly width: number;
}

/** From hairline to label, in px. */
export const FLAG_GAP = 7;

/**
 * Rows in which no label lies across the hairline of another that reads to the same side: labels to the right go down
 * from the leftmost flag, labels to the left from the rightmost. Where both are needed the left ones take the upper rows.
 */
export function flagRows(flags: readonly FlagAt[], left: number, right: number): FlagRow[] {
  const fitsRight = ({ x, width }: FlagAt) => x + FLAG_GAP + width <= right;
  const fitsLeft = ({ x, width }: FlagAt) => x - FLAG_GAP - width >= left;
  const ascending = [...flags].sort((a, b) => a.x - b.x);
  const turned = ascending.filter((flag) => !fitsRight(flag));
  const allLeft = turned.length > 0 && ascending.every(fitsLeft);
  const leftward = allLeft ? ascending : turned.filter(fitsLeft);
  const rows = [...leftward.reverse(), ...ascending.filter((flag) => !leftward.includes(flag))];
  return rows.map((flag, row) => ({
    id: flag.id,
    side: leftward.includes(flag) ? 'left' : 'right',
    row
  }));
}
