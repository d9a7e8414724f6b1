/** `sealwright sweep`: one of the three decisions, one row a value. */
import type { Chain } from '$lib/engine/chain';
import { sweep as computeSweep } from '$lib/engine/budget/sweep';
import type { Sweep, SweepOver } from '$lib/engine/budget/sweep-types';
import { sweepAnswerText, sweptValue } from '$lib/words/sweep-answer';
import { sweepTable } from '$lib/words/sweep-columns';
import { numberOption, onePlan, pointsOption, readArguments } from './arguments';
import { csv } from './csv';
import { FORMAT_OPTIONS, formatOption } from './format-option';
import type { Command, Io } from './io';
import { json, rowObjects } from './json';
import { loadPlan } from './load-plan';
import { plainText } from './plain-text';
import { textTable } from './text-table';
import { UsageError } from './usage-error';

/** What may be swept, in the file's units, as wide as the plan file allows. */
const RANGES: {
  readonly [O in SweepOver]: { readonly low: number; readonly high: number; readonly unit: string };
} = {
  volume: { low: 0.2, high: 5000, unit: 'L' },
  boost: { low: -40, high: 2000, unit: 'Hz or dB' },
  level: { low: 40, high: 150, unit: 'dB' }
};
/** A transform's target must be at least this, and a shelf's gain at most that. */
const LOWEST_TARGET = 1;
const MOST_GAIN = 40;

export const sweep: Command = async (args, io) => {
  const { values, plans } = readArguments('sweep', args, {
    over: 'string',
    from: 'string',
    to: 'string',
    points: 'string',
    ...FORMAT_OPTIONS
  });
  const path = onePlan('sweep', plans);
  const over = overOption(values.over);
  const format = formatOption('sweep', values);
  const points = pointsOption('sweep', values.points);
  const from = endOption(over, 'from', values.from);
  const to = endOption(over, 'to', values.to);
  requireUpward(from, to);
  const { chain } = await loadPlan(path);
  if (from !== undefined || to !== undefined) checkAgainstPlan(chain, over, from, to);
  const result = computeSweep(chain, { over, points, from: inSi(over, from), to: inSi(over, to) });
  if (format === 'json') io.out(json(asObject(result)));
  else if (format === 'csv') io.out(csv(sweepTable(result)));
  else printText(result, io);
  return 0;
};

function overOption(text: string | undefined): SweepOver {
  if (text === 'volume' || text === 'boost' || text === 'level') return text;
  const got = text === undefined ? '' : ` (got "${plainText(text)}")`;
  throw new UsageError(`--over must be volume, boost or level${got}`, 'sweep');
}

function endOption(over: SweepOver, name: string, text: string | undefined): number | undefined {
  const value = numberOption('sweep', name, text);
  const { low, high, unit } = RANGES[over];
  if (value !== undefined && !(value >= low && value <= high))
    throw new UsageError(`--${name} must lie within ${low} to ${high} ${unit} (got ${value})`, 'sweep');
  return value;
}

function requireUpward(from: number | undefined, to: number | undefined): void {
  if (from !== undefined && to !== undefined && !(from < to))
    throw new UsageError(`--from must be below --to (got ${from} and ${to})`, 'sweep');
}

/** What only the plan can tell: which end it fills in, and whether boost is a frequency or a gain. */
function checkAgainstPlan(
  chain: Chain,
  over: SweepOver,
  from: number | undefined,
  to: number | undefined
): void {
  const usual = computeSweep(chain, { over, points: 2 });
  const [low, high] = usual.rows.map((row) => sweptValue(usual, row.value));
  if (!((from ?? low) < (to ?? high)))
    throw new UsageError(
      `--from must be below --to (this plan's own range is ${Number(low.toPrecision(4))} to ${Number(high.toPrecision(4))})`,
      'sweep'
    );
  if (usual.column === 'boost_to_Hz' && from !== undefined && from < LOWEST_TARGET)
    throw new UsageError(`--from must be at least ${LOWEST_TARGET} Hz (got ${from})`, 'sweep');
  if (usual.column === 'boost_gain_dB' && (to ?? 0) > MOST_GAIN)
    throw new UsageError(`--to must be at most ${MOST_GAIN} dB (got ${to})`, 'sweep');
}

function inSi(over: SweepOver, value: number | undefined): number | undefined {
  return over === 'volume' && value !== undefined ? value / 1000 : value;
}

function asObject(result: Sweep) {
  const answer = (which: 'answer' | 'amplifierAnswer') => ({
    value: result[which] === null ? null : sweptValue(result, result[which]),
    text: sweepAnswerText(result, which)
  });
  return {
    over: result.over,
    block: result.block,
    answer: answer('answer'),
    amplifier_answer: answer('amplifierAnswer'),
    rows: rowObjects(sweepTable(result))
  };
}

function printText(result: Sweep, { out, ink }: Io): void {
  const texts = [sweepAnswerText(result, 'answer'), sweepAnswerText(result, 'amplifierAnswer')];
  const trial = result.column === 'boost_to_Hz' && result.block === null;
  if (trial)
    texts.push('the plan has no boost of its own: a trial transform from the box to Q 0.707 stands in');
  const [first, ...rest] = texts.map((text) => text.charAt(0).toUpperCase() + text.slice(1) + '\n');
  out([textTable(sweepTable(result)), '\n', ink.bold(first.trimEnd()) + '\n', ...rest].join(''));
}
