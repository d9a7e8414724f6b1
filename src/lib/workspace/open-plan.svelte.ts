import { workThrough, type RefusedFile, type WorkedPlan } from './work-through';

/** Files above this are no plans (the plan format's own bound): they are refused unread. */
export const LARGEST_FILE = 1024 * 1024;

/** Where a text comes from: an example to be fetched or a file to be read. */
export interface PlanSource {
  readonly name: string;
  readonly size?: number;
  readonly text: () => Promise<string>;
}

/** The plan on the screen, and the file that was last refused, if one was. Nothing is kept beyond the page. */
export class OpenPlan {
  #shown: WorkedPlan;
  #refused: RefusedFile | null;
  #latest = 0;

  constructor(name: string, text: string) {
    const first = workThrough(name, text);
    if (!first.ok) throw new Error(`${name}: ${first.problems.join('; ')}`);
    this.#shown = $state.raw(first);
    this.#refused = $state.raw(null);
  }

  get shown(): WorkedPlan {
    return this.#shown;
  }

  get refused(): RefusedFile | null {
    return this.#refused;
  }

  /** Shows the plan, or says why not and leaves what is shown alone. True when it is shown. A later call wins over an earlier one. */
  async open(source: PlanSource): Promise<boolean> {
    const turn = ++this.#latest;
    const result = await this.#read(source);
    if (turn !== this.#latest) return false;
    if (result.ok) this.#shown = result;
    this.#refused = result.ok ? null : result;
    return result.ok;
  }

  async #read({ name, size, text }: PlanSource): Promise<WorkedPlan | RefusedFile> {
    if (size !== undefined && size > LARGEST_FILE) {
      return {
        ok: false,
        name,
        problems: ['The file is larger than 1 MiB; a plan file is a few kilobytes of JSON.']
      };
    }
    let content: string;
    try {
      content = await text();
    } catch {
      return {
        ok: false,
        name,
        problems: ['The file could not be read. It may have been moved, or the connection is gone.']
      };
    }
    return workThrough(name, content);
  }
}
