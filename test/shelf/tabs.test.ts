import { afterEach, expect, test, vi } from 'vitest';
import { CHANNEL, Tabs } from '$lib/shelf/tabs';

const open: { close(): void }[] = [];
const kept = <T extends { close(): void }>(it: T): T => {
  open.push(it);
  return it;
};

afterEach(() => {
  for (const it of open.splice(0)) it.close();
  vi.unstubAllGlobals();
});

test('a notice reaches every other tab and not its own', async () => {
  const heard = [vi.fn(), vi.fn(), vi.fn()];
  const [one] = heard.map((onNotice, i) => kept(new Tabs(`tab-${i}`, onNotice)));
  one.say({ kind: 'changed', id: 'plan-1' });
  one.say({ kind: 'removed', id: 'plan-2' });
  await vi.waitFor(() => expect(heard[2]).toHaveBeenCalledTimes(2));
  await vi.waitFor(() => expect(heard[1]).toHaveBeenCalledTimes(2));
  expect(heard[1].mock.calls).toEqual([
    [{ kind: 'changed', id: 'plan-1' }],
    [{ kind: 'removed', id: 'plan-2' }]
  ]);
  expect(heard[0]).not.toHaveBeenCalled();
});

test('what is no notice, or its own come back, is ignored', async () => {
  const heard = vi.fn();
  kept(new Tabs('me', heard));
  const channel = kept(new BroadcastChannel(CHANNEL));
  for (const message of [
    null,
    'changed',
    { kind: 'exploded', id: 'a', from: 'x' },
    { kind: 'changed', from: 'x' },
    { kind: 'changed', id: 'mine', from: 'me' },
    { kind: 'changed', id: 'last', from: 'x' }
  ])
    channel.postMessage(message);
  await vi.waitFor(() => expect(heard).toHaveBeenCalled());
  expect(heard.mock.calls).toEqual([[{ kind: 'changed', id: 'last' }]]);
});

test.for<[string, unknown]>([
  ['absent', undefined],
  [
    'refused',
    class {
      constructor() {
        throw new DOMException('no', 'SecurityError');
      }
    }
  ]
])('a channel that is %s is done without', ([, channel]) => {
  vi.stubGlobal('BroadcastChannel', channel);
  const tabs = new Tabs('me', () => expect.unreachable());
  expect(() => {
    tabs.say({ kind: 'changed', id: 'a' });
    tabs.close();
  }).not.toThrow();
});
