import { fireEvent, render, screen, within } from '@testing-library/svelte';
import { flushSync, tick } from 'svelte';
import { expect, test } from 'vitest';
import { makeScale } from '$lib/charts/make-scale';
import type { Plan } from '$lib/plan/schema';
import HowBigABox from '$lib/workspace/questions/HowBigABox.svelte';
import HowLoud from '$lib/workspace/questions/HowLoud.svelte';
import HowMuchAmplifier from '$lib/workspace/questions/HowMuchAmplifier.svelte';
import { examplePlan, openDesk } from './open-desk';

const VIEWS = { box: HowBigABox, amplifier: HowMuchAmplifier, loud: HowLoud };

interface Opening {
  readonly name?: string;
  readonly change?: (plan: Plan) => Plan;
  readonly system?: 'metric' | 'imperial';
}

/** A view of an example, its sweep not yet there. */
function begin(view: keyof typeof VIEWS, { name = 'film-den', change, system = 'metric' }: Opening = {}) {
  const opened = openDesk(examplePlan(name, change));
  const rendered = render(VIEWS[view], { desk: opened.desk, system });
  return { ...opened, ...rendered, answered: () => (opened.answer(), tick()) };
}

async function open(view: keyof typeof VIEWS, opening: Opening = {}) {
  const opened = begin(view, opening);
  await opened.answered();
  return { ...opened, slider: screen.getByRole('slider') };
}

/** Without a layout a stack is 800 px wide and begins at the window's edge; these are its margins. */
const place = (slider: HTMLElement, kind: 'log' | 'linear', from: number, to: number) => {
  expect(Number(slider.getAttribute('aria-valuemin'))).toBeGreaterThanOrEqual(from);
  return makeScale(kind, [from, to], [46, 786]);
};

/** On the panels, above the handle's own row. */
const press = (clientX: number) => ({
  clientX,
  clientY: -300,
  pointerId: 1,
  pointerType: 'mouse',
  button: 0
});

async function dragged(slider: HTMLElement, ...to: number[]) {
  await fireEvent.pointerDown(slider, press(to[0]));
  for (const x of to.slice(1)) await fireEvent.pointerMove(slider, press(x));
  await fireEvent.pointerUp(slider, press(to[to.length - 1]));
}

const net = (plan: Plan) => plan.box.net_L;
/** Given by its net volume, 95.4 L. */
const netBox = (plan: Plan): Plan => ({ ...plan, box: { net_L: 95.4, fill_gain: plan.box.fill_gain } });

test('says what it is doing until the sweep is there, with the plots already as high', async () => {
  const { container, answered } = begin('box');
  expect(screen.getByText('Working it out')).toBeVisible();
  expect(screen.queryByRole('slider')).toBeNull();
  const heights = () =>
    [...container.querySelectorAll('figure svg')].map((svg) => svg.getAttribute('height'));
  const before = heights();
  expect(before).toHaveLength(4);
  await answered();
  expect(screen.queryByText('Working it out')).toBeNull();
  expect(screen.getByRole('slider')).toBeVisible();
  expect(heights()).toEqual(before);
});

test('asks for its sweep while it is there, and no longer', async () => {
  const { desk, unmount, answer, sweepsAsked } = await open('box');
  desk.edit('Level', [{ op: 'replace', path: '/goal/level_dB', value: 101 }]);
  expect(sweepsAsked()).toBe(1);
  answer();
  unmount();
  desk.edit('Level', [{ op: 'replace', path: '/goal/level_dB', value: 102 }]);
  expect(sweepsAsked()).toBe(0);
});

test('keys write the plan, whole litres, one step of undo', async () => {
  const { desk, slider, wait } = await open('box', { change: netBox });
  expect(slider).toHaveAccessibleName('Net volume');
  const written: unknown[] = [];
  for (const key of ['ArrowRight', 'ArrowRight', 'ArrowLeft']) {
    await fireEvent.keyDown(slider, { key });
    written.push(net(desk.plan));
    wait(100);
  }
  await fireEvent.keyDown(slider, { key: 'ArrowUp', shiftKey: true });
  // From 95.4 L onto the next whole litre, and on to the next whole five.
  expect([...written, net(desk.plan)]).toEqual([96, 97, 96, 100]);
  expect(slider).toHaveAttribute('aria-valuenow', '100');
  expect(slider.getAttribute('aria-valuetext')).toMatch(/^100 L net\. At 100 L net the box has Qtc 0\.\d\d/);
  expect(desk.undoLabel).toBe('Net volume');
  desk.undo();
  expect(net(desk.plan)).toBe(95.4);
  expect(desk.canUndo).toBe(false);
});

test('in cubic feet the steps are tenths of one', async () => {
  const { desk, slider } = await open('box', { change: netBox, system: 'imperial' });
  await fireEvent.keyDown(slider, { key: 'ArrowRight' });
  // 95.4 L are 3.369 cu ft; 3.4 are 96.277 L.
  expect(net(desk.plan)).toBeCloseTo(3.4 * 28.316846592, 6);
  await fireEvent.keyDown(slider, { key: 'ArrowRight', shiftKey: true });
  expect(net(desk.plan)).toBeCloseTo(3.5 * 28.316846592, 6);
});

