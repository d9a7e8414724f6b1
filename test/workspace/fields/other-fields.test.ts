import { fireEvent, render, screen } from '@testing-library/svelte';
import { expect, test, vi } from 'vitest';
import CheckField from '$lib/workspace/fields/CheckField.svelte';
import ChoiceField from '$lib/workspace/fields/ChoiceField.svelte';
import SelectField from '$lib/workspace/fields/SelectField.svelte';
import TextField from '$lib/workspace/fields/TextField.svelte';

const options = [
  { value: 'side', label: 'To the side' },
  { value: 'down', label: 'Down', note: 'checked for sag' }
];

test('text is taken trimmed on Enter, null where it is empty, and Escape restores', async () => {
  const oncommit = vi.fn(() => null);
  render(TextField, { label: 'Name', value: 'Den', oncommit });
  const input = screen.getByRole('textbox', { name: 'Name' });
  await fireEvent.input(input, { target: { value: ' Loft ' } });
  await fireEvent.keyDown(input, { key: 'Escape' });
  expect(input).toHaveValue('Den');
  await fireEvent.input(input, { target: { value: ' Loft ' } });
  await fireEvent.keyDown(input, { key: 'Enter' });
  expect(oncommit).toHaveBeenLastCalledWith('Loft');
  await fireEvent.input(input, { target: { value: '  ' } });
  await fireEvent.blur(input);
  expect(oncommit).toHaveBeenLastCalledWith(null);
});

test('long text keeps Enter for new lines', async () => {
  const oncommit = vi.fn(() => null);
  render(TextField, { label: 'Notes', value: null, long: true, oncommit });
  const input = screen.getByRole('textbox', { name: 'Notes' });
  await fireEvent.input(input, { target: { value: 'one' } });
  await fireEvent.keyDown(input, { key: 'Enter' });
  expect(oncommit).not.toHaveBeenCalled();
  await fireEvent.blur(input);
  expect(oncommit).toHaveBeenCalledExactlyOnceWith('one');
});

test('a refused choice goes back to what is in use and says why', async () => {
  const oncommit = vi.fn(() => 'Only with two coils.');
  render(ChoiceField, { label: 'Facing', value: 'side', options, oncommit });
  const down = screen.getByRole('radio', { name: 'Down' });
  expect(down).toHaveAccessibleDescription('checked for sag');
  await fireEvent.click(down);
  expect(oncommit).toHaveBeenCalledExactlyOnceWith('down');
  expect(down).not.toBeChecked();
  expect(screen.getByRole('radio', { name: 'To the side' })).toBeChecked();
  expect(screen.getByRole('radiogroup', { name: 'Facing' })).toHaveAccessibleDescription(
    /Only with two coils\./
  );
});

test('a choice taken back from outside is shown', async () => {
  const view = render(ChoiceField, { label: 'Facing', value: 'side', options, oncommit: () => null });
  await fireEvent.click(screen.getByRole('radio', { name: 'Down' }));
  await view.rerender({ value: 'down' });
  await view.rerender({ value: 'side' });
  expect(screen.getByRole('radio', { name: 'To the side' })).toBeChecked();
  expect(screen.getByRole('radio', { name: 'Down' })).not.toBeChecked();
});

test('a list of choices gives back the value, refuses with a sentence, follows from outside', async () => {
  const oncommit = vi.fn((value: number) => (value === 3 ? 'Not of this family.' : null));
  const orders = [1, 2, 3].map((value) => ({ value, label: `${value * 6} dB an octave` }));
  const view = render(SelectField<number>, { label: 'Slope', value: 1, options: orders, oncommit });
  const select = screen.getByRole<HTMLSelectElement>('combobox', { name: 'Slope' });
  await fireEvent.change(select, { target: { value: '3' } });
  expect(oncommit).toHaveBeenLastCalledWith(3);
  expect(select).toHaveValue('1');
  expect(select).toBeInvalid();
  expect(select).toHaveAccessibleDescription(/Not of this family\./);
  await fireEvent.change(select, { target: { value: '2' } });
  expect(oncommit).toHaveBeenLastCalledWith(2);
  await view.rerender({ value: 2 });
  expect(select).toHaveValue('2');
  expect(select).toBeValid();
  await view.rerender({ value: 1 });
  expect(select).toHaveValue('1');
});

test('a tick that is refused comes off again', async () => {
  render(CheckField, { label: 'Bypass', checked: false, oncommit: () => 'It is built in.' });
  const tick = screen.getByRole('checkbox', { name: 'Bypass' });
  await fireEvent.click(tick);
  expect(tick).not.toBeChecked();
  expect(tick).toHaveAccessibleDescription(/It is built in\./);
});
