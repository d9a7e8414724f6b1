/** How much shaping lifts and what that costs. Thresholds: common practice, no source. */
import { transformLift } from '../../shaping/linkwitz-transform';
import type { Finding } from '../budget';
import { bandWayOut } from '../ways-out/band';
import { shapingLevel } from '../workings';
import { finding, type Context } from './context';

const NOTE_DB = 6;
const CAUTION_DB = 9;
const STRONG_DB = 12;
const LARGE_TRANSFORM_DB = 15;

export function boostHigh({ figures }: Context): Finding[] {
  const { boost, boostAt, boostPower } = figures.system;
  if (!(boost > NOTE_DB)) return [];
  return [
    finding(
      { code: 'boost-high', facts: { boost, power: boostPower, strong: boost > STRONG_DB } },
      boost > CAUTION_DB ? 'caution' : 'note',
      boostAt
    )
  ];
}

export function largeTransforms({ w }: Context): Finding[] {
  return w.chain.shaping.flatMap((block, index) => {
    if (block.kind !== 'linkwitz-transform' || block.bypass) return [];
    const lift = transformLift(block, w.alignment);
    return lift > LARGE_TRANSFORM_DB
      ? [finding({ code: 'transform-large', facts: { lift, block: index } }, 'caution')]
      : [];
  });
}

/** The goal not reached inside its band: by how much, where, and how much of that the shaping itself takes there. */
export function goalShort({ w, figures, solve }: Context): Finding[] {
  const { short, at, beyondTolerance } = figures.goalShort;
  if (!beyondTolerance) return [];
  return [
    finding(
      {
        code: 'goal-short',
        facts: {
          short,
          level: w.chain.goal.level,
          tolerance: w.chain.goal.tolerance,
          shapingHere: shapingLevel(w.cascade, at) - shapingLevel(w.cascade, w.chain.goal.pivot)
        }
      },
      'caution',
      at,
      solve(() => [bandWayOut(w)])
    )
  ];
}
