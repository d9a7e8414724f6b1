/** A session over a shelf in memory, for the tests of the shelf page. All data invented. */
import { readFileSync } from 'node:fs';
import { vi } from 'vitest';
import type { Plan } from '$lib/plan/schema';
import { memoryReason } from '$lib/shelf/open-database';
import { memoryShelf } from '$lib/shelf/open-shelf';
import type { Shelf } from '$lib/shelf/shelf';
import { ShelfSession } from '$lib/workspace/session/shelf-session.svelte';
import { ShelfActions } from '$lib/workspace/shelf-page/shelf-actions.svelte';

const LOFT = readFileSync('static/examples/loft-corner.sealwright.json', 'utf8');

export const planCalled = (title: string, more: Partial<Plan> = {}): Plan => ({
  ...(JSON.parse(LOFT) as Plan),
  title,
  ...more
});

export const fileOf = (name: string, content: unknown): File =>
  new File([typeof content === 'string' ? content : JSON.stringify(content)], name);

/** A session with these plans on its shelf, the first changed last. */
export async function sessionWith(titles: readonly string[]) {
  let time = Date.UTC(2025, 10, 12, 12);
  const now = () => (time += 60_000);
  const session = new ShelfSession({
    now,
    openShelf: async (options) => memoryShelf(options, memoryReason('absent'))
  });
  session.open();
  const shelf: Shelf = await session.whenOpen();
  for (const title of titles.toReversed()) await shelf.add(planCalled(title));
  await session.reload();
  return { session, shelf };
}

/** What can be done on it, with the files that are offered kept. */
export async function actionsWith(titles: readonly string[]) {
  const { session, shelf } = await sessionWith(titles);
  const exportFile = vi.fn<(name: string, content: string | Uint8Array<ArrayBuffer>) => void>();
  const now = () => new Date(2026, 0, 5, 9).getTime();
  const actions = new ShelfActions(session, { exportFile, now });
  const titlesNow = () => session.list?.map(({ title }) => title);
  const plan = (title: string) => {
    const found = session.list?.find((summary) => summary.title === title);
    if (found === undefined) throw new Error(`${title} is not on the shelf`);
    return found;
  };
  return { session, shelf, actions, exportFile, titlesNow, plan };
}
