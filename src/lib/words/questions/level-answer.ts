/** How loud it can go, in words. Limits fall dB for dB with the level, so the report alone knows where each gives out. */
import type { Chain } from '$lib/engine/chain';
import { fixed, floorTo } from '../format-number';
import { capital, isPlural, limitName } from '../limit-names';
import { marginSize } from '../margin-text';
import { aboutHertzText, levelText, safeLevelText } from '../quantities';
import type { Report } from '../report';
import { besidesLimits } from './answers';
import { over, say, sentences, within, type Phrase } from './phrases';
import { reportedLimits } from './report-limits';

interface Question {
  readonly report: Report;
  readonly chain: Chain;
}

/** "Within limits up to 100.2 dB at the seat. There cone travel runs out first, at 18 Hz. The next is amplifier volts, at 102.2 dB. …" */
export function levelAnswer({ report, chain }: Question): Phrase[] {
  const { level } = chain.goal;
  const ordered = reportedLimits(report).sort((a, b) => a.margin - b.margin);
  const [first, next] = ordered;
  const most = `${safeLevelText(report.max_level_dB ?? NaN)} at the seat`;
  const runs = isPlural(first.limit) ? 'run' : 'runs';
  return sentences(
    [say('Within limits up to '), first.margin < 0 ? over(most) : within(most), say('.')],
    [say(`There ${limitName(first.limit)} ${runs} out first, at ${aboutHertzText(first.worstHz)}.`)],
    next === undefined
      ? []
      : [say(`The next limit is ${limitName(next.limit)}, at ${safeLevelText(level + next.margin)}.`)],
    [wanted(level, first.margin)],
    besidesLimits(report)
  );
}

function wanted(level: number, margin: number): Phrase {
  const opening = `${levelText(level)} is wanted`;
  if (margin === 0) return say(`${opening}, just that.`);
  return margin < 0
    ? over(`${opening}: ${marginSize(margin)} dB too much.`)
    : say(`${opening}, with ${marginSize(margin)} dB in hand.`);
}

/** "The room is good to 4 dB either way: the highest level lies between 96.2 dB and 104.2 dB." Empty without doubt. */
export function doubtText({ report, chain }: Question): string {
  const { doubt_dB: doubt, worst_margin_dB: worst, best_margin_dB: best } = report.room_doubt;
  if (doubt === null || worst === null || best === null || doubt === 0) return '';
  const at = (margin: number) => safeLevelText(chain.goal.level + margin);
  return `The room is an estimate, good to ${levelText(doubt)} either way: the highest level lies between ${at(worst)} and ${at(best)}.`;
}

/** Volts to set a limiter to, rounded to the safe side. */
export function limiterText({ limiter, max_level_dB: most }: Report): string {
  const { terminal_V: volts, input_dBV: input } = limiter;
  if (volts === null || most === null) return '';
  const atInput = input === null ? '' : `, which is ${fixed(floorTo(input, 1), 1)} dBV at its input`;
  return capital(
    `set the limiter to ${fixed(floorTo(volts, 1), 1)} V RMS at the amplifier's terminals${atInput}: it lets ${safeLevelText(most)} through and no more.`
  );
}
