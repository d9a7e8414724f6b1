import type { Table } from '$lib/words/curve-columns';

/** Rows as objects, each under its column's name. */
export const rowObjects = ({ columns, rows }: Table): { [column: string]: Table['rows'][number][number] }[] =>
  rows.map((row) => Object.fromEntries(columns.map((name, i) => [name, row[i]])));

export const json = (value: unknown): string => JSON.stringify(value, null, 2) + '\n';
