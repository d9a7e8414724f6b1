/** Speed of the engine and the command line beside a circuit simulator and bare Node, all in one run. */
import { spawnSync } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { sweep } from '$lib/engine/budget/sweep';
import { logGrid } from '$lib/engine/quantity/grid';
import { readPlan } from '$lib/plan/read-plan';
import { planNetlist } from '../spice/plan-netlist';
import { AcBench } from '../spice/run-ac';
import { printRows, time, timeAsync, type BenchRow } from './time';

const root = process.cwd();
const folder = join(root, 'static/examples');
const grid = logGrid(5, 500, 400);
const spice = await AcBench.start();
const rows: BenchRow[] = [];

for (const file of readdirSync(folder).filter((name) => name.endsWith('.sealwright.json'))) {
  const text = readFileSync(join(folder, file), 'utf8');
  const read = readPlan(text);
  if (!read.ok) throw new Error(`${file} is no plan`);
  const { plan, chain } = read;
  const name = file.replace('.sealwright.json', '');
  // 200 points a decade over two decades: the engine's own 400 and one more.
  const netlist = planNetlist(plan);
  const simulator = await timeAsync(() => spice.run(netlist, { perDecade: 200 }), 15);
  rows.push({ what: `${name}: circuit simulator, AC analysis`, timed: simulator });
  rows.push({
    what: `${name}: evaluate and all curves, without ways out`,
    timed: time(() => {
      evaluate(chain, { waysOut: false });
      curves(chain, grid);
    }, 200),
    against: { name: 'the simulator', ms: simulator.median, atMost: 1 / 15 }
  });
  rows.push({
    what: `${name}: evaluate with ways out`,
    timed: time(() => evaluate(chain), 25),
    atMostMs: 25
  });
  for (const over of ['volume', 'boost', 'level'] as const)
    rows.push({
      what: `${name}: sweep of 200 over ${over}`,
      timed: time(() => sweep(chain, { over, points: 200 }), 9, 3),
      atMostMs: 60
    });
}

const example = join(folder, 'loft-corner.sealwright.json');
const node = (args: string[]) => {
  const { status, stderr } = spawnSync(process.execPath, args, { cwd: root });
  if (status !== 0) throw new Error(`node ${args.join(' ')}: ${stderr.toString()}`);
};
const bare = time(() => node(['-e', '0']), 15, 2);
rows.push({ what: 'node -e 0', timed: bare });
rows.push({
  what: 'node dist/cli.js check, one plan',
  timed: time(() => node(['dist/cli.js', 'check', example]), 15, 2),
  against: { name: 'bare Node', ms: bare.median, atMost: 2.5 }
});
printRows(rows);
process.exit(0);
