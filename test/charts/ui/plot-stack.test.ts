import { fireEvent, render, screen } from '@testing-library/svelte';
import { expect, test, vi } from 'vitest';
import PlotStack from '$lib/charts/PlotStack.svelte';
import { HANDLE_ROW } from '$lib/charts/handle-shape';
import { makeScale } from '$lib/charts/make-scale';
import type { Series } from '$lib/charts/plot-types';
import { FREQUENCY, levelSpecimen, loudnessSpecimen, volumeSpecimen } from '../specimens';
import { stackProps } from '../stack-of';

/** Without a layout a stack is 800 px wide and begins at the window's edge; these are its margins. */
const frequencyAt = makeScale('log', [10, 200], [46, 752]);
const litresAt = makeScale('log', [30, 250], [46, 786]);

function level() {
  const acts = { onmove: vi.fn(), onstep: vi.fn(), onstart: vi.fn(), onend: vi.fn() };
  const props = stackProps(levelSpecimen(acts));
  return { ...acts, props, ...render(PlotStack, { props }), slider: screen.getByRole('slider') };
}

const press = (clientX: number, more: object = {}) => ({
  clientX,
  clientY: 0,
  pointerId: 1,
  pointerType: 'mouse',
  button: 0,
  ...more
});

test('says what it sets, between what, and where it stands, in a sentence', () => {
  const { slider } = level();
  expect(slider).toHaveAccessibleName('Cursor frequency');
  expect(slider).toHaveAttribute('aria-valuemin', '10');
  expect(slider).toHaveAttribute('aria-valuemax', '200');
  expect(slider).toHaveAttribute('aria-valuenow', '20');
  expect(slider).toHaveAttribute('aria-valuetext', '20 hertz. Played 104.7 decibels.');
  expect(slider).toHaveAttribute('tabindex', '0');
});

test('each panel is a named picture that tells its lines', () => {
  level();
  expect(screen.getByRole('figure', { name: 'Cone travel, mm peak' })).toBeVisible();
  expect(
    screen.getByRole('img', { name: 'Cone travel, mm peak: travel needed, Xmax 16 mm, cone stop 26 mm' })
  ).toBeVisible();
});

test('keys step, Shift and the page keys step far, Home and End go to the ends', async () => {
  const { slider, onstep, onmove, onstart, onend } = level();
  for (const key of ['ArrowRight', 'ArrowUp', 'ArrowLeft', 'ArrowDown', 'PageUp', 'PageDown']) {
    await fireEvent.keyDown(slider, { key });
  }
  await fireEvent.keyDown(slider, { key: 'ArrowRight', shiftKey: true });
  expect(onstep.mock.calls).toEqual([
    [1, false],
    [1, false],
    [-1, false],
    [-1, false],
    [1, true],
    [-1, true],
    [1, true]
  ]);
  expect(onmove).not.toHaveBeenCalled();
  await fireEvent.keyDown(slider, { key: 'Home' });
  await fireEvent.keyDown(slider, { key: 'End' });
  expect(onmove.mock.calls).toEqual([[10], [200]]);
  expect(onstart).toHaveBeenCalledTimes(2);
  expect(onend).toHaveBeenCalledTimes(2);
});

test('keys that belong to the browser are left to it', async () => {
  const { slider, onstep } = level();
  expect(await fireEvent.keyDown(slider, { key: 'ArrowLeft', altKey: true })).toBe(true);
  expect(await fireEvent.keyDown(slider, { key: 'Tab' })).toBe(true);
  expect(await fireEvent.keyDown(slider, { key: 'ArrowLeft' })).toBe(false);
  expect(onstep).toHaveBeenCalledTimes(1);
});

test('a press on a panel asks for the value there, snapped; hovering asks for nothing', async () => {
  const { slider, onmove } = level();
  await fireEvent.pointerMove(slider, press(300));
  expect(onmove).not.toHaveBeenCalled();
  await fireEvent.pointerDown(slider, press(frequencyAt(31.54)));
  await fireEvent.pointerUp(slider, press(frequencyAt(31.54)));
  expect(onmove.mock.calls).toEqual([[31.5]]);
  expect(slider).toHaveFocus();
});

test('a drag is one change, and keeps to the range', async () => {
  const { slider, onmove, onstart, onend } = level();
  await fireEvent.pointerDown(slider, press(frequencyAt(40)));
  await fireEvent.pointerMove(slider, press(frequencyAt(80)));
  await fireEvent.pointerMove(slider, press(5000));
  await fireEvent.pointerMove(slider, press(-50));
  expect(onend).not.toHaveBeenCalled();
  await fireEvent.pointerUp(slider, press(0));
  expect(onmove.mock.calls).toEqual([[40], [80], [200], [10]]);
  expect(onstart).toHaveBeenCalledTimes(1);
  expect(onend).toHaveBeenCalledTimes(1);
});

