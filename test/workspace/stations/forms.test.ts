import { fireEvent, screen, within } from '@testing-library/svelte';
import { expect, test } from 'vitest';
import type { Plan } from '$lib/plan/schema';
import AmplifierForm from '$lib/workspace/stations/AmplifierForm.svelte';
import BoxForm from '$lib/workspace/stations/BoxForm.svelte';
import ProgrammeForm from '$lib/workspace/stations/ProgrammeForm.svelte';
import RoomForm from '$lib/workspace/stations/RoomForm.svelte';
import type { KeptRooms } from '$lib/workspace/stations/room-kinds';
import { examplePlan, showForm } from './desk';

const box = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name });
async function enter(name: string, text: string) {
  await fireEvent.input(box(name), { target: { value: text } });
  await fireEvent.keyDown(box(name), { key: 'Enter' });
}
const press = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));
const choose = (name: string) => fireEvent.click(screen.getByRole('radio', { name }));

const with_ = (over: Partial<Plan>): Plan => ({ ...examplePlan(), ...over });

test('programme: a typed level and a usual one are both patches on the goal', async () => {
  const { patch } = showForm(ProgrammeForm, examplePlan(), {});
  await enter('Level', '102,5 dB');
  expect(patch()).toEqual([{ op: 'replace', path: '/goal/level_dB', value: 102.5 }]);
  await press(/Music at home/);
  expect(patch()).toEqual([{ op: 'replace', path: '/goal/level_dB', value: 95 }]);
  expect(screen.getByRole('button', { name: /Music at home/ })).toHaveAttribute('aria-pressed', 'true');
  expect(box('Level')).toHaveValue('95');
});

test('programme: what the plan refuses across keys is said at the field that caused it', async () => {
  const { onedit, plan } = showForm(
    ProgrammeForm,
    with_({ goal: { level_dB: 100, from_Hz: 20, to_Hz: 80 } }),
    {}
  );
  await enter('To', '15');
  expect(onedit).toHaveBeenCalledOnce();
  expect(plan().goal.to_Hz).toBe(80);
  expect(box('To')).toBeInvalid();
  expect(box('To')).toHaveAccessibleDescription(/not above.*Still using 80 Hz/);
});

test('programme: steps in a row carry one mark for the history, typing carries none', async () => {
  const { onedit } = showForm(ProgrammeForm, examplePlan(), {});
  await fireEvent.keyDown(box('Level'), { key: 'ArrowUp' });
  await fireEvent.keyDown(box('Level'), { key: 'ArrowUp' });
  expect(onedit.mock.calls.map(([, , options]) => options)).toEqual([
    { merge: 'goal/level_dB' },
    { merge: 'goal/level_dB' }
  ]);
  await enter('Level', '99');
  expect(onedit.mock.lastCall).toHaveLength(2);
});

test('programme: the pivot left out is shown where it falls, 50 Hz moved into the band', () => {
  showForm(ProgrammeForm, with_({ goal: { level_dB: 100, from_Hz: 20, to_Hz: 40 } }), {});
  expect(box('Pivot')).toHaveAttribute('placeholder', '40 by default');
});

test('amplifier: a rating is added once both its numbers are there, and can be removed', async () => {
  const start = with_({ amplifier: { ratings: [{ power_W: 500, load_ohm: 4 }] } });
  const { onedit, plan } = showForm(AmplifierForm, start, {});
  expect(screen.queryByRole('button', { name: /Remove rating/ })).toBeNull();
  await press('Add a rating');
  await enter('New power', '250');
  expect(onedit).not.toHaveBeenCalled();
  await fireEvent.input(screen.getAllByRole('textbox', { name: 'Into' })[1], { target: { value: '8 Ω' } });
  await fireEvent.blur(screen.getAllByRole('textbox', { name: 'Into' })[1]);
  expect(plan().amplifier.ratings).toEqual([
    { power_W: 500, load_ohm: 4 },
    { power_W: 250, load_ohm: 8 }
  ]);
  await press('Remove rating 1');
  expect(plan().amplifier.ratings).toEqual([{ power_W: 250, load_ohm: 8 }]);
});

test('amplifier: no more than sixteen ratings', () => {
  const ratings = Array.from({ length: 16 }, (_, i) => ({ power_W: 100, load_ohm: i + 1 }));
  showForm(AmplifierForm, with_({ amplifier: { ratings } }), {});
  expect(screen.queryByRole('button', { name: 'Add a rating' })).toBeNull();
});

test('amplifier: efficiency is shown in percent and kept as a fraction', async () => {
  const { patch } = showForm(
    AmplifierForm,
    with_({ amplifier: { ratings: [{ power_W: 500, load_ohm: 4 }] } }),
    {}
  );
  expect(box('Efficiency')).toHaveAttribute('placeholder', '85 by default');
  await enter('Efficiency', '62');
  expect(patch()).toEqual([{ op: 'add', path: '/amplifier/efficiency', value: 0.62 }]);
});

// R = 0.0175 ohm·mm²/m × 2 × length / area: 6 m of 2.5 mm² is 0.084 ohm.
test('amplifier: length and cross-section give the resistance of the loop', async () => {
  const { onedit, patch } = showForm(AmplifierForm, with_({ cable: null }), {});
  await choose('Length and wire');
  await enter('Length, one way', '6');
  expect(onedit).not.toHaveBeenCalled();
  await enter('Cross-section', '2.5 mm2');
  expect(patch()).toEqual([{ op: 'replace', path: '/cable', value: { resistance_ohm: 0.084 } }]);
  await choose('Resistance');
  expect(box('Whole loop')).toHaveValue('0.084');
  await choose('Length and wire');
  expect(box('Length, one way')).toHaveValue('6');
});

