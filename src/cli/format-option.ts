import { UsageError } from './usage-error';

export const FORMAT_OPTIONS = { csv: 'boolean', json: 'boolean' } as const;

/** How rows are printed; an aligned table unless asked otherwise. */
export function formatOption(
  command: string,
  values: { csv?: boolean; json?: boolean }
): 'csv' | 'json' | 'table' {
  if (values.csv && values.json) throw new UsageError('--csv and --json exclude each other', command);
  return values.csv ? 'csv' : values.json ? 'json' : 'table';
}
