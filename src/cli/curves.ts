/** `sealwright curves`: one row a frequency. */
import { curves as computeCurves } from '$lib/engine/budget/curves';
import { logGrid } from '$lib/engine/quantity/grid';
import { curveTable } from '$lib/words/curve-columns';
import { numberOption, onePlan, pointsOption, readArguments } from './arguments';
import { csv } from './csv';
import type { Command } from './io';
import { json, rowObjects } from './json';
import { loadPlan } from './load-plan';
import { formatOption, FORMAT_OPTIONS } from './format-option';
import { textTable } from './text-table';
import { UsageError } from './usage-error';

const DEFAULT = { from: 5, to: 500, points: 400 };
/** Hz. The models hold for bass; wider grids are allowed, nonsense is not. */
const LOWEST = 0.1;
const HIGHEST = 100_000;

export const curves: Command = async (args, io) => {
  const { values, plans } = readArguments('curves', args, {
    from: 'string',
    to: 'string',
    points: 'string',
    ...FORMAT_OPTIONS
  });
  const path = onePlan('curves', plans);
  const format = formatOption('curves', values);
  const from = numberOption('curves', 'from', values.from) ?? DEFAULT.from;
  const to = numberOption('curves', 'to', values.to) ?? DEFAULT.to;
  const points = pointsOption('curves', values.points) ?? DEFAULT.points;
  if (!(from >= LOWEST && to <= HIGHEST))
    throw new UsageError(`--from and --to must lie within ${LOWEST} to ${HIGHEST} Hz`, 'curves');
  if (!(from < to)) throw new UsageError(`--from must be below --to (got ${from} and ${to})`, 'curves');
  const { chain } = await loadPlan(path);
  const table = curveTable(computeCurves(chain, logGrid(from, to, points)));
  if (format === 'json') io.out(json({ rows: rowObjects(table) }));
  else io.out(format === 'csv' ? csv(table) : textTable(table));
  return 0;
};
