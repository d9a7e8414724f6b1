import { fixed, significant } from '$lib/words/format-number';
import { isPlural, limitName } from '$lib/words/limit-names';
import { marginText } from '$lib/words/margin-text';
import {
  aboutHertzText,
  ampsText,
  dbText,
  hertzText,
  levelText,
  millimetresText,
  ohmText,
  qText,
  safeLevelText,
  voltsText,
  wattsText
} from '$lib/words/quantities';
import { pairLines } from '../table';
import { block, type Page } from './page';

/** What to buy first, then what the level asks of everything, then what room and heat do to it. */
export function levelBlock(page: Page): string[] {
  const { chain, budget } = page;
  const { demand, driver, verdict } = budget;
  const rows: [string, string][] = [
    ['amplifier to buy', `${wattsText(demand.ratedW)} into ${ohmText(driver.nominal)}`],
    [
      'wanted',
      `${levelText(chain.goal.level)} from ${hertzText(chain.goal.from)} to ${hertzText(chain.goal.to)}`
    ],
    [
      'within limits up to',
      `${safeLevelText(budget.maxLevel)} (${limitName(verdict.limit)}, at ${aboutHertzText(verdict.worst)})`
    ],
    ['amplifier peaks', `${voltsText(demand.peakV)}, ${ampsText(demand.peakA)}`],
    ['power', `${wattsText(demand.realW)} real, ${significant(demand.apparentVA, 3)} VA apparent`],
    ['from the mains', `${wattsText(demand.mainsW)} on average, idle not counted`],
    ['cone travel', `${millimetresText(demand.travel)} one way, at ${aboutHertzText(demand.travelAt)}`],
    ['master drive', `${voltsText(budget.masterDrive)}, where shaping is at 0 dB`],
    ['set a limiter to', limiterText(page)],
    ...(chain.copies > 1
      ? [['per set', `all of this is for each of ${chain.copies} sets`] as [string, string]]
      : []),
    ['room doubt', doubtText(page)],
    ['hot coil', hotText(page)]
  ];
  return block(page, 'Level and amplifier', pairLines(rows, page.width));
}

function limiterText({ budget: { limiter } }: Page): string {
  const input = limiter.inputDbv === null ? '' : `, ${fixed(limiter.inputDbv, 1)} dBV at its input`;
  return `${voltsText(limiter.terminalV)} RMS at the amplifier's terminals${input}`;
}

function doubtText({ budget: { roomDoubt: r } }: Page): string {
  if (r.doubt === 0) return 'none reckoned with';
  return `${levelText(r.doubt)} either way: ${marginText(r.worstMargin)} to ${marginText(r.bestMargin)}`;
}

function hotText({ budget: { hot } }: Page): string {
  const made =
    hot.margin < 0
      ? `${limitName(hot.limit)} ${isPlural(hot.limit) ? 'are' : 'is'} ${marginText(hot.margin)}`
      : `it leaves ${marginText(hot.margin)}`;
  return `${fixed(hot.rise, 0)} K up: Re ${ohmText(hot.re)}, Qtc ${qText(hot.qtc)}, ${dbText(hot.levelLoss)} less; made up, ${made}`;
}
