/** Whether the blocks together leave something to plan with. */
import { alignBox } from '../box/alignment';
import type { Chain } from '../chain';
import { equivalentDriver } from '../driver/equivalent';
import { logGrid } from '../quantity/grid';
import { blockResponse } from './block-response';
import { cascadePower, compileCascade, joinResponses } from './cascade';

/** dB beyond which shaping is no longer a design: any real chain stays far inside. */
const LIMIT = 400;

/**
 * Shaping that lifts or takes more than 400 dB at the pivot, or lifts more than that re the pivot anywhere from 1 to 500 Hz; null when all is well.
 * Blocks are summed in dB one by one, so that the check itself cannot overflow.
 */
export function shapingRangeProblem(chain: Chain): { kind: 'too-much' | 'too-little'; db: number } | null {
  const active = chain.shaping.filter((b) => !b.bypass);
  if (active.length === 0) return null;
  const driver = equivalentDriver(chain.driver, chain.air);
  const source = chain.cableResistance + chain.amplifier.outputResistance;
  const box = alignBox(driver, chain.box, chain.air, source);
  const parts = active.map((b) => joinResponses([blockResponse(b, box)]));
  const levelAt = (f: number) => parts.reduce((sum, c) => sum + 10 * Math.log10(cascadePower(c, f)), 0);
  const atPivot = levelAt(chain.goal.pivot);
  if (!(atPivot > -LIMIT)) return { kind: 'too-little', db: Math.max(-1e6, atPivot) };
  if (!(atPivot < LIMIT)) return { kind: 'too-much', db: Math.min(1e6, atPivot) };
  const whole = compileCascade(active, box);
  for (const f of logGrid(1, 500, 200)) {
    const lift = levelAt(f) - atPivot;
    // Blocks that lift beyond all numbers and take it away again are refused too: the cascade could not carry them.
    const carried = Number.isFinite(cascadePower(whole, f));
    if (!(lift < LIMIT) || !carried) return { kind: 'too-much', db: Math.min(1e6, Math.max(lift, LIMIT)) };
  }
  return null;
}
