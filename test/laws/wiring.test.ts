/** Drivers and coils together. */
import fc from 'fast-check';
import { describe } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import type { Chain, CoilWiring, DriverWiring } from '$lib/engine/chain';
import { logGrid } from '$lib/engine/quantity/grid';
import { plausibleChain } from './chain-arbitrary';
import { closeAll, law, near, nearAll } from './law';

const GRID = logGrid(5, 500, 60);
const quick = (chain: Chain) => evaluate(chain, { waysOut: false });

/** Resistance in the way grows with the load, so that damping stays. */
const withSource = (chain: Chain, factor: number): Chain => ({
  ...chain,
  cableResistance: chain.cableResistance * factor,
  amplifier: { ...chain.amplifier, outputResistance: chain.amplifier.outputResistance * factor }
});

const inBox = (chain: Chain, net: number): Chain => ({ ...chain, box: { ...chain.box, net, inner: null } });
const perVolt = (travel: Float64Array, drive: Float64Array): Float64Array =>
  travel.map((x, i) => x / drive[i]);

const manyDrivers = fc.tuple(plausibleChain, fc.integer({ min: 2, max: 16 })).map(([chain, n]) => {
  const net = quick(chain).alignment.net;
  const with_ = (count: number, driverWiring: DriverWiring, factor: number) =>
    withSource(inBox({ ...chain, driver: { ...chain.driver, count, driverWiring } }, count * net), factor);
  return {
    n,
    one: with_(1, 'parallel', 1),
    parallel: with_(n, 'parallel', 1 / n),
    series: with_(n, 'series', n)
  };
});

// Small, "Direct-Radiator Loudspeaker System Analysis", JAES 20(5), 1972: N drivers in N times the box.
describe('N identical drivers in a box against one in an Nth of it', () => {
  law('same fc and Qtc, N times the efficiency', manyDrivers, 40, ({ n, one, parallel, series }) => {
    const single = quick(one);
    for (const many of [quick(parallel), quick(series)]) {
      near(many.alignment.fc, single.alignment.fc, 1e-9, 'fc');
      near(many.alignment.qtc, single.alignment.qtc, 1e-9, 'Qtc');
      near(many.driver.efficiency, n * single.driver.efficiency, 1e-9, 'efficiency');
    }
  });

  law('in parallel: an Nth of the load, same travel and 20·log10 N more per volt', manyDrivers, 40, (p) => {
    const single = curves(p.one, GRID);
    const many = curves(p.parallel, GRID);
    nearAll(many.impedance, single.impedance, (z) => z / p.n, 1e-9, 'impedance');
    closeAll(many.impedancePhase, single.impedancePhase, (x) => x, 1e-7, 'its angle');
    closeAll(many.driverBox, single.driverBox, (x) => x + 20 * Math.log10(p.n), 1e-9, 'level per volt');
    const travel = perVolt(many.travel, many.driveV);
    nearAll(travel, perVolt(single.travel, single.driveV), (x) => x, 1e-9, 'travel per volt');
  });

  law(
    'in series: N times the load, an Nth of the travel and the same level per volt',
    manyDrivers,
    40,
    (p) => {
      const single = curves(p.one, GRID);
      const many = curves(p.series, GRID);
      nearAll(many.impedance, single.impedance, (z) => z * p.n, 1e-9, 'impedance');
      closeAll(many.driverBox, single.driverBox, (x) => x, 1e-9, 'level per volt');
      const travel = perVolt(many.travel, many.driveV);
      nearAll(travel, perVolt(single.travel, single.driveV), (x) => x / p.n, 1e-9, 'travel per volt');
    }
  );
});

const coils = (inductive: boolean) =>
  fc.tuple(plausibleChain, fc.integer({ min: 2, max: 4 })).map(([chain, k]) => {
    const free = inductive ? {} : { le: 0, l2: null, r2: null };
    const wired = (coilWiring: CoilWiring, factor: number) =>
      withSource({ ...chain, driver: { ...chain.driver, ...free, coils: k, coilWiring } }, factor);
    // Re of the driver as a whole stays near what it was, whatever the number of coils.
    return { k, parallel: wired('parallel', 1), series: wired('series', k * k), single: wired('single', k) };
  });

// Energy argument on Small 1972: the same coils, the same flux, the same watts. Inductance: circuit theory, coupling 1.
describe.each([
  ['without inductance', false],
  ['with inductance, all coils on one flux', true]
])('k coils of a driver in series against parallel, %s', (_, inductive) => {
  law('same Qes, fs and Qtc, k² the load', coils(inductive), 40, ({ k, parallel, series }) => {
    const [p, s] = [quick(parallel), quick(series)];
    near(s.driver.qes, p.driver.qes, 1e-9, 'Qes');
    near(s.driver.fs, p.driver.fs, 1e-9, 'fs');
    near(s.alignment.qtc, p.alignment.qtc, 1e-9, 'Qtc');
    near(s.driver.nominal, k * k * p.driver.nominal, 1e-9, 'nominal load');
    near(s.driver.power ?? 1, p.driver.power ?? 1, 1e-12, 'rated heat');
  });

  law('same watts and travel for a level, a kth of the current', coils(inductive), 40, (c) => {
    const p = curves(c.parallel, GRID);
    const s = curves(c.series, GRID);
    nearAll(s.realW, p.realW, (x) => x, 1e-9, 'watts');
    nearAll(s.currentA, p.currentA, (x) => x / c.k, 1e-9, 'current');
    nearAll(s.impedance, p.impedance, (x) => x * c.k * c.k, 1e-9, 'load');
    nearAll(s.driveV, p.driveV, (x) => x * c.k, 1e-9, 'drive');
    nearAll(s.travel, p.travel, (x) => x, 1e-9, 'travel');
  });
});

describe('one coil of k driven, the others open', () => {
  law('k times the Qes, a kth of the efficiency and of the rated heat', coils(true), 40, (c) => {
    const all = quick(c.parallel).driver;
    const one = quick(c.single).driver;
    near(one.qes, c.k * all.qes, 1e-9, 'Qes');
    near(one.efficiency, all.efficiency / c.k, 1e-9, 'efficiency');
    near(one.power ?? 1 / c.k, (all.power ?? 1) / c.k, 1e-9, 'rated heat');
    near(one.nominal, c.k * all.nominal, 1e-9, 'nominal load');
  });
});
