import { describe, expect, test, vi } from 'vitest';
import { memoryReason } from '$lib/shelf/open-database';
import { memoryShelf, type OpenShelfOptions } from '$lib/shelf/open-shelf';
import { Tabs } from '$lib/shelf/tabs';
import { exportFile, REVOKE_AFTER } from '$lib/workspace/session/export-file';
import { Preferences, SYSTEM_KEY, THEME_KEY } from '$lib/workspace/session/preferences.svelte';
import { LARGEST_FILE, readFiles } from '$lib/workspace/session/read-files';
import { ShelfSession } from '$lib/workspace/session/shelf-session.svelte';
import { planCalled, sessionWith } from '../shelf-page/shelf';

describe('the shelf session', () => {
  test('knows nothing before it is open, and the plans with their trouble after', async () => {
    const session = new ShelfSession({
      openShelf: async (options) => memoryShelf(options, memoryReason('refused'))
    });
    expect([session.shelf, session.list, session.trouble]).toEqual([null, null, null]);
    const close = session.open();
    const shelf = await session.whenOpen();
    await session.reload();
    expect(session.shelf).toBe(shelf);
    expect(session.list).toEqual([]);
    expect(session.trouble).toBe(memoryReason('refused').text);
    close();
  });

  test('lists its own changes, and those another tab tells of', async () => {
    const { session, shelf } = await sessionWith(['Loft']);
    await shelf.add(planCalled('Den'));
    await session.reload();
    expect(session.list?.map(({ title }) => title)).toEqual(['Den', 'Loft']);

    const heard = vi.fn();
    const stop = session.listen(heard);
    const list = vi.spyOn(shelf, 'list');
    const other = new Tabs('another tab', () => undefined);
    other.say({ kind: 'changed', id: 'plan' });
    await vi.waitFor(() => expect(heard).toHaveBeenCalledExactlyOnceWith({ kind: 'changed', id: 'plan' }));
    await vi.waitFor(() => expect(list).toHaveBeenCalled());
    stop();
    other.say({ kind: 'removed', id: 'plan' });
    await vi.waitFor(() => expect(list.mock.calls.length).toBeGreaterThan(1));
    expect(heard).toHaveBeenCalledOnce();
    other.close();
  });

  test('says when the store is closed under it, and when it cannot be read', async () => {
    let options: OpenShelfOptions | undefined;
    const session = new ShelfSession({
      openShelf: async (given) => {
        options = given;
        return memoryShelf(given, memoryReason('absent'));
      }
    });
    session.open();
    const shelf = await session.whenOpen();
    options?.onClosed?.();
    expect(session.trouble).toMatch(/^The shelf was closed by another tab or the browser\./);

    vi.spyOn(shelf, 'list').mockRejectedValue(new Error('disk'));
    await session.reload();
    expect(session.trouble).toMatch(/^The shelf could not be read\./);
    expect(session.list).not.toBeNull();
  });

  test('a call during a reading is answered by a later reading', async () => {
    const { session, shelf } = await sessionWith([]);
    const before = session.reload();
    await shelf.add(planCalled('Den'));
    await Promise.all([before, session.reload()]);
    expect(session.list).toHaveLength(1);
  });
});

describe('preferences', () => {
  const storeOf = (values: Record<string, string>) => {
    const kept = new Map(Object.entries(values));
    const setItem = (key: string, value: string) => void kept.set(key, value);
    const store = { getItem: (key: string) => kept.get(key) ?? null, setItem } as unknown as Storage;
    return { store, kept };
  };

  test('what was chosen is shown and kept', () => {
    const root = document.createElement('html');
    const { store, kept } = storeOf({ [THEME_KEY]: 'dark', [SYSTEM_KEY]: 'imperial' });
    const preferences = new Preferences();
    expect([preferences.theme, preferences.system]).toEqual(['system', 'metric']);
    preferences.restore(store, root);
    expect([preferences.theme, preferences.system]).toEqual(['dark', 'imperial']);
    expect(root.dataset.theme).toBe('dark');
    preferences.theme = 'light';
    preferences.system = 'metric';
    expect(root.dataset.theme).toBe('light');
    preferences.theme = 'system';
    expect(root.dataset.theme).toBeUndefined();
    expect(Object.fromEntries(kept)).toEqual({ [THEME_KEY]: 'system', [SYSTEM_KEY]: 'metric' });
  });

  test('what is stored and makes no sense is passed over', () => {
    const preferences = new Preferences();
    preferences.restore(
      storeOf({ [THEME_KEY]: 'sepia', [SYSTEM_KEY]: '' }).store,
      document.createElement('html')
    );
    expect([preferences.theme, preferences.system]).toEqual(['system', 'metric']);
  });

  test.for([
    ['absent', null],
    [
      'refusing',
      {
        getItem: () => {
          throw new Error('no');
        },
        setItem: () => {
          throw new Error('no');
        }
      } as unknown as Storage
    ]
  ] as const)('with a store %s, a choice lasts as long as the page', ([, store]) => {
    const root = document.createElement('html');
    const preferences = new Preferences();
    preferences.restore(store, root);
    preferences.theme = 'dark';
    preferences.system = 'imperial';
    expect([preferences.theme, preferences.system, root.dataset.theme]).toEqual(['dark', 'imperial', 'dark']);
  });
});

describe('files', () => {
  test('a file is offered under its name, and its address given up later', async () => {
    vi.useFakeTimers();
    const offered: Blob[] = [];
    const create = vi.spyOn(URL, 'createObjectURL').mockImplementation((blob) => {
      offered.push(blob as Blob);
      return 'blob:here';
    });
    const revoke = vi.spyOn(URL, 'revokeObjectURL').mockImplementation(() => undefined);
    const clicked: [string, string][] = [];
    const click = vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (
      this: HTMLAnchorElement
    ) {
      clicked.push([this.href, this.download]);
    });
    exportFile('loft.sealwright.json', '{"a":1}');
    expect(clicked).toEqual([['blob:here', 'loft.sealwright.json']]);
    expect(document.querySelector('a[download]')).toBeNull();
    expect(await offered[0].text()).toBe('{"a":1}');
    expect(revoke).not.toHaveBeenCalled();
    vi.advanceTimersByTime(REVOKE_AFTER);
    expect(revoke).toHaveBeenCalledExactlyOnceWith('blob:here');
    for (const spy of [create, revoke, click]) spy.mockRestore();
    vi.useRealTimers();
  });

  test('files are read as bytes, in order; one too large or gone is refused by name', async () => {
    const large = new File(['x'], 'film.json');
    Object.defineProperty(large, 'size', { value: LARGEST_FILE + 1 });
    const untouched = vi.spyOn(large, 'arrayBuffer');
    const gone = new File(['x'], 'gone.json');
    vi.spyOn(gone, 'arrayBuffer').mockRejectedValue(new DOMException('gone', 'NotFoundError'));
    const read = await readFiles([new File(['é'], 'plan.json'), large, gone]);
    expect(read[0]).toEqual({ ok: true, file: { name: 'plan.json', content: Uint8Array.of(0xc3, 0xa9) } });
    expect(read[1]).toEqual({
      ok: false,
      name: 'film.json',
      problems: ['larger than the 1 MiB a plan may have']
    });
    expect(read[2]).toMatchObject({
      ok: false,
      name: 'gone.json',
      problems: [expect.stringMatching(/^cannot be read/)]
    });
    expect(untouched).not.toHaveBeenCalled();
  });
});
