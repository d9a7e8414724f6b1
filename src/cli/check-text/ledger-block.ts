import type { LedgerRow } from '$lib/engine/budget/budget';
import { fixed, figures } from '$lib/words/format-number';
import { shortLimitName } from '$lib/words/limit-names';
import { marginReading, marginSize } from '$lib/words/margin-text';
import type { Ink } from '../colour';
import { tableLines, type Align } from '../table';
import { block, type Page } from './page';

interface Column {
  readonly name: string;
  readonly unit: string;
  readonly align?: Align;
  readonly show: (row: LedgerRow, ink: Ink) => string;
}

const db = (value: number | null): string => (value === null ? '' : fixed(value, 1));

const COLUMNS: readonly Column[] = [
  { name: 'at', unit: 'Hz', show: (r) => String(r.nominal) },
  { name: 'wanted', unit: 'dB', show: (r) => db(r.wanted) },
  { name: 'seat', unit: 'dB', show: (r) => db(r.delivered) },
  { name: 'box/V', unit: 'dB', show: (r) => db(r.driverBox) },
  { name: 'shaping', unit: 'dB', show: (r) => db(r.shaping) },
  { name: 'distance', unit: 'dB', show: (r) => db(r.distance) },
  { name: 'room', unit: 'dB', show: (r) => db(r.roomGain) },
  { name: 'copies', unit: 'dB', show: (r) => db(r.copies) },
  { name: 'drive', unit: 'V', show: (r) => figures(r.driveV, 3) },
  { name: 'amps', unit: 'A', show: (r) => figures(r.currentA, 3) },
  { name: 'power', unit: 'W', show: (r) => figures(r.realW, 3) },
  { name: 'travel', unit: 'mm', show: (r) => figures(r.travel * 1000, 3) },
  { name: 'margin', unit: 'dB', show: (r, ink) => margin(r, ink) },
  { name: 'limit', unit: '', align: 'left', show: (r) => (r.limit === null ? '' : shortLimitName(r.limit)) }
];

/** One-third octaves: the decibels that add up to the level, then what they cost. */
export function ledgerBlock(page: Page): string[] {
  const columns = COLUMNS.filter(({ name }) => name !== 'copies' || page.chain.copies > 1);
  const rows = [
    columns.map(({ name }) => name),
    columns.map(({ unit }) => unit),
    ...page.budget.ledger.map((row) => columns.map(({ show }) => show(row, page.ink)))
  ];
  return block(
    page,
    'Ledger by one-third octaves',
    tableLines(rows, { align: columns.map(({ align }) => align ?? 'right'), indent: '  ' })
  );
}

/** Over reads as "1.7 over": a sign alone is easily missed. */
function margin({ margin: value }: LedgerRow, ink: Ink): string {
  if (value === null) return '';
  const reading = marginReading(value);
  const text = reading === 'over' ? `${marginSize(value)} over` : marginSize(value).replace('under ', '<');
  return reading === 'over'
    ? ink.red(text.replace('under ', '<'))
    : reading === 'thin'
      ? ink.amber(text)
      : text;
}
