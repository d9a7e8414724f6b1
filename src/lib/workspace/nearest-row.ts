import type { Report } from '$lib/words/report';

type Row = Report['ledger'][number];

/** The row of the ledger whose band lies nearest to f (Hz), by ratio. */
export function nearestRow(rows: readonly Row[], f: number): Row {
  const distance = ({ f_Hz }: Row) => (f_Hz === null ? Infinity : Math.abs(Math.log(f_Hz / f)));
  return rows.reduce((a, b) => (distance(b) < distance(a) ? b : a));
}
