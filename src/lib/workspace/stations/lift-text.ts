/** What a lift at the lowest notes costs, in a sentence. */
import { transformLift } from '$lib/engine/shaping/linkwitz-transform';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import { toEngineBlock } from '$lib/plan/schema/blocks/blocks';
import { significant } from '$lib/words/format-number';
import { dbText } from '$lib/words/quantities';
import type { Report } from '$lib/words/report';

/** "Lifts 9.3 dB at the bottom: 8.5 times the power." Power goes with 10^(dB/10). */
export function liftText(db: number): string {
  if (Math.abs(db) < 0.05) return 'Neither lifts nor lowers the bottom.';
  return db > 0
    ? `Lifts ${dbText(db)} at the bottom: ${significant(10 ** (db / 10), 2)} times the power.`
    : `Lowers the bottom by ${dbText(-db)}.`;
}

/** dB the block lifts towards 0 Hz; null for a kind that has none of its own, or where the box is not worked out yet. */
export function bottomLift(block: PlanBlock, report: Report | null): number | null {
  if (block.kind === 'low-shelf') return block.gain_dB;
  const engine = toEngineBlock(block);
  if (engine.kind !== 'linkwitz-transform') return null;
  if (engine.from !== 'box') return transformLift(engine, { fc: engine.from, qtc: 1 });
  const fc = report?.alignment.fc_Hz ?? null;
  const qtc = report?.alignment.qtc ?? null;
  return fc === null || qtc === null ? null : transformLift(engine, { fc, qtc });
}
