/**
 * A live, independent witness: every public reference plan and every example plan as a circuit of its own in a general circuit simulator
 * (ngspice), written from the data sheet (`test/spice/plan-netlist.ts`), against the engine: load, cone travel, level and pressure phase
 * from 5 to 500 Hz within 0.001 dB and 0.01°. (0.02 dB and 0.2° would do for planning; two solvers of one circuit agree far better.)
 */
import { readdirSync, readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { toDb } from '$lib/engine/quantity/decibel';
import { toChain } from '$lib/plan/to-chain';
import type { Plan } from '$lib/plan/schema';
import { planNetlist, witnessed, type Witnessed } from '../spice/plan-netlist';
import { AcBench } from '../spice/run-ac';
import { absolute, angle, Comparison } from '../tolerance';

const DB = absolute(0.001);
const DEGREES = angle(0.01);

const plansIn = (folder: string): [name: string, plan: Plan][] => {
  const url = new URL(folder, import.meta.url);
  return readdirSync(url)
    .filter((file) => file.endsWith('.sealwright.json'))
    .map((file) => [
      file.replace('.sealwright.json', ''),
      JSON.parse(readFileSync(new URL(file, url), 'utf8')) as Plan
    ]);
};

/** Shapes no file has: coils left open, three and four coils, many drivers, every loss at once, other sheets. */
const base = JSON.parse(
  readFileSync(new URL('./public/two-coils-in-line.sealwright.json', import.meta.url), 'utf8')
) as Plan;
const variants: [name: string, plan: Plan][] = [
  ['one coil of two driven', { ...base, driver: { ...base.driver, coil_wiring: 'single' } }],
  ['two lossy coils side by side', { ...base, driver: { ...base.driver, coil_wiring: 'parallel' } }],
  ['three coils in line', { ...base, driver: { ...base.driver, coils: 3 } }],
  ['one coil of four driven', { ...base, driver: { ...base.driver, coils: 4, coil_wiring: 'single' } }],
  [
    'a sheet of mass, compliance, force and loss',
    {
      ...base,
      driver: {
        ...base.driver,
        ...{ fs_Hz: null, vas_L: null, qms: null, qes: null, qts: null },
        ...{ mms_g: 210, cms_mm_per_N: 0.21, rms_kg_per_s: 5.5, bl_Tm: 11 }
      }
    }
  ],
  [
    'a sheet of fs, mass, Qts and Qes',
    {
      ...base,
      driver: { ...base.driver, ...{ vas_L: null, qms: null, qes: 0.5, qts: 0.45, mms_g: 180 } }
    }
  ],
  [
    'three drivers of two coils, all in line, every loss',
    {
      ...base,
      driver: { ...base.driver, count: 3, driver_wiring: 'series' },
      box: { net_L: 90, fill_gain: 1.2, q_absorption: 4, q_leakage: 6 }
    }
  ],
  [
    'four drivers side by side in thin cold air',
    {
      ...base,
      air: { temperature_C: -20, pressure_kPa: 60 },
      driver: { ...base.driver, count: 4, driver_wiring: 'parallel', coil_wiring: 'parallel' },
      box: { net_L: 150, q_leakage: 10 }
    }
  ]
];

const PLANS = [...plansIn('./public/'), ...plansIn('../../static/examples/'), ...variants];

/** The engine's word for the same: shaping and room left out, per volt of drive. */
function compare(plan: Plan, due: Witnessed): Comparison {
  const chain = { ...toChain(plan), shaping: [], room: { kind: 'open-air', doubt: 0 } as const };
  const c = curves(chain, Float64Array.from(due.f));
  const all = new Comparison();
  due.f.forEach((f, i) => {
    const at = `at ${f.toFixed(2)} Hz`;
    all.check(`impedance ${at}, dB`, toDb(c.impedance[i]), toDb(due.impedance[i]), DB);
    all.check(`impedance phase ${at}`, c.impedancePhase[i], due.impedancePhase[i], DEGREES);
    const travel = toDb(c.travel[i] / c.driveV[i]);
    due.travel.forEach((cone, n) =>
      all.check(`travel of cone ${n + 1} ${at}, dB`, travel, toDb(cone[i]), DB)
    );
    all.check(`level ${at}, dB`, c.driverBox[i], due.level[i], DB);
    all.check(`pressure phase ${at}`, c.phase[i], due.phase[i], DEGREES);
  });
  return all;
}

describe('the circuit simulator bears the engine out', () => {
  let bench: AcBench;
  beforeAll(async () => {
    bench = await AcBench.start();
  }, 120_000);

  test('there are plans to look at', () => {
    expect(plansIn('./public/')).toHaveLength(8);
    expect(plansIn('../../static/examples/').length).toBeGreaterThan(1);
  });

  test.for(PLANS)('%s', async ([, plan]) => {
    const due = witnessed(plan, await bench.run(planNetlist(plan)));
    expect(due.f).toHaveLength(101);
    const all = compare(plan, due);
    expect(all.misses, all.nearest).toEqual([]);
    expect(all.count).toBe(101 * (4 + (plan.driver.count ?? 1)));
  });

  test('a cone heavier by one per cent is noticed', async () => {
    const due = witnessed(base, await bench.run(planNetlist(base, 1.01)));
    expect(compare(base, due).misses.length).toBeGreaterThan(100);
  });

  test.for<[name: string, lines: string[]]>([
    ['a line that says too little', ['r2 a']],
    ['a source that is not there', ['h2 b 0 nowhere 3', 'r2 b 0 1']],
    ['a part that is not there', ['x2 a 0 nothing']],
    ['a node that hangs in the air', ['c2 a b 1u', 'c3 b 0 1u']]
  ])('%s is refused, not left out or answered with the run before', async ([, lines]) => {
    const sound = ['vdrive a 0 dc 0 ac 1', 'r1 a 0 1'];
    await expect(bench.run([...sound, ...lines])).rejects.toThrow('simulator');
    expect((await bench.run(sound)).f).toHaveLength(101);
  });
});
