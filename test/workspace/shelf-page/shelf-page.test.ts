import { fireEvent, render, screen, waitFor, within } from '@testing-library/svelte';
import { beforeEach, expect, test, vi } from 'vitest';
import type { PlanSummary } from '$lib/shelf/plan-record';
import { ShelfSession } from '$lib/workspace/session/shelf-session.svelte';
import PlanRow from '$lib/workspace/shelf-page/PlanRow.svelte';
import ShelfPage from '$lib/workspace/shelf-page/ShelfPage.svelte';
import { fileOf, planCalled, sessionWith } from './shelf';

const examples = [
  { file: 'attic.json', title: 'Attic', about: 'Small and tight.', holds: true, levels: [90, 100] },
  { file: 'barn.json', title: 'Barn', about: 'Large and leaky.', holds: false, levels: [95, 90] }
];

beforeEach(() => {
  URL.createObjectURL ??= () => 'blob:none';
});

async function show(titles: readonly string[]) {
  const { session, shelf } = await sessionWith(titles);
  const view = render(ShelfPage, { session, examples });
  return { ...view, session, shelf };
}

const plans = () => screen.getByRole('list', { name: 'Plans' });
const titles = () =>
  within(plans())
    .getAllByRole('heading')
    .map((heading) => heading.textContent?.trim());

async function choose(title: string, word: string) {
  await fireEvent.click(screen.getByRole('button', { name: `More for ${title}` }));
  await fireEvent.click(screen.getByRole('button', { name: `${word} ${title}` }));
}

test('until the shelf is open, the page says so and shows the examples', () => {
  render(ShelfPage, { session: new ShelfSession(), examples });
  expect(screen.getByText('Opening the shelf …')).toBeVisible();
  expect(screen.queryByText(/before you cut the wood/)).toBeNull();
  expect(screen.getByRole('link', { name: 'Barn' })).toHaveAttribute(
    'href',
    expect.stringMatching(/\/plan\/\?example=barn\.json$/)
  );
});

test('an empty shelf says what this does; the first example is one press away', async () => {
  await show([]);
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(/before you cut the wood/);
  expect(screen.getByRole('link', { name: 'Open an example: Attic' })).toHaveAttribute(
    'href',
    expect.stringMatching(/\/plan\/\?example=attic\.json$/)
  );
  expect(screen.getByText('Nothing is sent anywhere.')).toBeVisible();
  expect(screen.getByRole('link', { name: 'New plan' })).toHaveAttribute(
    'href',
    expect.stringMatching(/\/plan\/\?new$/)
  );
});

test('plans are listed, the one changed last first, each leading to its page', async () => {
  const { session } = await show(['Loft', 'Den']);
  expect(titles()).toEqual(['Loft', 'Den']);
  const { id, verdict } = session.list![1];
  expect(screen.getByRole('link', { name: 'Den' })).toHaveAttribute(
    'href',
    expect.stringMatching(new RegExp(`/plan/\\?id=${id}$`))
  );
  const row = within(plans()).getAllByRole('listitem')[1];
  expect(row).toHaveTextContent(verdict!.sentence.split('. ')[1]);
  expect(within(row).getByRole('img', { name: /^Level at the seat/ })).toBeVisible();
});

test('a shelf in memory alone says so and offers a way out', async () => {
  await show(['Loft']);
  const notice = screen.getByText(/Plans are kept until this page is closed/);
  expect(notice).toBeVisible();
  expect(screen.getByRole('button', { name: 'Export all plans' })).toBeEnabled();
});

test('renaming in place: the field holds the title, Enter stores it, the focus is on the plan', async () => {
  await show(['Loft', 'Den']);
  await choose('Den', 'Rename');
  const field = screen.getByRole<HTMLInputElement>('textbox', { name: 'Title of Den' });
  expect(field).toHaveFocus();
  expect(field).toHaveValue('Den');
  await fireEvent.input(field, { target: { value: 'Snug' } });
  await fireEvent.submit(field.form!);
  await waitFor(() => expect(screen.getByRole('link', { name: 'Snug' })).toHaveFocus());
  expect(titles()).toEqual(['Snug', 'Loft']);
});

test('Escape leaves the title as it was, and the focus on the plan', async () => {
  const { session } = await show(['Den']);
  await choose('Den', 'Rename');
  const field = screen.getByRole('textbox', { name: 'Title of Den' });
  await fireEvent.input(field, { target: { value: 'Snug' } });
  await fireEvent.keyDown(field, { key: 'Escape' });
  await waitFor(() => expect(screen.getByRole('link', { name: 'Den' })).toHaveFocus());
  await session.reload();
  expect(titles()).toEqual(['Den']);
});

test('a deleted plan is gone at once; Undo has the focus and brings it back', async () => {
  await show(['Loft', 'Den']);
  await choose('Loft', 'Delete');
  const undo = await screen.findByRole('button', { name: 'Undo' });
  await waitFor(() => expect(undo).toHaveFocus());
  expect(titles()).toEqual(['Den']);
  expect(screen.getByRole('group', { name: 'Deleted' })).toHaveTextContent('Loft deleted.');
  expect(screen.getByText('Loft deleted.', { selector: '[role=status]' })).toBeInTheDocument();

  await fireEvent.click(undo);
  await waitFor(() => expect(screen.getByRole('link', { name: 'Loft' })).toHaveFocus());
  expect(titles()).toEqual(['Loft', 'Den']);
  expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull();
});

