import { render, screen } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import LedgerTable from '$lib/workspace/LedgerTable.svelte';
import { sampleReport } from './sample-report';

const cells = (row: Element) =>
  [...row.children].map((cell) => cell.textContent?.replace(/\s+/g, ' ').trim());
const rows = (container: HTMLElement) => [...container.querySelectorAll('tbody tr')].map(cells);

test('every column stands under its heading', () => {
  const { container } = render(LedgerTable, { report: sampleReport() });
  const heads = cells(container.querySelector('thead tr')!);
  const line = rows(container)[1];
  expect(Object.fromEntries(heads.map((head, i) => [head, line[i]]))).toEqual({
    'Band Hz': '20',
    'Wanted dB': '101.0',
    'Drive dB re 1 V': '+20.0',
    'Shaping dB': '+4.3',
    'Driver and box dB': '+69.6',
    'Room dB': '+6.7',
    'At the seat dB': '100.6',
    'Volts V RMS': '16.4',
    'Amps A RMS': '3.71',
    'Real power W': '54.4',
    'Travel mm peak': '11.30',
    'Margin dB': '+2.5',
    'First to run out limit': 'travel'
  });
});

test('the decibels of a line add up to the level at the seat', () => {
  const { container } = render(LedgerTable, { report: sampleReport() });
  const [, , drive, shaping, driverBox, room, seat] = rows(container)[1];
  const sum = [drive, shaping, driverBox, room].reduce((total, step) => total + Number(step), 0);
  expect(sum).toBeCloseTo(Number(seat), 6);
});

test('outside the goal and without a judged limit, the line says so to those who listen', () => {
  const { container } = render(LedgerTable, { report: sampleReport() });
  expect(rows(container)[0][1]).toBe('–outside the goal');
  expect(rows(container)[2].slice(-2)).toEqual(['–none judged', '']);
});

test('a margin that is barely over stays over', () => {
  const { container } = render(LedgerTable, { report: sampleReport() });
  expect(rows(container)[0].at(-2)).toBe('−0.0');
  expect(container.querySelectorAll('tbody .over')).toHaveLength(1);
});

test('copies have a column only where there are several', () => {
  const report = sampleReport();
  render(LedgerTable, { report });
  expect(screen.queryByRole('columnheader', { name: 'Copies dB' })).toBeNull();
  render(LedgerTable, {
    report: { ...report, ledger: report.ledger.map((r) => ({ ...r, copies_dB: 6.02 })) }
  });
  expect(screen.getByRole('columnheader', { name: 'Copies dB' })).toBeVisible();
  expect(screen.getAllByRole('cell', { name: '+6.0' })).toHaveLength(report.ledger.length);
});

test('the scrolling box is reached by the keyboard and has a name', () => {
  render(LedgerTable, { report: sampleReport() });
  const box = screen.getByRole('region', { name: /scrolls/i });
  expect(box).toHaveAttribute('tabindex', '0');
});
