import { fireEvent, screen, waitFor, within } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import { evaluate } from '$lib/engine/budget/evaluate';
import { toChain } from '$lib/plan/to-chain';
import type { Plan } from '$lib/plan/schema';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import { report } from '$lib/words/report';
import { BLOCK_KINDS } from '$lib/workspace/stations/block-kinds';
import { dropPlace } from '$lib/workspace/stations/block-drag.svelte';
import { KeptBlocks } from '$lib/workspace/stations/kept-blocks.svelte';
import { liftText } from '$lib/workspace/stations/lift-text';
import ShapingForm from '$lib/workspace/stations/ShapingForm.svelte';
import { examplePlan, showForm } from './desk';

const box = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name });
async function enter(name: string, text: string) {
  await fireEvent.input(box(name), { target: { value: text } });
  await fireEvent.keyDown(box(name), { key: 'Enter' });
}
const button = (name: string | RegExp) => screen.getByRole('button', { name });
const press = (name: string | RegExp) => fireEvent.click(button(name));
const pick = (name: string, value: string) =>
  fireEvent.change(screen.getByRole('combobox', { name }), { target: { value } });

const shaped = (shaping: PlanBlock[] | null): Plan => ({ ...examplePlan(), shaping });
/** The example's: low-pass 80 Hz, Linkwitz transform, high-pass 12 Hz. */
const kinds = (plan: Plan) => plan.shaping?.map(({ kind }) => kind);

test('blocks stand in signal order, and each opens its own fields', async () => {
  const { patch } = showForm(ShapingForm, examplePlan(), {});
  expect(screen.getAllByRole('listitem').map((row) => row.getAttribute('aria-label'))).toEqual([
    'Low-pass, 1 of 3',
    'Linkwitz transform, 2 of 3',
    'High-pass, 3 of 3'
  ]);
  expect(screen.queryByRole('textbox', { name: 'Corner' })).toBeNull();
  await press(/^High-pass 12 Hz/);
  await enter('Corner', '15');
  expect(patch()).toEqual([{ op: 'replace', path: '/shaping/2/corner_Hz', value: 15 }]);
  await enter('Corner', '0.2');
  expect(box('Corner')).toHaveAccessibleDescription(
    /High-pass corner must be 1 to 2000 Hz\. Still using 15 Hz/
  );
});

test('a family brings only the slopes it has', async () => {
  const start = shaped([{ kind: 'high-pass', family: 'butterworth', order: 3, corner_Hz: 15 }]);
  const { patch } = showForm(ShapingForm, start, {});
  await press(/^High-pass 15 Hz/);
  await pick('Family', 'linkwitz-riley');
  expect(patch()).toEqual([
    { op: 'replace', path: '/shaping/0/family', value: 'linkwitz-riley' },
    { op: 'replace', path: '/shaping/0/order', value: 4 }
  ]);
  const slopes = within(screen.getByRole('combobox', { name: 'Slope' })).getAllByRole('option');
  expect(slopes.map((option) => option.textContent.trim())).toEqual([
    '12 dB an octave',
    '24 dB an octave',
    '36 dB an octave',
    '48 dB an octave'
  ]);
});

test('by keys a block moves, keeps the focus, and is announced; one edit each', async () => {
  const { onedit, plan } = showForm(ShapingForm, examplePlan(), {});
  const handle = button('Move high-pass, 3 of 3');
  handle.focus();
  await fireEvent.keyDown(handle, { key: 'ArrowUp', altKey: true });
  expect(kinds(plan())).toEqual(['low-pass', 'high-pass', 'linkwitz-transform']);
  expect(onedit).toHaveBeenCalledOnce();
  expect(onedit.mock.lastCall?.slice(0, 2)).toEqual([
    'Move high-pass earlier',
    [
      { op: 'remove', path: '/shaping/2' },
      { op: 'add', path: '/shaping/1', value: examplePlan().shaping?.[2] }
    ]
  ]);
  await waitFor(() => expect(button('Move high-pass, 2 of 3')).toHaveFocus());
  expect(screen.getByRole('status')).toHaveTextContent('High-pass is now 2 of 3.');
  await fireEvent.keyDown(button('Move high-pass, 2 of 3'), { key: 'ArrowDown', altKey: true });
  expect(kinds(plan())).toEqual(['low-pass', 'linkwitz-transform', 'high-pass']);
  await fireEvent.keyDown(button('Move high-pass, 3 of 3'), { key: 'ArrowDown', altKey: true });
  await fireEvent.keyDown(button('Move high-pass, 3 of 3'), { key: 'ArrowUp' });
  expect(onedit).toHaveBeenCalledTimes(2);
});

