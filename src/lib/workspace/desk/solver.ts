/**
 * Asks the worker, one question of a kind at a time: while one is under way only the newest waits, the ones between are never asked.
 * Where workers are not to be had the work is done in place, when the page is idle.
 */
import { solveTask } from './solve-task';
import type { SolverAnswer, SolverQuestion, SolverResult, SolverTask } from './solver-messages';

/** The part of a worker that is needed; tests give their own. */
export interface SolverPort {
  post(question: SolverQuestion): void;
  listen(heard: (answer: SolverAnswer) => void): void;
  close(): void;
}

interface Waiting {
  readonly task: SolverTask;
  readonly done: (result: SolverResult | null) => void;
}

/** Which line a task stands in: sweeps over different things do not hold each other up. */
const lineOf = (task: SolverTask): string =>
  task.kind === 'sweep' ? `sweep ${task.request.over}` : task.kind;

export class Solver {
  readonly #port: SolverPort;
  readonly #running = new Map<string, { id: number; done: Waiting['done'] }>();
  readonly #next = new Map<string, Waiting>();
  #count = 0;

  constructor(port: SolverPort) {
    this.#port = port;
    port.listen((answer) => this.#heard(answer));
  }

  /** `done` is called once, with null when the question was overtaken by a newer one or refused. */
  ask(task: SolverTask, done: (result: SolverResult | null) => void): void {
    const line = lineOf(task);
    if (!this.#running.has(line)) {
      this.#post(line, { task, done });
      return;
    }
    this.#next.get(line)?.done(null);
    this.#next.set(line, { task, done });
  }

  close(): void {
    this.#port.close();
    this.#running.clear();
    this.#next.clear();
  }

  #post(line: string, { task, done }: Waiting): void {
    const id = ++this.#count;
    this.#running.set(line, { id, done });
    this.#port.post({ id, task });
  }

  #heard({ id, result }: SolverAnswer): void {
    for (const [line, running] of this.#running) {
      if (running.id !== id) continue;
      this.#running.delete(line);
      const next = this.#next.get(line);
      this.#next.delete(line);
      if (next) this.#post(line, next);
      running.done(result);
      return;
    }
  }
}

/** A port to a worker of our own. */
export function workerPort(): SolverPort {
  const worker = new Worker(new URL('./solver.worker.ts', import.meta.url), { type: 'module' });
  return {
    post: (question) => worker.postMessage(question),
    listen: (heard) =>
      worker.addEventListener('message', ({ data }: MessageEvent<SolverAnswer>) => heard(data)),
    close: () => worker.terminate()
  };
}

/** The same without a worker. */
export function inPlacePort(): SolverPort {
  let hear: (answer: SolverAnswer) => void = () => undefined;
  let open = true;
  return {
    post: ({ id, task }) => {
      setTimeout(() => {
        if (open) hear({ id, result: solveTask(task) });
      });
    },
    listen: (heard) => (hear = heard),
    close: () => (open = false)
  };
}
