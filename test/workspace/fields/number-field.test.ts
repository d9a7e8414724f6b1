import { fireEvent, render, screen } from '@testing-library/svelte';
import type { ComponentProps } from 'svelte';
import { expect, test, vi } from 'vitest';
import NumberField from '$lib/workspace/fields/NumberField.svelte';

type Props = ComponentProps<typeof NumberField>;

/** The field with an owner that keeps what it is given. */
function show(props: Partial<Props> = {}) {
  const oncommit = vi.fn<Props['oncommit']>((stored) => {
    void view.rerender({ value: stored });
    return null;
  });
  const view = render(NumberField, {
    label: 'High-pass',
    value: 15,
    quantity: 'frequency',
    system: 'metric',
    range: { min: 5, max: 60 },
    oncommit,
    ...props
  } satisfies Props);
  const input = screen.getByRole<HTMLInputElement>('textbox', { name: props.label ?? 'High-pass' });
  const type = (text: string) => fireEvent.input(input, { target: { value: text } });
  const press = (key: string, more: KeyboardEventInit = {}) => fireEvent.keyDown(input, { key, ...more });
  return { ...view, oncommit, input, type, press };
}

test('what is typed is taken on Enter and on leaving, once each', async () => {
  const { oncommit, input, type, press } = show();
  await type('20');
  expect(oncommit).not.toHaveBeenCalled();
  await press('Enter');
  expect(oncommit).toHaveBeenLastCalledWith(20, 'typed');
  await fireEvent.blur(input);
  expect(oncommit).toHaveBeenCalledOnce();
  await type('0.021 kHz');
  await fireEvent.blur(input);
  expect(oncommit).toHaveBeenLastCalledWith(21, 'typed');
  expect(input).toHaveValue('21');
});

test('out of range is said in a sentence, marked, and the last good value stays in use', async () => {
  const { oncommit, input, type, press } = show();
  await type('3');
  await press('Enter');
  expect(oncommit).not.toHaveBeenCalled();
  expect(input).toHaveValue('3');
  expect(input).toBeInvalid();
  expect(input).toHaveAccessibleDescription(/High-pass must be 5 to 60 Hz\. Still using 15 Hz\./);
  await press('Escape');
  expect(input).toHaveValue('15');
  expect(input).toBeValid();
});

test('trouble goes as soon as the text is mended, before it is taken', async () => {
  const { oncommit, input, type, press } = show();
  await type('3');
  await press('Enter');
  await type('30');
  expect(input).toBeValid();
  expect(oncommit).not.toHaveBeenCalled();
});

test('Escape with nothing to take back is left to whatever stands around', async () => {
  const outer = vi.fn();
  document.body.addEventListener('keydown', outer);
  const { type, press } = show();
  await press('Escape');
  expect(outer).toHaveBeenCalledOnce();
  await type('17');
  await press('Escape');
  expect(outer).toHaveBeenCalledOnce();
  document.body.removeEventListener('keydown', outer);
});

test('arrows step, Shift and Page steps are large, the range is the end', async () => {
  const { oncommit, press } = show();
  await press('ArrowUp');
  expect(oncommit).toHaveBeenLastCalledWith(16, 'stepped');
  await press('ArrowDown', { shiftKey: true });
  expect(oncommit).toHaveBeenLastCalledWith(15, 'stepped');
  await press('PageDown');
  await press('PageDown');
  expect(oncommit).toHaveBeenLastCalledWith(5, 'stepped');
  const calls = oncommit.mock.calls.length;
  await press('PageDown');
  expect(oncommit).toHaveBeenCalledTimes(calls);
});

test('the less and more buttons do the same and name their field', async () => {
  const { oncommit } = show();
  await fireEvent.click(screen.getByRole('button', { name: 'More: High-pass' }));
  expect(oncommit).toHaveBeenLastCalledWith(16, 'stepped');
  await fireEvent.click(screen.getByRole('button', { name: 'Less: High-pass' }));
  expect(oncommit).toHaveBeenLastCalledWith(15, 'stepped');
});

test('a number that can be read in two ways is asked about, with a button each', async () => {
  const { oncommit, type, press } = show({
    label: 'Net volume',
    value: 85,
    quantity: 'volume',
    range: { min: 0.2, max: 5000 }
  });
  await type('1,234');
  await press('Enter');
  expect(oncommit).not.toHaveBeenCalled();
  expect(screen.getByText(/can be read in two ways/)).toBeVisible();
  await fireEvent.click(screen.getByRole('button', { name: '1234 L' }));
  expect(oncommit).toHaveBeenCalledExactlyOnceWith(1234, 'typed');
  expect(screen.queryByRole('group')).toBeNull();
});