test('earlier and later are buttons too, and open fields go along', async () => {
  const { plan } = showForm(ShapingForm, examplePlan(), {});
  await press(/^Linkwitz transform/);
  const earlier = button('Move Linkwitz transform earlier');
  earlier.focus();
  await fireEvent.click(earlier);
  expect(kinds(plan())).toEqual(['linkwitz-transform', 'low-pass', 'high-pass']);
  expect(button(/^Linkwitz transform/)).toHaveAttribute('aria-expanded', 'true');
  expect(button('Move Linkwitz transform earlier')).toBeDisabled();
  // The button that was pressed has come to the end of its use.
  await waitFor(() => expect(button('Move Linkwitz transform, 1 of 3')).toHaveFocus());
});

test('dragged by its handle, a block lands where it is let go, in one edit', async () => {
  const { onedit, plan } = showForm(ShapingForm, examplePlan(), {});
  screen.getAllByRole('listitem').forEach((row, i) => {
    row.getBoundingClientRect = () => new DOMRect(0, 40 * i, 300, 40);
  });
  await fireEvent.pointerDown(button('Move low-pass, 1 of 3'), { button: 0, pointerId: 1 });
  await fireEvent.pointerMove(window, { clientY: 70 });
  await fireEvent.pointerMove(window, { clientY: 110 });
  expect(onedit).not.toHaveBeenCalled();
  await fireEvent.pointerUp(window);
  expect(kinds(plan())).toEqual(['linkwitz-transform', 'high-pass', 'low-pass']);
  expect(onedit.mock.calls.map(([label]) => label)).toEqual(['Move low-pass later']);
});

test('a dragged block let go by Escape stays where it was', async () => {
  const { onedit } = showForm(ShapingForm, examplePlan(), {});
  screen.getAllByRole('listitem').forEach((row, i) => {
    row.getBoundingClientRect = () => new DOMRect(0, 40 * i, 300, 40);
  });
  await fireEvent.pointerDown(button('Move low-pass, 1 of 3'), { button: 0, pointerId: 1 });
  await fireEvent.pointerMove(window, { clientY: 110 });
  await fireEvent.keyDown(button('Move low-pass, 1 of 3'), { key: 'Escape' });
  await fireEvent.pointerUp(window);
  expect(onedit).not.toHaveBeenCalled();
});

// Its own span never counts: the others have their middles at 20 and 100.
test.for([
  [-5, 0],
  [15, 0],
  [25, 1],
  [95, 1],
  [105, 2],
  [500, 2]
])('let go at %i, the middle one of three lands at %i', ([y, place]) => {
  const spans = [0, 40, 80].map((top) => ({ top, bottom: top + 40 }));
  expect(dropPlace(y, 1, spans)).toBe(place);
});

test('another kind and back: what was typed for each is there again, and what all have stays', async () => {
  const first: PlanBlock = {
    kind: 'high-pass',
    family: 'bessel',
    order: 3,
    corner_Hz: 17,
    label: 'Subsonic',
    fixed: true
  };
  const { onedit, plan } = showForm(ShapingForm, shaped([first]), {});
  await press(/^Subsonic/);
  await pick('Kind', 'peak');
  expect(onedit.mock.lastCall?.[0]).toBe('Change Subsonic to peak or dip');
  expect(plan().shaping?.[0]).toMatchObject({ kind: 'peak', label: 'Subsonic', fixed: true });
  await enter('Centre', '33');
  await pick('Kind', 'high-pass');
  expect(plan().shaping).toEqual([first]);
  await pick('Kind', 'peak');
  expect(plan().shaping?.[0]).toMatchObject({ kind: 'peak', centre_Hz: 33 });
});

test.for(BLOCK_KINDS)('a new %s is one the plan takes, and opens', async (kind) => {
  const { onedit, plan } = showForm(ShapingForm, shaped(null), {});
  await pick('Kind of block', kind);
  await press(/^Add /);
  expect(onedit.mock.lastCall?.[0]).toMatch(/^Add /);
  expect(kinds(plan())).toEqual([kind]);
  await waitFor(() => expect(screen.getByRole('combobox', { name: 'Kind' })).toHaveValue(kind));
});

