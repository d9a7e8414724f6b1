/** Load, cable and source resistance. Thresholds: common practice, no source. */
import { alignBox } from '../../box/alignment';
import { goldenMaximum } from '../../quantity/search';
import { circuitPoint, solveCircuit } from '../../box/circuit';
import { logGrid } from '../../quantity/grid';
import type { Finding } from '../budget';
import { HIGHEST_HZ } from '../extremes';
import { cableWayOut } from '../ways-out/cable';
import { wiringWaysOut } from '../ways-out/wiring';
import { loadTooLow } from '../workings';
import { finding, type Context } from './context';

const CABLE_LOSS_DB = 0.3;
const QES_RISE = 0.05;
const QTC_MOVE = 0.05;

export function load({ w, figures, solve }: Context): Finding[] {
  if (!loadTooLow(w)) return [];
  return [
    finding(
      {
        code: 'load-low',
        facts: {
          nominal: w.driver.nominal,
          minimum: w.chain.amplifier.minimumLoad,
          loads: figures.loads
        }
      },
      'blocking',
      null,
      solve(() => wiringWaysOut(w))
    )
  ];
}

export function cable({ w, solve }: Context): Finding[] {
  const resistance = w.chain.cableResistance;
  const qesRise = resistance / w.driver.coil.re;
  const loss = 20 * Math.log10(1 + qesRise);
  if (!(loss > CABLE_LOSS_DB || qesRise > QES_RISE)) return [];
  return [
    finding(
      { code: 'cable-loss', facts: { loss, qesRise, resistance } },
      'caution',
      null,
      solve(() => [cableWayOut(w, CABLE_LOSS_DB, QES_RISE)])
    )
  ];
}

export function sourceResistance({ w }: Context): Finding[] {
  const without = alignBox(w.driver, w.chain.box, w.chain.air, 0).qtc;
  const { qtc } = w.alignment;
  if (!(Math.abs(qtc / without - 1) > QTC_MOVE)) return [];
  return [
    finding(
      {
        code: 'source-resistance',
        facts: { qtcWith: qtc, qtcWithout: without, resistance: w.sourceResistance }
      },
      'caution'
    )
  ];
}

/** One rating makes current bind wherever the load dips below it: then a second rating is worth asking for. */
export function singleRating({ w, figures }: Context): Finding[] {
  const { ratings } = w.chain.amplifier;
  if (ratings.length > 1 || figures.verdict.limit !== 'amplifier-current' || figures.verdict.margin >= 3)
    return [];
  const point = circuitPoint();
  const negative = (f: number) => {
    solveCircuit(w.circuit, f, point);
    return -point.z2;
  };
  const grid = logGrid(w.chain.programme.lowest, HIGHEST_HZ, 60);
  let best = 0;
  for (let i = 1; i < grid.length; i++) if (negative(grid[i]) > negative(grid[best])) best = i;
  const lowest = goldenMaximum(negative, grid[Math.max(0, best - 1)], grid[Math.min(59, best + 1)], 1e-4);
  const lowestImpedance = Math.sqrt(-lowest.value);
  const { load } = ratings[0];
  return [finding({ code: 'single-rating', facts: { lowestImpedance, load } }, 'note', lowest.x)];
}
