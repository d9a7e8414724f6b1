/** Tells other tabs of this Sealwright which plans were changed or removed, and hears the same from them. */
import { z } from 'zod';
import type { ShelfNotice } from './shelf';

export const CHANNEL = 'sealwright-shelf';

const message = z.object({ kind: z.enum(['changed', 'removed']), id: z.string(), from: z.string() });

export class Tabs {
  readonly #channel: BroadcastChannel | null;
  readonly #self: string;

  /** `self` is an id no other tab has: notices that come back are its own, and are ignored. */
  constructor(self: string, onNotice: (notice: ShelfNotice) => void) {
    this.#self = self;
    this.#channel = openChannel();
    if (this.#channel === null) return;
    this.#channel.onmessage = ({ data }: MessageEvent<unknown>) => {
      const read = message.safeParse(data);
      if (!read.success || read.data.from === self) return;
      onNotice({ kind: read.data.kind, id: read.data.id });
    };
  }

  /** Says nothing where the browser has no channel between tabs. */
  say({ kind, id }: ShelfNotice): void {
    this.#channel?.postMessage({ kind, id, from: this.#self });
  }

  close(): void {
    this.#channel?.close();
  }
}

function openChannel(): BroadcastChannel | null {
  try {
    return typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(CHANNEL);
  } catch {
    return null;
  }
}
