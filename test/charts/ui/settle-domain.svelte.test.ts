import { expect, test } from 'vitest';
import { settleDomain } from '$lib/charts/settle-domain.svelte';

test('an axis stays as it is during a drag and settles when it is over', () => {
  let wanted = $state.raw<readonly [number, number]>([0, 32]);
  let dragging = $state(false);
  const settled = settleDomain(
    () => wanted,
    () => dragging
  );
  expect(settled.current).toEqual([0, 32]);
  wanted = [0, 40];
  expect(settled.current).toEqual([0, 40]);

  dragging = true;
  const before = settled.current;
  wanted = [0, 48];
  expect(settled.current).toBe(before);
  wanted = [0, 64];
  expect(settled.current).toBe(before);

  dragging = false;
  expect(settled.current).toEqual([0, 64]);
});

test('what is first asked for during a drag is what was wanted then', () => {
  let wanted = $state.raw<readonly [number, number]>([0, 10]);
  const settled = settleDomain(
    () => wanted,
    () => true
  );
  expect(settled.current).toEqual([0, 10]);
  wanted = [0, 20];
  expect(settled.current).toEqual([0, 10]);
});