test('the last plan deleted and the bar closed, the focus is on the heading and the plan can still be put back', async () => {
  await show(['Loft']);
  await choose('Loft', 'Delete');
  const bar = within(await screen.findByRole('group', { name: 'Deleted' }));
  await fireEvent.click(bar.getByRole('button', { name: 'Close' }));
  expect(screen.getByRole('heading', { level: 1 })).toHaveFocus();
  await fireEvent.click(screen.getByText('Deleted plans (1)'));
  await fireEvent.click(screen.getByRole('button', { name: 'Put back Loft' }));
  await waitFor(() => expect(titles()).toEqual(['Loft']));
  expect(screen.queryByText(/Deleted plans/)).toBeNull();
});

test('a copy is added, with the focus on it', async () => {
  await show(['Loft']);
  await choose('Loft', 'Duplicate');
  await waitFor(() => expect(screen.getByRole('link', { name: 'Loft (copy)' })).toHaveFocus());
});

test('the menu of a plan closes on Escape, with the focus where it came from, and on leaving it', async () => {
  await show(['Loft', 'Den']);
  const more = screen.getByRole('button', { name: 'More for Loft' });
  await fireEvent.click(more);
  const rename = screen.getByRole('button', { name: 'Rename Loft' });
  rename.focus();
  await fireEvent.keyDown(rename, { key: 'Escape' });
  expect(screen.queryByRole('button', { name: 'Rename Loft' })).toBeNull();
  expect(more).toHaveFocus();

  await fireEvent.click(more);
  await fireEvent.pointerDown(document.body);
  expect(more).toHaveAttribute('aria-expanded', 'false');
});

test('picked files: plans are listed, the others explained where they were picked', async () => {
  await show(['Loft']);
  const input = screen.getByLabelText<HTMLInputElement>('Plan files');
  expect(input.multiple).toBe(true);
  const opened = vi.spyOn(input, 'click');
  await fireEvent.click(screen.getByRole('button', { name: 'Import files' }));
  expect(opened).toHaveBeenCalledOnce();
  const files = [fileOf('den.json', planCalled('Den')), fileOf('list.json', '[1, 2')];
  await fireEvent.change(input, { target: { files } });
  const alert = await screen.findByRole('alert');
  expect(alert).toHaveTextContent('One file cannot be imported');
  expect(within(alert).getByRole('heading', { name: 'list.json' })).toBeVisible();
  expect(within(alert).getAllByRole('listitem').length).toBeGreaterThan(0);
  expect(titles()).toEqual(['Den', 'Loft']);
  await fireEvent.click(within(alert).getByRole('button', { name: 'Close' }));
  expect(screen.queryByRole('alert')).toBeNull();
});

test('files dropped anywhere are imported; anything else dragged is left to the browser', async () => {
  await show([]);
  const drag = (type: string, types: string[], files: File[] = []) => {
    const event = new Event(type, { bubbles: true, cancelable: true });
    Object.assign(event, { dataTransfer: { types, files } });
    document.body.dispatchEvent(event);
    return event.defaultPrevented;
  };
  expect(drag('dragover', ['text/plain'])).toBe(false);
  expect(drag('dragover', ['Files'])).toBe(true);
  expect(await screen.findByText('Drop plan files to put them on the shelf')).toBeVisible();
  expect(
    drag('drop', ['Files'], [fileOf('a.json', planCalled('A')), fileOf('b.json', planCalled('B'))])
  ).toBe(true);
  await waitFor(() => expect(titles()).toEqual(['B', 'A']));
  expect(screen.queryByText('Drop plan files to put them on the shelf')).toBeNull();
});

test('searching leaves the plans that fit and counts them', async () => {
  await show(['Loft', 'Den', 'Left loft']);
  await fireEvent.input(screen.getByRole('searchbox', { name: 'Find' }), { target: { value: 'loft' } });
  expect(titles()).toEqual(['Loft', 'Left loft']);
  expect(screen.getByText('2 of 3')).toBeVisible();
  await fireEvent.input(screen.getByRole('searchbox'), { target: { value: 'barn' } });
  expect(screen.getByText('No plan has these words in its title or notes.')).toBeVisible();
});

test('a plan that cannot be read shows its trouble, leads nowhere, and can be exported or deleted', async () => {
  const plan: PlanSummary = {
    id: 'later',
    title: 'From tomorrow',
    created: 1,
    changed: Date.UTC(2025, 10, 12, 12),
    verdict: { holds: true, sentence: 'Holds.', margin: 1 },
    curve: null,
    engineVersion: '99',
    planVersion: 9,
    revision: 1,
    trouble: 'Needs a newer Sealwright.'
  };
  const acts = { onrename: vi.fn(), onduplicate: vi.fn(), onexport: vi.fn(), ondelete: vi.fn() };
  render(PlanRow, { plan, domain: [70, 110] as const, now: plan.changed, ...acts });
  expect(screen.getByText(/^Needs a newer Sealwright\. It is kept as it is/)).toBeVisible();
  expect(screen.queryByRole('link')).toBeNull();
  expect(screen.queryByText('Holds.')).toBeNull();
  await fireEvent.click(screen.getByRole('button', { name: 'More for From tomorrow' }));
  expect(screen.getAllByRole('button').map((button) => button.textContent?.trim())).toEqual([
    '',
    'Export From tomorrow',
    'Delete From tomorrow'
  ]);
  await fireEvent.click(screen.getByRole('button', { name: 'Export From tomorrow' }));
  expect(acts.onexport).toHaveBeenCalledOnce();
});
