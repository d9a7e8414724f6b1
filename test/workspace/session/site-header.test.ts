import { fireEvent, render, screen, within } from '@testing-library/svelte';
import { expect, test, vi } from 'vitest';
import { Preferences } from '$lib/workspace/session/preferences.svelte';
import { sessionWith } from '../shelf-page/shelf';
import HeaderHarness from './HeaderHarness.svelte';

async function show() {
  const { session } = await sessionWith(['Loft', 'Den']);
  const preferences = new Preferences();
  const onprint = vi.fn();
  render(HeaderHarness, { session, preferences, onprint });
  return { preferences, onprint, bar: within(screen.getByRole('banner')) };
}

test('the brand leads to the shelf, and the page puts its own beside it', async () => {
  const { bar } = await show();
  expect(bar.getByRole('link', { name: 'Sealwright' })).toHaveAttribute('href', '/');
  expect(bar.getByText('Loft corner')).toBeVisible();
  expect(screen.getByRole('link', { name: 'Skip to the plan' })).toHaveAttribute('href', '#main');
});

test('theme and units say what they are, and go on to the next', async () => {
  const { bar, preferences } = await show();
  const press = (name: string) => fireEvent.click(bar.getByRole('button', { name }));
  await press('Theme: As the device');
  await press('Theme: Light');
  expect(preferences.theme).toBe('dark');
  await press('Theme: Dark');
  expect(preferences.theme).toBe('system');
  await press('Units: Metric');
  expect(preferences.system).toBe('imperial');
  await press('Units: Imperial');
  expect(preferences.system).toBe('metric');
});

test('the menu holds the same tools; using one closes it, changing a setting does not', async () => {
  const { bar, preferences, onprint } = await show();
  expect(screen.queryByRole('dialog')).toBeNull();
  await fireEvent.click(bar.getByText('Menu'));
  const menu = screen.getByRole('dialog', { name: 'Menu' });
  expect(within(menu).getByRole('link', { name: /^Plans/ })).toHaveTextContent('2 plans');
  await fireEvent.click(within(menu).getByRole('button', { name: 'Units: Metric' }));
  expect(preferences.system).toBe('imperial');
  expect(menu).toHaveAttribute('open');
  await fireEvent.click(within(menu).getByRole('button', { name: 'Print' }));
  expect(onprint).toHaveBeenCalledOnce();
  expect(screen.queryByRole('dialog')).toBeNull();

  await fireEvent.click(bar.getByText('Menu'));
  await fireEvent.click(screen.getByRole('button', { name: 'Close' }));
  expect(screen.queryByRole('dialog')).toBeNull();
});
