/** CSV (RFC 4180, line feeds): full precision, what does not exist is empty. */
import type { Table } from '$lib/words/curve-columns';

type Cell = Table['rows'][number][number];

const field = (cell: Cell): string => {
  const text = cell === null ? '' : String(cell);
  return /[",\n\r]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
};

export const csv = ({ columns, rows }: Table): string =>
  [columns, ...rows].map((row) => row.map(field).join(',') + '\n').join('');