test('the stepper does the same without dragging', async () => {
  const { desk } = await open('box', { change: netBox });
  const stepper = within(screen.getByRole('group', { name: 'Net volume' }));
  await fireEvent.click(stepper.getByRole('button', { name: 'More: net volume' }));
  await fireEvent.click(stepper.getByRole('button', { name: 'More: net volume' }));
  await fireEvent.click(stepper.getByRole('button', { name: 'Less: net volume' }));
  expect(net(desk.plan)).toBe(96);
  expect(stepper.getByText('96 L')).toBeVisible();
});

test('a drag snaps, follows, and is one step of undo; nothing rescales', async () => {
  const { desk, slider, answered } = await open('box', { change: netBox });
  const at = place(slider, 'log', 0.35 * 95.4, 3 * 95.4);
  const ends = () => ['aria-valuemin', 'aria-valuemax'].map((name) => slider.getAttribute(name));
  const before = ends();
  await fireEvent.pointerDown(slider, press(at(80.3)));
  expect(net(desk.plan)).toBe(80);
  await fireEvent.pointerMove(slider, press(at(60.4)));
  await answered();
  expect(net(desk.plan)).toBe(60);
  expect(ends()).toEqual(before);
  await fireEvent.pointerMove(slider, press(at(120.2)));
  await fireEvent.pointerUp(slider, press(at(120.2)));
  await answered();
  expect(net(desk.plan)).toBe(120);
  expect(ends()).toEqual(before);
  expect(desk.history.entries).toHaveLength(1);
  expect(desk.history.entries[0].forward).toEqual([{ op: 'replace', path: '/box/net_L', value: 120 }]);
  desk.undo();
  expect(net(desk.plan)).toBe(95.4);
});

test('taken to the end of its range, the axis settles about it after the drag', async () => {
  const { desk, slider, answered } = await open('box', { change: netBox });
  await fireEvent.keyDown(slider, { key: 'Home' });
  // 0.35 times 95.4 L is 33.4 L: the first whole litre inside.
  expect(net(desk.plan)).toBe(34);
  expect(slider).toHaveAttribute('aria-valuemin', '34');
  await answered();
  // 0.35 times 34 L is 11.9 L.
  expect(slider).toHaveAttribute('aria-valuemin', '12');
  expect(desk.history.entries).toHaveLength(1);
});

test('the handle leaves its sweep true; any other edit dims it until it is worked out again', async () => {
  const { desk, container, slider, answered } = await open('box');
  const dim = () => container.querySelector('.stale') !== null;
  await fireEvent.keyDown(slider, { key: 'ArrowRight' });
  expect(dim()).toBe(false);
  desk.edit('Level', [{ op: 'replace', path: '/goal/level_dB', value: 100 }]);
  flushSync();
  expect(dim()).toBe(true);
  await answered();
  expect(dim()).toBe(false);
});

test('how big a box: sentence, plots, tint in words, the answer as a button, figures', async () => {
  const { desk } = await open('box', { name: 'organ-practice' });
  expect(
    screen.getByText(/At 48 L net the box has Qtc 0\.63, and the plan asks for 199 W into 8 ohm/)
  ).toBeVisible();
  const kept = screen.getAllByText(/^within limits from \d+ L to \d+ L$/i, { exact: false });
  expect(kept.length).toBeGreaterThan(0);
  for (const name of [
    'Qtc before shaping: ',
    '−3 dB point, Hz: box alone, in the room',
    'Amplifier to buy, W into 8 ohm: needed, rated 300 W',
    'Peak cone travel, mm: needed, Xmax 16 mm, cone stop 24 mm'
  ])
    expect(screen.getByRole('img', { name: name.replace(/: $/, '') })).toBeVisible();
  await fireEvent.click(
    screen.getByRole('button', { name: /^Make it \d+ L the smallest box within limits$/ })
  );
  expect(desk.budget.verdict.holds).toBe(true);
  await fireEvent.click(screen.getByText('Figures'));
  await tick();
  const table = within(screen.getByRole('table', { name: 'The plan in boxes of other sizes' }));
  expect(table.getAllByRole('row')).toHaveLength(102);
});

test('how much amplifier: the handle moves the transform by half hertz, undone in one', async () => {
  const { desk, slider } = await open('amplifier');
  const to = () => desk.plan.shaping?.find((b) => b.kind === 'linkwitz-transform')?.to_Hz;
  expect(to()).toBe(20);
  expect(screen.getByText(/^Boost down to 20 Hz lifts/)).toBeVisible();
  await fireEvent.keyDown(slider, { key: 'ArrowLeft' });
  expect(to()).toBe(19.5);
  await fireEvent.keyDown(slider, { key: 'ArrowRight', shiftKey: true });
  expect(to()).toBe(20);
  const at = place(slider, 'log', 10, 40);
  await dragged(slider, at(30), at(26.2), at(24.6));
  expect(to()).toBe(24.5);
  expect(desk.history.entries.at(-1)?.forward).toEqual([
    expect.objectContaining({ op: 'replace', value: 24.5 })
  ]);
  desk.undo();
  expect(to()).toBe(20);
});