test('where the range allows one reading alone, nothing is asked', async () => {
  const { oncommit, type, press } = show({
    label: 'Pressure',
    value: null,
    quantity: 'pressure',
    range: { min: 50, max: 110 }
  });
  await type('101.325');
  await press('Enter');
  expect(oncommit).toHaveBeenCalledExactlyOnceWith(101.325, 'typed');
});

test('a number in the wrong unit is offered in the right one', async () => {
  const { oncommit, type, press } = show({
    label: 'Sd',
    value: null,
    quantity: 'area',
    range: { min: 5, max: 5000 }
  });
  await type('0.081');
  await press('Enter');
  await fireEvent.click(screen.getByRole('button', { name: '0.081 m² = 810 cm²' }));
  expect(oncommit).toHaveBeenCalledExactlyOnceWith(810, 'typed');
});

test('a default is shown in grey, and clearing goes back to it', async () => {
  const { oncommit, input, type, press } = show({ value: 12, optional: true, initial: 10 });
  await type('');
  await press('Enter');
  expect(oncommit).toHaveBeenCalledExactlyOnceWith(null, 'typed');
  expect(input).toHaveValue('');
  expect(input).toHaveAttribute('placeholder', '10 by default');
  await press('ArrowUp');
  expect(oncommit).toHaveBeenLastCalledWith(11, 'stepped');
});

test('a value that is needed cannot be cleared', async () => {
  const { oncommit, input, type, press } = show();
  expect(input).toBeRequired();
  await type(' ');
  await press('Enter');
  expect(oncommit).not.toHaveBeenCalled();
  expect(input).toHaveAccessibleDescription(/High-pass is needed\. Still using 15 Hz\./);
});

test('what the owner refuses is said, and the text stays to be mended', async () => {
  const { input, type, press } = show({ oncommit: () => 'The corner lies above the band.' });
  await type('40');
  await press('Enter');
  expect(input).toHaveValue('40');
  expect(input).toHaveAccessibleDescription(/The corner lies above the band\. Still using 15 Hz\./);
});

test('a displayed imperial value is never written back unless it is edited', async () => {
  const { oncommit, input, rerender, press } = show({
    label: 'Net volume',
    value: 85,
    quantity: 'volume',
    system: 'imperial',
    range: { min: 0.2, max: 5000 }
  });
  expect(input).toHaveValue('3.002');
  await fireEvent.focus(input);
  await press('Enter');
  await fireEvent.blur(input);
  expect(oncommit).not.toHaveBeenCalled();
  await rerender({ system: 'metric' });
  expect(input).toHaveValue('85');
});

test('a new value from outside replaces text that was refused', async () => {
  const { input, rerender, type, press } = show();
  await type('900');
  await press('Enter');
  expect(input).toBeInvalid();
  await rerender({ value: 25 });
  expect(input).toHaveValue('25');
  expect(input).toBeValid();
});

test('a derived value and a contradiction stand beside, and are read with the field', () => {
  const { input } = show({
    label: 'Mms',
    value: 300,
    quantity: 'mass-small',
    range: null,
    derived: 254.73,
    contradiction: 'fs and Vas make it 255 g, 15 % less.'
  });
  expect(input).toHaveAccessibleDescription('g derived 255 g fs and Vas make it 255 g, 15 % less.');
});

test('help opens and closes by its own button, Escape closes it', async () => {
  const { input } = show({ help: 'Protects the cone below the band.' });
  const button = screen.getByRole('button', { name: 'About High-pass' });
  expect(button).toHaveAttribute('aria-expanded', 'false');
  await fireEvent.click(button);
  expect(screen.getByText('Protects the cone below the band.')).toBeVisible();
  expect(input).toHaveAccessibleDescription(/Protects the cone/);
  await fireEvent.keyDown(button, { key: 'Escape' });
  expect(screen.queryByText('Protects the cone below the band.')).toBeNull();
});

test('a whole number stays whole', async () => {
  const { oncommit, input, type, press } = show({
    label: 'Copies',
    value: 1,
    quantity: 'count',
    whole: true,
    range: { min: 1, max: 16 }
  });
  await type('1.5');
  await press('Enter');
  expect(oncommit).not.toHaveBeenCalled();
  expect(input).toHaveAccessibleDescription(/Copies must be a whole number, 1 to 16\. Still using 1\./);
});

test('a field that is being taken away with text in it writes nothing', async () => {
  const { oncommit, input, type, unmount } = show();
  await type('20');
  // The order of browsers: the blur is told while the element goes.
  input.dispatchEvent(new FocusEvent('blur'));
  unmount();
  await Promise.resolve();
  expect(oncommit).not.toHaveBeenCalled();
});
