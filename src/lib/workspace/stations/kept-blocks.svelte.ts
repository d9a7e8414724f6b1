/** What the form remembers of each shaping block and the plan does not: its row, and what was typed for other kinds. */
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import type { BlockKind } from './block-kinds';

export class BlockRow {
  readonly #kept: Partial<Record<BlockKind, PlanBlock>> = {};
  #open = $state(false);

  constructor(
    /** The same for as long as the block is in the chain, wherever it is moved. */
    readonly key: number
  ) {}

  get open(): boolean {
    return this.#open;
  }
  set open(open: boolean) {
    this.#open = open;
  }

  keep(block: PlanBlock): void {
    this.#kept[block.kind] = block;
  }
  /** As it was last typed; null where that kind was never in use here. */
  recall(kind: BlockKind): PlanBlock | null {
    return this.#kept[kind] ?? null;
  }
}

interface Seen {
  readonly row: BlockRow;
  /** The block as it was then. */
  readonly text: string;
}

export class KeptBlocks {
  #seen: readonly Seen[] = [];
  #next = 0;

  /**
   * The rows of these blocks. A block found again unchanged keeps its row wherever it went, one changed in place keeps it too: this
   * holds for edits made here, for undo, and for ways out alike.
   */
  follow(blocks: readonly PlanBlock[]): readonly BlockRow[] {
    const texts = blocks.map((block) => JSON.stringify(block));
    const rows: (BlockRow | null)[] = texts.map(() => null);
    const isFree = (seen: Seen) => !rows.includes(seen.row);
    texts.forEach((text, i) => {
      const here = this.#seen[i];
      if (here?.text === text) rows[i] = here.row;
    });
    texts.forEach((text, i) => {
      rows[i] ??= this.#seen.find((seen) => seen.text === text && isFree(seen))?.row ?? null;
    });
    if (blocks.length === this.#seen.length)
      this.#seen.forEach((here, i) => {
        if (isFree(here)) rows[i] ??= here.row;
      });
    const followed = rows.map((row) => row ?? new BlockRow(this.#next++));
    this.#seen = followed.map((row, i) => ({ row, text: texts[i] }));
    return followed;
  }
}
