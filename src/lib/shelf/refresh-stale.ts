import { isStale } from './engine-version';
import type { Shelf } from './shelf';

export interface RefreshOptions {
  /** Resolves when there is time for one more plan. */
  readonly idle: () => Promise<void>;
  /** Told of each plan done, so that a list on screen can follow. */
  readonly onRefreshed?: (id: string) => void;
}

/** Works the figures out again that an older engine left beside the plans, one plan at a time. The number of plans done. */
export async function refreshStale(shelf: Shelf, { idle, onRefreshed }: RefreshOptions): Promise<number> {
  const stale = (await shelf.list()).filter(({ engineVersion }) => isStale(engineVersion));
  for (const { id } of stale) {
    await idle();
    await shelf.refresh(id);
    onRefreshed?.(id);
  }
  return stale.length;
}
