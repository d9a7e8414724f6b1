import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { AT_MOST, Autosave, RETRY_AFTER, REST, type AutosaveStatus } from '$lib/shelf/autosave';
import { flushOnHide } from '$lib/shelf/flush-on-hide';

beforeEach(() => void vi.useFakeTimers({ now: 1_000_000 }));
afterEach(() => void vi.useRealTimers());

function setUp(save: () => Promise<void> = async () => undefined) {
  const seen: AutosaveStatus[] = [];
  const saves: number[] = [];
  const autosave = new Autosave({
    save: () => {
      saves.push(Date.now());
      return save();
    },
    now: Date.now,
    onStatus: (status) => void seen.push(status)
  });
  return { autosave, saves, seen, states: () => seen.map(({ state }) => state) };
}

const pass = (ms: number) => vi.advanceTimersByTimeAsync(ms);

test('an edit is stored after a short rest, and not before', async () => {
  const { autosave, saves, states } = setUp();
  expect(autosave.status).toEqual({ state: 'saved', lastSaved: null, reason: null });
  autosave.edited();
  expect(autosave.status.state).toBe('saving');
  await pass(REST - 1);
  expect(saves).toEqual([]);
  await pass(1);
  expect(saves).toEqual([1_000_000 + REST]);
  expect(autosave.status).toEqual({ state: 'saved', lastSaved: 1_000_000 + REST, reason: null });
  expect(states()).toEqual(['saving', 'saved']);
});

test('edits that never rest are stored within a second of each', async () => {
  const { autosave, saves } = setUp();
  const edits: number[] = [];
  for (let i = 0; i < 100; i++) {
    edits.push(Date.now());
    autosave.edited();
    await pass(70);
  }
  await pass(2000);
  expect(saves.length).toBeGreaterThan(5);
  for (const at of edits) {
    const next = saves.find((save) => save >= at) ?? Infinity;
    expect(next - at).toBeLessThanOrEqual(AT_MOST);
  }
  expect(AT_MOST).toBeLessThanOrEqual(1000);
});

test('without edits nothing is stored', async () => {
  const { autosave, saves } = setUp();
  await pass(100_000);
  expect((await autosave.flush()).state).toBe('saved');
  expect(saves).toEqual([]);
});

test('an edit made while storing is stored next, never both at once', async () => {
  let running = 0;
  let most = 0;
  const { autosave, saves, states } = setUp(async () => {
    most = Math.max(most, ++running);
    await new Promise((resolve) => setTimeout(resolve, 300));
    running--;
  });
  autosave.edited();
  await pass(REST + 100);
  autosave.edited();
  await pass(200);
  expect(autosave.status.state).toBe('saving');
  await pass(2000);
  expect(saves).toHaveLength(2);
  expect(most).toBe(1);
  expect(states()).toEqual(['saving', 'saving', 'saved']);
});

test('flush stores at once, waits for it, and leaves nothing for the timer', async () => {
  const { autosave, saves } = setUp();
  autosave.edited();
  expect(await autosave.flush()).toMatchObject({ state: 'saved', lastSaved: 1_000_000 });
  await pass(10_000);
  expect(saves).toEqual([1_000_000]);
});

test('flush while storing stores once more only where something was edited meanwhile', async () => {
  const slow = () => new Promise<void>((resolve) => setTimeout(resolve, 300));
  for (const [editedMeanwhile, times] of [
    [false, 1],
    [true, 2]
  ] as const) {
    const { autosave, saves } = setUp(slow);
    autosave.edited();
    await pass(REST);
    if (editedMeanwhile) autosave.edited();
    const flushed = autosave.flush();
    await pass(700);
    expect((await flushed).state).toBe('saved');
    expect(saves).toHaveLength(times);
  }
});

test('a failure is said with its reason and tried again, at longer and longer distances, until it succeeds', async () => {
  let fails = 6;
  const { autosave, saves } = setUp(async () => {
    if (fails-- > 0) throw new Error('There is no room left.');
  });
  autosave.edited();
  await pass(REST);
  expect(autosave.status).toEqual({ state: 'not-saved', lastSaved: null, reason: 'There is no room left.' });
  await pass(210_000);
  expect(autosave.status.state).toBe('saved');
  expect(autosave.status.reason).toBeNull();
  const gaps = saves.slice(1).map((at, i) => at - saves[i]);
  expect(gaps).toEqual([...RETRY_AFTER, 60_000, 60_000]);
});

test('after a failure an edit tries again within a second, and flush at once', async () => {
  let works = false;
  const { autosave, saves } = setUp(async () => {
    if (!works) throw new Error('closed');
  });
  autosave.edited();
  await pass(REST);
  await pass(RETRY_AFTER[0] + RETRY_AFTER[1]);
  expect(saves).toHaveLength(3);
  autosave.edited();
  expect(autosave.status.state).toBe('not-saved');
  await pass(REST);
  expect(saves).toHaveLength(4);
  expect((await autosave.flush()).state).toBe('not-saved');
  works = true;
  expect((await autosave.flush()).state).toBe('saved');
});

test('the time of the last save outlives a later failure', async () => {
  let works = true;
  const { autosave } = setUp(async () => {
    if (!works) throw new Error('full');
  });
  autosave.edited();
  await pass(REST);
  works = false;
  autosave.edited();
  await pass(REST);
  expect(autosave.status).toEqual({ state: 'not-saved', lastSaved: 1_000_000 + REST, reason: 'full' });
});

test('once stopped nothing more is stored', async () => {
  const { autosave, saves } = setUp();
  autosave.edited();
  autosave.stop();
  autosave.edited();
  await pass(10_000);
  expect(saves).toEqual([]);
});

test('a page hidden or left stores at once, until told to stop', () => {
  const page = Object.assign(new EventTarget(), { visibilityState: 'visible' as DocumentVisibilityState });
  const frame = new EventTarget();
  const flush = vi.fn(async () => ({ state: 'saved', lastSaved: null, reason: null }) as const);
  const stop = flushOnHide({ flush }, page, frame);
  page.dispatchEvent(new Event('visibilitychange'));
  expect(flush).toHaveBeenCalledTimes(0);
  page.visibilityState = 'hidden';
  page.dispatchEvent(new Event('visibilitychange'));
  expect(flush).toHaveBeenCalledTimes(1);
  frame.dispatchEvent(new Event('pagehide'));
  expect(flush).toHaveBeenCalledTimes(2);
  stop();
  page.dispatchEvent(new Event('visibilitychange'));
  frame.dispatchEvent(new Event('pagehide'));
  expect(flush).toHaveBeenCalledTimes(2);
});
