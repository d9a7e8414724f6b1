import { fireEvent, render, screen, within } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import PlotTable from '$lib/charts/PlotTable.svelte';
import Sparkline from '$lib/charts/Sparkline.svelte';

const props = {
  caption: 'Level at the seat',
  columns: [
    { name: 'Frequency', unit: 'Hz' },
    { name: 'Played', unit: 'dB' },
    { name: 'First to run out', text: true }
  ],
  rows: [
    ['20', '103.7', 'cone travel'],
    ['25', '104.1', '<b>coil heat</b>']
  ]
};

test('the figures are a table with a caption and headings for rows and columns', () => {
  render(PlotTable, { props: { ...props, open: true } });
  const table = screen.getByRole('table', { name: 'Level at the seat' });
  const heads = within(table).getAllByRole('columnheader');
  expect(heads.map((head) => head.getAttribute('scope'))).toEqual(['col', 'col', 'col']);
  expect(heads.map((head) => head.textContent?.replace(/\s+/g, ' '))).toEqual([
    'Frequency Hz',
    'Played dB',
    'First to run out'
  ]);
  const row = within(table).getByRole('rowheader', { name: '20' });
  expect(row).toHaveAttribute('scope', 'row');
  expect(row.parentElement).toHaveTextContent('20103.7cone travel');
  expect(screen.getByText('<b>coil heat</b>')).toBeVisible();
});

test('nothing is drawn until it is opened', async () => {
  const { container } = render(PlotTable, { props });
  expect(screen.queryByRole('table')).toBeNull();
  const details = container.querySelector('details');
  if (!details) throw new Error('no details');
  details.open = true;
  await fireEvent(details, new Event('toggle'));
  expect(screen.getByRole('table')).toBeInTheDocument();
});

test('a small curve has a name, and whether it holds shows without colour', () => {
  const levels = [90, 100, Number.NaN, 103];
  const draw = (holds: boolean) => {
    const { container, unmount } = render(Sparkline, {
      props: { levels, holds, domain: [80, 110], label: 'Den: level at the seat' }
    });
    expect(screen.getByRole('img', { name: 'Den: level at the seat' })).toBeVisible();
    const path = container.querySelector('path')?.getAttribute('d');
    const dash = container.querySelector('line')?.getAttribute('stroke-dasharray') ?? null;
    unmount();
    return { path, dash };
  };
  expect(draw(true).dash).toBeNull();
  expect(draw(false).dash).not.toBeNull();
  expect(draw(true).path?.match(/M/g)).toHaveLength(2);
});
