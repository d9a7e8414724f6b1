/** Stores what is being edited within a second of each edit, and says whether it is stored. Clock and timers are given. */
export interface AutosaveStatus {
  /** `saving` from the edit until it is stored; `not-saved` after a failure, until a later try succeeds. */
  readonly state: 'saved' | 'saving' | 'not-saved';
  /** ms since 1970; null before the first. */
  readonly lastSaved: number | null;
  /** What stood in the way, as an error says it; null unless `not-saved`. */
  readonly reason: string | null;
}

export interface Timers {
  /** Runs `work` after so many ms; what is given back cancels it. */
  readonly after: (ms: number, work: () => void) => () => void;
}

export interface AutosaveOptions {
  /** Stores the present state; called again for edits made meanwhile, never twice at once. */
  readonly save: () => Promise<void>;
  /** ms since 1970. */
  readonly now: () => number;
  readonly timers?: Timers;
  readonly onStatus?: (status: AutosaveStatus) => void;
}

/** ms of rest after the last edit, and at most after the first one not stored yet. */
export const REST = 400;
export const AT_MOST = 1000;

/** ms until the next try after the first, second … failure in a row; the last for all that follow. */
export const RETRY_AFTER: readonly number[] = [2000, 5000, 15_000, 60_000];

const BROWSER_TIMERS: Timers = {
  after: (ms, work) => {
    const timer = setTimeout(work, ms);
    return () => clearTimeout(timer);
  }
};

export class Autosave {
  readonly #options: AutosaveOptions;
  readonly #timers: Timers;
  #status: AutosaveStatus = { state: 'saved', lastSaved: null, reason: null };
  /** Something is not stored. */
  #dirty = false;
  /** When the oldest edit since the last try must be stored by; null where there is none. */
  #due: number | null = null;
  #failures = 0;
  #cancel: () => void = () => undefined;
  #running: Promise<void> | null = null;
  #stopped = false;

  constructor(options: AutosaveOptions) {
    this.#options = options;
    this.#timers = options.timers ?? BROWSER_TIMERS;
  }

  get status(): AutosaveStatus {
    return this.#status;
  }

  /** Something was edited: it is stored shortly. */
  edited(): void {
    if (this.#stopped) return;
    this.#dirty = true;
    this.#due ??= this.#options.now() + AT_MOST;
    if (this.#status.state === 'saved') this.#say('saving');
    if (this.#running === null) this.#soon();
  }

  /** Stores now what is not stored yet, as when the page is hidden. Never rejects: the status says how it went. */
  async flush(): Promise<AutosaveStatus> {
    this.#cancel();
    // Once for what is running already, once for what was edited meanwhile.
    await this.#running;
    if (this.#dirty) await this.#run();
    return this.#status;
  }

  /** Stores nothing more; what is running ends. Flush first to lose nothing. */
  stop(): void {
    this.#stopped = true;
    this.#cancel();
  }

  /** After the rest, or earlier where the oldest edit is due. */
  #soon(): void {
    const left = (this.#due ?? Infinity) - this.#options.now();
    this.#schedule(Math.max(0, Math.min(REST, left)));
  }

  #schedule(ms: number): void {
    this.#cancel();
    if (!this.#stopped) this.#cancel = this.#timers.after(ms, () => void this.#run());
  }

  #run(): Promise<void> {
    this.#cancel();
    this.#running ??= this.#store().finally(() => (this.#running = null));
    return this.#running;
  }

  async #store(): Promise<void> {
    this.#dirty = false;
    this.#due = null;
    try {
      await this.#options.save();
    } catch (error) {
      this.#dirty = true;
      this.#say('not-saved', error instanceof Error ? error.message : String(error));
      this.#schedule(RETRY_AFTER[Math.min(this.#failures++, RETRY_AFTER.length - 1)]);
      return;
    }
    this.#failures = 0;
    this.#status = { ...this.#status, lastSaved: this.#options.now() };
    this.#say(this.#dirty ? 'saving' : 'saved');
    if (this.#dirty) this.#soon();
  }

  #say(state: AutosaveStatus['state'], reason: string | null = null): void {
    this.#status = { ...this.#status, state, reason };
    this.#options.onStatus?.(this.#status);
  }
}
