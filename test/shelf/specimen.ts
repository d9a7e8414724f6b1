/** Plans and shelves for the tests of this folder. All data invented. */
import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { vi } from 'vitest';
import type { JsonPatch } from '$lib/plan/json-patch';
import type { Plan } from '$lib/plan/schema';
import { EMPTY_HISTORY, type History } from '$lib/shelf/history';
import { memoryShelf, openShelf } from '$lib/shelf/open-shelf';
import { memoryReason } from '$lib/shelf/open-database';
import type { PlanRecord, ShelvedPlan } from '$lib/shelf/plan-record';
import type { Shelf, ShelfNotice } from '$lib/shelf/shelf';

export const smallPlan = (title = 'Loft corner'): Plan => ({
  format: 'sealwright-plan',
  version: 1,
  title,
  goal: { level_dB: 100, from_Hz: 22, to_Hz: 80 },
  shaping: [{ kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 15 }],
  amplifier: { ratings: [{ power_W: 500, load_ohm: 4 }] },
  driver: {
    fs_Hz: 21,
    qms: 5.2,
    qes: 0.49,
    vas_L: 220,
    re_ohm: 3.3,
    le_mH: 1.8,
    sd_cm2: 810,
    xmax_mm: 16,
    power_W: 600
  },
  box: { net_L: 85 },
  seat: { distance_m: 3 }
});

export const replace = (path: string, value: unknown): JsonPatch => [{ op: 'replace', path, value }];
export const add = (path: string, value: unknown): JsonPatch => [{ op: 'add', path, value }];
export const remove = (path: string): JsonPatch => [{ op: 'remove', path }];

/** A clock that moves when told, and ids in order. */
export function fakeWorld() {
  const notices: ShelfNotice[] = [];
  let ids = 0;
  const world = {
    time: 1_700_000_000_000,
    now: () => world.time,
    newId: () => `plan-${++ids}`,
    notify: (notice: ShelfNotice) => void notices.push(notice),
    notices
  };
  return world;
}

export type World = ReturnType<typeof fakeWorld>;

/** Each kind of shelf; `open` opens one over what the ones before have stored, if that kind stores. */
export const SHELVES: { name: string; open: (world: World) => Promise<Shelf> }[] = [
  { name: 'stored', open: openShelf },
  { name: 'memory', open: async (world) => memoryShelf(world, memoryReason('absent')) }
];

/** A browser's store with nothing in it. */
export const freshBrowser = (): void => void vi.stubGlobal('indexedDB', new IDBFactory());

export type Readable = ShelvedPlan & { readable: true };

export async function readable(shelf: Shelf, id: string): Promise<Readable> {
  const shelved = await shelf.get(id);
  if (!shelved?.readable) throw new Error(`${id} cannot be read`);
  return shelved;
}

/** The record as it is stored, with another plan. */
export async function putPlan(
  shelf: Shelf,
  id: string,
  plan: Plan,
  history: History = EMPTY_HISTORY
): Promise<PlanRecord> {
  const { record } = await readable(shelf, id);
  const changed = { ...record, plan };
  await shelf.put(changed, history);
  return changed;
}