test('how much amplifier: a shelf is moved by its gain', async () => {
  const { desk, slider } = await open('amplifier', { name: 'organ-practice' });
  const gain = () => desk.plan.shaping?.find((b) => b.kind === 'low-shelf')?.gain_dB;
  expect(slider).toHaveAccessibleName('Shelf gain');
  expect(gain()).toBe(4);
  await fireEvent.keyDown(slider, { key: 'ArrowRight' });
  expect(gain()).toBe(4.5);
});

test('how much amplifier: where nothing is boosted the handle adds the transform, and undo takes it out', async () => {
  const { desk, slider, answered } = await open('amplifier', {
    change: (plan) => {
      const { shaping, ...rest } = plan;
      return { ...rest, shaping: shaping?.filter((b) => b.kind !== 'linkwitz-transform') };
    }
  });
  const before = desk.plan.shaping?.length ?? 0;
  expect(screen.getByText(/The plan has no boost yet.*Moving the handle adds a transform/)).toBeVisible();
  const at = place(slider, 'log', 10, 40);
  await dragged(slider, at(30), at(26), at(25));
  await answered();
  expect(desk.plan.shaping).toHaveLength(before + 1);
  const block = { kind: 'linkwitz-transform', from_Hz: 'box', from_q: 'box', to_Hz: 25, to_q: 0.707 };
  expect(desk.plan.shaping?.at(-1)).toEqual(block);
  expect(desk.history.entries).toHaveLength(1);
  expect(desk.history.entries[0].forward).toEqual([{ op: 'add', path: `/shaping/${before}`, value: block }]);
  expect(screen.getByText(/^Boost down to 25 Hz/)).toBeVisible();
  desk.undo();
  expect(desk.plan.shaping).toHaveLength(before);
});

test('how loud: tenths by keys, halves by hand', async () => {
  const { desk, slider } = await open('loud');
  const level = () => desk.plan.goal.level_dB;
  const start = level();
  await fireEvent.keyDown(slider, { key: 'ArrowRight' });
  expect(level()).toBeCloseTo(start + 0.1, 9);
  const at = place(slider, 'linear', start - 15, start + 10);
  await dragged(slider, at(start - 4), at(start - 6.8));
  expect(level()).toBe(start - 7);
  await fireEvent.keyDown(slider, { key: 'End' });
  expect(level()).toBe(start + 10);
});

test('how loud: margins, flags, room, limiter, and where it gives out', async () => {
  const { desk, container } = await open('loud', {
    change: (plan) => ({ ...plan, goal: { ...plan.goal, level_dB: 110 } })
  });
  const most = Math.floor(desk.budget.maxLevel * 10) / 10;
  expect(desk.sweep('level')?.sweep.answer).toBeCloseTo(most, 9);
  expect(container.querySelector('.answer')?.textContent).toMatch(
    new RegExp(`^Within limits up to ${most.toFixed(1)}.dB at the seat\\. There cone travel runs out first`)
  );
  expect(screen.getByText(/^Set the limiter to \d+\.\d V RMS at the amplifier's terminals/)).toBeVisible();
  expect(screen.getByText(/^The room is an estimate, good to 4 dB either way/)).toBeVisible();
  const panel = screen.getByRole('figure', { name: 'In hand before each limit, dB' });
  for (const { limit, margin } of desk.budget.limits) {
    if (margin > 10) continue;
    const flag = { 'cone-travel': 'cone travel', 'mechanical-stop': "cone's stop" }[limit as string];
    if (flag) {
      const at = Math.floor((110 + margin) * 10 + 1e-6) / 10;
      expect(within(panel).getByText(`${flag} ${at.toFixed(1)} dB`)).toBeInTheDocument();
    }
  }
  expect(within(panel).getByText(`within limits up to ${most.toFixed(1)} dB`)).toBeInTheDocument();
  expect(screen.getByRole('img', { name: /^Where it gives out first, Hz: .*cone travel/ })).toBeVisible();
  expect(screen.getByText(/^cone travel at \d+ Hz$/)).toBeVisible();
});

test('a move the plan file refuses leaves the plan and says why', async () => {
  const { desk } = await open('box', {
    change: (plan) => ({ ...plan, box: { ...plan.box, net_L: undefined, inner_L: 5000 } })
  });
  const before = desk.plan;
  await fireEvent.click(screen.getByRole('button', { name: 'More: net volume' }));
  expect(desk.plan).toBe(before);
  expect(screen.getByText(/is above what is allowed, 0\.2 to 5000 L\.$/)).toBeVisible();
});
