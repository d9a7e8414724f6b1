/** Every finding of a plan, gravest first. A new one adds its function here and its facts in budget.ts; its words live in `words/`. */
import type { Budget, Finding, Severity } from '../budget';
import type { Workings } from '../workings';
import * as amplifier from './amplifier-findings';
import * as box from './box-findings';
import type { Context } from './context';
import * as driver from './driver-findings';
import * as limits from './limit-findings';
import * as room from './room-findings';
import * as shaping from './shaping-findings';

const SOURCES: readonly ((context: Context) => Finding[])[] = [
  limits.exceeded,
  amplifier.load,
  limits.boostShort,
  limits.thin,
  limits.unjudged,
  limits.roomDoubt,
  limits.hotCoil,
  shaping.goalShort,
  limits.infrasonic,
  shaping.boostHigh,
  shaping.largeTransforms,
  box.qtc,
  box.netSmall,
  box.airSpring,
  box.alignmentDiffers,
  box.losses,
  driver.driverData,
  driver.sag,
  amplifier.cable,
  amplifier.sourceResistance,
  amplifier.singleRating,
  room.boundaryDip,
  room.loudPeaks
];

const GRAVITY: readonly Severity[] = ['blocking', 'caution', 'note'];

export function findings(w: Workings, figures: Omit<Budget, 'findings'>, waysOut: boolean): Finding[] {
  const context: Context = {
    w,
    figures,
    solve: (ways) => (waysOut ? ways().filter((way) => way !== null) : [])
  };
  const all = SOURCES.flatMap((source) => source(context));
  return GRAVITY.flatMap((severity) => all.filter((f) => f.severity === severity));
}