test('a new block goes before what is built into the amplifier', async () => {
  const { plan } = showForm(
    ShapingForm,
    shaped([
      { kind: 'gain', gain_dB: -3 },
      { kind: 'low-pass', family: 'butterworth', order: 2, corner_Hz: 120, fixed: true }
    ]),
    {}
  );
  await press('Add High-pass');
  expect(kinds(plan())).toEqual(['gain', 'high-pass', 'low-pass']);
});

test('bypass, built in and remove are one edit each', async () => {
  const { onedit, patch } = showForm(ShapingForm, examplePlan(), {});
  await fireEvent.click(screen.getByRole('checkbox', { name: 'High-pass in use' }));
  expect(patch()).toEqual([{ op: 'add', path: '/shaping/2/bypass', value: true }]);
  await fireEvent.click(screen.getByRole('checkbox', { name: 'High-pass in use' }));
  expect(patch()).toEqual([{ op: 'remove', path: '/shaping/2/bypass' }]);
  await press(/^High-pass/);
  await fireEvent.click(screen.getByRole('checkbox', { name: 'Built into the amplifier' }));
  expect(patch()).toEqual([{ op: 'add', path: '/shaping/2/fixed', value: true }]);
  await press('Remove high-pass');
  expect(patch()).toEqual([{ op: 'remove', path: '/shaping/2' }]);
  expect(onedit.mock.calls.map(([label]) => label)).toEqual([
    'Bypass high-pass',
    'Bring back high-pass',
    'High-pass built in',
    'Remove high-pass'
  ]);
});

test('a transform says its lift from the box as worked out, and takes numbers in its place', async () => {
  const start = examplePlan();
  const chain = toChain(start);
  const worked = report(start, chain, evaluate(chain, { waysOut: false }));
  const view = showForm(ShapingForm, start, {});
  await view.rerender({ report: worked });
  await press(/^Linkwitz transform/);
  // Linkwitz 1978: 40·log10(f0/fp) at 0 Hz.
  const lift = 40 * Math.log10((worked.alignment.fc_Hz ?? NaN) / 20);
  expect(screen.getByText(new RegExp(`^Lifts ${lift.toFixed(1)} dB at the bottom: `))).toBeVisible();
  await fireEvent.click(screen.getByRole('radio', { name: 'Numbers' }));
  await enter('From corner', '40');
  // Twice the corner is 12.04 dB, 16 times the power.
  expect(screen.getByText('Lifts 12.0 dB at the bottom: 16 times the power.')).toBeVisible();
  await fireEvent.click(screen.getByRole('radio', { name: 'The box as planned' }));
  expect(view.plan().shaping?.[1]).toMatchObject({ from_Hz: 'box', from_q: 'box' });
  await fireEvent.click(screen.getByRole('radio', { name: 'Numbers' }));
  expect(view.plan().shaping?.[1]).toMatchObject({ from_Hz: 40 });
});

// 10^0.93 = 8.51.
test('a lift is said in power too', () => {
  expect(liftText(9.3)).toBe('Lifts 9.3 dB at the bottom: 8.5 times the power.');
  expect(liftText(-3)).toBe('Lowers the bottom by 3.0 dB.');
});

test('coefficients of a section that would grow without end are refused at their field', async () => {
  const { plan } = showForm(ShapingForm, shaped([{ kind: 'section', b: [0, 0, 1], a: [1, 2, 3] }]), {});
  await press(/^Section/);
  await enter('Below, S', '-2');
  expect(box('Below, S')).toHaveAccessibleDescription(/grow without end/);
  await enter('Above, S²', '0.5');
  expect(plan().shaping?.[0]).toMatchObject({ b: [0.5, 0, 1], a: [1, 2, 3] });
});

test('rows follow their blocks through moves, removals and edits in place', () => {
  const kept = new KeptBlocks();
  const [a, b, c]: PlanBlock[] = [1, 2, 3].map((gain_dB) => ({ kind: 'gain', gain_dB }));
  const [rowA, rowB, rowC] = kept.follow([a, b, c]);
  expect(kept.follow([c, a, b])).toEqual([rowC, rowA, rowB]);
  expect(kept.follow([c, a])).toEqual([rowC, rowA]);
  const changed: PlanBlock = { kind: 'polarity' };
  expect(kept.follow([c, changed])).toEqual([rowC, rowA]);
  const [, , fresh] = kept.follow([c, changed, b]);
  expect([rowA, rowB, rowC]).not.toContain(fresh);
});
