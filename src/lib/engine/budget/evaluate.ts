/** A chain goes in, a budget comes out. Pure: the same chain gives the same budget. */
import type { Chain } from '../chain';
import { loadChoices } from '../driver/wiring';
import { fromDb, toDb } from '../quantity/decibel';
import type { Budget, Hot } from './budget';
import { exposure } from './exposure';
import { findings } from './findings/all-findings';
import { ledger } from './ledger';
import { keyFigures } from './key-figures';
import { limitMargins, notJudged, tightest } from './limit-margins';
import { goalShortfall } from './system';
import { deliveredLevel, loadTooLow, withHotCoil, workOut, type Workings } from './workings';

/** Everything again with the coil hot: the level is still to be delivered, the drive makes up what the coil loses. */
function hotCoil(w: Workings): Hot {
  const hot = withHotCoil(w);
  const pivot = w.chain.goal.pivot;
  const worst = tightest(limitMargins(hot, { from: w.chain.programme.lowest }));
  return {
    rise: w.chain.driver.coilRise,
    re: hot.circuit.coil.re,
    qtc: hot.alignment.qtc,
    levelLoss: deliveredLevel(w, pivot) - (deliveredLevel(hot, pivot) - hot.masterDriveDb + w.masterDriveDb),
    margin: worst.margin,
    limit: worst.limit,
    worst: worst.worst,
    holds: worst.margin >= 0 && !loadTooLow(w)
  };
}

export interface EvaluateOptions {
  /** Solve ways out too (default): the costly part. */
  readonly waysOut?: boolean;
}

export function evaluate(chain: Chain, options: EvaluateOptions = {}): Budget {
  const w = workOut(chain);
  const { limits, verdict, demand, system } = keyFigures(w);
  const loads = loadChoices(chain.driver, chain.amplifier.minimumLoad);
  const rows = ledger(w);
  const doubt = chain.room.doubt;
  const terminalV = demand.terminalV * fromDb(verdict.margin);
  const figures: Omit<Budget, 'findings'> = {
    driver: w.driver,
    alignment: w.alignment,
    system,
    limits,
    notJudged: notJudged(w),
    verdict,
    maxLevel: chain.goal.level + verdict.margin,
    masterDrive: w.masterDrive,
    demand,
    goalShort: goalShortfall(w),
    exposure: exposure(w, rows),
    limiter: {
      terminalV,
      inputDbv: chain.amplifier.gain === null ? null : toDb(terminalV) - chain.amplifier.gain
    },
    roomDoubt: { doubt, worstMargin: verdict.margin - doubt, bestMargin: verdict.margin + doubt },
    hot: hotCoil(w),
    ledger: rows,
    loads
  };
  return { ...figures, findings: findings(w, figures, options.waysOut ?? true) };
}
