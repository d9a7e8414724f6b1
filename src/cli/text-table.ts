/** A table of numbers for the terminal: six significant digits, plain hyphen-minus, so that what is piped stays numbers. */
import type { Table } from '$lib/words/curve-columns';
import { tableLines } from './table';

type Cell = Table['rows'][number][number];

function cellText(cell: Cell): string {
  if (cell === null) return '-';
  if (typeof cell === 'boolean') return cell ? 'yes' : 'no';
  return typeof cell === 'number' ? String(Number(cell.toPrecision(6))) : cell;
}

export function textTable({ columns, rows }: Table): string {
  const cells = [columns, ...rows.map((row) => row.map(cellText))];
  const align = columns.map(
    (_, i) => (rows.some((row) => typeof row[i] === 'string') ? 'left' : 'right') as 'left' | 'right'
  );
  return tableLines(cells, { align })
    .map((line) => line + '\n')
    .join('');
}