test('amplifier: a built-in filter is a fixed block at the end of the shaping', async () => {
  const { plan } = showForm(AmplifierForm, with_({ shaping: null }), {});
  await press('Add a built-in filter');
  expect(plan().shaping).toEqual([
    { kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 20, fixed: true }
  ]);
  await enter('Corner', '25');
  expect(plan().shaping?.[0]).toMatchObject({ corner_Hz: 25, fixed: true });
  await press('Remove High-pass');
  expect(plan().shaping).toEqual([]);
});

test('box: given the other way it keeps its air, and its bracing comes back', async () => {
  const start = with_({ box: { inner_L: 100, bracing_L: 3, fill_gain: 1.1 } });
  const driver = { ...start.driver, count: 1, displacement_L: 4.5 };
  const { plan } = showForm(BoxForm, { ...start, driver }, {});
  await choose('Net volume');
  expect(plan().box).toEqual({ net_L: 92.5, fill_gain: 1.1 });
  await choose('Inner volume');
  expect(plan().box).toEqual({ inner_L: 100, bracing_L: 3, fill_gain: 1.1 });
});

test('box: typical losses follow the fill and are one edit', async () => {
  const { onedit, plan } = showForm(BoxForm, with_({ box: { net_L: 80 } }), {});
  await press('Typical losses');
  expect(plan().box).toEqual({ net_L: 80, q_absorption: 8, q_leakage: 20 });
  expect(screen.getByRole('button', { name: 'Typical losses' })).toBeDisabled();
  await press(/Well filled/);
  await press('Typical losses');
  expect(plan().box).toMatchObject({ fill_gain: 1.2, q_absorption: 4 });
  expect(onedit).toHaveBeenCalledTimes(3);
});

test('box: an empty Q leaves the file', async () => {
  const { patch } = showForm(BoxForm, with_({ box: { net_L: 80, q_leakage: 20 } }), {});
  await enter('Leakage Q', '');
  expect(patch()).toEqual([{ op: 'remove', path: '/box/q_leakage' }]);
});

test('box: in imperial units the volume is typed in cubic feet and kept in litres', async () => {
  const { plan } = showForm(BoxForm, with_({ box: { net_L: 80 } }), {}, 'imperial');
  expect(box('Net volume')).toHaveValue('2.825');
  await enter('Net volume', '3');
  // 1 cu ft is 28.316846592 L (1 ft = 0.3048 m, International yard and pound agreement, 1959).
  expect(plan().box.net_L).toBe(84.950539776);
});

const closed: Plan['room'] = {
  kind: 'pressure-gain',
  length_m: 6,
  width_m: 4,
  height_m: 2.5,
  airtightness: 'leaky',
  boundary_distances_m: [0.4, 0.3]
};

test('room: turning to the open and back brings back all that was typed', async () => {
  const kept: KeptRooms = new Map();
  const { plan, unmount } = showForm(RoomForm, with_({ room: closed }), { kept });
  await choose('In the open');
  expect(plan().room).toEqual({ kind: 'open-air' });
  await enter('Doubt', '1');
  unmount();
  const again = showForm(RoomForm, plan(), { kept });
  await choose('In a closed room');
  expect(again.plan().room).toEqual(closed);
  await choose('In the open');
  expect(again.plan().room).toEqual({ kind: 'open-air', doubt_dB: 1 });
});

test('room: a new closed room begins when its three sides are there', async () => {
  const { onedit, plan } = showForm(RoomForm, with_({ room: null }), { kept: new Map() });
  await choose('In a closed room');
  await enter('Length', '5');
  await enter('Width', '4');
  expect(onedit).not.toHaveBeenCalled();
  await enter('Height', '2.4');
  expect(plan().room).toEqual({ kind: 'pressure-gain', length_m: 5, width_m: 4, height_m: 2.4 });
  expect(screen.getByRole('radio', { name: 'In a closed room' })).toBeChecked();
});

test('room: doubt of a plan without a room makes one in the open', async () => {
  const { patch } = showForm(RoomForm, with_({ room: null }), { kept: new Map() });
  await enter('Doubt', '2');
  expect(patch()).toEqual([{ op: 'replace', path: '/room', value: { kind: 'open-air', doubt_dB: 2 } }]);
});

test('room: up to three boundaries, one empty field for the next, clearing takes one out', async () => {
  const { plan } = showForm(RoomForm, with_({ room: closed }), { kept: new Map() });
  const group = within(screen.getByRole('group', { name: 'Boundaries near the box' }));
  expect(group.getAllByRole('textbox')).toHaveLength(3);
  await enter('Third boundary', '1.1');
  expect(plan().room).toMatchObject({ boundary_distances_m: [0.4, 0.3, 1.1] });
  expect(group.getAllByRole('textbox')).toHaveLength(3);
  await enter('First boundary', '');
  expect(plan().room).toMatchObject({ boundary_distances_m: [0.3, 1.1] });
  await enter('First boundary', '');
  await enter('First boundary', '');
  expect(plan().room).not.toHaveProperty('boundary_distances_m');
  expect(group.getAllByRole('textbox')).toHaveLength(1);
});

test('room: the most gain follows the airtightness until it is known', async () => {
  const { patch } = showForm(RoomForm, with_({ room: closed }), { kept: new Map() });
  expect(box('Most gain, if known')).toHaveAttribute('placeholder', '6 by default');
  await choose('Tight');
  expect(patch()).toEqual([{ op: 'replace', path: '/room/airtightness', value: 'tight' }]);
  expect(box('Most gain, if known')).toHaveAttribute('placeholder', '18 by default');
});
