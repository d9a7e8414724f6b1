/** Ways out and sweeps off the page's own thread. */
import { EngineError } from '$lib/engine/error';
import { solveTask } from './solve-task';
import type { SolverAnswer, SolverQuestion } from './solver-messages';

addEventListener('message', ({ data }: MessageEvent<SolverQuestion>) => {
  let answer: SolverAnswer;
  try {
    answer = { id: data.id, result: solveTask(data.task) };
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    answer = { id: data.id, result: null };
  }
  postMessage(answer);
});
