import { render, screen } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import LimitTable from '$lib/workspace/LimitTable.svelte';
import { sampleReport } from './sample-report';

const cells = (row: Element) => [...row.querySelectorAll('th, td')].map((cell) => cell.textContent?.trim());

test('each limit has its worst frequency, its need and its margin; an unrated one says that it was not judged', () => {
  const { container } = render(LimitTable, { report: sampleReport() });
  expect([...container.querySelectorAll('tbody tr')].map(cells)).toEqual([
    ['Amplifier volts', '18.5 Hz', '19.6 of 47.3 V', '7.7 dB in hand'],
    ['Amplifier amps', '15.3 Hz', '4.42 of 4.4 A', 'under 0.1 dB over'],
    ['Cone travel', '17.6 Hz', '11.6 of 15 mm', '≈2.3 dB in hand, thin'],
    ['Coil heat', '15.2 Hz', '4.43 of 34.6 A', '17.9 dB in hand'],
    ["Cone's stop", 'not judged: no rating given']
  ]);
});

test('over, thin and comfortable are told apart by more than words', () => {
  const { container } = render(LimitTable, { report: sampleReport() });
  expect(container.querySelector('.over')).toHaveTextContent('under 0.1 dB over');
  expect(container.querySelector('.thin')).toHaveTextContent('2.3 dB in hand, thin');
  expect(container.querySelectorAll('.comfortable')).toHaveLength(2);
});

test('the highest level is rounded down, so that it holds', () => {
  render(LimitTable, { report: sampleReport({ max_level_dB: 104.39 }) });
  expect(screen.getByText(/Within limits up to/)).toHaveTextContent(
    'Within limits up to 104.3 dB at the seat.'
  );
});

test('the table has a caption and headings in both directions', () => {
  render(LimitTable, { report: sampleReport() });
  expect(screen.getByRole('table', { name: /Least margin of each limit/ })).toBeVisible();
  expect(screen.getAllByRole('columnheader')).toHaveLength(4);
  expect(screen.getAllByRole('rowheader')).toHaveLength(5);
});
