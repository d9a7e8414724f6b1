/** `sealwright check`: judges plans. */
import type { Exposure } from '$lib/engine/budget/budget';
import { evaluate } from '$lib/engine/budget/evaluate';
import { report } from '$lib/words/report';
import { readArguments } from './arguments';
import { cautionsText, checkText } from './check-text/check-text';
import { InputError } from './input-error';
import type { Command, ExitStatus } from './io';
import { json } from './json';
import { loadPlan } from './load-plan';
import { UsageError } from './usage-error';

const SEPARATOR = '\n' + '='.repeat(72) + '\n\n';

export const check: Command = async (args, io) => {
  const { values, plans } = readArguments('check', args, { json: 'boolean' });
  if (plans.length === 0)
    throw new UsageError('check needs a PLAN: a file, or - for standard input', 'check');
  if (plans.filter((path) => path === '-').length > 1)
    throw new UsageError('standard input (-) can be given once', 'check');
  let status: ExitStatus = 0;
  let loudest: Exposure | null = null;
  const reports: object[] = [];
  for (const path of plans) {
    const loaded = await loadPlan(path).catch(asRefused);
    if (loaded instanceof InputError) {
      loaded.lines.forEach(io.err);
      status = 2;
      continue;
    }
    const { plan, chain } = loaded;
    const budget = evaluate(chain);
    if (!budget.verdict.holds && status === 0) status = 1;
    if (values.json) {
      reports.push({ file: path, ...report(plan, chain, budget) });
      continue;
    }
    const text = checkText({ plan, chain, budget, ink: io.ink, width: io.width });
    io.out((loudest === null ? '' : SEPARATOR) + text);
    if (loudest === null || budget.exposure.peakC > loudest.peakC) loudest = budget.exposure;
  }
  if (!values.json) {
    if (loudest !== null) io.out(cautionsText(loudest, io.ink, io.width));
  } else if (plans.length > 1) io.out(json(reports));
  else if (reports.length === 1) io.out(json(reports[0]));
  return status;
};

/** What cannot be read is said and passed over; anything else goes on up. */
function asRefused(error: unknown): InputError {
  if (error instanceof InputError) return error;
  throw error;
}
