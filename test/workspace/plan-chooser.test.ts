import { fireEvent, render, screen } from '@testing-library/svelte';
import { expect, test, vi } from 'vitest';
import PlanChooser from '$lib/workspace/PlanChooser.svelte';

const examples = [
  { file: 'a.json', title: 'Attic', about: 'Small and tight.' },
  { file: 'b.json', title: 'Barn', about: 'Large and leaky.' }
];

function show(chosen: string | null) {
  const onexample = vi.fn();
  const onfile = vi.fn();
  const { container } = render(PlanChooser, { examples, chosen, onexample, onfile });
  return { container, onexample, onfile };
}

test('choosing another example reports it; the line below tells about the one that is shown', async () => {
  const { onexample } = show('a.json');
  const select = screen.getByRole('combobox', { name: 'Example plan' });
  expect(select).toHaveAccessibleDescription('Small and tight.');
  await fireEvent.change(select, { target: { value: 'b.json' } });
  expect(onexample).toHaveBeenCalledExactlyOnceWith(examples[1]);
});

test("a file of one's own is shown as such", () => {
  show(null);
  expect(screen.getByRole('option', { name: 'A file of your own' })).toBeDisabled();
  expect(screen.getByRole('combobox')).toHaveAccessibleDescription('Shown from your own file.');
});

test('a picked file is handed on with its name, size and text, and can be picked again', async () => {
  const { onfile } = show('a.json');
  const input = screen.getByLabelText<HTMLInputElement>('Open a plan file');
  const file = new File(['{"a":1}'], 'shed.sealwright.json');
  await fireEvent.change(input, { target: { files: [file] } });
  expect(onfile).toHaveBeenCalledOnce();
  const [source] = onfile.mock.calls[0];
  expect(source).toMatchObject({ name: 'shed.sealwright.json', size: 7 });
  expect(await source.text()).toBe('{"a":1}');
  expect(input.value).toBe('');
});

test('a file dropped anywhere on the page is opened in place of being navigated to', async () => {
  const { onfile } = show('a.json');
  const drop = new Event('drop', { bubbles: true, cancelable: true });
  Object.assign(drop, { dataTransfer: { files: [new File(['x'], 'dropped.json')] } });
  document.body.dispatchEvent(drop);
  expect(drop.defaultPrevented).toBe(true);
  expect(onfile.mock.calls[0][0].name).toBe('dropped.json');
});

test('the page says that nothing is stored', () => {
  show('a.json');
  expect(screen.getByLabelText('Open a plan file')).toHaveAccessibleDescription(
    /nothing is sent and, in this release, nothing is stored/
  );
});
