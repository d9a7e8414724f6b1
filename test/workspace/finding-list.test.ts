import { render, screen, within } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import FindingList from '$lib/workspace/FindingList.svelte';
import { sampleReport } from './sample-report';

test('what stands in the way comes first, then cautions, then notes, each with its own ways out', () => {
  const { container } = render(FindingList, { report: sampleReport() });
  const items = [...container.querySelectorAll<HTMLElement>('.findings > li')];
  expect(items.map((item) => item.querySelector('.tag')?.textContent)).toEqual([
    'In the way',
    'Caution',
    'Note'
  ]);

  const ways = items.map((item) => [...item.querySelectorAll('.ways li')].map((way) => way.textContent));
  expect(ways).toEqual([
    ['Listen 2 dB lower: nothing in hand.', 'Raise the high-pass to 18 Hz: 0.2 dB in hand.'],
    ['Listen 1 dB lower.'],
    []
  ]);
  expect(within(items[0]).getByText('Ways out')).toBeVisible();
  expect(within(items[1]).getByText('Way out')).toBeVisible();
  expect(within(items[2]).queryByText(/way/i)).toBeNull();
});

test('a plan without findings says so', () => {
  render(FindingList, { report: sampleReport({ findings: [] }) });
  expect(screen.getByText(/Nothing to report/)).toBeVisible();
  expect(screen.queryByRole('list')).toBeNull();
});

test('text from a file is text, never markup', () => {
  const [finding] = sampleReport().findings;
  const text = '<img src=x onerror=alert(1)> is loud';
  const { container } = render(FindingList, { report: sampleReport({ findings: [{ ...finding, text }] }) });
  expect(screen.getByText(text)).toBeVisible();
  expect(container.querySelector('img')).toBeNull();
});