test('a swipe past it with a finger asks for nothing', async () => {
  const { slider, onmove, onstart } = level();
  await fireEvent.pointerDown(slider, press(300, { pointerType: 'touch' }));
  await fireEvent.pointerMove(slider, press(303, { pointerType: 'touch', clientY: 40 }));
  await fireEvent.pointerCancel(slider, press(303, { pointerType: 'touch', clientY: 40 }));
  expect(onmove).not.toHaveBeenCalled();
  expect(onstart).not.toHaveBeenCalled();
});

test('it is controlled: the cursor stands where the value is, not where it was pressed', async () => {
  const { slider, rerender, container } = level();
  const cursors = () => [...container.querySelectorAll('figure svg > line[stroke="var(--accent)"]')];
  const places = () => new Set(cursors().map((line) => Number(line.getAttribute('x1')).toFixed(3)));
  await fireEvent.pointerDown(slider, press(500));
  expect(cursors()).toHaveLength(3);
  expect(places()).toEqual(new Set([frequencyAt(20).toFixed(3)]));
  await rerender({ value: 50 });
  expect(places()).toEqual(new Set([frequencyAt(50).toFixed(3)]));
});

/** A series that counts how often its numbers are read. */
function counted(series: Series): { series: Series; reads: () => number } {
  let reads = 0;
  const proxy = new Proxy([...series], {
    get(target, key, receiver) {
      if (key !== 'length') reads++;
      return Reflect.get(target, key, receiver);
    }
  });
  return { series: proxy, reads: () => reads };
}

test('a moved cursor works out no line again; new data do', async () => {
  const specimen = levelSpecimen({ onmove: () => {} });
  const [panel, ...others] = specimen.panels;
  const [curve, ...curves] = panel.curves ?? [];
  const y = counted(curve.y);
  const panels = [{ ...panel, curves: [{ ...curve, y: y.series }, ...curves] }, ...others];
  const { rerender, container } = render(PlotStack, { props: stackProps({ ...specimen, panels }) });
  const dot = () => container.querySelector('circle')?.getAttribute('cy');
  const [drawn, before] = [y.reads(), dot()];
  expect(drawn).toBeGreaterThan(100);
  await rerender({ value: 100 });
  expect(dot()).not.toBe(before);
  expect(y.reads()).toBe(drawn);
  // An axis written in place is a new object with the same ends.
  await rerender({ x: { ...FREQUENCY } });
  expect(y.reads()).toBe(drawn);
  await rerender({ x: { ...FREQUENCY, domain: [10, 160] } });
  expect(y.reads()).toBeGreaterThan(drawn);
});

test('the grip is taken hold of where it is pressed; a chevron is one step', async () => {
  const acts = { onmove: vi.fn(), onstep: vi.fn(), onstart: vi.fn(), onend: vi.fn() };
  render(PlotStack, { props: stackProps(volumeSpecimen(acts)) });
  const slider = screen.getByRole('slider');
  const x = litresAt(85);
  // Without a layout the stack's lower edge is at 0.
  const clientY = 45 - HANDLE_ROW;
  await fireEvent.pointerDown(slider, press(x + 20, { clientY }));
  await fireEvent.pointerUp(slider, press(x + 20, { clientY }));
  expect(acts.onmove).not.toHaveBeenCalled();
  await fireEvent.pointerDown(slider, press(x + 20, { clientY }));
  await fireEvent.pointerMove(slider, press(litresAt(100) + 20, { clientY }));
  await fireEvent.pointerUp(slider, press(litresAt(100) + 20, { clientY }));
  expect(acts.onmove.mock.calls).toEqual([[100]]);
  await fireEvent.pointerDown(slider, press(x + 52, { clientY }));
  await fireEvent.pointerUp(slider, press(x + 52, { clientY }));
  expect(acts.onstep.mock.calls).toEqual([[1, false]]);
});

test('a drag ends when the plot goes away', async () => {
  const { slider, onend, unmount } = level();
  await fireEvent.pointerDown(slider, press(400));
  unmount();
  expect(onend).toHaveBeenCalledTimes(1);
});

test('every label of a limit is written, and a flag names its curve once', () => {
  const { container } = render(PlotStack, { props: stackProps(loudnessSpecimen()) });
  const texts = [...container.querySelectorAll('figure:first-child text')].map((text) => text.textContent);
  for (const name of ['cone travel', 'amplifier volts', 'coil heat', 'amplifier amps']) {
    expect(texts.filter((text) => text?.startsWith(name))).toHaveLength(1);
  }
});

test('without a way to move it there is a picture and no slider', () => {
  const props = stackProps(loudnessSpecimen());
  render(PlotStack, { props: { ...props, value: undefined } });
  expect(screen.queryByRole('slider')).toBeNull();
});

test('ids are unique in a page with several stacks', () => {
  render(PlotStack, { props: stackProps(volumeSpecimen()) });
  render(PlotStack, { props: stackProps(levelSpecimen()) });
  const ids = [...document.querySelectorAll('[id]')].map(({ id }) => id);
  expect(ids.length).toBeGreaterThan(12);
  expect(new Set(ids).size).toBe(ids.length);
});
