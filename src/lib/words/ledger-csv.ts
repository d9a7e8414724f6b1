/** The ledger as CSV: the report's own names, full precision, empty where a figure does not exist. */
import type { Report } from './report';

export function ledgerCsv(report: Report): string {
  const columns = Object.keys(report.ledger[0]) as (keyof Report['ledger'][number])[];
  const rows = report.ledger.map((row) => columns.map((column) => row[column] ?? '').join(','));
  return [columns.join(','), ...rows].join('\n') + '\n';
}
